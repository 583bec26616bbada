package etchloom.survey;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.HashSet;
import java.util.Optional;
import java.util.Set;

/** What a survey leaves in its folder besides the journal. */
final class Folder {
  private Folder() {}

  /** The variants' own files go into it. */
  static Path variants(Path dir) throws IOException {
    return Files.createDirectories(dir.resolve("variants"));
  }

  static void variant(Path dir, long number, String yaml) throws IOException {
    Files.writeString(dir.resolve("variants").resolve(number + ".yaml"), yaml);
  }

  /** Copies of rules files, so that the variants find them. */
  static void rules(Path dir, Shelf shelf) throws IOException {
    for (Shelf.Rules r : shelf.rules().values()) {
      if (!r.file().isEmpty()) {
        Files.writeString(dir.resolve(r.file()), r.text(), StandardCharsets.UTF_8);
      }
    }
  }

  /**
   * Goes through the journal twice: what columns there are, then the files.
   *
   * @param best of a search
   */
  static Summary tables(Path dir, Plan plan, Listing listing, Optional<Best> best)
      throws IOException {
    Summary summary = new Summary(listing);
    Journal.each(dir, summary::add);
    Set<Long> onPage = new HashSet<>(summary.onPage());
    try (RowWriter csv = new CsvWriter(dir, plan, summary);
        RowWriter json = new JsonWriter(dir, plan, summary, best);
        RowWriter page = new PageWriter(dir, plan, summary)) {
      Journal.each(
          dir,
          row -> {
            if (listing.keeps(row)) {
              put(csv, row);
              put(json, row);
              if (onPage.contains(row.variant())) {
                put(page, row);
              }
            }
          });
      csv.finish();
      json.finish();
      page.finish();
    }
    return summary;
  }

  private static void put(RowWriter w, Row row) {
    try {
      w.row(row);
    } catch (IOException e) {
      throw new java.io.UncheckedIOException(e);
    }
  }
}
