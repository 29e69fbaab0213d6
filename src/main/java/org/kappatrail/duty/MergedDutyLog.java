package org.kappatrail.duty;

import java.sql.SQLException;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SourceLine;

/** The log of a site from all its sources, each in the order of the bearings. */
final class MergedDutyLog implements DutyLog {
  private final List<DutySource> sources;
  private final List<Problem> firstProblems;
  private List<Problem> problems;

  MergedDutyLog(List<DutySource> sources, List<Problem> firstProblems) {
    this.sources = List.copyOf(sources);
    this.firstProblems = List.copyOf(firstProblems);
    this.problems = this.firstProblems;
  }

  @Override
  public void forEachBearing(Consumer<BearingDuty> use) {
    forEachBearing(use, RowsRead.UNHEARD);
  }

  @Override
  public void forEachBearing(Consumer<BearingDuty> use, RowsRead progress) {
    List<Problem> found = new ArrayList<>(firstProblems);
    List<@Nullable BearingDuty> heads = new ArrayList<>();
    for (DutySource source : sources) {
      heads.add(first(source, progress));
    }
    BearingKey last = null;
    int least = least(heads);
    while (least >= 0) {
      BearingDuty duty = heads.get(least);
      if (duty != null && duty.bearing().equals(last)) {
        found.add(twice(duty.bearing()));
      } else if (duty != null) {
        last = duty.bearing();
        use.accept(duty);
      }
      heads.set(least, next(sources.get(least)));
      least = least(heads);
    }
    for (DutySource source : sources) {
      finish(source);
      found.addAll(source.problems());
    }
    found.sort(null);
    problems = List.copyOf(found);
  }

  @Override
  public List<FileAccount> accounts() {
    return sources.stream()
        .flatMap(source -> source.accounts().stream())
        .sorted(Comparator.comparing(FileAccount::file))
        .toList();
  }

  @Override
  public List<ReadingFates> fates() {
    return sources.stream()
        .flatMap(source -> source.fates().stream())
        .sorted(Comparator.comparing(ReadingFates::file))
        .toList();
  }

  @Override
  public List<Problem> problems() {
    return problems;
  }

  @Override
  public void close() {
    sources.forEach(DutySource::close);
  }

  private static @Nullable BearingDuty first(DutySource source, RowsRead progress) {
    try {
      source.start(progress);
      return source.next();
    } catch (SQLException e) {
      throw explain(source, e);
    }
  }

  private static @Nullable BearingDuty next(DutySource source) {
    try {
      return source.next();
    } catch (SQLException e) {
      throw explain(source, e);
    }
  }

  private static void finish(DutySource source) {
    try {
      source.finish();
    } catch (SQLException e) {
      throw explain(source, e);
    }
  }

  private static RuntimeException explain(DutySource source, SQLException failure) {
    return Thread.currentThread().isInterrupted()
        ? new CancellationException("the reading of the logs was cancelled")
        : source.explain(failure);
  }

  private static int least(List<@Nullable BearingDuty> heads) {
    int least = -1;
    BearingKey key = null;
    for (int index = 0; index < heads.size(); index++) {
      BearingDuty head = heads.get(index);
      if (head != null && (key == null || head.bearing().compareTo(key) < 0)) {
        least = index;
        key = head.bearing();
      }
    }
    return least;
  }

  private static Problem twice(BearingKey bearing) {
    return new Problem(
        new SourceLine("kappatrail.yaml", 0),
        "temperatures",
        bearing.toString(),
        "has readings in two places; those of the files, or of the first table, are used");
  }
}
