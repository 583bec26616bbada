package etchloom.proof.read;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.proof.image.Attributes;
import etchloom.proof.image.DrawnObject;
import etchloom.proof.image.DrawnObject.Flash;
import etchloom.proof.image.DrawnObject.Stroke;
import etchloom.proof.image.LayerImage;
import etchloom.proof.image.ReadWarning;
import java.util.List;
import java.util.Map;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * What is read with a warning, what is refused, and the attributes. Gerber Layer Format 2024.05,
 * chapters 2 to 5 and 8, recalled.
 */
class GerberLanguageTest {
  /** Stands after the frame of {@link Samples#MM}, on line 4. */
  private static final String DISC = "%ADD10C,1*%\nD10*\n";

  private static List<String> codes(LayerImage image) {
    return image.warnings().stream().map(ReadWarning::code).toList();
  }

  @ParameterizedTest(name = "{1}: {0}")
  @CsvSource(
      delimiter = '|',
      value = {
        "G54D10*X0Y0D03* | deprecated",
        "G01X0Y0D02*X1Y1D01* | deprecated",
        "G01*X0Y0D02*X1Y1D01*X2Y2* | deprecated",
        "G90*X0Y0D03* | deprecated",
        "G71*X0Y0D03* | deprecated",
        "M01*X0Y0D03* | deprecated",
        "%IPPOS*%X0Y0D03* | deprecated",
        "%OFA0B0*%X0Y0D03* | deprecated",
        "%LNcopper*%X0Y0D03* | deprecated",
        "%ADD11C,1*ADD12C,1*%X0Y0D03* | deprecated",
        "%ADD11R,1X1*%D11*G01*X0Y0D02*X9Y0D01* | deprecated",
        "G74*G03*X2000000Y0D02*X0Y2000000I2000000J0D01* | deprecated",
        "X0Y0D02*X1Y1D01* | no-plot-mode",
        "G01*X1Y1D01* | no-current-point",
        "%ADD11C,0*%D11*X0Y0D03* | zero-size",
        "%ADD11C,1X2*%D11*X0Y0D03* | aperture-hole",
        "G36*G37* | empty-region",
        "G36*G01*X0Y0D02*X9000000D01*Y9000000D01*X5000Y0D01*G37* | open-contour",
        "G36*G01*X0Y0D02*X9000000D01*X9000000D01*Y9000000D01*X0Y0D01*G37* | zero-length",
        "G36*G01*X0Y0D02*X9000000D01*%TO.N,A*%Y9000000D01*X0Y0D01*G37* | in-region",
        "G03*X2000000Y0D02*X0Y2005000I-2000000J0D01* | arc-radius",
        "X0Y0D03*M02*X1Y1D03* | after-end",
        "%FSLAX46Y46*%X0Y0D03* | format-twice",
        "*X0Y0D03* | empty-command",
        "%TF.Part,Single*%%TF.Part,Array*% | attribute-twice",
        "%SRX2Y2I5J5*%X0Y0D03* | repeat"
      })
  void readWithWarning(String body, String code) throws UnreadableFile {
    assertTrue(codes(Samples.mm(DISC + body)).contains(code), body);
  }

