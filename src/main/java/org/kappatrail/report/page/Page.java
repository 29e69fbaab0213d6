package org.kappatrail.report.page;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import org.kappatrail.history.Problem;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.Level;
import org.kappatrail.review.Review;
import org.kappatrail.review.correlation.PairCorrelation;

/** The review as one self-contained page: nothing is loaded from anywhere. */
public final class Page {
  private static final int MOST_PROBLEMS = 200;

  /**
   * Rows of samples beyond which earlier ones are left to the table: what a browser still opens.
   */
  private static final long MOST_SAMPLE_ROWS = 20_000;

  private final Review review;
  private final Pictures pictures;
  private final Map<String, String> anchors;

  /**
   * A page.
   *
   * @param review what was found
   * @param pictures its pictures
   */
  public Page(Review review, Pictures pictures) {
    this.review = review;
    this.pictures = pictures;
    this.anchors = FileNames.of(review.assets().stream().map(asset -> asset.asset().id()).toList());
  }

  /** Writes the page asset by asset. */
  public void write(Path file) throws IOException {
    try (Writer out = Files.newBufferedWriter(file)) {
      write(out);
    } catch (UncheckedIOException e) {
      throw e.getCause();
    }
  }

  private void write(Writer out) {
    Html html = new Html();
    String site = review.settings().site();
    String title = (site.isEmpty() ? "Oil film review" : site + ": oil film review");
    html.raw("<!DOCTYPE html>\n<html lang=\"en\">\n<head>\n<meta charset=\"utf-8\">\n")
        .raw(
            "<meta http-equiv=\"Content-Security-Policy\" content=\"default-src 'none'; img-src"
                + " data:; style-src 'unsafe-inline'; script-src 'unsafe-inline'\">\n")
        .raw("<meta name=\"viewport\" content=\"width=device-width, initial-scale=1\">\n")
        .element("title", title + ", " + review.asOf())
        .raw("\n<style>\n")
        .raw(resource("page.css"))
        .raw("</style>\n</head>\n<body>\n");
    html.around("header", () -> head(html, title));
    boolean earlierSamples = sampleRows() <= MOST_SAMPLE_ROWS;
    html.around(
        "main",
        () -> {
          review.since().ifPresent(since -> new SinceSection(since, links()).write(html));
          new FleetTable(review, anchors).write(html);
          Map<String, List<PairCorrelation>> correlations = review.correlations().byAsset();
          for (AssetReview asset : review.worstFirst()) {
            String id = asset.asset().id();
            new AssetSection(
                    asset,
                    anchorOf(asset),
                    pictures.assets().getOrDefault(id, ""),
                    earlierSamples,
                    new CorrelationSection(
                        correlations.getOrDefault(id, List.of()),
                        pictures.correlations().getOrDefault(id, ""),
                        false))
                .write(html);
            html.drainTo(out);
          }
          html.around("section id=\"correlations\"", () -> fleetCorrelations(html));
          problems(html);
          html.raw(resource("method.html"));
        });
    html.raw("</body>\n</html>\n").drainTo(out);
  }

  private long sampleRows() {
    return review.assets().stream()
        .flatMap(asset -> asset.bearings().stream())
        .mapToLong(bearing -> bearing.trail().size())
        .sum();
  }

  private Map<String, String> links() {
    Map<String, String> links = new TreeMap<>();
    anchors.forEach((asset, anchor) -> links.put(asset, "#" + anchor));
    return links;
  }

  private void fleetCorrelations(Html html) {
    html.element("h2", "What goes with what in the fleet").raw("\n");
    new CorrelationSection(review.correlations().fleet(), pictures.fleetCorrelation(), true)
        .write(html, "the fleet");
  }

  private String anchorOf(AssetReview asset) {
    return anchors.getOrDefault(asset.asset().id(), "");
  }

  private void head(Html html, String title) {
    html.element("h1", title).raw("\n");
    long alarms = count(Level.ALARM);
    long alerts = count(Level.ALERT);
    long unknown = review.assets().stream().filter(asset -> asset.level().isEmpty()).count();
    html.element(
        "p class=\"lead\"",
        "State of "
            + review.asOf()
            + ". Of "
            + review.assets().size()
            + (review.assets().size() == 1 ? " asset, " : " assets, ")
            + alarms
            + (alarms == 1 ? " has" : " have")
            + " a bearing below its κ floor, "
            + alerts
            + (alerts == 1 ? " has" : " have")
            + " one whose interval reaches below it"
            + (unknown == 0 ? "." : ", and of " + unknown + " no κ is known."));
    if (!review.problems().isEmpty()) {
      html.raw("<p><a href=\"#problems\">")
          .text(review.problems().size() + " problems in the inputs")
          .raw("</a> were left out of what follows.</p>\n");
    }
  }

  private long count(Level level) {
    return review.assets().stream()
        .filter(asset -> asset.level().filter(found -> found == level).isPresent())
        .count();
  }

  private void problems(Html html) {
    List<Problem> problems = review.problems();
    if (problems.isEmpty()) {
      return;
    }
    html.around(
        "section id=\"problems\"",
        () -> {
          html.element("h2", "Problems in the inputs");
          html.raw("<div class=\"scroll\"><table>\n<thead><tr><th>file</th><th class=\"n\">line")
              .raw("</th><th>column</th><th>value</th><th>problem</th></tr></thead>\n<tbody>\n");
          for (Problem problem : problems.subList(0, Math.min(MOST_PROBLEMS, problems.size()))) {
            long line = problem.source().line();
            html.raw("<tr>")
                .element("td", problem.source().file())
                .element("td class=\"n\"", line > 0 ? Long.toString(line) : "")
                .element("td", problem.column())
                .element("td", problem.value())
                .element("td", problem.text())
                .raw("</tr>\n");
          }
          html.raw("</tbody></table></div>\n");
          if (problems.size() > MOST_PROBLEMS) {
            html.element("p", problems.size() - MOST_PROBLEMS + " more are in problems.csv.");
          }
        });
  }

  private static String resource(String name) {
    try (InputStream in = Page.class.getResourceAsStream(name)) {
      if (in == null) {
        throw new IllegalStateException("the program lacks its file " + name);
      }
      return new String(in.readAllBytes(), StandardCharsets.UTF_8);
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }
}
