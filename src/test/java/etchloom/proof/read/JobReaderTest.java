package etchloom.proof.read;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import etchloom.proof.image.JobFile;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Source: Gerber Job Format Specification 2020.08, recalled; the sample is from a script. */
class JobReaderTest {
  private static JobFile read(String text) throws UnreadableFile {
    return JobReader.read("t.gbrjob", text.getBytes(StandardCharsets.UTF_8));
  }

  @Test
  void sample() throws UnreadableFile {
    JobFile f = JobReader.read("round.gbrjob", Samples.file("round.gbrjob"));
    assertEquals(List.of(), f.warnings());
    assertEquals("roundcoil", f.projectName());
    assertEquals("A", f.projectRevision());
    assertEquals(40.0, f.sizeXMm().getAsDouble());
    assertEquals(2, f.layerNumber().getAsInt());
    assertEquals(1.6, f.boardThicknessMm().getAsDouble());
    assertEquals("ENIG", f.finish());
    assertEquals("round-L1.gbr", f.files().get(0).path());
    assertEquals(List.of("Copper", "L1", "Top"), f.files().get(0).function());
    assertEquals("Negative", f.files().get(2).polarity());
    Map<String, Double> outer = f.designRules().get(0).valuesMm();
    assertEquals(
        List.of("PadToPad", "PadToTrack", "TrackToTrack", "MinLineWidth"),
        List.copyOf(outer.keySet()));
    assertEquals(0.2, outer.get("TrackToTrack"));
    // Published files add up mask, copper and dielectric to the board's thickness.
    double sum = f.stackup().stream().mapToDouble(l -> l.thicknessMm().orElse(0)).sum();
    assertEquals(1.6, sum, 1e-9);
  }

  @Test
  void whatIsAbsentStaysAbsent() throws UnreadableFile {
    JobFile f = read("{\"FilesAttributes\":[],\"GeneralSpecs\":{\"BoardThickness\":\"1.2\"}}");
    assertEquals(true, f.sizeXMm().isEmpty());
    assertEquals(true, f.layerNumber().isEmpty());
    assertEquals("", f.finish());
    assertEquals(1.2, f.boardThicknessMm().getAsDouble());
    assertEquals("job-value", f.warnings().get(0).code());
  }

  @ParameterizedTest(name = "{2}: {0}")
  @CsvSource(
      delimiter = '|',
      value = {
        "{ | 1 | json",
        "[] | 1 | json",
        "'' | 1 | json",
        "{} | 1 | job-value",
        "{\"FilesAttributes\":[]} 7 | 1 | json",
        "{\"FilesAttributes\":[],;\"GeneralSpecs\":{\"LayerNumber\":2.5}} | 2 | job-value",
        "{\"FilesAttributes\":[],;\"GeneralSpecs\":{\"Size\":{\"X\":true}}} | 2 | job-value",
        "{\"FilesAttributes\":[],;\"GeneralSpecs\":{\"Size\":{\"X\":1e999}}} | 2 | job-value",
        "{\"FilesAttributes\":[;{\"FileFunction\":\"Profile,NP\"}]} | 2 | job-value",
        "{\"FilesAttributes\":[;{\"Path\":\"../a.gbr\"}]} | 2 | job-value",
        "{\"FilesAttributes\":[;{\"Path\":\"/a.gbr\"}]} | 2 | job-value"
      })
  void refused(String text, int line, String code) {
    UnreadableFile e = assertThrows(UnreadableFile.class, () -> read(text.replace(';', '\n')));
    assertEquals(code, e.code(), e.getMessage());
    assertEquals(line, e.line(), e.getMessage());
  }

  @Test
  void nestingIsBounded() {
    UnreadableFile e =
        assertThrows(
            UnreadableFile.class, () -> read("{\"a\":" + "[".repeat(900) + "]".repeat(900) + "}"));
    assertEquals("too-large", e.code());
  }
}
