package org.kappatrail.cli;

import java.io.PrintWriter;
import java.io.StringWriter;
import java.time.Clock;
import java.time.Instant;
import java.time.ZoneOffset;

/** A command line run in this process, with what it printed. */
public record Run(int code, String out, String err) {
  private static final Clock CLOCK =
      Clock.fixed(Instant.parse("2026-12-01T12:00:00Z"), ZoneOffset.UTC);

  public static Run of(String... arguments) {
    StringWriter out = new StringWriter();
    StringWriter err = new StringWriter();
    int code =
        new Kappatrail(new PrintWriter(out, true), new PrintWriter(err, true), false, CLOCK)
            .run(arguments);
    return new Run(code, out.toString(), err.toString());
  }
}
