package etchloom.proof.read;

import static org.junit.jupiter.api.Assertions.assertEquals;
import static org.junit.jupiter.api.Assertions.assertThrows;
import static org.junit.jupiter.api.Assertions.assertTrue;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.NoSuchFileException;
import java.nio.file.Path;
import java.util.List;
import java.util.zip.ZipEntry;
import java.util.zip.ZipOutputStream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class FolderReaderTest {
  @TempDir Path dir;

  private Path zip(byte[] content, String... names) throws IOException {
    Path path = dir.resolve("set.zip");
    try (OutputStream out = Files.newOutputStream(path);
        ZipOutputStream zip = new ZipOutputStream(out)) {
      for (String n : names) {
        zip.putNextEntry(new ZipEntry(n));
        zip.write(content);
        zip.closeEntry();
      }
    }
    return path;
  }

  private static String refused(Path path, String code) {
    UnreadableFile e = assertThrows(UnreadableFile.class, () -> FolderReader.read(path));
    assertEquals(code, e.code(), e.getMessage());
    return e.getMessage();
  }

  @Test
  void folder_takesOnlyWhatCanBeRead() throws Exception {
    Files.write(dir.resolve("b.gbr"), Samples.file("round-L1.gbr"));
    Files.write(dir.resolve("a.xnc"), Samples.file("round-pth.xnc"));
    Files.write(dir.resolve(".hidden.xnc"), Samples.file("round-pth.xnc"));
    Files.writeString(dir.resolve("spec.yaml"), "title: x\n");
    Files.createDirectory(dir.resolve("sub"));
    Files.write(dir.resolve("sub/c.gbr"), Samples.file("round-L1.gbr"));
    SetFolder f = FolderReader.read(dir);
    assertEquals(List.of("a.xnc", "b.gbr"), List.copyOf(f.files().keySet()));
  }

  @Test
  void zip_alsoWithinFolders() throws Exception {
    byte[] content = Samples.file("round-L1.gbr");
    SetFolder f =
        FolderReader.read(
            zip(content, "fab/", "fab/L1.gbr", "fab\\L2.gbr", "__MACOSX/x.gbr", ".y.gbr"));
    assertEquals(List.of("fab/L1.gbr", "fab/L2.gbr"), List.copyOf(f.files().keySet()));
    assertEquals(content.length, f.files().get("fab/L1.gbr").length);
  }

  @ParameterizedTest
  @ValueSource(
      strings = {
        "../a.gbr",
        "a/../../b.gbr",
        "/etc/a.gbr",
        "C:\\a.gbr",
        "..\\a.gbr",
        "a//b.gbr",
        "./a.gbr",
        "a\nb.gbr",
        "1/2/3/4/5/6/7/8/9.gbr"
      })
  void zip_namesThatLeadOut(String name) throws IOException {
    String message = refused(zip(Samples.file("round-L1.gbr"), name), "zip-name");
    assertTrue(message.indexOf('\n') < 0, message);
  }

  @Test
  void zip_longNameAndDouble() throws IOException {
    refused(zip(new byte[0], "a".repeat(300) + ".gbr"), "zip-name");
    refused(zip(Samples.file("round-L1.gbr"), "a/b.gbr", "a\\b.gbr"), "zip-name");
  }

  @Test
  void zip_bombOfOneFile() throws IOException {
    // 60 MB of blanks after a good beginning, 60 kB in the archive.
    byte[] big = new byte[60_000_000];
    java.util.Arrays.fill(big, (byte) ' ');
    byte[] head = Samples.MM.getBytes(StandardCharsets.UTF_8);
    System.arraycopy(head, 0, big, 0, head.length);
    Path path = zip(big, "a.gbr");
    assertTrue(Files.size(path) < 200_000);
    refused(path, "too-large");
  }

  @Test
  void zip_bombOfManyFiles() throws IOException {
    String[] names = new String[2001];
    for (int i = 0; i < names.length; i++) {
      names[i] = "f" + i + ".gbr";
    }
    refused(zip(new byte[0], names), "too-large");
  }

  @Test
  void zip_damaged() throws IOException {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    out.write(Files.readAllBytes(zip(Samples.file("round-L1.gbr"), "a.gbr")));
    byte[] good = out.toByteArray();
    Path path = dir.resolve("bad.zip");
    Files.write(path, java.util.Arrays.copyOf(good, good.length / 2));
    refused(path, "zip");
    byte[] flipped = good.clone();
    for (int i = 60; i < 160; i++) {
      flipped[i] ^= 0x55;
    }
    Files.write(path, flipped);
    refused(path, "zip");
    Files.writeString(path, "no zip at all");
    refused(path, "not-a-set");
    Files.writeString(path, "P");
    refused(path, "not-a-set");
    assertThrows(NoSuchFileException.class, () -> FolderReader.read(dir.resolve("nothing")));
  }
}
