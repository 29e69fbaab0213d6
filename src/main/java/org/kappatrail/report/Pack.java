package org.kappatrail.report;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.stream.Stream;
import org.kappatrail.report.chart.AssetChart;
import org.kappatrail.report.chart.ChartFiles;
import org.kappatrail.report.chart.Drawing;
import org.kappatrail.report.chart.FleetChart;
import org.kappatrail.report.page.FileNames;
import org.kappatrail.report.page.Page;
import org.kappatrail.report.table.CsvFile;
import org.kappatrail.report.table.ReviewTables;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.Progress;
import org.kappatrail.review.Review;
import tech.tablesaw.api.Table;

/**
 * Writes the pack of a review: into a folder beside its place first, then moved there whole, so
 * that a pack is complete or not there.
 */
public final class Pack {
  private final Review review;
  private final Manifest manifest;
  private final boolean charts;
  private final Progress progress;

  /**
   * A pack to be written.
   *
   * @param review what was found
   * @param manifest what it was made from
   * @param charts false to leave the charts out
   * @param progress told how far it has come
   */
  public Pack(Review review, Manifest manifest, boolean charts, Progress progress) {
    this.review = review;
    this.manifest = manifest;
    this.charts = charts;
    this.progress = progress;
  }

  /**
   * Writes the pack to {@code directory/<as-of>}; an earlier one of that day is replaced only by a
   * complete one.
   *
   * @return the pack's folder
   */
  public Path writeTo(Path directory) throws IOException {
    Files.createDirectories(directory);
    Path place = directory.resolve(review.asOf().toString());
    Path fresh = Files.createTempDirectory(directory, "." + review.asOf() + ".new-");
    try {
      write(fresh);
      swap(fresh, place);
    } finally {
      deleteTree(fresh);
    }
    return place;
  }

  private void write(Path folder) throws IOException {
    for (Table table : ReviewTables.all(review)) {
      CsvFile.write(table, folder.resolve(table.name() + ".csv"));
    }
    CsvFile.write(ReviewTables.kappaDaily(review), folder.resolve("kappa-daily.csv"));
    manifest.write(folder.resolve("manifest.json"), review);
    Map<String, String> pictures = charts ? writeCharts(folder) : Map.of();
    Files.writeString(folder.resolve("index.html"), new Page(review, pictures).html());
  }

  /** Writes the charts and gives each asset's SVG text for the page. */
  private Map<String, String> writeCharts(Path folder) throws IOException {
    Path place = Files.createDirectory(folder.resolve("charts"));
    List<AssetReview> assets = review.assets();
    Map<String, String> names = FileNames.of(assets.stream().map(a -> a.asset().id()).toList());
    Map<String, String> pictures = new TreeMap<>();
    List<Job> jobs = new ArrayList<>();
    for (AssetReview asset : assets) {
      Optional<Drawing> drawing = AssetChart.of(review, asset);
      drawing.ifPresent(
          found ->
              jobs.add(
                  new Job(
                      asset.asset().id(), names.getOrDefault(asset.asset().id(), "asset"), found)));
    }
    FleetChart.of(review)
        .ifPresent(found -> jobs.add(new Job("", freeName("fleet", names.values()), found)));
    List<Result> results = jobs.parallelStream().map(job -> draw(job, place)).toList();
    int done = 0;
    for (Result result : results) {
      if (result.failure().isPresent()) {
        throw result.failure().get();
      }
      pictures.put(result.asset(), result.svg());
      progress.at("charts", ++done, results.size());
    }
    return pictures;
  }

  /** A file name that no asset's chart has, under any case. */
  private static String freeName(String wanted, Collection<String> taken) {
    String name = wanted;
    for (int n = 2; taken.stream().anyMatch(name::equalsIgnoreCase); n++) {
      name = wanted + "-" + n;
    }
    return name;
  }

  private record Job(String asset, String fileName, Drawing drawing) {}

  private record Result(String asset, String svg, Optional<IOException> failure) {}

  private static Result draw(Job job, Path place) {
    try {
      String svg = ChartFiles.svg(job.drawing());
      Files.writeString(place.resolve(job.fileName() + ".svg"), svg);
      ChartFiles.writePng(job.drawing(), place.resolve(job.fileName() + ".png"));
      return new Result(job.asset(), svg, Optional.empty());
    } catch (IOException e) {
      return new Result(job.asset(), "", Optional.of(e));
    }
  }

  private static void swap(Path fresh, Path place) throws IOException {
    if (!Files.exists(place)) {
      Files.move(fresh, place);
      return;
    }
    Path old = Files.createTempDirectory(place.getParent(), "." + place.getFileName() + ".old-");
    Path aside = old.resolve("pack");
    Files.move(place, aside);
    try {
      Files.move(fresh, place);
    } catch (IOException e) {
      Files.move(aside, place);
      throw e;
    } finally {
      deleteTree(old);
    }
  }

  private static void deleteTree(Path folder) throws IOException {
    if (!Files.exists(folder)) {
      return;
    }
    try (Stream<Path> tree = Files.walk(folder)) {
      for (Path path : tree.sorted(Comparator.reverseOrder()).toList()) {
        Files.delete(path);
      }
    }
  }
}
