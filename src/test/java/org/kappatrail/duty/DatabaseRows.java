package org.kappatrail.duty;

import java.sql.Connection;
import java.sql.PreparedStatement;
import java.sql.SQLException;
import java.sql.Types;
import java.time.LocalDateTime;
import java.time.OffsetDateTime;
import java.util.List;

/** Puts readings into a table. */
final class DatabaseRows {
  private DatabaseRows() {}

  /** Rows that a typed table can hold: no texts in place of numbers. */
  static List<RawReading> typed(List<RawReading> rows) {
    return rows.stream()
        .filter(row -> row.temperature().matches("(-?\\d+(\\.\\d+)?)?"))
        .filter(row -> row.speed().matches("(-?\\d+(\\.\\d+)?)?"))
        .toList();
  }

  static String createTable(String name, String timestamp, String number) {
    return "CREATE TABLE "
        + name
        + " (time "
        + timestamp
        + ", asset VARCHAR(40), bearing VARCHAR(40), temperature_c "
        + number
        + ", speed_rpm "
        + number
        + ", quality VARCHAR(20))";
  }

  /** Times with Z go to a column of instants, others to one of local times. */
  static void insert(Connection connection, String table, List<RawReading> rows)
      throws SQLException {
    String sql = "INSERT INTO " + table + " VALUES (?, ?, ?, ?, ?, ?)";
    try (PreparedStatement insert = connection.prepareStatement(sql)) {
      for (RawReading row : rows) {
        insert.setObject(
            1,
            row.time().endsWith("Z")
                ? OffsetDateTime.parse(row.time())
                : LocalDateTime.parse(row.time()));
        insert.setString(2, row.bearing().asset());
        insert.setString(3, row.bearing().bearing());
        number(insert, 4, row.temperature());
        number(insert, 5, row.speed());
        insert.setString(6, row.quality());
        insert.addBatch();
      }
      insert.executeBatch();
    }
  }

  private static void number(PreparedStatement insert, int index, String text) throws SQLException {
    if (text.isEmpty()) {
      insert.setNull(index, Types.DOUBLE);
    } else {
      insert.setDouble(index, Double.parseDouble(text));
    }
  }
}
