package org.kappatrail.report;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;
import org.kappatrail.cli.Kappatrail;

/**
 * A command, run in this process.
 *
 * @param code its exit code
 * @param out what it printed
 * @param err what it complained of
 */
record Run(int code, String out, String err) {
  private static final Clock CLOCK =
      Clock.fixed(Instant.parse("2026-11-30T12:00:00Z"), ZoneOffset.UTC);

  static Run of(String... arguments) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int code =
        new Kappatrail(new PrintWriter(out), new PrintWriter(err), false, CLOCK).run(arguments);
    return new Run(code, out.toString(), err.toString());
  }
}
