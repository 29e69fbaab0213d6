package org.kappatrail.report.page;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.io.Writer;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.Review;
import org.kappatrail.review.correlation.PairCorrelation;

/**
 * The review to read: one self-contained page, or for a large fleet an index with a page for every
 * asset behind it. Nothing is loaded from anywhere.
 */
public final class Page {
  /** Assets beyond which each gets a page of its own. */
  public static final int MOST_ON_ONE_PAGE = 60;

  /** Folder of the assets' own pages. */
  private static final String PAGES = "pages";

  /**
   * Rows of samples beyond which earlier ones are left to the table: what a browser still opens.
   */
  private static final long MOST_SAMPLE_ROWS = 20_000;

  private final Review review;
  private final Pictures pictures;
  private final String title;
  private final boolean one;
  private final List<AssetReview> worstFirst;
  private final Map<String, String> names;
  private final Map<String, List<PairCorrelation>> correlations;

  /**
   * A page.
   *
   * @param review what was found
   * @param pictures its pictures
   */
  public Page(Review review, Pictures pictures) {
    this.review = review;
    this.pictures = pictures;
    String site = review.settings().site();
    title = (site.isEmpty() ? "Oil film review" : site + ": oil film review");
    one = review.assets().size() <= MOST_ON_ONE_PAGE;
    worstFirst = review.worstFirst();
    names = FileNames.of(review.assets().stream().map(asset -> asset.asset().id()).toList());
    correlations = review.correlations().byAsset();
  }

  /** Writes {@code index.html} into a folder, asset by asset, and the assets' pages. */
  public void write(Path folder) throws IOException {
    try (Writer out = Files.newBufferedWriter(folder.resolve("index.html"))) {
      index(out);
    } catch (UncheckedIOException e) {
      throw e.getCause();
    }
    if (!one) {
      writePages(Files.createDirectories(folder.resolve(PAGES)));
    }
  }

  private void index(Writer out) {
    List<Picture> shown = new ArrayList<>();
    pictures.fleet().ifPresent(shown::add);
    pictures.fleetCorrelation().ifPresent(shown::add);
    if (one) {
      shown.addAll(pictures.assets().values());
      shown.addAll(pictures.correlations().values());
    }
    Shell shell = new Shell(DarkCharts.rules(shown));
    Html html = new Html();
    shell.begin(html, title + ", " + review.asOf());
    Map<String, String> links = links();
    html.around("header", () -> new Opening(review, title).write(html));
    html.around(
        "main",
        () -> {
          review.since().ifPresent(since -> new SinceSection(since, links).write(html));
          pictures.fleet().ifPresent(found -> new FleetFigure(review, links).write(html, found));
          new FleetTable(review, links).write(html);
          if (one) {
            boolean earlierSamples = sampleRows() <= MOST_SAMPLE_ROWS;
            for (AssetReview asset : worstFirst) {
              section(asset, earlierSamples).write(html);
              html.drainTo(out);
            }
          }
          html.around("section id=\"correlations\"", () -> fleetCorrelations(html));
          ProblemsSection.write(html, review.problems());
          html.raw(Shell.resource("method.html")).raw(Shell.resource("cautions.html"));
        });
    shell.end(html);
    html.drainTo(out);
  }

  private void writePages(Path folder) throws IOException {
    for (int i = 0; i < worstFirst.size(); i++) {
      AssetReview asset = worstFirst.get(i);
      Optional<AssetReview> before = i == 0 ? Optional.empty() : Optional.of(worstFirst.get(i - 1));
      Optional<AssetReview> after =
          i + 1 == worstFirst.size() ? Optional.empty() : Optional.of(worstFirst.get(i + 1));
      String text;
      try {
        text = page(asset, before, after);
      } catch (UncheckedIOException e) {
        throw e.getCause();
      }
      Files.writeString(folder.resolve(name(asset) + ".html"), text);
    }
  }

  private String page(
      AssetReview asset, Optional<AssetReview> before, Optional<AssetReview> after) {
    List<Picture> shown = new ArrayList<>();
    pictures.asset(asset.asset().id()).ifPresent(shown::add);
    pictures.correlation(asset.asset().id()).ifPresent(shown::add);
    Shell shell = new Shell(DarkCharts.rules(shown));
    Html html = new Html();
    shell.begin(html, asset.asset().id() + ", " + title + ", " + review.asOf());
    html.around(
        "header",
        () -> {
          html.element("h1", title + ", " + review.asOf()).raw("\n");
          html.raw("<nav aria-label=\"pages\"><a href=\"../index.html#fleet\">the fleet</a>");
          before.ifPresent(other -> neighbour(html, "worse", other));
          after.ifPresent(other -> neighbour(html, "better", other));
          html.raw("</nav>\n");
        });
    html.around(
        "main",
        () -> {
          section(asset, true).write(html);
          html.raw(Shell.resource("cautions.html"));
        });
    shell.end(html);
    return html.toString();
  }

  private void neighbour(Html html, String which, AssetReview other) {
    html.raw(" <a href=\"")
        .text(name(other) + ".html")
        .raw("\">next " + which + ": <bdi>")
        .text(other.asset().id())
        .raw("</bdi></a>");
  }

  private AssetSection section(AssetReview asset, boolean earlierSamples) {
    String id = asset.asset().id();
    return new AssetSection(
        asset,
        name(asset),
        pictures.asset(id),
        earlierSamples,
        new CorrelationSection(
            correlations.getOrDefault(id, List.of()), pictures.correlation(id), false));
  }

  private void fleetCorrelations(Html html) {
    html.element("h2", "What goes with what in the fleet").raw("\n");
    new CorrelationSection(review.correlations().fleet(), pictures.fleetCorrelation(), true)
        .write(html, "the fleet", "fleet-correlation");
  }

  private long sampleRows() {
    return review.assets().stream()
        .flatMap(asset -> asset.bearings().stream())
        .mapToLong(bearing -> bearing.trail().size())
        .sum();
  }

  private Map<String, String> links() {
    Map<String, String> links = new TreeMap<>();
    names.forEach(
        (asset, name) -> links.put(asset, one ? "#a-" + name : PAGES + "/" + name + ".html"));
    return links;
  }

  private String name(AssetReview asset) {
    return names.getOrDefault(asset.asset().id(), "asset");
  }
}
