package etchloom.survey;

import etchloom.report.JsonTree;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Path;
import java.util.Optional;

/** {@code survey.json}: what was surveyed, then the variants, a line each. */
final class JsonWriter extends RowWriter {
  private boolean first = true;

  JsonWriter(Path dir, Plan plan, Summary summary, Optional<Best> best) throws IOException {
    super(dir.resolve("survey.json"));
    JsonTree head = plan.json();
    head.put("part", plan.part().toString());
    if (!summary.listing().keepText().isEmpty()) {
      head.put("keep", summary.listing().keepText());
    }
    summary
        .listing()
        .rank()
        .ifPresent(
            r ->
                head.put(
                    "rank",
                    new JsonTree()
                        .put("key", r.name().name())
                        .put("best", r.low() ? "low" : "high")
                        .putTexts(
                            "variants",
                            summary.top().stream().map(b -> Long.toString(b.variant())).toList())));
    best.ifPresent(b -> head.put("seek", b.json()));
    head.put("kept", summary.kept());
    head.put("passed", summary.passed());
    String text = new String(head.bytes(), StandardCharsets.UTF_8);
    put(text.substring(0, text.lastIndexOf('}')).stripTrailing()).put(",\n  \"variants\": [");
  }

  @Override
  void row(Row row) throws IOException {
    put(first ? "\n" : ",\n").put(RowJson.write(row));
    first = false;
  }

  @Override
  void end() throws IOException {
    put(first ? "]\n}\n" : "\n]\n}\n");
  }
}
