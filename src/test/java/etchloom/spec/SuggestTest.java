package etchloom.spec;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.List;
import java.util.Optional;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The nearest valid word, and none where none is clearly nearest. */
class SuggestTest {
  private static final List<String> COIL =
      List.of(
          "outline",
          "inner-radius",
          "outer-radius",
          "width",
          "turns",
          "track",
          "space",
          "corner",
          "layers",
          "taper");

  @ParameterizedTest(name = "{0}")
  @CsvSource({
    "trak, track",
    "tracks, track",
    "rtack, track",
    "Track, track",
    "TURNS, turns",
    "inner_radius, inner-radius",
    "inner radius, inner-radius",
    "innerradius, inner-radius",
    "outer-raduis, outer-radius",
    "oter-radius, outer-radius",
    "spcae, space",
    "with, width",
    "coner, corner",
    "layer, layers",
    "inner, inner-radius",
    "outer, outer-radius",
    "outlin, outline"
  })
  void misspeltKeys(String wrong, String right) {
    assertEquals(Optional.of(right), Suggest.nearest(wrong, COIL));
  }

  @ParameterizedTest(name = "[{0}]")
  @CsvSource({"radius", "pitch", "x", "''", "colour", "iner-rads", "tr", "gap-between-the-tracks"})
  void nothingNearEnough(String wrong) {
    assertEquals(Optional.empty(), Suggest.nearest(wrong, COIL));
  }

  @Test
  void aTie_givesNone() {
    assertEquals(Optional.empty(), Suggest.nearest("nm", List.of("mm", "cm", "m", "um")));
    assertEquals(Optional.of("mm"), Suggest.nearest("MM", List.of("mm", "cm", "m", "um")));
  }

  @Test
  void aLongText_isNotCompared() {
    assertEquals(Optional.empty(), Suggest.nearest("track".repeat(100), COIL));
  }

  /** Worked by hand; the last differs from plain edit distance, which gives 2. */
  @ParameterizedTest(name = "{0} {1}")
  @CsvSource({"'', abc, 3", "abc, '', 3", "same, same, 0", "kitten, sitting, 3", "wedge, wegde, 1"})
  void distances(String a, String b, int d) {
    assertEquals(d, Suggest.distance(a, b));
    assertEquals(d, Suggest.distance(b, a));
  }
}
