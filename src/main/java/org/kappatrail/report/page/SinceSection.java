package org.kappatrail.report.page;

import java.util.List;
import java.util.Map;
import org.kappatrail.review.Finding;
import org.kappatrail.review.Since;

/** What is new, worse, better and settled since an earlier day. */
final class SinceSection {
  private static final int OPEN = 20;

  private final Since since;
  private final Map<String, String> links;

  SinceSection(Since since, Map<String, String> links) {
    this.since = since;
    this.links = links;
  }

  void write(Html html) {
    html.around(
        "section id=\"since\"",
        () -> {
          html.element("h2", "Since " + since.date());
          List<Since.Item> items = since.items();
          if (items.isEmpty()) {
            html.element("p", "Nothing changed.");
            return;
          }
          html.element(
              "p class=\"note\"",
              "Against a review of the history as it was known then; later results are left out.");
          list(html, items.subList(0, Math.min(OPEN, items.size())));
          if (items.size() > OPEN) {
            html.raw("<details><summary>").text(items.size() - OPEN + " more").raw("</summary>\n");
            list(html, items.subList(OPEN, items.size()));
            html.raw("</details>\n");
          }
        });
  }

  private void list(Html html, List<Since.Item> items) {
    html.raw("<ul class=\"findings\">\n");
    for (Since.Item item : items) {
      Finding finding = item.finding();
      html.raw("<li><b>")
          .text(item.change().label())
          .raw("</b> ")
          .raw(LevelMark.of(finding.level()))
          .raw(" <a href=\"")
          .text(links.getOrDefault(finding.asset(), "#"))
          .raw("\">")
          .text(finding.asset())
          .raw("</a>")
          .text(finding.bearing().map(id -> " · " + id).orElse(""))
          .text(" · " + finding.kind().label())
          .text(item.before().map(level -> " (was " + level.label() + ")").orElse(""))
          .text(": " + finding.message())
          .raw("</li>\n");
    }
    html.raw("</ul>\n");
  }
}
