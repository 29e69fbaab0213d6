package org.kappatrail.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.List;
import java.util.Locale;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.kappatrail.browser.Chromium;
import org.kappatrail.browser.Tab;
import org.kappatrail.duty.DutyLog;
import org.kappatrail.duty.DutyLogs;
import org.kappatrail.duty.DutyOptions;
import org.kappatrail.history.Asset;
import org.kappatrail.intake.HistoryReader;
import org.kappatrail.intake.Intake;
import org.kappatrail.report.chart.ChartFiles;
import org.kappatrail.report.page.Page;
import org.kappatrail.report.page.Picture;
import org.kappatrail.report.page.Pictures;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.CorrelationVariables;
import org.kappatrail.review.Progress;
import org.kappatrail.review.Review;
import org.kappatrail.review.Reviewer;

/** The page of 500 assets: the invented site's own, over and over under other names. */
@Tag("slow")
class LargeFleetPageTest {
  private static final int ASSETS = 500;
  private static final long MOST_BYTES = 25_000_000;
  private static final int MOST_MS = 2000;
  private static final LocalDate AS_OF = LocalDate.of(2026, 10, 28);

  @TempDir static Path folder;

  @BeforeAll
  static void write() throws IOException {
    Review few = review();
    List<AssetReview> many = new ArrayList<>();
    Map<String, Picture> pictures = new HashMap<>();
    Map<String, Picture> drawn = draw(few);
    for (int i = 0; i < ASSETS; i++) {
      AssetReview original = few.assets().get(i % few.assets().size());
      String id = String.format(Locale.ROOT, "%s-%03d", original.asset().id(), i);
      many.add(renamed(original, id));
      pictures.put(id, drawn.get(original.asset().id()));
    }
    Review review =
        new Review(
            AS_OF,
            few.settings(),
            many,
            Optional.empty(),
            few.correlations(),
            few.problems(),
            few.files());
    Optional<Picture> fleet =
        ChartJob.of(review).stream()
            .filter(job -> job.kind() == ChartJob.Kind.FLEET)
            .map(LargeFleetPageTest::picture)
            .findFirst();
    assertThat(fleet).isPresent();
    new Page(review, new Pictures(pictures, Map.of(), fleet, Optional.empty())).write(folder);
  }

  @Test
  void weighsLittleAndHasAPageForEveryAsset() throws IOException {
    assertThat(Files.size(folder.resolve("index.html"))).isLessThan(MOST_BYTES);
    try (Stream<Path> pages = Files.list(folder.resolve("pages"))) {
      assertThat(pages).hasSize(ASSETS);
    }
  }

  @Test
  void opensInTwoSeconds() throws IOException {
    try (Chromium browser = Chromium.start();
        Tab tab = browser.open(folder.resolve("index.html"), 1400, 900)) {
      double best = Double.POSITIVE_INFINITY;
      // the machine may do other things at the same time, so the best of three counts
      for (int i = 0; i < 3; i++) {
        tab.go(folder.resolve("index.html"));
        tab.waitFor("document.querySelector('#shown').textContent === '500 of 500 assets'");
        double ms = tab.look("performance.getEntriesByType('navigation')[0].loadEventEnd").asDouble();
        best = Math.min(best, ms);
      }
      assertThat(best).isPositive().isLessThan(MOST_MS);
    }
  }

  @Test
  void leadsToEveryPageAndBack() throws IOException {
    try (Chromium browser = Chromium.start();
        Tab tab = browser.open(folder.resolve("index.html"), 1400, 900)) {
      List<String> links =
          tab.texts("[...document.querySelectorAll('td.name a, .spots a')].map(a => a.getAttribute('href'))");
      assertThat(Set.copyOf(links)).hasSize(ASSETS);
      assertThat(links).allSatisfy(link -> assertThat(folder.resolve(link)).isRegularFile());
      assertThat(tab.text("document.querySelector('#picture .chart').textContent"))
          .contains("the worst 40 of");
      String asset = tab.text("document.querySelector('td.name').dataset.v");
      tab.click("td.name a");
      tab.waitFor("location.pathname.includes('/pages/') && document.readyState === 'complete'");
      assertThat(tab.text("document.querySelector('h2 bdi').textContent")).isEqualTo(asset);
      assertThat(tab.look("document.querySelectorAll('section.asset .chart').length").asInt())
          .isEqualTo(1);
      tab.point("section.asset rect[role=option]:last-of-type");
      tab.waitFor("!document.querySelector('#tip').hidden");
      assertThat(tab.text("document.querySelector('#cautions').textContent"))
          .contains("lock out");
      tab.click("nav a");
      tab.waitFor("location.pathname.endsWith('/index.html') && location.hash === '#fleet'");
      assertThat(tab.complaints()).isEmpty();
    }
  }

  private static Review review() {
    Path history = Path.of("sample-history");
    Intake intake = HistoryReader.read(history);
    try (DutyLog log =
        DutyLogs.open(
            history, intake.settings(), intake.history(), AS_OF, DutyOptions.defaults())) {
      List<AssetReview> assets =
          new Reviewer(intake.history(), intake.history(), intake.settings(), AS_OF, Progress.SILENT)
              .review(log);
      return new Review(
          AS_OF,
          intake.settings(),
          assets,
          Optional.empty(),
          CorrelationVariables.correlate(assets),
          intake.problems(),
          intake.files());
    }
  }

  private static Map<String, Picture> draw(Review review) {
    Map<String, Picture> drawn = new HashMap<>();
    ChartJob.of(review).stream()
        .filter(job -> job.kind() == ChartJob.Kind.TRAIL)
        .forEach(job -> drawn.put(job.subject(), picture(job)));
    return drawn;
  }

  private static Picture picture(ChartJob job) {
    try {
      String svg = ChartFiles.svg(job.drawing());
      return new Picture(() -> svg, job.drawing().spots());
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  private static AssetReview renamed(AssetReview review, String id) {
    Asset asset = review.asset();
    Asset other =
        new Asset(
            id,
            asset.name(),
            asset.area(),
            asset.oil(),
            asset.supply(),
            asset.oilVolumeL(),
            asset.contaminationFactor(),
            asset.changeCost(),
            asset.coolingCost(),
            asset.failureCost(),
            asset.samplingIntervalDays());
    return new AssetReview(
        other,
        review.oil(),
        review.charges(),
        review.samples(),
        review.events(),
        review.bearings(),
        review.lastChange(),
        review.decision(),
        review.oilCauses(),
        review.followUps(),
        review.story(),
        review.findings());
  }
}
