package org.kappatrail.cli;

import java.io.Console;
import java.io.PrintWriter;
import java.nio.charset.StandardCharsets;
import java.time.Clock;

/** Program entry: runs a command and exits with its code. */
public final class Main {
  private Main() {}

  public static void main(String[] args) {
    System.setProperty("java.awt.headless", "true");
    PrintWriter out = new PrintWriter(System.out, false, StandardCharsets.UTF_8);
    PrintWriter err = new PrintWriter(System.err, true, StandardCharsets.UTF_8);
    Kappatrail program = new Kappatrail(out, err, onTerminal(), Clock.systemUTC());
    int code = EndInOrder.run(() -> program.run(args));
    out.flush();
    err.flush();
    System.exit(code);
  }

  /** From Java 22 on there is a console also where there is no terminal. */
  @SuppressWarnings("SystemConsoleNull")
  private static boolean onTerminal() {
    Console console = System.console();
    if (console == null) {
      return false;
    }
    try {
      return (boolean) Console.class.getMethod("isTerminal").invoke(console);
    } catch (ReflectiveOperationException olderJava) {
      return true;
    }
  }
}
