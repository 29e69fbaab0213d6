package org.kappatrail.duty;

import java.sql.SQLException;
import java.util.ArrayList;
import java.util.Collections;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.concurrent.CancellationException;
import java.util.function.Consumer;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SourceLine;

/** The log of a site from all its sources, each in the order of the bearings. */
final class MergedDutyLog implements DutyLog {
  private static final String TWICE = "of a bearing that has readings elsewhere";

  private final List<DutySource> sources;
  private final List<Problem> firstProblems;
  private List<Problem> problems;
  private List<FileAccount> accounts = List.of();
  private Map<String, Long> unknown = Map.of();

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
    Map<Integer, Long> unneeded = new TreeMap<>();
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
        unneeded.merge(least, readings(duty), Long::sum);
      } else if (duty != null) {
        last = duty.bearing();
        use.accept(duty);
      }
      heads.set(least, next(sources.get(least)));
      least = least(heads);
    }
    List<FileAccount> files = new ArrayList<>();
    Map<String, Long> names = new TreeMap<>();
    for (int index = 0; index < sources.size(); index++) {
      DutySource source = sources.get(index);
      finish(source);
      found.addAll(source.problems());
      source.unknownBearings().forEach((name, readings) -> names.merge(name, readings, Long::sum));
      // Only a database comes after another source, and it is one table.
      long left = unneeded.getOrDefault(index, 0L);
      source.accounts().forEach(account -> files.add(account.without(left, TWICE)));
    }
    found.sort(null);
    problems = List.copyOf(found);
    files.sort(Comparator.comparing(FileAccount::file));
    accounts = List.copyOf(files);
    unknown = Collections.unmodifiableMap(names);
  }

  @Override
  public List<FileAccount> accounts() {
    return accounts;
  }

  @Override
  public Map<String, Long> unknownBearings() {
    return unknown;
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

  private static long readings(BearingDuty duty) {
    long readings = 0;
    for (int cell = 0; cell < duty.cells().size(); cell++) {
      readings += duty.cells().readings(cell);
    }
    return readings;
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