  @ParameterizedTest(name = "{1}: {0}")
  @CsvSource(
      delimiter = '|',
      value = {
        "%TF.A | truncated",
        "D10%LPD*% | syntax",
        "X0.5Y0D03* | syntax",
        "XY0D03* | syntax",
        "Q1* | syntax",
        "X0Y0D05* | unknown-command",
        "G10* | unknown-command",
        "M30* | unknown-command",
        "%XX1*% | unknown-command",
        "%LPX*% | unknown-command",
        "%LMZ*% | unknown-command",
        "%LS0*% | unknown-command",
        "%MOMIL*% | unknown-command",
        "X0Y0* | no-operation",
        "D11* | undefined-aperture",
        "%ADD9C,1*% | aperture-number",
        "%ADD10C,2*% | aperture-twice",
        "%ADD11C*% | aperture-size",
        "%ADD11C,-1*% | aperture-size",
        "%ADD11R,1*% | aperture-size",
        "%ADD11R,1X0*% | aperture-size",
        "%ADD11P,1X13*% | aperture-size",
        "%ADD11R,1X1X0.2X0.2*% | aperture-hole",
        "%ADD11MISSING*% | undefined-macro",
        "%AMA*1,1,1,0,0*%%AMA*1,1,1,0,0*% | macro-twice",
        "%AMA*9,1*%%ADD11A*% | macro-primitive",
        "%AMA*1,2,1,0,0*%%ADD11A*% | macro-primitive",
        "%AMA*4,1,3,0,0,1,0,1,1*%%ADD11A*% | macro-primitive",
        "%AMA*7,0,0,1,2,0.1,0*%%ADD11A*% | macro-primitive",
        "%AMA*1,1,1/0,0,0*%%ADD11A*% | macro-value",
        "%AMA*1,1,(1,0,0*%%ADD11A*% | macro-syntax",
        "%AMA*$0=1*1,1,1,0,0*%%ADD11A*% | macro-syntax",
        "G91* | incremental",
        "%MIA1B0*% | deprecated",
        "%IR90*% | deprecated",
        "%IPNEG*% | deprecated",
        "%MOIN*% | unit",
        "%FSLAX45Y45*% | format",
        "G03*X2000000Y0D02*X0Y3000000I-2000000J0D01* | arc-radius",
        "G03*X2000000Y0D02*X0Y3000000I0J0D01* | arc-radius",
        "G74*G03*X2000000Y0D02*X-2000000Y100I2000000J0D01* | arc-radius",
        "%ADD11R,1X1*%D11*G03*X2000000Y0D02*X0Y2000000I-2000000J0D01* | draw-aperture",
        "%ADD11O,1X2*%D11*G01*X0Y0D02*X9Y0D01* | draw-aperture",
        "%ADD11C,1X0.5*%D11*G01*X0Y0D02*X9Y0D01* | draw-aperture",
        "%AMA*1,1,1,0,0*%%ADD11A*%D11*G01*X0Y0D02*X9Y0D01* | draw-aperture",
        "%ABD11*%X0Y0D03*%AB*%D11*G01*X0Y0D02*X9Y0D01* | draw-aperture",
        "G37* | region",
        "G36*X0Y0D02* | region",
        "G36*G36* | in-region",
        "G36*X0Y0D03* | in-region",
        "G36*%LPC*% | in-region",
        "G36*%ADD11C,1*% | in-region",
        "G36*%LR90*% | in-region",
        "G36*%SRX2Y2I1J1*% | in-region",
        "G36*G01*X0Y0D02*X9000000D01*Y9000000D01*G37* | open-contour",
        "%AB*% | block",
        "%ABD11*%X0Y0D03* | block",
        "%SRX2Y2I5J5*%%ABD11*%%SR*% | block",
        "%SRX0Y1I1J1*% | repeat",
        "%SRX1.5Y1I1J1*% | repeat",
        "%SRX1700Y1700I1J1*%X0Y0D03*%SR*% | too-large",
        "X9999999999999Y0D03* | coordinate-range"
      })
  void refused(String body, String code) {
    UnreadableFile e = assertThrows(UnreadableFile.class, () -> Samples.mm(DISC + body));
    assertEquals(code, e.code(), e.getMessage());
    assertTrue(e.getMessage().matches("t\\.gbr:[67]: .*"), e.getMessage());
  }

