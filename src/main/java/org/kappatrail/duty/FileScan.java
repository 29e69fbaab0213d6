package org.kappatrail.duty;

import java.util.stream.Collectors;
import java.util.stream.IntStream;

/**
 * The table function of DuckDB that reads a group of files; it is told everything and guesses
 * nothing.
 */
final class FileScan {
  /** Takes what a row has beyond the header. */
  static final String OVERFLOW = "overflow";

  private FileScan() {}

  /**
   * The scan.
   *
   * @param group files of one shape
   * @param parallel false where a quoted cell holds a line break, which the parallel scan refuses
   */
  static String of(LogGroup group, boolean parallel) {
    String paths =
        group.tables().stream()
            .map(table -> SqlText.literal(literalPath(table.path().toAbsolutePath().toString())))
            .collect(Collectors.joining(", "));
    if (group.shape().format() == LogFile.Format.PARQUET) {
      return "read_parquet([" + paths + "], file_row_number = true)";
    }
    int width = group.shape().columns().size();
    String columns =
        IntStream.range(0, width)
            .mapToObj(index -> "'c" + index + "': 'VARCHAR', ")
            .collect(Collectors.joining());
    return "read_csv(["
        + paths
        + "], auto_detect = false, header = false, skip = "
        + group.shape().headerLines()
        + ", delim = "
        + SqlText.literal(Character.toString(group.shape().delimiter()))
        + ", quote = '\"', escape = '\"', null_padding = true, strict_mode = false, parallel = "
        + parallel
        + ", columns = {"
        + columns
        + "'"
        + OVERFLOW
        + "': 'VARCHAR'})";
  }

  /** Name of a column in the scan. */
  static String column(LogTable.Shape shape, int index) {
    return shape.format() == LogFile.Format.PARQUET
        ? SqlText.identifier(shape.columns().get(index))
        : "c" + index;
  }

  /** A path in which no letter stands for others. */
  private static String literalPath(String path) {
    return path.replace("[", "[[]").replace("*", "[*]").replace("?", "[?]");
  }
}
