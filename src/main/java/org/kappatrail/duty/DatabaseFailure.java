package org.kappatrail.duty;

import java.sql.SQLException;
import org.kappatrail.history.UnusableInputException;

/** What a failed connection or query means, in words without user, password or parameters. */
final class DatabaseFailure {
  private final DatabaseLogin login;
  private final String address;
  private final String table;

  DatabaseFailure(DatabaseLogin login, String address, String table) {
    this.login = login;
    this.address = login.scrub(address);
    this.table = table;
  }

  /** One message; the driver's exception is not handed on, as it may carry the login. */
  UnusableInputException explain(SQLException failure) {
    String state = failure.getSQLState() == null ? "" : failure.getSQLState();
    String text = String.valueOf(failure.getMessage());
    return new UnusableInputException(address + " " + table + ": " + reason(state, text));
  }

  private String reason(String state, String text) {
    if (text.contains("No suitable driver")) {
      return "no driver for this address is on the class path; add the driver's jar to it";
    }
    if (state.startsWith("28")) {
      return "user or password is refused; set KAPPATRAIL_DB_USER and KAPPATRAIL_DB_PASSWORD";
    }
    if (state.startsWith("08") || state.startsWith("57P")) {
      return "the database cannot be reached or the connection was lost; try again later ("
          + firstLine(text)
          + ")";
    }
    if (state.equals("42P01")) {
      return "there is no such table or view; correct table:";
    }
    if (state.equals("42501")) {
      return "the table may not be read; ask for SELECT on it";
    }
    return "the database refuses the query (" + firstLine(text) + ")";
  }

  private String firstLine(String text) {
    return login.scrub(text.lines().findFirst().orElse(""));
  }
}
