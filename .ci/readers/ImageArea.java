import java.io.DataInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.SequenceInputStream;
import java.nio.ByteBuffer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.zip.InflaterInputStream;

/**
 * Prints the bright area of PNG images in mm², a line each: {@code java ImageArea.java DPI
 * FILE...}. Reads 8-bit RGB or RGBA without interlacing, row by row, by the PNG specification.
 */
public final class ImageArea {
  public static void main(String[] args) throws IOException {
    double pixelMm = 25.4 / Double.parseDouble(args[0]);
    for (int i = 1; i < args.length; i++) {
      System.out.println(bright(Path.of(args[i])) / 255 * pixelMm * pixelMm);
    }
  }

  /** The sum of the first channel. */
  private static double bright(Path file) throws IOException {
    int width = 0;
    int height = 0;
    int channels = 0;
    List<InputStream> data = new ArrayList<>();
    ByteBuffer png = ByteBuffer.wrap(Files.readAllBytes(file));
    png.position(8);
    while (png.hasRemaining()) {
      int length = png.getInt();
      int type = png.getInt();
      int at = png.position();
      if (type == 0x49484452) { // IHDR
        width = png.getInt();
        height = png.getInt();
        int depth = png.get();
        int colour = png.get();
        channels = colour == 2 ? 3 : colour == 6 ? 4 : 0;
        if (depth != 8 || channels == 0 || png.get(at + 12) != 0) {
          throw new IOException(file + ": a kind of PNG that this does not read");
        }
      } else if (type == 0x49444154) { // IDAT
        data.add(new java.io.ByteArrayInputStream(png.array(), at, length));
      }
      png.position(at + length + 4);
    }
    try (DataInputStream in =
        new DataInputStream(
            new InflaterInputStream(new SequenceInputStream(Collections.enumeration(data))))) {
      return sum(in, width, height, channels);
    }
  }

  private static double sum(DataInputStream in, int width, int height, int channels)
      throws IOException {
    byte[] row = new byte[width * channels];
    byte[] above = new byte[width * channels];
    long sum = 0;
    for (int y = 0; y < height; y++) {
      int filter = in.readUnsignedByte();
      byte[] swap = above;
      above = row;
      row = swap;
      in.readFully(row);
      for (int i = 0; i < row.length; i++) {
        int a = i < channels ? 0 : row[i - channels] & 255;
        int b = above[i] & 255;
        int c = i < channels ? 0 : above[i - channels] & 255;
        row[i] += predict(filter, a, b, c);
      }
      for (int i = 0; i < row.length; i += channels) {
        sum += row[i] & 255;
      }
    }
    return sum;
  }

  /** PNG specification, chapter 9: none, sub, up, average, Paeth. */
  private static int predict(int filter, int a, int b, int c) {
    return switch (filter) {
      case 0 -> 0;
      case 1 -> a;
      case 2 -> b;
      case 3 -> (a + b) / 2;
      default -> {
        int p = a + b - c;
        int pa = Math.abs(p - a);
        int pb = Math.abs(p - b);
        int pc = Math.abs(p - c);
        yield pa <= pb && pa <= pc ? a : pb <= pc ? b : c;
      }
    };
  }
}
