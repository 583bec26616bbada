package etchloom.proof.read;

import static org.junit.jupiter.api.Assertions.assertEquals;

import etchloom.proof.image.DrawnObject.Flash;
import etchloom.proof.image.DrawnObject.Region;
import etchloom.proof.image.DrawnObject.Stroke;
import etchloom.proof.image.LayerImage;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/**
 * The round sample board, written by a script of its own that shares nothing with this project's
 * writers; its MD5 sums come from Python's hashlib.
 */
class GerberSampleTest {
  @Test
  void copperLayer() throws UnreadableFile {
    LayerImage image = GerberReader.read("round-L1.gbr", Samples.file("round-L1.gbr"));
    assertEquals(List.of("Copper", "L1", "Top"), image.fileAttribute(".FileFunction"));
    assertEquals(5, image.objects().size());
    Stroke spiral = (Stroke) image.objects().get(0);
    assertEquals(0.3, spiral.widthMm());
    assertEquals("PH_A", spiral.attributes().net());
    assertEquals("Conductor", spiral.attributes().function());
    assertEquals(10, spiral.path().segments().size());
    assertEquals(27, spiral.line());
    // Half circles of 1.2 to 2.6 mm in steps of 0.2 mm, then 4 mm down and 20.6 mm across.
    double halfCircles = Math.PI * (1.2 + 1.4 + 1.6 + 1.8 + 2.0 + 2.2 + 2.4 + 2.6);
    assertEquals(halfCircles + 4 + 20.6, spiral.path().lengthMm(), 1e-9);
    Flash terminal = (Flash) image.objects().get(2);
    assertEquals("J1", terminal.attributes().refdes());
    assertEquals("1", terminal.attributes().pin());
    assertEquals(12, terminal.aperture());
    Region label = (Region) image.objects().get(4);
    assertEquals(List.of(""), label.attributes().nets());
    assertEquals("NonConductor", label.attributes().function());
    // A twelfth of a ring, radii 16 and 18 mm, less what the grid's rounding moves.
    double ring = TestCopper.shape(label).getArea();
    assertEquals(Math.PI * (18 * 18 - 16 * 16) / 12, ring, 1e-4 * ring);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "round-L1.gbr",
        "round-L2.gbr",
        "round-legend-top.gbr",
        "round-mask-top.gbr",
        "round-mask-bot.gbr",
        "round-profile.gbr",
        "round-pth.gbr"
      })
  void readsWithoutWarning(String name) throws UnreadableFile {
    assertEquals(List.of(), GerberReader.read(name, Samples.file(name)).warnings());
  }

  @Test
  void aByteChangedShowsInTheSum() throws UnreadableFile {
    String text = new String(Samples.file("round-L1.gbr"), StandardCharsets.UTF_8);
    LayerImage image = Samples.gerber(text.replace("C,0.3", "C,0.4"));
    assertEquals("md5-mismatch", image.warnings().get(0).code());
  }
}
