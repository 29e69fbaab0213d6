package org.kappatrail.duty;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.nio.charset.CharacterCodingException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.zip.ZipException;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.UnusableInputException;

/** Reads the header of a CSV file of readings. */
final class CsvHeader {
  private static final char[] DELIMITERS = {',', ';', '\t', '|'};
  private static final int LONGEST_HEADER = 1 << 20;

  private CsvHeader() {}

  /**
   * The file with its header.
   *
   * @throws UnusableInputException where the file has none or cannot be opened
   */
  static LogTable read(LogFile file) {
    try (BufferedReader text = CsvText.open(file)) {
      return read(file, text);
    } catch (CharacterCodingException e) {
      throw new UnusableInputException(
          file.name() + ": is not " + CsvText.charset(file) + " text; set encoding for this file",
          e);
    } catch (ZipException | java.io.EOFException e) {
      throw new UnusableInputException(
          file.name() + ": is not a whole gzip file; copy it again from its source", e);
    } catch (IOException | UncheckedIOException | CsvParseException e) {
      throw new UnusableInputException(
          file.name() + ": cannot be read (" + e.getMessage() + ")", e);
    }
  }

  private static LogTable read(LogFile file, BufferedReader text) throws IOException {
    ExportMapping mapping = file.mapping();
    StringBuilder head = new StringBuilder();
    for (int line = 0; line < mapping.skipLines(); line++) {
      text.readLine();
    }
    String line = text.readLine();
    int rows = 0;
    while (line != null && head.length() < LONGEST_HEADER) {
      head.append(line).append('\n');
      rows += line.isEmpty() ? 0 : 1;
      if (rows >= mapping.headerRows() && quotesAreClosed(head)) {
        break;
      }
      line = text.readLine();
    }
    if (head.toString().isBlank()) {
      throw new UnusableInputException(
          file.name() + ": is empty; a file of readings begins with a header line");
    }
    char delimiter = delimiter(mapping, head.toString());
    List<CsvRecord> records = parse(head.toString(), delimiter, mapping.headerRows());
    long lines = mapping.skipLines() + head.chars().filter(letter -> letter == '\n').count();
    List<String> columns = join(records);
    return new LogTable(
        file,
        file.path(),
        columns,
        Collections.nCopies(columns.size(), LogTable.TEXT),
        delimiter,
        lines);
  }

  private static boolean quotesAreClosed(CharSequence head) {
    return head.chars().filter(letter -> letter == '"').count() % 2 == 0;
  }

  private static char delimiter(ExportMapping mapping, String head) {
    if (mapping.delimiter().isPresent()) {
      String given = mapping.delimiter().get();
      if (given.length() != 1) {
        throw new UnusableInputException(
            "kappatrail.yaml: temperatures: delimiter '" + given + "' must be one character");
      }
      return given.charAt(0);
    }
    char best = ',';
    int most = 0;
    for (char candidate : DELIMITERS) {
      List<CsvRecord> records = parse(head, candidate, mapping.headerRows());
      int columns = records.isEmpty() ? 0 : records.get(0).getFieldCount();
      if (columns > most) {
        most = columns;
        best = candidate;
      }
    }
    return best;
  }

  private static List<CsvRecord> parse(String head, char delimiter, int rows) {
    List<CsvRecord> records = new ArrayList<>();
    try (CsvReader<CsvRecord> reader = CsvText.records(new StringReader(head), delimiter)) {
      for (CsvRecord row : reader) {
        if (records.size() < Math.max(1, rows)) {
          records.add(row);
        }
      }
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    return records;
  }

  private static List<String> join(List<CsvRecord> records) {
    int width = records.stream().mapToInt(CsvRecord::getFieldCount).max().orElse(0);
    List<String> columns = new ArrayList<>();
    for (int column = 0; column < width; column++) {
      StringBuilder name = new StringBuilder();
      for (CsvRecord row : records) {
        if (column < row.getFieldCount()) {
          name.append(' ').append(row.getField(column).strip());
        }
      }
      columns.add(name.toString().strip());
    }
    return columns;
  }
}