  @ParameterizedTest(name = "{1}: {0}")
  @CsvSource(
      delimiter = '|',
      value = {
        "%MOMM*%%ADD10C,1*%D10*X0Y0D03*M02* | format",
        "%FSLAX46Y46*%%ADD10C,1*%M02* | unit",
        "%FSLIX46Y46*%M02* | incremental",
        "%FSLAX46Y45*%M02* | format",
        "%FSLAX46Y46*%%MOMM*%%ADD10C,1*%D10*X0Y0D03* | missing-end",
        "%FSLAX46Y46*%%MOMM*%%ADD10C,1*%D10*G02*X1Y1D01*M02* | no-arc-mode",
        "%FSLAX46Y46*%%MOMM*%X0Y0D03*M02* | no-aperture",
        "'' | missing-end"
      })
  void refusedFrame(String text, String code) {
    UnreadableFile e = assertThrows(UnreadableFile.class, () -> Samples.gerber(text));
    assertEquals(code, e.code(), e.getMessage());
  }

  @Test
  void inchAndOldFormats_areTheSamePlace() throws UnreadableFile {
    Flash inch =
        (Flash)
            Samples.gerber("%FSLAX24Y24*%%MOIN*%%ADD10C,0.1*%D10*X15000Y-5D03*M02*")
                .objects()
                .get(0);
    assertEquals(38.1, inch.at().x(), 1e-12);
    assertEquals(-0.0127, inch.at().y(), 1e-12);
    Flash trailing =
        (Flash)
            Samples.gerber("%FSTAX33Y33*%%MOMM*%%ADD10C,0.1*%D10*X0125Y-1D03*M02*")
                .objects()
                .get(0);
    assertEquals(12.5, trailing.at().x(), 1e-12);
    assertEquals(-100, trailing.at().y(), 1e-12);
  }

  /** Section 5: what an aperture and an object have when they are made, they keep. */
  @Test
  void attributesHoldFromTheMomentOfMaking() throws UnreadableFile {
    LayerImage image =
        Samples.mm(
            """
            %TF.FileFunction,Copper,L1,Top*%
            %TA.AperFunction,ViaPad*%
            %ADD10C,1*%
            %TD.AperFunction*%
            %TA.AperFunction,Conductor*%
            %ADD11C,0.2*%
            %TO.N,U\\u002CV*%
            D10*X0Y0D03*
            %TO.P,X1,U1*%X1000000D03*
            %TD.P*%
            D11*G01*X0Y0D02*X1000000D01*
            %TO.N,W*%X2000000D01*X3000000D01*
            %TD*%
            D10*X0Y5000000D03*
            G36*X0Y0D02*X9D01*Y9D01*X0Y0D01*G37*
            G04 #@! TO.C,R1*
            X0Y6000000D03*
            """);
    assertEquals(List.of("Copper", "L1", "Top"), image.fileAttribute(".FileFunction"));
    List<DrawnObject> o = image.objects();
    assertEquals(7, o.size());
    assertEquals("ViaPad", o.get(0).attributes().function());
    assertEquals("U,V", o.get(0).attributes().net());
    assertEquals("", o.get(0).attributes().refdes());
    assertEquals("X1", o.get(1).attributes().refdes());
    assertEquals("U1", o.get(1).attributes().pin());
    assertEquals("Conductor", o.get(2).attributes().function());
    assertEquals("U,V", o.get(2).attributes().net());
    Stroke w = (Stroke) o.get(3);
    assertEquals("W", w.attributes().net());
    assertEquals(2, w.path().segments().size());
    // The bare TD empties the dictionaries, not the aperture.
    assertEquals("ViaPad", o.get(4).attributes().function());
    assertEquals(List.of(), o.get(4).attributes().nets());
    assertEquals(Attributes.NONE, o.get(5).attributes());
    assertEquals(Map.of(".C", List.of("R1")), o.get(6).attributes().other());
    assertEquals(List.of(), image.warnings());
  }

  @Test
  void aBlockFlashedWithANet_handsItToWhatHasNone() throws UnreadableFile {
    LayerImage image =
        Samples.mm(DISC + "%ABD20*%X0Y0D03*%TO.N,OWN*%X1D03*%TD.N*%%AB*%%TO.N,GIVEN*%D20*X5Y5D03*");
    assertEquals("GIVEN", image.objects().get(0).attributes().net());
    assertEquals("OWN", image.objects().get(1).attributes().net());
  }
}
