package org.kappatrail.cli;

import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;

/** Program entry: runs a command and exits with its code. */
public final class Main {
  private Main() {}

  public static void main(String[] args) {
    System.setProperty("java.awt.headless", "true");
    PrintWriter out = new PrintWriter(System.out, false, StandardCharsets.UTF_8);
    PrintWriter err = new PrintWriter(System.err, true, StandardCharsets.UTF_8);
    int code = new Kappatrail(out, err, System.console() != null).run(args);
    out.flush();
    err.flush();
    System.exit(code);
  }
}
