package org.kappatrail.report.page;

import java.math.BigDecimal;
import java.math.RoundingMode;
import java.util.List;
import java.util.Optional;
import java.util.function.IntFunction;
import org.kappatrail.report.chart.Spot;

/**
 * A picture inside the page: the chart's SVG, and over it places that can be pointed at, tapped or
 * reached by keyboard.
 */
final class Figure {
  private final String svg;
  private final List<Spot> spots;
  private final String id;

  /**
   * A picture.
   *
   * @param id no other picture's of the page; letters, digits, dots, hyphens
   */
  Figure(Picture picture, String id) {
    this.svg = picture.text().get();
    this.spots = picture.spots();
    this.id = id;
  }

  /** Writes a picture that nobody points at, if there is one. */
  static void write(Html html, Optional<Picture> picture, String id, String description) {
    picture.ifPresent(
        found -> html.around("figure", () -> new Figure(found, id).picture(html, description)));
  }

  /**
   * Writes the picture with its places as a list to choose from.
   *
   * @param description what it shows, for those who cannot see it
   * @param listName what the places are
   * @param label what is told at a place, line by line
   */
  void withChoices(Html html, String description, String listName, IntFunction<String> label) {
    html.around(
        "figure",
        () -> {
          picture(html, description);
          overlay(html, "role=\"listbox\" aria-orientation=\"horizontal\"", listName);
          for (int i = 0; i < spots.size(); i++) {
            html.raw("<rect class=\"spot\" role=\"option\" aria-selected=\"false\" tabindex=\"")
                .raw(i == spots.size() - 1 ? "0\"" : "-1\"");
            place(html, spots.get(i), label.apply(i));
          }
          html.raw("</svg>");
        });
  }

  /**
   * Writes the picture with its places as links.
   *
   * @param link where a place leads to
   */
  void withLinks(
      Html html,
      String description,
      String listName,
      IntFunction<String> link,
      IntFunction<String> label) {
    html.around(
        "figure",
        () -> {
          picture(html, description);
          overlay(html, "role=\"group\"", listName);
          for (int i = 0; i < spots.size(); i++) {
            html.raw("<a href=\"").text(link.apply(i)).raw("\" aria-label=\"");
            html.text(label.apply(i)).raw("\"><rect class=\"spot\"");
            place(html, spots.get(i), label.apply(i));
            html.raw("</a>");
          }
          html.raw("</svg>");
        });
  }

  private void picture(Html html, String description) {
    int open = svg.indexOf('>');
    String head = svg.substring(0, Math.max(0, open));
    html.raw("<svg class=\"chart\" role=\"img\" aria-label=\"")
        .text(description)
        .raw("\"")
        .raw(head.replaceFirst("^<svg xmlns=\"[^\"]*\" width=\"[^\"]*\" height=\"[^\"]*\"", ""))
        .raw(
            svg.substring(Math.max(0, open))
                .replace("id=\"clip", "id=\"" + id + "-clip")
                .replace("clip-path=\"url(#clip", "clip-path=\"url(#" + id + "-clip"));
  }

  /** A transparent drawing in the chart's own coordinates. */
  private void overlay(Html html, String role, String name) {
    int from = svg.indexOf("viewBox=\"");
    String box = from < 0 ? "" : svg.substring(from, svg.indexOf('"', from + 9) + 1);
    html.raw("<svg class=\"spots\" " + role + " aria-label=\"").text(name).raw("\" " + box + ">\n");
  }

  private static void place(Html html, Spot spot, String label) {
    html.raw(" x=\"" + px(spot.x()) + "\" y=\"" + px(spot.y()) + "\" width=\"" + px(spot.width()))
        .raw("\" height=\"" + px(spot.height()) + "\" aria-label=\"")
        .text(label)
        .raw("\"/>\n");
  }

  private static String px(double value) {
    return new BigDecimal(value)
        .setScale(1, RoundingMode.HALF_EVEN)
        .stripTrailingZeros()
        .toPlainString();
  }
}
