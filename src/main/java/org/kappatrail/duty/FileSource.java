package org.kappatrail.duty;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.OptionalLong;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Settings;
import org.kappatrail.history.UnusableInputException;

/** Readings in files, taken by embedded DuckDB. */
final class FileSource implements DutySource {
  private static final String COLUMNS =
      "bearing, source, instant_ms, temperature, speed, fault, flaw";

  private final DuckEngine engine;
  private final List<Bearing> bearings;
  private final Settings settings;
  private final LocalDate asOf;
  private final List<LogGroup> groups;
  private final List<FileReadings> readings;
  private final boolean[] serial;
  private final long rowEstimate;
  private Tally tally;
  private @Nullable RunningStatement running;

  private List<FileAccount> accounts = List.of();
  private List<ReadingFates> fates = List.of();
  private List<Problem> problems = List.of();
  private Map<String, Long> unknown = Map.of();

  /**
   * Reads the headers.
   *
   * @param bearings the register in the order of the keys
   */
  FileSource(
      List<LogFile> files,
      Settings settings,
      List<Bearing> bearings,
      LocalDate asOf,
      DutyOptions options)
      throws SQLException {
    this.bearings = List.copyOf(bearings);
    this.settings = settings;
    this.asOf = asOf;
    this.engine = new DuckEngine(options);
    try {
      List<LogTable> tables = new ArrayList<>();
      for (LogFile file : files) {
        tables.add(Utf8Copy.of(header(file), engine.work().path(), tables.size()));
      }
      this.groups = LogGroup.of(tables);
      this.rowEstimate = RowEstimate.of(tables, engine);
      this.readings =
          groups.stream().map(group -> new FileReadings(group, bearings, settings)).toList();
      this.serial = new boolean[groups.size()];
      this.tally = new Tally(tables.size());
      statement();
    } catch (RuntimeException e) {
      engine.close();
      throw e;
    }
  }

  @Override
  public void start(RowsRead progress) throws SQLException {
    stop();
    tell(0, progress);
    try {
      running = run(progress);
    } catch (SQLException e) {
      if (Thread.currentThread().isInterrupted() || !canBeRetried(e)) {
        throw e;
      }
      running = run(progress);
    }
  }

  @Override
  public @Nullable BearingDuty next() throws SQLException {
    return running == null ? null : running.next();
  }

  @Override
  public void finish() throws SQLException {
    stop();
    List<BearingKey> register = bearings.stream().map(Bearing::key).toList();
    RejectedCells rejected = new RejectedCells(register);
    List<FileAccount> newAccounts = new ArrayList<>();
    List<ReadingFates> newFates = new ArrayList<>();
    for (int group = 0; group < groups.size(); group++) {
      for (int index = 0; index < groups.get(group).tables().size(); index++) {
        int source = groups.get(group).firstSource() + index;
        ReadingFates fate = new ReadingFates(file(group, index), tally.counts(source));
        newFates.add(fate);
        newAccounts.add(
            tally.account(
                source, fate, fileRows(group, index), readings.get(group).layout().unused()));
        look(group, index, rejected);
      }
    }
    accounts = List.copyOf(newAccounts);
    fates = List.copyOf(newFates);
    problems = rejected.problems();
    unknown = rejected.unknownBearings();
  }

  @Override
  public List<FileAccount> accounts() {
    return accounts;
  }

  @Override
  public List<ReadingFates> fates() {
    return fates;
  }

  @Override
  public Map<String, Long> unknownBearings() {
    return unknown;
  }

  @Override
  public List<Problem> problems() {
    return problems;
  }

  @Override
  public RuntimeException explain(SQLException failure) {
    return EngineFailure.of(failure);
  }

  @Override
  public void close() {
    try {
      stop();
    } catch (SQLException e) {
      throw new IllegalStateException("the query does not close", e);
    } finally {
      engine.close();
    }
  }

  /** The statement as it is run. */
  String statement() {
    List<String> parts = new ArrayList<>();
    for (int group = 0; group < groups.size(); group++) {
      parts.add("SELECT " + COLUMNS + " FROM (" + query(group, readings.get(group)) + ")");
    }
    String relation = String.join(" UNION ALL ", parts);
    return DayCellsStatement.over(relation, bearings, settings, asOf);
  }

  private RunningStatement run(RowsRead progress) throws SQLException {
    tally = new Tally(tally.sources());
    return new RunningStatement(
        engine.statement(), statement(), bearings, tally, share -> tell(share, progress));
  }

  private void tell(double share, RowsRead progress) {
    progress.at(Math.round(share * rowEstimate), rowEstimate);
  }

  private void stop() throws SQLException {
    if (running != null) {
      running.close();
      running = null;
    }
  }

  private String query(int group, FileReadings of) {
    ZoneShift zone =
        DayCellsStatement.shift(ZoneNames.of(groups.get(group).shape().mapping(), settings), asOf);
    return of.sql(zone, !serial[group]);
  }

  /** Finds the file that is to blame; true where a slower scan will read it. */
  private boolean canBeRetried(SQLException failure) {
    boolean changed = false;
    for (int group = 0; group < groups.size(); group++) {
      for (int index = 0; index < groups.get(group).tables().size(); index++) {
        String complaint = complaint(group, index);
        if (FileComplaint.asksForSerialScan(complaint) && !serial[group]) {
          serial[group] = true;
          changed = true;
          complaint = complaint(group, index);
        }
        if (!complaint.isEmpty()) {
          throw new UnusableInputException(
              FileComplaint.explain(file(group, index), complaint), failure);
        }
      }
    }
    return changed;
  }

  private String complaint(int group, int index) {
    String all = FileScan.of(groups.get(group).only(index), !serial[group]);
    return engine.complaint("SELECT COUNT(COLUMNS(*)) FROM " + all);
  }

  private void look(int group, int index, RejectedCells rejected) throws SQLException {
    int source = groups.get(group).firstSource() + index;
    if (!tally.hasOddCells(source)) {
      return;
    }
    FileReadings alone = new FileReadings(groups.get(group).only(index), bearings, settings);
    OddTexts texts = OddTexts.find(engine, query(group, alone), tally.flaws(source) > 0);
    long speeds =
        texts.of(CellFault.SPEED).values().stream().mapToLong(OddTexts.Occurrence::count).sum();
    LogTable table = groups.get(group).tables().get(index);
    rejected.add(table, alone.layout(), texts, tally.unreadable(source) + speeds);
  }

  /** Rows of a file with a column per tag, where what is counted are the cells. */
  private OptionalLong fileRows(int group, int index) throws SQLException {
    if (readings.get(group).layout().form() != LogLayout.Form.WIDE) {
      return OptionalLong.empty();
    }
    String all = FileScan.of(groups.get(group).only(index), !serial[group]);
    try (Statement statement = engine.statement();
        ResultSet rows = statement.executeQuery("SELECT COUNT(*) FROM " + all)) {
      rows.next();
      return OptionalLong.of(rows.getLong(1));
    }
  }

  private String file(int group, int index) {
    return groups.get(group).tables().get(index).file().name();
  }

  private LogTable header(LogFile file) {
    return file.format() == LogFile.Format.PARQUET
        ? ParquetHeader.read(file, engine)
        : CsvHeader.read(file);
  }
}
