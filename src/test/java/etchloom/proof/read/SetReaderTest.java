package etchloom.proof.read;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import etchloom.proof.image.DrillFile;
import etchloom.proof.image.LayerSet;
import etchloom.proof.image.Plating;
import etchloom.proof.image.ReadWarning;
import java.nio.charset.StandardCharsets;
import java.util.List;
import java.util.SortedMap;
import java.util.TreeMap;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class SetReaderTest {
  private static final List<String> ALL =
      List.of(
          "round-L1.gbr",
          "round-L2.gbr",
          "round-mask-top.gbr",
          "round-mask-bot.gbr",
          "round-legend-top.gbr",
          "round-profile.gbr",
          "round-pth.gbr",
          "round-pth.xnc",
          "round-npth.xnc",
          "round.ipc",
          "round.gbrjob",
          "round.svg",
          "round.dxf");

  private final SortedMap<String, byte[]> files = new TreeMap<>();

  private LayerSet read(String... options) throws UnreadableFile {
    return SetReader.read(new SetFolder("set", files), List.of(options));
  }

  private void all() {
    ALL.forEach(n -> files.put(n, Samples.file(n)));
  }

  private void change(String file, String from, String to) {
    String text = new String(files.get(file), StandardCharsets.UTF_8);
    assertTrue(text.contains(from));
    put(file, text.replace(from, to));
  }

  private void put(String file, String text) {
    files.put(file, text.getBytes(StandardCharsets.UTF_8));
  }

  private static List<String> codes(List<ReadWarning> warnings) {
    return warnings.stream().map(ReadWarning::code).toList();
  }

  private void refused(String code, String... options) {
    UnreadableFile e = assertThrows(UnreadableFile.class, () -> read(options));
    assertEquals(code, e.code(), e.getMessage());
  }

  @Test
  void rolesFromFileFunctions() throws UnreadableFile {
    all();
    LayerSet s = read();
    assertEquals(List.of(), s.allWarnings());
    assertEquals(2, s.copper().size());
    assertEquals("round-L2.gbr", s.copper().get(1).fileName());
    assertEquals("round-mask-top.gbr", s.maskTop().get().fileName());
    assertEquals("round-mask-bot.gbr", s.maskBottom().get().fileName());
    assertEquals("round-legend-top.gbr", s.legendTop().get().fileName());
    assertTrue(s.legendBottom().isEmpty());
    assertEquals("round-profile.gbr", s.profile().get().fileName());
    assertEquals(5, s.netlist().get().points().size());
    assertEquals("roundcoil", s.job().get().projectName());
    // The plated holes are there in both forms and count once.
    assertEquals(
        List.of("round-pth.gbr", "round-npth.xnc"),
        s.drills().stream().map(DrillFile::fileName).toList());
  }

  @Test
  void drillFormsThatDiffer_areRefused() {
    all();
    change("round-pth.xnc", "X11.0", "X11.1");
    refused("drill-differs");
    change("round-pth.xnc", "X11.1Y0.0", "X11.003Y0.0\nX1.0Y1.0");
    refused("drill-differs");
  }

  @Test
  void drillForms_mayDifferByRounding_andTheUserMayChoose() throws UnreadableFile {
    all();
    change("round-pth.xnc", "X11.0", "X11.0025");
    assertEquals(2, read().drills().size());
    change("round-pth.xnc", "X11.0025", "X12.0");
    LayerSet s = read("plated=round-pth.xnc", "nonplated=round-npth.xnc");
    assertEquals(2, s.drills().size());
    assertEquals(12.0, s.drills().get(0).holes().get(0).at().x());
  }

  @Test
  void withoutAttributes_byOption() throws UnreadableFile {
    put("top.art", Samples.MM + "%ADD10C,1*%D10*X0Y0D03*M02*");
    put("sub/bottom.art", Samples.MM + "%ADD10C,1*%D10*X0Y0D03*M02*");
    put("drill.txt", "M48\nMETRIC\nT1C0.3\n%\nT1\nX1.0Y1.0\nM30\n");
    refused("no-copper");
    LayerSet s = read("L1=top.art", "L2=bottom.art");
    assertEquals(2, s.copper().size());
    assertEquals(List.of("plating-unknown"), codes(s.warnings()));
    DrillFile d = s.drills().get(0);
    assertEquals(Plating.PLATED, d.holes().get(0).plating());
    assertEquals(1, d.fromLayer());
    assertEquals(2, d.toLayer());
    s = read("L1=top.art", "L2=bottom.art", "nonplated=drill.txt");
    assertEquals(List.of(), codes(s.warnings()));
    assertEquals(Plating.NON_PLATED, s.drills().get(0).holes().get(0).plating());
    s = read("L1=top.art");
    assertEquals(List.of("no-function", "plating-unknown"), codes(s.warnings()));
  }

  @Test
  void functionsFromTheJobFile() throws UnreadableFile {
    all();
    change("round-L1.gbr", "%TF.FileFunction,Copper,L1,Top*%\n", "");
    change("round-npth.xnc", "; #@! TF.FileFunction,NonPlated,1,2,NPTH\n", "");
    change("round-npth.xnc", "; #@! TA.AperFunction,NonPlated,NPTH,MechanicalDrill\n", "");
    LayerSet s = read();
    assertEquals("round-L1.gbr", s.copper().get(0).fileName());
    assertEquals(Plating.NON_PLATED, s.drills().get(1).holes().get(0).plating());
  }

  @Test
  void jobFileThatDiffers_warns() throws UnreadableFile {
    all();
    change("round.gbrjob", "Copper,L2,Bot", "Copper,L3,Inr");
    change("round.gbrjob", "\"LayerNumber\": 2", "\"LayerNumber\": 4");
    files.remove("round-legend-top.gbr");
    assertEquals(List.of("job-missing", "job-differs", "job-differs"), codes(read().warnings()));
  }

  @Test
  void layersMustBeComplete() {
    all();
    change("round-L2.gbr", "Copper,L2,Bot", "Copper,L3,Bot");
    refused("layer-missing");
    change("round-L2.gbr", "Copper,L3,Bot", "Copper,L1,Bot");
    refused("role-twice");
  }

  @Test
  void otherRefusals() {
    all();
    change("round-L2.gbr", "FilePolarity,Positive", "FilePolarity,Negative");
    refused("negative");
    all();
    change("round-npth.xnc", "NonPlated,1,2", "NonPlated,1,4");
    refused("drill-span");
    all();
    put("more.xnc", "M48\nMETRIC\nT1C0.3\n%\nT1\nX1.0Y1.0\nM30\n");
    refused("drill-unclear");
  }

  @ParameterizedTest
  @CsvSource({
    "L1",
    "L0=round-L1.gbr",
    "L100=round-L1.gbr",
    "copper=round-L1.gbr",
    "L1=",
    "L1=nothing.gbr"
  })
  void wrongOptions(String option) {
    all();
    refused("layer-option", option);
  }

  @Test
  void twiceNamed() {
    all();
    refused("layer-option", "L1=round-L1.gbr", "L2=round-L1.gbr");
    refused("layer-option", "L1=round-L1.gbr", "L1=round-L2.gbr");
    files.put("a/round-L1.gbr", Samples.file("round-L1.gbr"));
    files.put("b/round-L1.gbr", Samples.file("round-L1.gbr"));
    files.remove("round-L1.gbr");
    refused("layer-option", "L1=round-L1.gbr");
  }

  @Test
  void kinds() {
    all();
    assertEquals(FileKind.GERBER, FileKind.of(files.get("round-profile.gbr")));
    assertEquals(FileKind.NC_DRILL, FileKind.of(files.get("round-npth.xnc")));
    assertEquals(FileKind.NETLIST, FileKind.of(files.get("round.ipc")));
    assertEquals(FileKind.JOB, FileKind.of(files.get("round.gbrjob")));
    assertEquals(FileKind.SVG, FileKind.of(files.get("round.svg")));
    assertEquals(FileKind.DXF, FileKind.of(files.get("round.dxf")));
    assertEquals(FileKind.DXF, FileKind.of(Samples.file("round-r12.dxf")));
    for (String other : List.of("", "{}", "<html><p>%FS</p>", "title: a\n", "PK\0\0%FS")) {
      assertEquals(FileKind.OTHER, FileKind.of(other.getBytes(StandardCharsets.UTF_8)), other);
    }
  }
}
