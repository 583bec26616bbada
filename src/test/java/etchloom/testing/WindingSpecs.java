package etchloom.testing;

import etchloom.diagnostic.Staged;
import etchloom.run.Drawn;
import etchloom.run.Pipeline;
import etchloom.spec.FabReader;
import etchloom.spec.SpecFile;
import etchloom.spec.SpecReader;
import java.nio.charset.StandardCharsets;

/**
 * One board with room to spare, its winding and terminals given by the test. Two layers, four
 * turns, block magnets over the coils.
 *
 * @param extra more lines of the section {@code board}, each with its indent and line end
 * @param rotor likewise of the section {@code rotor}
 */
public record WindingSpecs(
    int phases,
    int coils,
    int poles,
    String connection,
    int paths,
    String terminals,
    String extra,
    String rotor) {
  private static final String HOLES = "{kind: hole, pitch: 3 mm, hole: 0.9 mm, pad: 1.8 mm}";

  public static WindingSpecs of(int phases, int coils, int poles, String connection) {
    return new WindingSpecs(phases, coils, poles, connection, 1, HOLES, "", "");
  }

  public WindingSpecs paths(int count) {
    return new WindingSpecs(phases, coils, poles, connection, count, terminals, extra, rotor);
  }

  public WindingSpecs terminals(String group) {
    return new WindingSpecs(phases, coils, poles, connection, paths, group, extra, rotor);
  }

  public WindingSpecs board(String line) {
    return new WindingSpecs(
        phases, coils, poles, connection, paths, terminals, extra + "  " + line + "\n", rotor);
  }

  /** A line of the section {@code rotor}. */
  public WindingSpecs rotor(String line) {
    return new WindingSpecs(
        phases, coils, poles, connection, paths, terminals, extra, "  " + line + "\n");
  }

  public String yaml() {
    return """
        etchloom: 1
        title: Winding test
        rotor:
          poles: %d
          air-gap: 1 mm
          magnet: {outline: block, length: 18 mm, width: 4 mm, pitch-radius: 26 mm, thickness: 3 mm, remanence: 1.2 T}
        %swinding: {phases: %d, coils: %d, connection: %s, parallel-paths: %d}
        coil: {outline: wedge, inner-radius: 16 mm, outer-radius: 36 mm, turns: 4, track: 0.25 mm, space: 0.2 mm}
        via: {hole: 0.3 mm, pad: 0.6 mm}
        board:
          layers: 2
          thickness: 1.2 mm
          copper: 1 oz
          diameter: 116 mm
          bore: 14 mm
          terminals: %s
        %sfab: standard
        duty: {bus: 24 V, speed: 600 rpm, current: 0.5 A, switching: 50 kHz}
        """
        .formatted(poles, rotor, phases, coils, connection, paths, terminals, extra);
  }

  public SpecFile read() {
    byte[] bytes = yaml().getBytes(StandardCharsets.UTF_8);
    var staged = SpecReader.read("winding-test.yaml", bytes);
    return staged
        .value()
        .orElseThrow(() -> new AssertionError(staged.diagnostics() + "\n" + yaml()));
  }

  public Staged<Drawn> run() {
    SpecFile f = read();
    return Pipeline.run(f.spec(), FabReader.builtIn(f.spec().fab()), f.positions(), false);
  }

  public Drawn drawn() {
    Staged<Drawn> staged = run();
    return staged
        .value()
        .orElseThrow(() -> new AssertionError(staged.diagnostics() + "\n" + yaml()));
  }
}
