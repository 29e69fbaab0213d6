package org.kappatrail.cli;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Clock;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.TreeSet;
import org.kappatrail.duty.DutyLog;
import org.kappatrail.duty.DutyLogs;
import org.kappatrail.duty.DutyOptions;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.NearestName;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Sample;
import org.kappatrail.history.UnusableInputException;
import org.kappatrail.intake.Fingerprint;
import org.kappatrail.intake.HistoryReader;
import org.kappatrail.intake.Intake;
import org.kappatrail.report.Manifest;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.CorrelationVariables;
import org.kappatrail.review.Progress;
import org.kappatrail.review.Review;
import org.kappatrail.review.Reviewer;
import org.kappatrail.review.Since;

/** Reads a history folder and reviews it: what the commands share. */
final class HistoryLoad {
  /** East of the clock's zone it may already be the next day. */
  private static final int ZONE_MARGIN_DAYS = 1;

  private final Path folder;
  private final Intake intake;
  private final PlantHistory chosen;
  private final LocalDate asOf;

  /**
   * Reads what is to be reviewed.
   *
   * @throws UnusableInputException where there is no day that the review could be made for
   */
  HistoryLoad(HistoryOptions options, Clock clock) {
    this(options, clock, false, Optional.empty());
  }

  /** A load of the whole fleet, whatever assets are named; the names are checked all the same. */
  static HistoryLoad ofWholeFleet(HistoryOptions options, Clock clock) {
    return new HistoryLoad(options, clock, true, Optional.empty());
  }

  private HistoryLoad(
      HistoryOptions options, Clock clock, boolean wholeFleet, Optional<LocalDate> otherwise) {
    folder = options.folder();
    intake =
        HistoryReader.read(folder, Optional.of(LocalDate.now(clock).plusDays(ZONE_MARGIN_DAYS)));
    PlantHistory named = choose(intake.history(), options.assets());
    chosen = wholeFleet ? intake.history() : named;
    LocalDate given = options.asOf();
    asOf =
        given != null
            ? given
            : Reviewer.latestSampling(intake.history())
                .or(() -> otherwise)
                .orElseThrow(
                    () ->
                        new UnusableInputException(
                            folder
                                + ": no oil sample that can be used, so there is nothing to"
                                + " review; put the laboratory's files into samples/, or give"
                                + " --as-of to look at the logs alone"));
  }

  /** Reads what is to be looked at, which may be a history without samples. */
  static HistoryLoad toCheck(HistoryOptions options, Clock clock) {
    return new HistoryLoad(options, clock, false, Optional.of(LocalDate.now(clock)));
  }

  Intake intake() {
    return intake;
  }

  LocalDate asOf() {
    return asOf;
  }

  /** Reviews the chosen assets. */
  Review review(Progress progress) {
    return review(Optional.empty(), progress);
  }

  /** Reviews the chosen assets, and says what changed since an earlier day. */
  Review review(Optional<LocalDate> earlier, Progress progress) {
    List<AssetReview> assets;
    List<Problem> problems = new ArrayList<>(intake.problems());
    List<FileAccount> files = new ArrayList<>(intake.upTo(asOf).files());
    try (DutyLog log = openLog(asOf)) {
      assets =
          new Reviewer(chosen, intake.history(), intake.settings(), asOf, progress).review(log);
      problems.addAll(log.problems());
      files.addAll(log.accounts());
    }
    Optional<Since> since = earlier.map(day -> since(day, assets, progress));
    return new Review(
        asOf,
        intake.settings(),
        assets,
        since,
        CorrelationVariables.correlate(assets),
        problems,
        files);
  }

  private Since since(LocalDate day, List<AssetReview> now, Progress progress) {
    try (DutyLog log = openLog(day)) {
      List<AssetReview> before =
          new Reviewer(
                  Reviewer.knownOn(chosen, day),
                  Reviewer.knownOn(intake.history(), day),
                  intake.settings(),
                  day,
                  progress)
              .review(log);
      return Reviewer.compare(day, before, now);
    }
  }

  /** The logs of the whole history, so that no log counts as unknown for not being chosen. */
  private DutyLog openLog(LocalDate lastDay) {
    return DutyLogs.open(
        folder, intake.settings(), intake.history(), lastDay, DutyOptions.defaults());
  }

  /** The logs up to the review's last day. */
  DutyLog openLog() {
    return openLog(asOf);
  }

  /** What the review was made from. */
  Manifest manifest(Review review) throws IOException {
    List<Path> files = new ArrayList<>(intake.inputFiles());
    for (FileAccount account : review.files()) {
      Path file = folder.resolve(account.file());
      if (account.kind() == FileAccount.Kind.TEMPERATURES && Files.isRegularFile(file)) {
        files.add(file);
      }
    }
    List<Manifest.Input> inputs =
        Fingerprint.of(folder, files).stream()
            .map(print -> new Manifest.Input(print.file(), print.bytes(), print.sha256()))
            .toList();
    return new Manifest(ProgramVersion.number(), inputs);
  }

  private static PlantHistory choose(PlantHistory history, List<String> assets) {
    if (assets.isEmpty()) {
      return history;
    }
    TreeSet<String> wanted = new TreeSet<>(assets);
    for (String asset : wanted) {
      if (history.findAsset(asset).isEmpty()) {
        Optional<String> nearest =
            NearestName.of(asset, history.assets().stream().map(a -> a.id()).toList());
        throw new UnusableInputException(
            "no asset '"
                + asset
                + "' in assets.csv"
                + nearest.map(name -> "; nearest is '" + name + "'").orElse(""));
      }
    }
    return new PlantHistory(
        history.oils(),
        history.assets().stream().filter(asset -> wanted.contains(asset.id())).toList(),
        history.bearings().stream().filter(item -> wanted.contains(item.asset())).toList(),
        history.samples().stream().filter((Sample item) -> wanted.contains(item.asset())).toList(),
        wanted.stream().flatMap(asset -> history.eventsOf(asset).stream()).toList());
  }
}
