package org.kappatrail.report.page;

import java.util.List;
import org.kappatrail.history.Problem;

/** Inputs that could not be used. */
final class ProblemsSection {
  private static final int MOST = 200;

  private ProblemsSection() {}

  static void write(Html html, List<Problem> problems) {
    if (problems.isEmpty()) {
      return;
    }
    html.around(
        "section id=\"problems\"",
        () -> {
          html.element("h2", "Problems in the inputs");
          html.raw("<div class=\"scroll\"><table data-name=\"problems\">\n<thead><tr>")
              .raw("<th>file</th><th class=\"n\">line</th><th>column</th><th>value</th>")
              .raw("<th>problem</th></tr></thead>\n<tbody>\n");
          problems.stream().limit(MOST).forEach(problem -> row(html, problem));
          html.raw("</tbody></table></div>\n");
          if (problems.size() > MOST) {
            html.element("p", problems.size() - MOST + " more are in problems.csv.");
          }
        });
  }

  private static void row(Html html, Problem problem) {
    long line = problem.source().line();
    html.raw("<tr>")
        .element("td class=\"any\"", problem.source().file())
        .element("td class=\"n\"", line > 0 ? Long.toString(line) : "")
        .element("td class=\"any\"", problem.column())
        .element("td class=\"any\"", problem.value())
        .element("td class=\"any\"", problem.text())
        .raw("</tr>\n");
  }
}
