package org.kappatrail.cli;

/** What the program's exit codes mean. */
final class ExitCodes {
  static final int DONE = 0;
  static final int FOUND = 1;
  static final int USAGE = 2;
  static final int UNUSABLE_INPUT = 3;
  static final int BUG = 70;

  /** As shells have it for a program ended by Ctrl-C. */
  static final int STOPPED = 130;

  private ExitCodes() {}
}
