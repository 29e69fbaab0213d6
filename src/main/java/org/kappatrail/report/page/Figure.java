package org.kappatrail.report.page;

import java.nio.charset.StandardCharsets;
import java.util.Base64;

/** A picture inside the page. */
final class Figure {
  private Figure() {}

  /**
   * Writes a picture.
   *
   * @param svg its SVG text; nothing is written for an empty one
   * @param description what it shows, for those who cannot see it
   */
  static void write(Html html, String svg, String description) {
    if (svg.isEmpty()) {
      return;
    }
    String data = Base64.getEncoder().encodeToString(svg.getBytes(StandardCharsets.UTF_8));
    html.raw("<figure><img loading=\"lazy\" alt=\"")
        .text(description)
        .raw("\" src=\"data:image/svg+xml;base64,")
        .raw(data)
        .raw("\"></figure>\n");
  }
}
