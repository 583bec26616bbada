package etchloom.proof.read;

import static org.junit.jupiter.api.Assertions.assertEquals;

import java.util.stream.Stream;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Each drawing construct of the Gerber Layer Format (2024.05), one small file each, against the
 * area in closed form. Section numbers are those of the format, recalled.
 */
class GerberAreaTest {
  private static final double PI = Math.PI;
  private static final double R2 = Math.sqrt(2);

  /** Circles are chorded 1440 to the turn here, which takes 3e-6 of a full circle's area. */
  private static final double SHARE = 1e-5;

  static Arguments of(String name, double areaMm2, String body) {
    return Arguments.of(name, areaMm2, body);
  }

  static Stream<Arguments> standardApertures() {
    return Stream.of(
        of("4.4.2 circle", PI, "%ADD10C,2*%D10*X0Y0D03*"),
        of("4.4.2 circle with hole", PI - PI / 4, "%ADD10C,2X1*%D10*X0Y0D03*"),
        of("4.4.3 rectangle", 6, "%ADD10R,2X3*%D10*X0Y0D03*"),
        of("4.4.3 rectangle with hole", 6 - PI / 4, "%ADD10R,2X3X1*%D10*X0Y0D03*"),
        of("4.4.4 obround", PI + 2, "%ADD10O,2X3*%D10*X0Y0D03*"),
        of("4.4.4 obround lying, hole", PI + 2 - PI / 16, "%ADD10O,3X2X0.5*%D10*X0Y0D03*"),
        of("4.4.5 hexagon", 1.5 * Math.sqrt(3), "%ADD10P,2X6*%D10*X0Y0D03*"),
        of("4.4.5 triangle turned", 0.75 * Math.sqrt(3), "%ADD10P,2X3X17.5*%D10*X0Y0D03*"),
        of("4.4.5 square with hole", 2 - PI / 16, "%ADD10P,2X4X45X0.5*%D10*X0Y0D03*"),
        of("hole shows what is below", 4, "%ADD10R,2X2*%%ADD11C,1.5X1*%D10*X0Y0D03*D11*X0Y0D03*"));
  }

  static Stream<Arguments> macros() {
    return Stream.of(
        of("4.5.1.3 circle", PI, "%AMA*1,1,2,5,5,30*%%ADD10A*%D10*X0Y0D03*"),
        of("4.5.1.3 circle, old, no rotation", PI, "%AMA*1,1,2,5,5*%%ADD10A*%D10*X0Y0D03*"),
        of("4.5.1.4 vector line", 3, "%AMA*20,1,1,0,0,3,0,45*%%ADD10A*%D10*X0Y0D03*"),
        of("4.5.1.5 centre line", 6, "%AMA*21,1,2,3,1,1,10*%%ADD10A*%D10*X0Y0D03*"),
        of("4.5.1.6 outline", 2, "%AMA*4,1,3,0,0,2,0,0,2,0,0,33*%%ADD10A*%D10*X0Y0D03*"),
        of("4.5.1.7 polygon", 2, "%AMA*5,1,4,1,1,2,45*%%ADD10A*%D10*X0Y0D03*"),
        of("4.5.1.8 thermal, gap 0", PI * (4 - 1), "%AMA*7,0,0,4,2,0,0*%%ADD10A*%D10*X0Y0D03*"),
        of("4.5.1.8 thermal", thermal(2, 1, 0.2), "%AMA*7,1,1,4,2,0.4,30*%%ADD10A*%D10*X0Y0D03*"),
        of(
            "4.5.1.8 thermal, inner circle within the cross",
            thermal(2, 0.2, 0.4),
            "%AMA*7,0,0,4,0.4,0.8,0*%%ADD10A*%D10*X0Y0D03*"),
        of("22 corner line, deprecated", 6, "%AMA*22,1,2,3,1,1,10*%%ADD10A*%D10*X0Y0D03*"),
        of("2 vector line, deprecated", 3, "%AMA*2,1,1,0,0,3,0,45*%%ADD10A*%D10*X0Y0D03*"),
        of(
            "6 moire, deprecated: two rings, thin cross within the outer one",
            PI * (4 - 2.25) + PI * (1 - 0.25) + cross(),
            "%AMA*6,0,0,4,0.5,0.5,2,0.01,3,0*%%ADD10A*%D10*X0Y0D03*"),
        of(
            "4.5.2 exposure off erases within the macro only",
            4 - PI / 4 + 1,
            "%ADD11R,1X1*%%AMA*21,1,2,2,0,0,0*1,0,1,0,0,0*%%ADD10A*%"
                + "D11*X0Y5000000D03*D10*X0Y0D03*"),
        of(
            "4.5.2 exposure off leaves what lies below",
            4,
            "%ADD11R,1.5X1.5*%%AMA*21,1,2,2,0,0,0*1,0,1,0,0,0*%%ADD10A*%"
                + "D11*X0Y0D03*D10*X0Y0D03*"),
        of(
            "4.5.4 variables and arithmetic",
            PI * 2.25,
            "%AMA*0 the disc*$3=$1x2-(1+$2)/4*1,1,$3,-$1,+$2X3,0*%%ADD10A,2X3*%D10*X0Y0D03*"),
        of(
            "4.5.4 a variable not given is 0",
            PI / 4,
            "%AMA*1,1,$1+$7,0,0*%%ADD10A,1*%D10*X0Y0D03*"),
        of(
            "4.5.4 signs and order: 1+2x3-4/2x1 = 5",
            25,
            "%AMA*21,1,1+2x3-4/2x1,--5,0,0,0*%%ADD10A*%D10*X0Y0D03*"));
  }

