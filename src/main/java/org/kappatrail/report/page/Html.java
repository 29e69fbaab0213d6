package org.kappatrail.report.page;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.io.Writer;

/** Writes HTML; every text goes through {@link #escape}. */
final class Html {
  private final StringBuilder text = new StringBuilder();

  /**
   * Text as it can stand in element content and in quoted attributes. Control characters show as
   * U+FFFD; overrides of the writing direction, which would turn the text around it, go.
   */
  static String escape(String text) {
    StringBuilder safe = new StringBuilder(text.length() + 16);
    for (int i = 0; i < text.length(); i++) {
      char c = text.charAt(i);
      switch (c) {
        case '&' -> safe.append("&amp;");
        case '<' -> safe.append("&lt;");
        case '>' -> safe.append("&gt;");
        case '"' -> safe.append("&quot;");
        case '\'' -> safe.append("&#39;");
        default -> {
          if (!turnsDirection(c)) {
            boolean control = Character.isISOControl(c) && c != '\n' && c != '\t';
            safe.append(control ? '\uFFFD' : c);
          }
        }
      }
    }
    return safe.toString();
  }

  private static boolean turnsDirection(char c) {
    return (c >= '\u202A' && c <= '\u202E') || (c >= '\u2066' && c <= '\u2069');
  }

  /** Adds markup of the program's own. */
  Html raw(String markup) {
    text.append(markup);
    return this;
  }

  /** Adds text from anywhere. */
  Html text(String content) {
    text.append(escape(content));
    return this;
  }

  /** Adds an element with text in it; the tag may carry attributes of the program's own. */
  Html element(String tag, String content) {
    int blank = tag.indexOf(' ');
    String name = blank < 0 ? tag : tag.substring(0, blank);
    return raw("<" + tag + ">").text(content).raw("</" + name + ">");
  }

  /** Adds an element around what the body writes. */
  Html around(String tag, Runnable body) {
    int blank = tag.indexOf(' ');
    String name = blank < 0 ? tag : tag.substring(0, blank);
    raw("<" + tag + ">");
    body.run();
    return raw("</" + name + ">\n");
  }

  /** Hands over what was added since the last time, so that a large page is never held whole. */
  void drainTo(Writer out) {
    try {
      out.append(text);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
    text.setLength(0);
  }

  @Override
  public String toString() {
    return text.toString();
  }
}
