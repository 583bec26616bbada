package etchloom.cli;

import static org.junit.jupiter.api.Assertions.assertEquals;

import etchloom.testing.Run;
import java.nio.file.Path;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.w3c.dom.Node;

class VersionTest {
  @Test
  void theProgramTellsTheBuildFilesVersion() throws Exception {
    Node project =
        DocumentBuilderFactory.newInstance()
            .newDocumentBuilder()
            .parse(Path.of("pom.xml").toFile())
            .getDocumentElement();
    String version = "";
    for (Node n = project.getFirstChild(); n != null; n = n.getNextSibling()) {
      if (n.getNodeName().equals("version")) {
        version = n.getTextContent();
      }
    }
    Run run = Run.of("--version");
    assertEquals("etchloom " + version + "\n", run.out());
    assertEquals(ExitCode.DONE, run.code());
  }
}