  /** Four quarters of a ring of radii R and r without a cross of half width g. */
  private static double thermal(double outer, double inner, double g) {
    double cut = inner > g * R2 ? corner(inner, g) : 0;
    return 4 * (corner(outer, g) - cut);
  }

  /** The part of the first quadrant's disc with x and y above g: by integration. */
  private static double corner(double r, double g) {
    double x = Math.sqrt(r * r - g * g);
    double under = (x * g + r * r * Math.asin(x / r) - g * x - r * r * Math.asin(g / r)) / 2;
    return under - g * (x - g);
  }

  /** What a cross of 3 mm and 0.01 mm adds to rings 1.5..2 and 0.5..1: gaps 1..1.5 and 0..0.5. */
  private static double cross() {
    return 4 * 0.5 * 0.01 + (2 * 1 * 0.01 - 0.01 * 0.01);
  }

  static Stream<Arguments> draws() {
    return Stream.of(
        of("4.8 straight draw", 3 + PI / 4, "%ADD10C,1*%D10*G01*X0Y0D02*X3000000Y0D01*"),
        of("draw of no length is a dot", PI / 4, "%ADD10C,1*%D10*G01*X0Y0D02*X0Y0D01*"),
        of(
            "a dot before a draw adds nothing",
            3 + PI / 4,
            "%ADD10C,1*%D10*G01*X0Y0D02*D01*X3000000D01*X3000000D01*"),
        of(
            "modal coordinates",
            6 - 0.25 + PI / 4 + PI / 16,
            "%ADD10C,1*%D10*G01*X0Y0D02*X3000000D01*Y3000000D01*"),
        of("rectangle pen, deprecated", 4, "%ADD10R,1X1*%D10*G01*X0Y0D02*X3000000Y0D01*"),
        of("rectangle pen, slanted", 1 + 6, "%ADD10R,1X1*%D10*G01*X0Y0D02*X3000000Y3000000D01*"),
        of(
            "4.7 half circle",
            PI * 2 + PI / 4,
            "%ADD10C,1*%D10*G03*X2000000Y0D02*X-2000000Y0I-2000000J0D01*"),
        of(
            "4.7 clockwise quarter",
            PI + PI / 4,
            "%ADD10C,1*%D10*G02*X2000000Y0D02*X0Y-2000000I-2000000J0D01*"),
        of(
            "4.7 three quarters",
            3 * PI + PI / 4,
            "%ADD10C,1*%D10*G03*X2000000Y0D02*X0Y-2000000I-2000000J0D01*"),
        of("4.7 full circle", PI * 4, "%ADD10C,1*%D10*G03*X2000000Y0D02*I-2000000J0D01*"),
        of(
            "G74 quarter, deprecated, unsigned offsets",
            PI + PI / 4,
            "%ADD10C,1*%D10*G74*G03*X2000000Y0D02*X0Y2000000I2000000J0D01*"),
        of(
            "G74 clockwise, third quadrant",
            PI + PI / 4,
            "%ADD10C,1*%D10*G74*G02*X0Y-2000000D02*X-2000000Y0I0J2000000D01*"));
  }

  static Stream<Arguments> regions() {
    return Stream.of(
        of("4.10 square", 4, "G36*G01*X0Y0D02*X2000000D01*Y2000000D01*X0D01*Y0D01*G37*"),
        of("4.10 disc", PI, "G36*G03*X1000000Y0D02*I-1000000J0D01*G37*"),
        of(
            "4.10 ring sector of 90°, radii 1 and 2",
            3 * PI / 4,
            "G36*G01*X1000000Y0D02*X2000000D01*G03*X0Y2000000I-2000000J0D01*"
                + "G01*Y1000000D01*G02*X1000000Y0I0J-1000000D01*G37*"),
        of(
            "4.10.3 two contours are united, not cancelled",
            6,
            "G36*G01*X0Y0D02*X2000000D01*Y2000000D01*X0D01*Y0D01*"
                + "X1000000Y0D02*X3000000D01*Y2000000D01*X1000000D01*Y0D01*G37*"),
        of(
            "4.10.3 cut-in: a square of 4 with a square hole of 2",
            12,
            "G36*G01*X0Y0D02*X4000000D01*Y4000000D01*X0D01*Y1000000D01*X1000000D01*Y3000000D01*"
                + "X3000000D01*Y1000000D01*X1000000D01*X0D01*Y0D01*G37*"),
        of(
            "4.9 a clear region erases",
            16 - 4,
            "%ADD10R,4X4*%D10*X0Y0D03*%LPC*%G36*G01*X-1000000Y-1000000D02*X1000000D01*Y1000000D01*"
                + "X-1000000D01*Y-1000000D01*G37*%LPD*%"),
        of(
            "4.9 dark again over the clear",
            16 - 4 + 1,
            "%ADD10R,4X4*%%ADD11R,2X2*%%ADD12R,1X1*%D10*X0Y0D03*%LPC*%D11*X0Y0D03*%LPD*%"
                + "D12*X0Y0D03*"));
  }

