package org.kappatrail.intake;

import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.SampleColumns;

/**
 * The header of a CSV text and its delimiter.
 *
 * @param rows the header rows; none for an empty file
 * @param delimiter the delimiter that the settings or the header tell
 */
record HeadLines(List<RawRow> rows, char delimiter) {
  private static final char[] DELIMITERS = {',', ';', '\t', '|'};
  private static final Pattern HINT = Pattern.compile("(?i)\"?sep=(.)\"?");
  private static final int MOST_HEADER_LINES = 50;

  HeadLines {
    rows = List.copyOf(rows);
  }

  static HeadLines read(TextLines lines, ExportMapping mapping) throws IOException {
    for (int skipped = 0; skipped < mapping.skipLines(); skipped++) {
      lines.next();
    }
    List<TextLines.Line> read = new ArrayList<>();
    @Nullable Character hinted = null;
    TextLines.@Nullable Line line = nextNotBlank(lines);
    if (line != null) {
      Matcher hint = HINT.matcher(Texts.clean(line.text()));
      if (hint.matches()) {
        hinted = hint.group(1).charAt(0);
        line = nextNotBlank(lines);
      }
    }
    List<String> records = new ArrayList<>();
    StringBuilder open = new StringBuilder();
    while (line != null) {
      read.add(line);
      open.append(open.isEmpty() ? "" : "\n").append(line.text());
      boolean closed = open.chars().filter(letter -> letter == '"').count() % 2 == 0;
      if (closed || read.size() >= MOST_HEADER_LINES) {
        records.add(open.toString());
        open.setLength(0);
      }
      if (records.size() >= mapping.headerRows() || read.size() >= MOST_HEADER_LINES) {
        break;
      }
      line = nextNotBlank(lines);
    }
    if (records.isEmpty()) {
      return new HeadLines(List.of(), ',');
    }
    char delimiter = hinted == null ? best(records, mapping) : hinted;
    char chosen = mapping.delimiter().map(text -> text.charAt(0)).orElse(delimiter);
    List<RawRow> rows = new ArrayList<>();
    for (String text : records) {
      rows.add(RawRow.of(read.get(0).number(), split(text, chosen)));
    }
    return new HeadLines(rows, chosen);
  }

  /** The delimiter that gives most known column names, then most columns. */
  static char best(List<String> records, ExportMapping mapping) {
    Set<String> known = new LinkedHashSet<>();
    mapping.columns().keySet().forEach(name -> known.add(Texts.key(name)));
    known.addAll(SampleColumns.DESCRIPTIVE);
    known.addAll(SampleColumns.NUMERIC);
    char best = ',';
    int most = -1;
    for (char candidate : DELIMITERS) {
      int score = 0;
      for (String record : records) {
        List<String> names = split(record, candidate);
        score += names.size() - 1;
        score +=
            1000 * (int) names.stream().filter(name -> known.contains(Texts.key(name))).count();
      }
      if (score > most) {
        most = score;
        best = candidate;
      }
    }
    return best;
  }

  private static List<String> split(String record, char delimiter) {
    return CsvRows.fields(record, delimiter).orElse(List.of(record));
  }

  private static TextLines.@Nullable Line nextNotBlank(TextLines lines) throws IOException {
    TextLines.Line line = lines.next();
    while (line != null && line.text().isBlank()) {
      line = lines.next();
    }
    return line;
  }
}
