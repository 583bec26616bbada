package etchloom.write;

import com.fasterxml.jackson.core.JsonFactory;
import com.fasterxml.jackson.core.JsonGenerator;
import com.fasterxml.jackson.core.json.JsonWriteFeature;
import com.fasterxml.jackson.core.util.DefaultIndenter;
import com.fasterxml.jackson.core.util.DefaultPrettyPrinter;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;

/** JSON as all our files hold it: indented by two, ASCII only, final line end. */
final class Json {
  private Json() {}

  /** Writes one value. */
  interface Body {
    void write(JsonGenerator g) throws IOException;
  }

  static byte[] write(Body body) {
    ByteArrayOutputStream out = new ByteArrayOutputStream();
    JsonFactory factory = JsonFactory.builder().enable(JsonWriteFeature.ESCAPE_NON_ASCII).build();
    DefaultIndenter indent = new DefaultIndenter("  ", "\n");
    try (JsonGenerator g = factory.createGenerator(out)) {
      g.setPrettyPrinter(
          new DefaultPrettyPrinter().withObjectIndenter(indent).withArrayIndenter(indent));
      body.write(g);
      g.writeRaw('\n');
    } catch (IOException e) {
      throw new UncheckedIOException("writing to memory failed", e);
    }
    return out.toByteArray();
  }
}
