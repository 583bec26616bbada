package etchloom.receive;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.diagnostic.Diagnostic;
import etchloom.diagnostic.Staged;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class ReadingsReaderTest {
  private static final String HEAD = "board,from,to,ohm,celsius\n";

  private static Staged<Readings> read(String text) {
    return ReadingsReader.read(
        "r.csv", text.getBytes(StandardCharsets.UTF_8), List.of("U1", "V1", "W1"));
  }

  @Test
  void oneRowAMeasurement() {
    Readings r = read(HEAD + "7,U1,V1,11.25,23.5\n7,v1,w1,OL,23.5\n").value().orElseThrow();
    assertEquals(List.of(), r.faults());
    assertEquals(new Reading(2, "7", "U1", "V1", 11.25, 23.5), r.all().get(0));
    assertEquals(Double.POSITIVE_INFINITY, r.all().get(1).ohm());
    assertEquals("W1", r.all().get(1).to());
  }

  @Test
  void leadsAreTakenOff() {
    Readings r =
        read(HEAD + "7,U1,V1,11.25,20\nlead,,,0.2,\nLead,U1,U1,0.3,20\n").value().orElseThrow();
    assertEquals(0.25, r.leadOhm(), 1e-12);
    assertEquals(11.0, r.all().get(0).ohm(), 1e-12);
  }

  /** RFC 4180, section 2: quoted values, doubled quotes, line ends of two characters. */
  @Test
  void quotesColumnsAndLineEnds() {
    Readings r =
        read("\uFEFFcelsius, note,board,to,from,ohm\r\n20,x,\"a, \"\"b\"\"\",U1,W1, 3.5\r\n")
            .value()
            .orElseThrow();
    assertEquals(List.of(), r.faults());
    assertEquals(new Reading(2, "a, \"b\"", "W1", "U1", 3.5, 20), r.all().get(0));
  }

  @ParameterizedTest
  @CsvSource(
      delimiter = '|',
      value = {
        "7,U1,V1,abc,20|ohm|abc",
        "7,U1,V1,,20|ohm|nothing",
        "7,U1,V1,-3,20|ohm|above 0",
        "7,U1,V1,NaN,20|ohm|NaN",
        "7,U1,V1,1e999,20|ohm|1e999",
        "7,U1,V1,3 ohm,20|ohm|3 ohm",
        "7,U1,V1,3,warm|celsius|warm",
        "7,U1,V1,3,1000|celsius|1000",
        "7,U1,X1,3,20|to|X1",
        "7,U1,U1,3,20|to|itself",
        ",U1,V1,3,20|board|name",
        "7,U1,V1,3|''|4 values",
        "7,U1,V1,3,5,20|''|decimal point",
        "\"7,U1,V1,3,20|''|quote",
        "lead,,,OL,|ohm|OL"
      })
  void badRowsAreNamedAndTheRestTaken(String row, String key, String words) {
    Readings r = read(HEAD + "1,U1,V1,3,20\n\n" + row + "\n2,U1,V1,3,20\n").value().orElseThrow();
    assertEquals(2, r.all().size());
    Diagnostic d = r.faults().get(0);
    assertEquals(1, r.faults().size());
    assertEquals(4, d.where().line());
    assertEquals(key, d.key());
    assertTrue(d.message().contains(words), d.message());
  }

  @Test
  void lessThanTheLeads() {
    Readings r = read(HEAD + "lead,,,0.5,\n7,U1,V1,0.4,20\n").value().orElseThrow();
    assertEquals(3, r.faults().get(0).where().line());
    assertEquals(List.of(), r.all());
  }

  @ParameterizedTest
  @ValueSource(strings = {"", "\n", "board;from;to;ohm;celsius\n7;U1;V1;3;20\n", "7,U1,V1,3,20\n"})
  void noHeaderNoReadings(String text) {
    Staged<Readings> s = read(text);
    assertTrue(s.value().isEmpty());
    assertTrue(s.diagnostics().get(0).hints().get(0).contains("board,from,to,ohm,celsius"));
  }

  @Test
  void notText() {
    byte[] bytes = {'b', (byte) 0xff, '\n'};
    assertTrue(ReadingsReader.read("r.csv", bytes, List.of("U1", "V1")).value().isEmpty());
  }
}
