package org.kappatrail.duty;

import java.sql.SQLException;
import java.util.ArrayList;
import java.util.List;
import org.kappatrail.history.UnusableInputException;

/** Reads names and types of the columns of a Parquet file. */
final class ParquetHeader {
  private ParquetHeader() {}

  static LogTable read(LogFile file, DuckEngine engine) {
    LogTable unknown = new LogTable(file, file.path(), List.of(), List.of(), ',', 0);
    String scan = FileScan.of(new LogGroup(unknown.shape(), List.of(unknown), 0), true);
    List<String> described;
    try {
      described = engine.describe("SELECT * EXCLUDE (file_row_number) FROM " + scan);
    } catch (SQLException e) {
      throw new UnusableInputException(
          FileComplaint.explain(file.name(), String.valueOf(e.getMessage())), e);
    }
    List<String> columns = new ArrayList<>();
    List<String> types = new ArrayList<>();
    for (int index = 0; index < described.size(); index += 2) {
      columns.add(described.get(index));
      types.add(described.get(index + 1));
    }
    return new LogTable(file, file.path(), columns, types, ',', 0);
  }
}
