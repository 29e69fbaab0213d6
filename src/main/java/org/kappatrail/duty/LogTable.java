package org.kappatrail.duty;

import java.nio.file.Path;
import java.util.List;

/**
 * A file of readings whose header is known.
 *
 * @param file the file
 * @param path what is read: the file itself or a copy of it in UTF-8
 * @param columns names of its columns
 * @param types engine types of its columns; all text in a CSV file
 * @param delimiter column delimiter of a CSV file
 * @param headerLines lines of a CSV file before the first row
 */
record LogTable(
    LogFile file,
    Path path,
    List<String> columns,
    List<String> types,
    char delimiter,
    long headerLines) {
  static final String TEXT = "VARCHAR";

  LogTable {
    columns = List.copyOf(columns);
    types = List.copyOf(types);
  }

  /** Tables with equal shapes are read by one scan. */
  Shape shape() {
    return new Shape(file.format(), columns, types, delimiter, headerLines, file.mapping());
  }

  /** All that tells how a file is scanned, but the file. */
  record Shape(
      LogFile.Format format,
      List<String> columns,
      List<String> types,
      char delimiter,
      long headerLines,
      org.kappatrail.history.ExportMapping mapping) {
    Shape {
      columns = List.copyOf(columns);
      types = List.copyOf(types);
    }
  }
}
