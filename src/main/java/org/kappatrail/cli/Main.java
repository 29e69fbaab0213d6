package org.kappatrail.cli;

/** Program entry: runs a command and exits with its code. */
public final class Main {
  private Main() {}

  public static void main(String[] args) {
    System.out.println("kappatrail");
  }
}
