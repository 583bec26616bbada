package etchloom.browser;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import com.fasterxml.jackson.jr.ob.JSON;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** Every number in a table of the page, as the browser has it, against {@code report.json}. */
@NeedsBrowser
class ReportNumbersTest {
  /** A star motor, a generator, layers side by side, and broken rules. */
  private static final String BROKEN = "broken";

  @TempDir private Path folder;

  @ParameterizedTest
  @ValueSource(strings = {"dosing-pump", "wind-logger", "tide-meter", BROKEN})
  void everyNumberIsTheOneOfTheFile(String name) throws IOException {
    Path set = name.equals(BROKEN) ? DrawnPages.broken(folder) : DrawnPages.template(folder, name);
    Map<String, Object> json = JSON.std.mapFrom(Files.readAllBytes(set.resolve("report.json")));
    Browser b = Browser.get();
    b.open(set.resolve("report.html").toUri());
    List<?> cells =
        (List<?>)
            b.run(
                "return Array.from(document.querySelectorAll('main table:not(.u-legend) [data-key]'),"
                    + " c => [c.dataset.key, c.dataset.over || '', c.dataset.v || '',"
                    + " c.textContent])");
    List<String> wrong = new ArrayList<>();
    for (Object o : cells) {
      List<?> c = (List<?>) o;
      fault(json, (String) c.get(0), (String) c.get(1), (String) c.get(2), (String) c.get(3))
          .forEach(wrong::add);
    }
    assertEquals(List.of(), wrong.stream().limit(10).toList(), wrong.size() + " are wrong");
    assertTrue(cells.size() > 600, cells.size() + " numbers");
    Object without =
        b.run(
            "return Array.from(document.querySelectorAll('main table:not(.u-legend) td.n'))"
                + ".filter(c => /[0-9]/.test(c.textContent) && !c.dataset.key)"
                + ".map(c => c.textContent)");
    assertEquals(List.of(), without, "numbers that say not which of the file they are");
  }

  private static List<String> fault(
      Map<String, Object> json, String key, String over, String exact, String text) {
    Object found = at(json, key);
    if (found instanceof Boolean b) {
      return text.equals(b ? "yes" : "no") ? List.of() : List.of(key + ": " + text + ", " + b);
    }
    if (found == null) {
      boolean said = text.startsWith("none") || text.startsWith("never");
      return said ? List.of() : List.of(key + " is not in the file: " + text);
    }
    double value = ((Number) found).doubleValue();
    double factor = over.isEmpty() ? 1 : 1 / ((Number) at(json, over)).doubleValue();
    List<String> out = new ArrayList<>();
    ShownNumber shown = ShownNumber.of(text);
    boolean share = shown.unit().equals("%") && (!over.isEmpty() || !key.contains("Percent"));
    if (!shown.shows(value * factor * (share ? 100 : 1))) {
      out.add(key + ": " + text + ", " + value);
    }
    if (!exact.isEmpty()) {
      double v = Double.parseDouble(exact);
      double wanted = value * factor * (over.isEmpty() ? 1 : 100);
      // A share is of unrounded numbers, each of which the file has to ten digits.
      if (Math.abs(v - wanted) > (over.isEmpty() ? 0 : 1e-9) * Math.abs(wanted)) {
        out.add(key + ": " + exact + " for a plot, " + wanted);
      }
    }
    return out;
  }

  /** The value at {@code emf.waveform[3].U}; null if there is none. */
  private static Object at(Object tree, String key) {
    Object here = tree;
    for (String step : key.replace("[", ".[").split("\\.")) {
      if (step.startsWith("[")) {
        here = ((List<?>) here).get(Integer.parseInt(step.substring(1, step.length() - 1)));
      } else {
        here = ((Map<?, ?>) here).get(step);
      }
    }
    return here;
  }

  /** That a wrong number would be seen. */
  @Test
  void shownNumbers_areReadWithTheirPrefix() {
    assertTrue(ShownNumber.of("2.732 mV s/rad").shows(0.0027320414));
    assertFalse(ShownNumber.of("2.732 mV s/rad").shows(0.0027326));
    assertFalse(ShownNumber.of("2.732 V s/rad").shows(0.0027320414));
    assertTrue(ShownNumber.of("at least 0.1270 mm").shows(0.127));
    assertTrue(ShownNumber.of("35 \u00b5m").shows(0.035));
    assertTrue(ShownNumber.of("265300 V/(A s)").shows(265319.2));
    assertFalse(ShownNumber.of("265300 V/(A s)").shows(265351));
    assertFalse(ShownNumber.of("12").shows(13));
  }
}
