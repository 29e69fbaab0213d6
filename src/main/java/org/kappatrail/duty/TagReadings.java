package org.kappatrail.duty;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.ExportMapping.Tag;
import org.kappatrail.history.NearestName;
import org.kappatrail.history.Settings;
import org.kappatrail.history.UnusableInputException;

/**
 * Readings of files that name tags, as columns or row by row. Temperature and speed of a bearing
 * come apart there: an empty cell holds the value before it, up to the gap limit, and values of one
 * instant make one reading (of two values of one tag the higher one). The query is in {@code
 * held-readings.sql}.
 */
final class TagReadings {
  private static final String HELD = Resources.sql("held-readings.sql");
  private static final String MARK = Resources.sql("quality-mark.sql");

  private final LogGroup group;
  private final LogLayout layout;
  private final TableColumns columns;
  private final List<Bearing> bearings;
  private final Settings settings;
  private final ExportMapping mapping;

  TagReadings(
      LogGroup group,
      LogLayout layout,
      TableColumns columns,
      List<Bearing> bearings,
      Settings settings) {
    this.group = group;
    this.layout = layout;
    this.columns = columns;
    this.bearings = List.copyOf(bearings);
    this.settings = settings;
    this.mapping = group.shape().mapping();
  }

  String sql(ZoneShift zone, String scan) {
    String events = layout.form() == LogLayout.Form.WIDE ? wide(scan) : tagged(scan);
    return HELD.replace("{instant}", TableColumns.instant(zone))
        .replace("{temperature}", NumberSql.thousandths("temperature_c"))
        .replace("{speed}", NumberSql.thousandths("speed_rpm"))
        .replace("{is_not_good}", FaultSql.isNotGood("quality_text"))
        .replace("{bad_quality}", FaultSql.badQuality("quality_text"))
        .replace("{mark}", hasMarks() ? MARK : "0")
        .replace("{mark_is_not_good}", FaultSql.isNotGood("mark_text"))
        .replace("{bad_mark}", FaultSql.badQuality("mark_text"))
        .replace("{no_temperature}", FaultSql.noTemperature())
        .replace("{flaw}", FaultSql.flaw())
        .replace("{gap_ms}", Long.toString(settings.duty().gapMinutes() * 60_000L))
        .replace("{events}", events);
  }

  private boolean hasMarks() {
    return mapping.tags().values().stream().anyMatch(tag -> tag.quantity() == Tag.Quantity.QUALITY);
  }

  /** A bearing as tags name it: without an asset where a column of the file tells that. */
  private record Place(Optional<String> asset, String bearing) {
    static Place of(Tag tag) {
      return new Place(tag.asset(), tag.bearing());
    }

    @Override
    public String toString() {
      return asset.map(name -> name + "/").orElse("") + bearing;
    }
  }

  /** An event per row and bearing; rows that cannot be placed make one event of no bearing. */
  private String wide(String scan) {
    Map<Place, Map<Tag.Quantity, Integer>> byPlace = new LinkedHashMap<>();
    layout.tagColumns().entrySet().stream()
        .sorted(Map.Entry.comparingByKey())
        .forEach(entry -> put(byPlace, entry.getValue(), entry.getKey()));
    List<String> cells = new ArrayList<>();
    byPlace.forEach((place, found) -> cells.add(cells(key(place), place.bearing(), found)));
    return """
        SELECT source, row_number, overflow, time_text, clock_ms, zoned, quality_text,
          CAST(NULL AS VARCHAR) AS tag_text, row_asset AS asset_text, e.name AS name_text,
          {bearing} AS bearing, 0 AS rank,
          e.temperature_text AS temperature_text, e.temperature_c AS temperature_c,
          e.speed_text AS speed_text, e.speed_rpm AS speed_rpm, e.mark_text AS mark_text
        FROM (
          SELECT source, row_number, overflow, time_text, clock_ms, zoned, quality_text, row_asset,
            UNNEST(CASE WHEN clock_ms IS NULL OR trim(overflow) <> '' THEN [{nothing}]
              ELSE [{cells}] END) AS e
          FROM (SELECT {common}, {quality} AS quality_text, {asset} AS row_asset, * FROM {scan})
        )
        {names}
        WHERE e.bearing = 0 OR trim(e.temperature_text) <> '' OR trim(e.speed_text) <> ''
          OR trim(e.mark_text) <> ''"""
        .replace("{bearing}", bearing("e.bearing"))
        .replace("{names}", names("e.bearing", "e.name"))
        .replace("{nothing}", cells(0, "", Map.of()))
        .replace("{cells}", String.join(", ", cells))
        .replace("{common}", columns.common())
        .replace("{quality}", columns.text(LogLayout.QUALITY))
        .replace("{asset}", columns.text(LogLayout.ASSET))
        .replace("{scan}", scan);
  }

  /** The key of the register that a tag leads to, with the row's asset where it has none. */
  private String bearing(String ofTag) {
    return layout.takesAssetsFromRows()
        ? "CASE WHEN {t} < 0 THEN COALESCE(names.bearing, 0) ELSE COALESCE({t}, 0) END"
            .replace("{t}", ofTag)
        : "COALESCE(" + ofTag + ", 0)";
  }

  private String names(String ofTag, String name) {
    return layout.takesAssetsFromRows()
        ? "LEFT JOIN (VALUES {rows}) names (bearing, asset, name) ON {t} < 0"
            .concat(" AND names.asset = trim(row_asset) AND names.name = {n}")
            .replace("{t}", ofTag)
            .replace("{n}", name)
            .replace("{rows}", RegisterNames.rows(bearings))
        : "";
  }

