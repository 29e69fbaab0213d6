package org.kappatrail.report.slides;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.kappatrail.report.chart.FleetRow;
import org.kappatrail.report.office.OfficeProperties;
import org.kappatrail.report.office.ShownText;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.Level;
import org.kappatrail.review.Review;

/**
 * The slides of the reliability meeting: where every bearing stands, what needs a decision, a slide
 * per asset, method and cautions.
 */
public final class Slides {
  private static final double LEVEL_TEXT = 18;
  private static final double LEVEL_GAP = 30;

  private final Review review;
  private final Choice choice;
  private final Optional<Path> template;

  /**
   * Slides to be written.
   *
   * @param review what was found
   * @param assets ids of the assets that get a slide; where none is named, those that need a
   *     decision, at most twelve
   * @param template the site's own template, of which master and layouts are used
   */
  public Slides(Review review, List<String> assets, Optional<Path> template) {
    this.review = review;
    this.choice = Choice.of(review, assets);
    this.template = template;
  }

  /** Assets that get a slide. */
  public int assets() {
    return choice.shown().size();
  }

  /** Assets that need a decision and get none. */
  public int more() {
    return choice.more();
  }

  /** Writes the file; an earlier one is replaced only by a complete one. */
  public void write(Path file) throws IOException {
    Path folder = Optional.ofNullable(file.toAbsolutePath().getParent()).orElseThrow();
    Files.createDirectories(folder);
    Path fresh = folder.resolve("." + file.getFileName() + ".new");
    try {
      try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(fresh))) {
        make(out);
      }
      Files.move(fresh, file, StandardCopyOption.REPLACE_EXISTING);
    } finally {
      Files.deleteIfExists(fresh);
    }
  }

  private void make(OutputStream out) throws IOException {
    String site = ShownText.of(review.settings().site());
    String footer = (site.isEmpty() ? "" : site + " · ") + "state of " + review.asOf();
    try (Stage stage = new Stage(template, footer)) {
      opening(stage, site);
      fleet(stage);
      new DecisionList(stage, choice).add();
      for (AssetReview asset : choice.shown()) {
        new AssetSlide(stage, asset).add();
      }
      MethodSlide.add(stage);
      OfficeProperties.set(stage.show().getProperties(), review, "Slides");
      stage.write(out);
    }
  }

  private void fleet(Stage stage) {
    List<FleetRow> rows = FleetRow.of(review);
    long low = rows.stream().filter(row -> row.film().kappa() < row.floor()).count();
    if (rows.isEmpty()) {
      stage.leaf("No bearing has a κ yet: see the data problems of the review");
      return;
    }
    String headline =
        low == 0
            ? "Every bearing stands at or above its floor"
            : low + " of " + rows.size() + " bearings stand below their floor";
    Map<String, String> names = new TreeMap<>();
    review.assets().forEach(asset -> names.put(asset.asset().id(), asset.asset().name()));
    new FleetPicture(stage.leaf(headline), rows, names).draw();
  }

  private void opening(Stage stage, String site) {
    int bearings = review.assets().stream().mapToInt(asset -> asset.bearings().size()).sum();
    Leaf leaf =
        stage.opening(
            site.isEmpty() ? "Oil film of the rolling bearings" : site,
            List.of(
                (site.isEmpty() ? "Review" : "Oil film of the rolling bearings")
                    + ", state of "
                    + review.asOf(),
                count(review.assets().size(), "asset") + ", " + count(bearings, "bearing")));
    double x = leaf.room().getX();
    double y = leaf.room().getY();
    for (Level level : List.of(Level.ALARM, Level.ALERT, Level.CLEAR)) {
      String text = count(level) + " " + level.label();
      double width = leaf.fit().width(text, LEVEL_TEXT, true) + 2;
      LevelShape.draw(leaf.slide(), level, x + 8, y + 11, 14);
      leaf.box(x + 22, y, width + LEVEL_GAP / 2, LEVEL_TEXT * TextFit.LINE + 1)
          .line(text, LEVEL_TEXT, true);
      x += 22 + width + LEVEL_GAP;
    }
  }

  private static String count(int number, String thing) {
    return number + " " + thing + (number == 1 ? "" : "s");
  }

  private long count(Level level) {
    return review.assets().stream()
        .filter(asset -> asset.level().filter(found -> found == level).isPresent())
        .count();
  }
}
