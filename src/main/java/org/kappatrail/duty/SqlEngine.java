package org.kappatrail.duty;

import java.util.Locale;
import java.util.Optional;

/** What engines spell differently outside the statement: two expressions. */
enum SqlEngine {
  DUCKDB("duckdb", "epoch_ms(%s)", "CAST(%s AS DOUBLE)"),
  POSTGRESQL(
      "postgresql",
      "CAST(FLOOR(EXTRACT(EPOCH FROM %s) * 1000) AS BIGINT)",
      "CAST(%s AS DOUBLE PRECISION)"),
  SPARK("spark", "unix_millis(CAST(%s AS TIMESTAMP))", "CAST(%s AS DOUBLE)");

  private final String product;
  private final String epochMillis;
  private final String number;

  SqlEngine(String product, String epochMillis, String number) {
    this.product = product;
    this.epochMillis = epochMillis;
    this.number = number;
  }

  /** The engine of a product name; empty where it is none of these. */
  static Optional<SqlEngine> of(String productName) {
    String lower = productName.toLowerCase(Locale.ROOT);
    for (SqlEngine engine : values()) {
      if (lower.contains(engine.product)) {
        return Optional.of(engine);
      }
    }
    return Optional.empty();
  }

  /** Milliseconds since 1970 of a timestamp; of its clock reading where it has no offset. */
  String epochMillis(String timestamp) {
    return String.format(Locale.ROOT, epochMillis, timestamp);
  }

  /** The column in double precision. */
  String number(String column) {
    return String.format(Locale.ROOT, number, column);
  }
}
