package org.kappatrail.report.page;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.Base64;

/**
 * What stands around the content of every page: title, style, script, and the policy that nothing
 * but these two may run or be loaded.
 */
final class Shell {
  private final String style;
  private final String script = "\n" + resource("page.js");

  /**
   * A shell.
   *
   * @param chartRules style rules for the charts of the page
   */
  Shell(String chartRules) {
    style = "\n" + resource("page.css") + chartRules;
  }

  /** Everything up to the content. */
  void begin(Html html, String title) {
    html.raw("<!DOCTYPE html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n")
        .raw("<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none';")
        .raw(" style-src '" + fingerprint(style) + "'; script-src '" + fingerprint(script))
        .raw("'; base-uri 'none'; form-action 'none'\">\n")
        .raw("<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n")
        .raw("<meta name=\"color-scheme\" content=\"light dark\">\n")
        .element("title", title)
        .raw("\n<style>" + style + "</style>\n</head>\n<body>\n");
  }

  /** Everything after the content. */
  void end(Html html) {
    html.raw("<script>" + script + "</script>\n</body>\n</html>\n");
  }

  private static String fingerprint(String text) {
    try {
      byte[] digest =
          MessageDigest.getInstance("SHA-256").digest(text.getBytes(StandardCharsets.UTF_8));
      return "sha256-" + Base64.getEncoder().encodeToString(digest);
    } catch (NoSuchAlgorithmException e) {
      throw new IllegalStateException("every Java platform has SHA-256", e);
    }
  }

  /** A file of the program's own, beside this class. */
  static String resource(String name) {
    try (InputStream in = Shell.class.getResourceAsStream(name)) {
      if (in == null) {
        throw new IllegalStateException("the program lacks its file " + name);
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
