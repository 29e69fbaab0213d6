package org.kappatrail.duty;

import java.sql.ResultSet;
import java.sql.SQLException;
import java.sql.Statement;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.function.Consumer;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Settings;
import org.kappatrail.history.UnusableInputException;

/** Readings in files, taken by embedded DuckDB. */
final class FileDutyLog implements DutyLog {
  private static final String COLUMNS =
      "bearing, source, instant_ms, temperature, speed, fault, flaw";

  private final DuckEngine engine;
  private final List<Bearing> bearings;
  private final Settings settings;
  private final LocalDate asOf;
  private final List<Problem> folderProblems;
  private final List<LogGroup> groups;
  private final List<LongReadings> readings;
  private final boolean[] serial;

  private List<FileAccount> accounts = List.of();
  private List<ReadingFates> fates = List.of();
  private List<Problem> problems;

  FileDutyLog(
      LogFolder folder,
      Settings settings,
      List<Bearing> bearings,
      LocalDate asOf,
      DutyOptions options)
      throws SQLException {
    this.bearings = bearings.stream().sorted(Comparator.comparing(Bearing::key)).toList();
    this.settings = settings;
    this.asOf = asOf;
    this.folderProblems = folder.problems();
    this.problems = folderProblems;
    this.engine = new DuckEngine(options);
    try {
      this.groups = LogGroup.of(folder.files().stream().map(this::header).toList());
      this.readings = groups.stream().map(LongReadings::new).toList();
      this.serial = new boolean[groups.size()];
      statement();
    } catch (RuntimeException e) {
      engine.close();
      throw e;
    }
  }

  @Override
  public void forEachBearing(Consumer<BearingDuty> use) {
    Tally tally = new Tally(groups.stream().mapToInt(group -> group.tables().size()).sum());
    boolean[] handedOver = {false};
    Consumer<BearingDuty> watched =
        duty -> {
          handedOver[0] = true;
          use.accept(duty);
        };
    try {
      try {
        run(new CellReader(bearings, tally, watched));
      } catch (SQLException e) {
        if (handedOver[0] || !canBeRetried(e)) {
          throw e;
        }
        run(new CellReader(bearings, tally, watched));
      }
      report(tally);
    } catch (SQLException e) {
      throw EngineFailure.of(e);
    }
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
  public List<Problem> problems() {
    return problems;
  }

  @Override
  public void close() {
    engine.close();
  }

  /** The statement as it is run. */
  String statement() {
    String names = LongReadings.names(bearings);
    List<String> parts = new ArrayList<>();
    for (int group = 0; group < groups.size(); group++) {
      parts.add("SELECT " + COLUMNS + " FROM (" + query(group, readings.get(group)) + ")");
    }
    String relation = "WITH " + names + " " + String.join(" UNION ALL ", parts);
    return DayCellsStatement.over(relation, bearings, settings, asOf);
  }

  private String query(int group, LongReadings of) {
    return of.sql(zone(groups.get(group)), !serial[group]);
  }

  private ZoneShift zone(LogGroup group) {
    return DayCellsStatement.shift(ZoneNames.of(group.shape().mapping(), settings), asOf);
  }

  private void run(CellReader reader) throws SQLException {
    try (Statement statement = engine.statement();
        ResultSet rows = statement.executeQuery(statement())) {
      reader.read(rows);
    }
  }

  /** Finds the file that is to blame; true where a slower scan will read it. */
  private boolean canBeRetried(SQLException failure) {
    boolean changed = false;
    for (int group = 0; group < groups.size(); group++) {
      for (int index = 0; index < groups.get(group).tables().size(); index++) {
        String file = groups.get(group).tables().get(index).file().name();
        String complaint = complaint(group, index);
        if (FileComplaint.asksForSerialScan(complaint) && !serial[group]) {
          serial[group] = true;
          changed = true;
          complaint = complaint(group, index);
        }
        if (!complaint.isEmpty()) {
          throw new UnusableInputException(FileComplaint.explain(file, complaint), failure);
        }
      }
    }
    return changed;
  }

  private String complaint(int group, int index) {
    String all = FileScan.of(groups.get(group).only(index), !serial[group]);
    return engine.complaint("SELECT COUNT(COLUMNS(*)) FROM " + all);
  }

  private void report(Tally tally) throws SQLException {
    List<FileAccount> newAccounts = new ArrayList<>();
    List<ReadingFates> newFates = new ArrayList<>();
    RejectedCells rejected = new RejectedCells(bearings.stream().map(Bearing::key).toList());
    for (int group = 0; group < groups.size(); group++) {
      for (int index = 0; index < groups.get(group).tables().size(); index++) {
        int source = groups.get(group).firstSource() + index;
        LogTable table = groups.get(group).tables().get(index);
        ReadingFates fate = new ReadingFates(table.file().name(), tally.counts(source));
        newFates.add(fate);
        newAccounts.add(
            new FileAccount(
                fate.file(),
                FileAccount.Kind.TEMPERATURES,
                fate.total(),
                fate.used(),
                fate.total() - fate.used(),
                tally.from(source),
                tally.to(source),
                readings.get(group).layout().unused()));
        look(group, index, tally, rejected);
      }
    }
    newAccounts.sort(Comparator.comparing(FileAccount::file));
    newFates.sort(Comparator.comparing(ReadingFates::file));
    accounts = List.copyOf(newAccounts);
    fates = List.copyOf(newFates);
    List<Problem> all = new ArrayList<>(folderProblems);
    all.addAll(rejected.problems());
    all.sort(null);
    problems = List.copyOf(all);
  }

  private void look(int group, int index, Tally tally, RejectedCells rejected) throws SQLException {
    int source = groups.get(group).firstSource() + index;
    boolean odd = tally.flaws(source) > 0;
    for (CellFault fault : CellFault.values()) {
      odd |= !fault.state().isUsed() && tally.count(source, fault.state()) > 0;
    }
    if (!odd) {
      return;
    }
    LongReadings alone = new LongReadings(groups.get(group).only(index));
    String sql = "WITH " + LongReadings.names(bearings) + " " + query(group, alone);
    OddTexts texts = OddTexts.find(engine, sql, tally.flaws(source) > 0);
    long speeds =
        texts.of(CellFault.SPEED).values().stream().mapToLong(OddTexts.Occurrence::count).sum();
    long unreadable =
        tally.count(source, ReadingState.TIME_UNREADABLE)
            + tally.count(source, ReadingState.TOO_MANY_CELLS)
            + tally.count(source, ReadingState.TEMPERATURE_UNREADABLE)
            + speeds;
    rejected.add(groups.get(group).tables().get(index), alone.layout(), texts, unreadable);
  }

  private LogTable header(LogFile file) {
    return file.format() == LogFile.Format.PARQUET
        ? ParquetHeader.read(file, engine)
        : CsvHeader.read(file);
  }
}
