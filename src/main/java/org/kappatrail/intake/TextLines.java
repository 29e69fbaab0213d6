package org.kappatrail.intake;

import java.io.Closeable;
import java.io.IOException;
import java.io.Reader;
import org.jspecify.annotations.Nullable;

/**
 * Physical lines of a text, numbered as an editor numbers them. The ends {@code \n}, {@code \r\n}
 * and {@code \r} all count; a line longer than the limit is cut there and marked.
 */
final class TextLines implements Closeable {
  /** Longest line that is kept, characters. */
  static final int LONGEST_LINE = 1 << 20;

  private static final int BUFFER = 1 << 15;

  /** A line without its end. */
  record Line(long number, String text, boolean tooLong) {}

  private final Reader reader;
  private final char[] buffer = new char[BUFFER];
  private final StringBuilder line = new StringBuilder();
  private int at;
  private int filled;
  private long number;
  private boolean skipLineFeed;

  TextLines(Reader reader) {
    this.reader = reader;
  }

  /** The next line; null at the end. */
  @Nullable Line next() throws IOException {
    line.setLength(0);
    boolean tooLong = false;
    boolean any = false;
    while (fill()) {
      char letter = buffer[at++];
      if (skipLineFeed) {
        skipLineFeed = false;
        if (letter == '\n') {
          continue;
        }
      }
      any = true;
      if (letter == '\n' || letter == '\r') {
        skipLineFeed = letter == '\r';
        return line(tooLong);
      }
      if (line.length() < LONGEST_LINE) {
        line.append(letter);
      } else {
        tooLong = true;
      }
    }
    return any ? line(tooLong) : null;
  }

  @Override
  public void close() throws IOException {
    reader.close();
  }

  private Line line(boolean tooLong) {
    number++;
    String text = line.toString();
    if (number == 1 && text.startsWith("\uFEFF")) {
      text = text.substring(1);
    }
    return new Line(number, text, tooLong);
  }

  private boolean fill() throws IOException {
    if (at < filled) {
      return true;
    }
    at = 0;
    filled = reader.read(buffer, 0, buffer.length);
    return filled > 0;
  }
}
