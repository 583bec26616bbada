package etchloom.proof;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.artwork.Joint;
import java.util.List;
import org.junit.jupiter.api.Test;

/** One fault at a time in what the files of a clean set say of themselves and each other. */
class DeclaredFaultTest {
  private final Artwork wheel = EditedSet.wheel().art;

  @Test
  void wrongNetName_isFoundWithItsLine() {
    EditedSet e =
        EditedSet.wheel().replace(EditedSet.copper(2), "%TO.N,WINDING*%", "%TO.N,WINDUNG*%");
    ProofFinding f =
        e.mustFind(ProofNames.NET_NAME, 2, wheel.conductorsOn(2).get(0).path().start(), 1e-6);
    assertTrue(f.line() > 10 && f.message().contains("WINDUNG"), f.text());
  }

  @Test
  void netlistOfAnotherNet_isFound() {
    EditedSet e = EditedSet.wheel();
    String line = e.text(".ipc").lines().filter(l -> l.startsWith("317")).skip(6).findFirst().get();
    e.replace(".ipc", line, line.replace("WINDING", "WINDUNG"));
    ProofFinding f = EditedSet.only(e.prove(), ProofNames.NETLIST);
    assertTrue(f.at().isPresent() && f.line() > 5 && f.message().contains("WINDUNG"), f.text());
  }

  @Test
  void netlistEdgeOffThePlace_isFound() {
    EditedSet e = EditedSet.wheel();
    String line = e.text(".ipc").lines().filter(l -> l.startsWith("089")).findFirst().get();
    int x = line.indexOf("X", 6);
    String moved = line.substring(0, x + 4) + (line.charAt(x + 4) == '0' ? '1' : '0');
    e.replace(".ipc", line, moved + line.substring(x + 5));
    assertTrue(e.prove().findings().stream().anyMatch(f -> f.name().equals(ProofNames.NETLIST)));
  }

  @Test
  void padAndHoleCalledSomethingElse_areFound() {
    EditedSet pad =
        EditedSet.wheel()
            .replace(
                EditedSet.copper(1),
                "%TA.AperFunction,ComponentPad*%",
                "%TA.AperFunction,ViaPad*%");
    Joint t = wheel.terminals().get(0);
    pad.mustFind(ProofNames.FUNCTION, 1, t.at(), 1e-6);
    EditedSet hole = EditedSet.wheel().replace("-plated.xnc", "ComponentDrill", "ViaDrill");
    hole.mustFind(ProofNames.FUNCTION, 0, t.at(), 1e-6);
  }

  @Test
  void jobFileThatSaysOtherwise_isFound() {
    EditedSet e = EditedSet.wheel().replace(".gbrjob", "Copper,L2,Inr", "Copper,L3,Inr");
    assertTrue(EditedSet.only(e.prove(), ProofNames.JOB_FILE).message().contains("-copper-L2.gbr"));
    EditedSet size = EditedSet.wheel().replace(".gbrjob", "84", "85");
    assertTrue(EditedSet.only(size.prove(), ProofNames.JOB_FILE).message().contains("85"));
  }

  @Test
  void missingMaskOpening_isFound() {
    Joint t = wheel.terminals().get(1);
    EditedSet e = EditedSet.wheel().replace("-mask-top.gbr", EditedSet.xy(t.at()) + "D03*\n", "");
    e.mustFind(ProofNames.MASK, 0, t.at(), 1e-6);
  }

  @Test
  void movedEdge_isFound() {
    EditedSet e = EditedSet.wheel();
    String t = e.text("-profile.gbr");
    ProofReport r = e.put("-profile.gbr", t.replace("7000000", "7100000")).prove();
    assertEquals(4, r.findings().stream().filter(f -> f.name().equals("profile")).count());
  }

  @Test
  void archiveOfOtherBytes_isFound() {
    EditedSet e = EditedSet.wheel();
    byte[] zip = e.files.get(wheel.slug() + "-fab.zip").clone();
    String name = wheel.slug() + "-profile.gbr";
    byte[] bytes = e.files.get(name).clone();
    e.files.put(name, bytes);
    bytes[5] = 'q'; // a letter of the comment
    e.files.put(wheel.slug() + "-fab.zip", zip);
    List<String> told =
        e.prove().findings().stream()
            .filter(f -> f.name().equals(ProofNames.ARCHIVE))
            .map(ProofFinding::message)
            .toList();
    assertTrue(told.stream().anyMatch(m -> m.contains("-profile.gbr")), told::toString);
  }

  @Test
  void exchangedTerminalMarks_areFound() {
    EditedSet e = EditedSet.wheel();
    String t = e.text(EditedSet.copper(1)).replace("X1,U1", "X1,?").replace("X1,V1", "X1,U1");
    e.put(EditedSet.copper(1), t.replace("X1,?", "X1,V1"));
    ProofReport r = e.prove();
    assertEquals(2, r.findings().stream().filter(f -> f.name().equals("terminal")).count());
    assertFalse(r.passed());
  }
}
