package org.kappatrail.duty;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.ExportMapping.Tag;

/** Puts a block of the settings together. */
final class Block {
  private final String files;
  private final Map<String, String> columns = new LinkedHashMap<>();
  private final Map<String, String> units = new LinkedHashMap<>();
  private final Map<String, String> constants = new LinkedHashMap<>();
  private final Map<String, Tag> tags = new LinkedHashMap<>();
  private final Map<String, String> texts = new LinkedHashMap<>();
  private List<String> missing = List.of();
  private boolean decimalComma;
  private int skipLines;
  private int headerRows = 1;

  private Block(String files) {
    this.files = files;
  }

  static Block of(String files) {
    return new Block(files);
  }

  Block column(String header, String canonical) {
    columns.put(header, canonical);
    return this;
  }

  Block unit(String canonical, String unit) {
    units.put(canonical, unit);
    return this;
  }

  Block constant(String canonical, String text) {
    constants.put(canonical, text);
    return this;
  }

  Block tag(String name, Tag tag) {
    tags.put(name, tag);
    return this;
  }

  Block tag(String name, BearingKey bearing, Tag.Quantity quantity) {
    tags.put(name, new Tag(bearing, quantity));
    return this;
  }

  /** One of date-format, thousands, delimiter, encoding, footer, timezone, jdbc and table. */
  Block with(String key, String text) {
    texts.put(key, text);
    return this;
  }

  Block missing(String... markers) {
    missing = List.of(markers);
    return this;
  }

  Block decimalComma() {
    decimalComma = true;
    return this;
  }

  Block header(int linesBefore, int rows) {
    skipLines = linesBefore;
    headerRows = rows;
    return this;
  }

  ExportMapping build() {
    return new ExportMapping(
        files,
        text("jdbc"),
        text("table"),
        columns,
        units,
        text("date-format"),
        decimalComma,
        text("thousands"),
        text("delimiter"),
        text("encoding"),
        skipLines,
        headerRows,
        text("footer"),
        constants,
        Optional.empty(),
        text("timezone"),
        tags,
        missing);
  }

  private Optional<String> text(String key) {
    @Nullable String text = texts.get(key);
    return Optional.ofNullable(text);
  }
}
