package etchloom.write;

import static org.junit.jupiter.api.Assertions.assertArrayEquals;
import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertFalse;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.artwork.Artwork;
import etchloom.testing.ToyBoards;
import etchloom.testing.ToyOrders;
import java.nio.charset.StandardCharsets;
import java.time.Instant;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.SortedMap;
import java.util.TimeZone;
import java.util.regex.Pattern;
import org.junit.jupiter.api.AfterEach;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** What every writer owes, whatever its format. */
class WriterContractTest {
  private static final Pattern NOT_A_NUMBER =
      Pattern.compile("(?<![A-Za-z])(NaN|Infinity|-0(\\.0+)?(?![.0-9]))(?![A-Za-z])");
  private static final Pattern EXPONENT =
      Pattern.compile("(?<![A-Za-z0-9-])\\d+\\.\\d+[eE][-+]?\\d");

  private final Locale locale = Locale.getDefault();
  private final TimeZone zone = TimeZone.getDefault();

  @AfterEach
  void restore() {
    Locale.setDefault(locale);
    TimeZone.setDefault(zone);
  }

  static List<Artwork> boards() {
    return List.of(ToyBoards.twoLayers(), ToyBoards.fourLayers());
  }

  @Test
  void everyTextFile_isAscii_endsWithALineEnd_andHoldsOnlyPlainNumbers() {
    for (Artwork art : boards()) {
      write(art)
          .forEach(
              (name, bytes) -> {
                if (name.endsWith(".zip")) {
                  return;
                }
                for (byte b : bytes) {
                  assertTrue(b == '\n' || b == '\r' || (b >= 32 && b <= 126), name + ": byte " + b);
                }
                String text = new String(bytes, StandardCharsets.US_ASCII);
                assertTrue(text.endsWith("\n"), name);
                assertFalse(NOT_A_NUMBER.matcher(text).find(), name);
                assertFalse(EXPONENT.matcher(text).find(), name);
              });
    }
  }

  @ParameterizedTest
  @ValueSource(strings = {"de-DE", "ar-EG", "th-TH-u-nu-thai", "tr-TR"})
  void bytesDoNotHangOnLocaleOrTimeZone(String tag) {
    List<SortedMap<String, byte[]>> before =
        boards().stream().map(WriterContractTest::write).toList();
    Locale.setDefault(Locale.forLanguageTag(tag));
    TimeZone.setDefault(TimeZone.getTimeZone("Pacific/Chatham"));
    List<SortedMap<String, byte[]>> after =
        boards().stream().map(WriterContractTest::write).toList();
    for (int i = 0; i < before.size(); i++) {
      assertEquals(before.get(i).keySet(), after.get(i).keySet());
      for (Map.Entry<String, byte[]> e : before.get(i).entrySet()) {
        assertArrayEquals(e.getValue(), after.get(i).get(e.getKey()), e.getKey());
      }
    }
  }

  @Test
  void aTitleBeyondAscii_isEscapedNotLost() {
    Artwork art = ToyBoards.fourLayers("50 % \u00d6l*pumpe, \\ <b>&", "U", "V", true);
    SortedMap<String, byte[]> set = write(art);
    String copper = text(set, "toy-four-copper-L1.gbr");
    assertTrue(
        copper.contains("%TF.ProjectId,50 \\u0025 \\u00D6l\\u002Apumpe\\u002C \\u005C <b>&,"),
        copper.substring(0, 400));
    assertTrue(text(set, "toy-four.gbrjob").contains("50 % \\u00D6l*pumpe, \\\\ <b>&"));
  }

  @Test
  void theDate_standsInTheFiles_onlyWhenGiven() {
    Instant when = Instant.ofEpochSecond(1_700_000_000L); // 2023-11-14T22:13:20Z, by date -u
    SortedMap<String, byte[]> dated =
        LayerSet.write(ToyBoards.twoLayers(), ToyOrders.at(1.0, Optional.of(when)));
    assertTrue(
        text(dated, "toy-two-copper-L2.gbr").contains("%TF.CreationDate,2023-11-14T22:13:20Z*%\n"));
    assertTrue(text(dated, "toy-two.gbrjob").contains("\"2023-11-14T22:13:20Z\""));
    assertFalse(text(write(ToyBoards.twoLayers()), "toy-two.gbrjob").contains("CreationDate"));
  }

  @Test
  void aDraft_saysSo() {
    SortedMap<String, byte[]> set = write(ToyBoards.fourLayers("Toy", "U", "V", true));
    for (String name :
        List.of("toy-four.gbrjob", "toy-four-copper-L3.gbr", "toy-four-plated.xnc")) {
      assertTrue(text(set, name).contains("DRAFT"), name);
    }
    assertFalse(text(write(ToyBoards.fourLayers()), "toy-four.gbrjob").contains("DRAFT"));
  }

  static SortedMap<String, byte[]> write(Artwork art) {
    return LayerSet.write(art, ToyOrders.plain(art.stackup().thicknessMm()));
  }

  static String text(SortedMap<String, byte[]> set, String name) {
    return new String(set.get(name), StandardCharsets.US_ASCII);
  }
}
