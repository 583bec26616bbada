package etchloom.write;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;

import org.junit.jupiter.api.Test;

class NumbersTest {
  @Test
  void lengths_arePrintedFromWholeNanometres() {
    assertEquals("12.5", Numbers.mm(12_500_000L));
    assertEquals("-0.000001", Numbers.mm(-1L));
    assertEquals("0.0", Numbers.mm(0L));
    assertEquals("0.0", Numbers.mm(-0.0));
    assertEquals("-9223372036854.775807", Numbers.mm(-Long.MAX_VALUE));
    assertThrows(IllegalArgumentException.class, () -> Numbers.mm(Double.NaN));
  }

  @Test
  void halves_andRatios() {
    StringBuilder s = new StringBuilder();
    Numbers.half(s, 3);
    Numbers.half(s.append(' '), 3_200_000);
    Numbers.ratio(s.append(' '), -1);
    Numbers.ratio(s.append(' '), 1.0 / 3);
    assertEquals("0.0000015 1.6 -1.0 0.333333333333", s.toString());
  }

  /** Halves away from zero, so that mirrored boards round alike. */
  @Test
  void micrometres_roundSymmetrically() {
    assertEquals(1, Numbers.micrometres(500));
    assertEquals(-1, Numbers.micrometres(-500));
    assertEquals(0, Numbers.micrometres(-499));
  }
}