  private void put(Map<Place, Map<Tag.Quantity, Integer>> byPlace, Tag tag, int index) {
    Map<Tag.Quantity, Integer> found =
        byPlace.computeIfAbsent(Place.of(tag), key -> new LinkedHashMap<>());
    if (found.put(tag.quantity(), index) != null) {
      throw new UnusableInputException(
          group.tables().get(0).file().name()
              + ": two tags carry "
              + tag.quantity().label()
              + " of "
              + Place.of(tag)
              + "; name one of them in tags: only");
    }
  }

  /** A missing value is an empty cell here, so that the value before it is held. */
  private String value(int index) {
    return MissingSql.withoutUsual(columns.value(index));
  }

  private String cells(int key, String name, Map<Tag.Quantity, Integer> found) {
    Optional<Integer> temperature = Optional.ofNullable(found.get(Tag.Quantity.TEMPERATURE));
    Optional<Integer> speed = Optional.ofNullable(found.get(Tag.Quantity.SPEED));
    Optional<Integer> mark = Optional.ofNullable(found.get(Tag.Quantity.QUALITY));
    return "{'bearing': "
        + key
        + ", 'name': "
        + SqlText.literal(name)
        + ", 'temperature_text': "
        + temperature.map(this::value).orElse("CAST(NULL AS VARCHAR)")
        + ", 'temperature_c': "
        + temperature
            .map(index -> NumberSql.celsius(columns.number(index), mapping))
            .orElse("CAST(NULL AS DOUBLE)")
        + ", 'speed_text': "
        + speed.map(this::value).orElse("CAST(NULL AS VARCHAR)")
        + ", 'speed_rpm': "
        + speed
            .map(index -> NumberSql.rpm(columns.number(index), mapping))
            .orElse("CAST(NULL AS DOUBLE)")
        + ", 'mark_text': "
        + mark.map(columns::text).orElse("CAST(NULL AS VARCHAR)")
        + "}";
  }

  /** An event per row. */
  private String tagged(String scan) {
    String tags =
        mapping.tags().entrySet().stream()
            .map(entry -> tag(entry.getKey().strip(), entry.getValue()))
            .collect(Collectors.joining(", "));
    return """
        SELECT source, row_number, overflow, time_text, clock_ms, zoned, quality_text, tag_text,
          CASE WHEN tags.bearing < 0 THEN row_asset ELSE tag_text END AS asset_text,
          CASE WHEN tags.bearing < 0 THEN tags.name END AS name_text,
          {bearing} AS bearing, COALESCE(tags.quantity, 0) AS rank,
          CASE WHEN tags.quantity = 0 THEN value_text END AS temperature_text,
          CASE WHEN tags.quantity = 0 THEN {celsius} END AS temperature_c,
          CASE WHEN tags.quantity = 1 THEN value_text END AS speed_text,
          CASE WHEN tags.quantity = 1 THEN {rpm} END AS speed_rpm,
          CASE WHEN tags.quantity = 2 THEN value_text END AS mark_text
        FROM (
          SELECT {common}, {quality} AS quality_text, {tag} AS tag_text, {asset} AS row_asset,
            {value_text} AS value_text, {number} AS number
          FROM {scan}
        )
        LEFT JOIN (VALUES {tags}) tags (tag, bearing, quantity, name) ON tags.tag = trim(tag_text)
        {names}"""
        .replace("{bearing}", bearing("tags.bearing"))
        .replace("{names}", names("tags.bearing", "tags.name"))
        .replace("{celsius}", NumberSql.celsius("number", mapping))
        .replace("{rpm}", NumberSql.rpm("number", mapping))
        .replace("{common}", columns.common())
        .replace("{quality}", columns.text(LogLayout.QUALITY))
        .replace("{tag}", columns.text(LogLayout.TAG))
        .replace("{asset}", columns.text(LogLayout.ASSET))
        .replace("{value_text}", MissingSql.withoutUsual(columns.value(LogLayout.VALUE)))
        .replace("{number}", columns.number(LogLayout.VALUE))
        .replace("{tags}", tags)
        .replace("{scan}", scan);
  }

  private String tag(String name, Tag tag) {
    return "("
        + SqlText.literal(name)
        + ", "
        + key(Place.of(tag))
        + ", "
        + rank(tag.quantity())
        + ", "
        + SqlText.literal(tag.bearing())
        + ")";
  }

  /** As the query names them. */
  private static int rank(Tag.Quantity quantity) {
    return switch (quantity) {
      case TEMPERATURE -> 0;
      case SPEED -> 1;
      case QUALITY -> 2;
    };
  }

  /** Place in the register, from 1; -1 where the asset of the row is needed to know it. */
  private int key(Place place) {
    for (int index = 0; index < bearings.size(); index++) {
      Bearing bearing = bearings.get(index);
      if (bearing.id().equals(place.bearing())) {
        if (place.asset().isEmpty()) {
          return -1;
        }
        if (place.asset().get().equals(bearing.asset())) {
          return index + 1;
        }
      }
    }
    List<String> known =
        bearings.stream()
            .map(bearing -> place.asset().isEmpty() ? bearing.id() : bearing.key().toString())
            .toList();
    String nearest =
        NearestName.of(place.toString(), known)
            .map(name -> "; the nearest name is '" + name + "'")
            .orElse("");
    throw new UnusableInputException(
        "kappatrail.yaml: temperatures: tags: the register has no bearing '"
            + place
            + "'"
            + nearest);
  }
}
