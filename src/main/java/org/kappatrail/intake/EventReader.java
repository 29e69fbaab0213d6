package org.kappatrail.intake;

import java.time.LocalDate;
import java.util.Arrays;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.kappatrail.history.BearingKey;
import org.kappatrail.history.Event;
import org.kappatrail.history.EventKind;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.SourceLine;

/** Reads {@code events.csv}. */
final class EventReader {
  static final String FILE = "events.csv";

  private static final List<String> COLUMNS =
      List.of("asset", "date", "event", "oil", "litres", "bearing", "note");

  private final RegisterFolder folder;
  private final Set<String> assets;
  private final Map<String, SourceLine> left;
  private final Set<String> oils;
  private final Set<BearingKey> bearings;
  private final DateText dates;

  EventReader(
      RegisterFolder folder,
      Set<String> assets,
      Map<String, SourceLine> left,
      Set<String> oils,
      Set<BearingKey> bearings,
      DateText dates) {
    this.folder = folder;
    this.assets = assets;
    this.left = left;
    this.oils = oils;
    this.bearings = bearings;
    this.dates = dates;
  }

  List<Event> read() {
    RegisterTable table =
        folder.table(FILE, FileAccount.Kind.EVENTS, COLUMNS, List.of("asset", "date", "event"));
    return table.read(
        this::event,
        folder.accounts(),
        List.copyOf(table.further()),
        event -> Optional.of(event.date()));
  }

  private Optional<Event> event(Row row) {
    Optional<String> asset = row.requiredName("asset");
    if (asset.isPresent() && !assets.contains(asset.get())) {
      row.reject(
          "asset",
          asset.get(),
          RegisterFolder.unknown(asset.get(), assets, left, AssetReader.FILE));
    }
    Optional<LocalDate> day = requiredDay(row);
    Optional<EventKind> kind = kind(row);
    if (row.isRejected() || asset.isEmpty() || day.isEmpty() || kind.isEmpty()) {
      return Optional.empty();
    }
    return Optional.of(
        new Event(
            asset.get(),
            day.get(),
            kind.get(),
            oil(row),
            row.number("litres", new Limit(0.001, 1e7, "l")),
            bearing(row, asset.get()),
            row.text("note")));
  }

  private Optional<LocalDate> requiredDay(Row row) {
    String text = row.cell("date");
    Optional<LocalDate> day = row.day("date", dates);
    if (day.isEmpty()) {
      if (Texts.isMissing(text)) {
        row.reject("date", text, "is required and missing; fill in the day, such as 2024-03-31");
      } else {
        row.leaveOut();
      }
    }
    return day;
  }

  private static Optional<EventKind> kind(Row row) {
    Optional<String> label = row.requiredName("event");
    Optional<EventKind> kind = label.flatMap(EventKind::find);
    if (label.isPresent() && kind.isEmpty()) {
      String known =
          Arrays.stream(EventKind.values()).map(EventKind::label).collect(Collectors.joining(", "));
      row.reject("event", label.get(), "is none of " + known + "; write one of them");
    }
    return kind;
  }

  private Optional<String> oil(Row row) {
    Optional<String> oil = row.name("oil");
    if (oil.isPresent() && !oils.contains(oil.get())) {
      row.problem(
          "oil",
          oil.get(),
          RegisterFolder.unknown(oil.get(), oils, Map.of(), OilReader.FILE)
              + "; the event is kept without its oil");
      return Optional.empty();
    }
    return oil;
  }

  private Optional<String> bearing(Row row, String asset) {
    Optional<String> bearing = row.name("bearing");
    if (bearing.isPresent() && !bearings.contains(new BearingKey(asset, bearing.get()))) {
      List<String> there =
          bearings.stream()
              .filter(key -> key.asset().equals(asset))
              .map(BearingKey::bearing)
              .sorted()
              .toList();
      row.problem(
          "bearing",
          bearing.get(),
          RegisterFolder.unknown(bearing.get(), there, Map.of(), BearingReader.FILE)
              + "; the event is kept without its bearing");
      return Optional.empty();
    }
    return bearing;
  }
}