  static Stream<Arguments> transforms() {
    String right = "%AMT*4,1,3,0,0,2,0,0,1,0,0,0*%%ADD10T*%%ADD11R,2X1*%D10*";
    return Stream.of(
        of("4.9.5 scale", 4 * PI, "%ADD10C,2*%D10*%LS2*%X0Y0D03*"),
        of("4.9.5 scale of a draw", 6 + PI, "%ADD10C,1*%D10*%LS2*%G01*X0Y0D02*X3000000D01*"),
        of("4.9.4 rotation: cross of two", 2 + 2 - 1, right + "D11*X0Y0D03*%LR90*%X0Y0D03*"),
        of("4.9.4 half turn of a symmetric one", 2, right + "D11*X0Y0D03*%LR180*%X0Y0D03*"),
        // A right triangle (0,0) (2,0) (0,1) and its mirrored selves meet along the legs only.
        of("4.9.3 mirror X", 2, right + "X0Y0D03*%LMX*%X0Y0D03*"),
        of("4.9.3 mirror Y", 2, right + "X0Y0D03*%LMY*%X0Y0D03*"),
        of("4.9.3 mirror XY is a half turn", 1, right + "%LMXY*%X0Y0D03*%LMN*%%LR180*%X0Y0D03*"),
        of(
            "mirror comes before rotation",
            1,
            right + "%LMX*%%LR90*%X0Y0D03*%LMN*%%LR0*%%LMY*%%LR-90*%X0Y0D03*"));
  }

  static Stream<Arguments> repeats() {
    return Stream.of(
        of("4.11 step and repeat", 6, "%ADD10R,1X1*%D10*%SRX3Y2I5J4*%X0Y0D03*%SR*%"),
        of(
            "4.11 closed by the next",
            6 + 2,
            "%ADD10R,1X1*%D10*%SRX3Y2I5J4*%X0Y0D03*" + "%SRX2Y1I5J0*%X0Y9000000D03*%SR*%"),
        of(
            "4.11 draws and regions repeat too",
            2 * (3 + PI / 4) + 2 * 4,
            "%ADD10C,1*%D10*%SRX1Y2I0J9*%G01*X0Y0D02*X3000000D01*G36*X0Y3000000D02*X2000000D01*"
                + "Y5000000D01*X0D01*Y3000000D01*G37*%SR*%"),
        of(
            "4.11 block",
            2 * (1 + PI / 4),
            "%ABD20*%%ADD10R,1X1*%%ADD11C,1*%D10*X0Y0D03*D11*"
                + "X5000000Y0D03*%AB*%D20*X0Y0D03*X0Y9000000D03*"),
        of("4.11 block alone draws nothing", 0, "%ADD10R,1X1*%%ABD20*%D10*X0Y0D03*%AB*%"),
        of(
            "4.11 nested blocks, scaled by 2 and 3",
            36,
            "%ADD10R,1X1*%%ABD20*%D10*X0Y0D03*%AB*%%ABD21*%%LS2*%D20*X1000000Y0D03*%LS1*%%AB*%"
                + "%LS3*%D21*X0Y0D03*"),
        of(
            "4.11 a clear flash of a block swaps polarity",
            16 - 4 + 1,
            "%ADD9999R,4X4*%%ADD11R,2X2*%%ADD12R,1X1*%%ABD20*%D11*X0Y0D03*%LPC*%D12*X0Y0D03*%LPD*%"
                + "%AB*%D9999*X0Y0D03*%LPC*%D20*X0Y0D03*"),
        of(
            "repeat within a block",
            2 * 4,
            "%ADD10R,1X1*%D10*%ABD20*%%SRX2Y2I3J3*%X0Y0D03*%SR*%%AB*%D20*X0Y0D03*X20000000D03*"));
  }

  @ParameterizedTest(name = "{0}")
  @MethodSource({"standardApertures", "macros", "draws", "regions", "transforms", "repeats"})
  void area(String name, double areaMm2, String body) throws UnreadableFile {
    assertEquals(areaMm2, Samples.area(body), SHARE * Math.max(areaMm2, PI), name);
  }
}
