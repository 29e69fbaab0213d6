package org.kappatrail.intake;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.FieldMismatchStrategy;
import java.io.IOException;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import org.jspecify.annotations.Nullable;

/**
 * Rows of a CSV text. A row whose quotes do not close is a faulty row of one line, and reading goes
 * on with the next line, so that one stray quote costs one row and not the rest of the file.
 */
final class CsvRows {
  private static final int MOST_LINES_OF_A_ROW = 200;

  private final TextLines lines;
  private final CsvReader.CsvReaderBuilder parser;
  private final Deque<TextLines.Line> pushedBack = new ArrayDeque<>();

  CsvRows(TextLines lines, char delimiter) {
    this.lines = lines;
    this.parser = parser(delimiter);
  }

  /** Fields of a text that is one record; empty where its quotes are not well formed. */
  static Optional<List<String>> fields(String text, char delimiter) {
    return fields(parser(delimiter), text);
  }

  /** The next row that is not blank; null at the end. */
  @Nullable RawRow next() throws IOException {
    TextLines.Line line = nextLine();
    while (line != null && line.text().isBlank()) {
      line = nextLine();
    }
    return line == null ? null : row(line);
  }

  private RawRow row(TextLines.Line first) throws IOException {
    if (first.tooLong()) {
      return RawRow.faulty(
          first.number(),
          first.text().substring(0, 40),
          "the line is longer than "
              + TextLines.LONGEST_LINE
              + " characters; a line end is missing or the file is damaged");
    }
    Optional<List<String>> fields = fields(parser, first.text());
    if (fields.isPresent()) {
      return RawRow.of(first.number(), fields.get());
    }
    List<TextLines.Line> more = new ArrayList<>();
    StringBuilder text = new StringBuilder(first.text());
    while (isOpen(text) && more.size() < MOST_LINES_OF_A_ROW) {
      TextLines.Line next = nextLine();
      if (next == null) {
        break;
      }
      more.add(next);
      text.append('\n').append(next.text());
      if (next.tooLong() || text.length() > TextLines.LONGEST_LINE) {
        break;
      }
      fields = fields(parser, text.toString());
      if (fields.isPresent()) {
        return RawRow.of(first.number(), fields.get());
      }
    }
    for (int index = more.size() - 1; index >= 0; index--) {
      pushedBack.push(more.get(index));
    }
    return RawRow.faulty(
        first.number(), first.text(), "a quote is not closed, or stands within a quoted cell");
  }

  private TextLines.@Nullable Line nextLine() throws IOException {
    TextLines.Line line = pushedBack.poll();
    return line != null ? line : lines.next();
  }

  private static boolean isOpen(CharSequence text) {
    return text.chars().filter(letter -> letter == '"').count() % 2 == 1;
  }

  private static CsvReader.CsvReaderBuilder parser(char delimiter) {
    return CsvReader.builder()
        .fieldSeparator(delimiter)
        .extraFieldStrategy(FieldMismatchStrategy.IGNORE)
        .missingFieldStrategy(FieldMismatchStrategy.IGNORE)
        .allowUnclosedQuote(false);
  }

  private static Optional<List<String>> fields(CsvReader.CsvReaderBuilder parser, String text) {
    if (text.isEmpty()) {
      return Optional.of(List.of(""));
    }
    try {
      return Optional.of(List.copyOf(parser.ofSingleCsvRecord(text).getFields()));
    } catch (CsvParseException e) {
      return Optional.empty();
    }
  }
}
