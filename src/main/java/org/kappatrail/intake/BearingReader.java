package org.kappatrail.intake;

import java.util.Arrays;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Collectors;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.SourceLine;
import org.kappatrail.tribology.BearingType;
import org.kappatrail.tribology.Iso281RatedViscosity;

/** Reads {@code bearings.csv}. */
final class BearingReader {
  static final String FILE = "bearings.csv";

  private static final List<String> COLUMNS =
      List.of(
          "asset",
          "bearing",
          "type",
          "bore_mm",
          "outside_mm",
          "pitch_mm",
          "speed_rpm",
          "dynamic_rating_kn",
          "static_rating_kn",
          "fatigue_limit_kn",
          "equivalent_load_kn",
          "kappa_floor",
          "temperature_offset_c");
  private static final Limit DIAMETER = new Limit(1, 10_000, "mm");
  private static final Limit SPEED = new Limit(0.01, 1_000_000, "r/min");
  private static final Limit LOAD = new Limit(1e-6, 1e6, "kN");

  private final RegisterFolder folder;
  private final Set<String> assets;
  private final Map<String, SourceLine> left;
  private final Map<String, SourceLine> seen = new HashMap<>();

  BearingReader(RegisterFolder folder, Set<String> assets, Map<String, SourceLine> left) {
    this.folder = folder;
    this.assets = assets;
    this.left = left;
  }

  List<Bearing> read() {
    RegisterTable table =
        folder.table(
            FILE, FileAccount.Kind.BEARINGS, COLUMNS, List.of("asset", "bearing", "speed_rpm"));
    return table.read(
        this::bearing,
        folder.accounts(),
        List.copyOf(table.further()),
        bearing -> Optional.empty());
  }

  private Optional<Bearing> bearing(Row row) {
    Optional<String> asset = row.requiredName("asset");
    Optional<String> id = row.requiredName("bearing");
    OptionalDouble speed = row.requiredNumber("speed_rpm", SPEED);
    if (asset.isPresent() && !assets.contains(asset.get())) {
      row.reject(
          "asset",
          asset.get(),
          RegisterFolder.unknown(asset.get(), assets, left, AssetReader.FILE));
    }
    if (row.isRejected() || asset.isEmpty() || id.isEmpty() || speed.isEmpty()) {
      return Optional.empty();
    }
    OptionalDouble bore = row.number("bore_mm", DIAMETER);
    OptionalDouble outside = row.number("outside_mm", DIAMETER);
    OptionalDouble pitch = pitch(row, bore, outside);
    if (pitch.isEmpty() || folder.isRepeated(seen, "bearing", asset.get() + "/" + id.get(), row)) {
      return Optional.empty();
    }
    return Optional.of(
        new Bearing(
            asset.get(),
            id.get(),
            type(row),
            bore,
            outside,
            pitch.getAsDouble(),
            speed.getAsDouble(),
            row.number("dynamic_rating_kn", LOAD),
            row.number("static_rating_kn", LOAD),
            row.number("fatigue_limit_kn", LOAD),
            row.number("equivalent_load_kn", LOAD),
            row.number("kappa_floor", new Limit(0.1, 10, "")),
            row.number("temperature_offset_c", new Limit(-100, 100, "°C")).orElse(0)));
  }

  private static OptionalDouble pitch(Row row, OptionalDouble bore, OptionalDouble outside) {
    OptionalDouble given = row.number("pitch_mm", DIAMETER);
    boolean both = bore.isPresent() && outside.isPresent();
    if (given.isEmpty() && !both) {
      row.reject(
          "pitch_mm",
          row.cell("pitch_mm"),
          "neither a pitch diameter nor both of bore_mm and outside_mm can be used; fill in either");
      return given;
    }
    if (!both) {
      return given;
    }
    double mean;
    try {
      mean = Iso281RatedViscosity.pitchMm(bore.getAsDouble(), outside.getAsDouble());
    } catch (IllegalArgumentException e) {
      row.reject("outside_mm", row.cell("outside_mm"), e.getMessage() + "; correct one of them");
      return OptionalDouble.empty();
    }
    if (given.isPresent()
        && (given.getAsDouble() <= bore.getAsDouble()
            || given.getAsDouble() >= outside.getAsDouble())) {
      row.problem(
          "pitch_mm",
          row.cell("pitch_mm"),
          "must lie between bore_mm and outside_mm; their mean is used instead");
      return OptionalDouble.of(mean);
    }
    return given.isPresent() ? given : OptionalDouble.of(mean);
  }

  private static Optional<BearingType> type(Row row) {
    String text = row.text("type");
    Optional<BearingType> type = BearingType.parse(text);
    if (type.isEmpty() && !text.isEmpty()) {
      String known =
          Arrays.stream(BearingType.values())
              .map(BearingType::label)
              .collect(Collectors.joining(", "));
      row.problem("type", text, "is none of " + known + "; without it there is no rating life");
    }
    return type;
  }
}
