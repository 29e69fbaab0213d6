package org.kappatrail.report;

import java.io.IOException;
import java.io.InterruptedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import org.kappatrail.report.chart.ChartFiles;
import org.kappatrail.report.json.ReviewJson;
import org.kappatrail.report.page.Page;
import org.kappatrail.report.page.Picture;
import org.kappatrail.report.page.Pictures;
import org.kappatrail.report.table.CsvFile;
import org.kappatrail.report.table.ReviewTables;
import org.kappatrail.report.workbook.ReviewWorkbook;
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
    try (Draft draft = new Draft(directory, review.asOf())) {
      write(draft.pack());
      return draft.publish();
    }
  }

  private void write(Path folder) throws IOException {
    progress.at("tables and page", 0, 1);
    Pictures pictures = charts ? writeCharts(folder) : Pictures.none();
    List<Table> tables = ReviewTables.all(review);
    List<Output> outputs = new ArrayList<>();
    outputs.add(() -> new Page(review, pictures).write(folder));
    outputs.add(
        () ->
            new ReviewJson(review, manifest.programVersion()).write(folder.resolve("review.json")));
    outputs.add(() -> new ReviewWorkbook(review, tables).write(folder.resolve("review.xlsx")));
    for (Table table : tables) {
      outputs.add(() -> CsvFile.write(table, folder.resolve(table.name() + ".csv")));
    }
    outputs.add(
        () -> CsvFile.write(ReviewTables.kappaDaily(review), folder.resolve("kappa-daily.csv")));
    outputs.add(() -> manifest.write(folder.resolve("manifest.json"), review));
    writeTogether(outputs);
  }

  private interface Output {
    void write() throws IOException;
  }

  /** Writes files side by side; none depends on another. */
  private static void writeTogether(List<Output> outputs) throws IOException {
    Thread caller = Thread.currentThread();
    List<IOException> failures =
        outputs.parallelStream().flatMap(output -> failure(output, caller).stream()).toList();
    if (!failures.isEmpty()) {
      throw failures.get(0);
    }
  }

  private static Optional<IOException> failure(Output output, Thread caller) {
    try {
      if (caller.isInterrupted()) {
        throw new InterruptedIOException("the writing of the pack was stopped");
      }
      output.write();
      return Optional.empty();
    } catch (IOException e) {
      return Optional.of(e);
    }
  }

  /** Writes the charts; the page reads them again when their turn comes. */
  private Pictures writeCharts(Path folder) throws IOException {
    Path place = Files.createDirectory(folder.resolve("charts"));
    List<ChartJob> jobs = ChartJob.of(review);
    Thread caller = Thread.currentThread();
    List<Result> results = jobs.parallelStream().map(job -> draw(job, place, caller)).toList();
    Map<ChartJob.Kind, Map<String, Picture>> found = new EnumMap<>(ChartJob.Kind.class);
    int done = 0;
    for (Result result : results) {
      if (result.failure().isPresent()) {
        throw result.failure().get();
      }
      found
          .computeIfAbsent(result.job().kind(), kind -> new TreeMap<>())
          .put(result.job().subject(), result.picture());
      progress.at("charts", ++done, results.size());
    }
    return new Pictures(
        found.getOrDefault(ChartJob.Kind.TRAIL, Map.of()),
        found.getOrDefault(ChartJob.Kind.CORRELATION, Map.of()),
        only(found, ChartJob.Kind.FLEET),
        only(found, ChartJob.Kind.FLEET_CORRELATION));
  }

  private static Optional<Picture> only(
      Map<ChartJob.Kind, Map<String, Picture>> found, ChartJob.Kind kind) {
    return found.getOrDefault(kind, Map.of()).values().stream().findFirst();
  }

  private record Result(ChartJob job, Picture picture, Optional<IOException> failure) {}

  private static Result draw(ChartJob job, Path place, Thread caller) {
    Path file = place.resolve(job.fileName() + ".svg");
    try {
      if (caller.isInterrupted()) {
        throw new InterruptedIOException("the drawing of charts was stopped");
      }
      Files.writeString(file, ChartFiles.svg(job.drawing()));
      ChartFiles.writePng(job.drawing(), place.resolve(job.fileName() + ".png"));
      return new Result(job, Picture.ofFile(file, job.drawing().spots()), Optional.empty());
    } catch (IOException e) {
      return new Result(job, Picture.ofText(""), Optional.of(e));
    }
  }
}
