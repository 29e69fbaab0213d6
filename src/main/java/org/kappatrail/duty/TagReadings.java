package org.kappatrail.duty;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.Collectors;
import org.kappatrail.history.Bearing;
import org.kappatrail.history.BearingKey;
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

  /** An event per row and bearing; rows that cannot be placed make one event of no bearing. */
  private String wide(String scan) {
    Map<BearingKey, Map<Tag.Quantity, Integer>> byBearing = new LinkedHashMap<>();
    layout.tagColumns().entrySet().stream()
        .sorted(Map.Entry.comparingByKey())
        .forEach(entry -> put(byBearing, entry.getValue(), entry.getKey()));
    List<String> cells = new ArrayList<>();
    byBearing.forEach((bearing, found) -> cells.add(cells(bearing, found)));
    return """
        SELECT source, row_number, overflow, time_text, clock_ms, zoned, quality_text,
          CAST(NULL AS VARCHAR) AS tag_text, e.bearing AS bearing, 0 AS rank,
          e.temperature_text AS temperature_text, e.temperature_c AS temperature_c,
          e.speed_text AS speed_text, e.speed_rpm AS speed_rpm, e.mark_text AS mark_text
        FROM (
          SELECT source, row_number, overflow, time_text, clock_ms, zoned, quality_text,
            UNNEST(CASE WHEN clock_ms IS NULL OR trim(overflow) <> '' THEN [{nothing}]
              ELSE [{cells}] END) AS e
          FROM (SELECT {common}, {quality} AS quality_text, * FROM {scan})
        )
        WHERE e.bearing = 0 OR trim(e.temperature_text) <> '' OR trim(e.speed_text) <> ''
          OR trim(e.mark_text) <> ''"""
        .replace("{nothing}", cells(0, Map.of()))
        .replace("{cells}", String.join(", ", cells))
        .replace("{common}", columns.common())
        .replace("{quality}", columns.text(LogLayout.QUALITY))
        .replace("{scan}", scan);
  }

  private void put(Map<BearingKey, Map<Tag.Quantity, Integer>> byBearing, Tag tag, int index) {
    Map<Tag.Quantity, Integer> found =
        byBearing.computeIfAbsent(tag.bearing(), key -> new LinkedHashMap<>());
    if (found.put(tag.quantity(), index) != null) {
      throw new UnusableInputException(
          group.tables().get(0).file().name()
              + ": two tags carry "
              + tag.quantity().label()
              + " of "
              + tag.bearing()
              + "; name one of them in tags: only");
    }
  }

  /** A missing value is an empty cell here, so that the value before it is held. */
  private String value(int index) {
    return MissingSql.withoutUsual(columns.value(index));
  }

  private String cells(BearingKey bearing, Map<Tag.Quantity, Integer> found) {
    return cells(key(bearing), found);
  }

  private String cells(int key, Map<Tag.Quantity, Integer> found) {
    Optional<Integer> temperature = Optional.ofNullable(found.get(Tag.Quantity.TEMPERATURE));
    Optional<Integer> speed = Optional.ofNullable(found.get(Tag.Quantity.SPEED));
    Optional<Integer> mark = Optional.ofNullable(found.get(Tag.Quantity.QUALITY));
    return "{'bearing': "
        + key
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
            .map(
                entry ->
                    "("
                        + SqlText.literal(entry.getKey().strip())
                        + ", "
                        + key(entry.getValue().bearing())
                        + ", "
                        + rank(entry.getValue().quantity())
                        + ")")
            .collect(Collectors.joining(", "));
    return """
        SELECT source, row_number, overflow, time_text, clock_ms, zoned, quality_text, tag_text,
          COALESCE(tags.bearing, 0) AS bearing, COALESCE(tags.quantity, 0) AS rank,
          CASE WHEN tags.quantity = 0 THEN value_text END AS temperature_text,
          CASE WHEN tags.quantity = 0 THEN {celsius} END AS temperature_c,
          CASE WHEN tags.quantity = 1 THEN value_text END AS speed_text,
          CASE WHEN tags.quantity = 1 THEN {rpm} END AS speed_rpm,
          CASE WHEN tags.quantity = 2 THEN value_text END AS mark_text
        FROM (
          SELECT {common}, {quality} AS quality_text, {tag} AS tag_text,
            {value_text} AS value_text, {number} AS number
          FROM {scan}
        )
        LEFT JOIN (VALUES {tags}) tags (tag, bearing, quantity) ON tags.tag = trim(tag_text)"""
        .replace("{celsius}", NumberSql.celsius("number", mapping))
        .replace("{rpm}", NumberSql.rpm("number", mapping))
        .replace("{common}", columns.common())
        .replace("{quality}", columns.text(LogLayout.QUALITY))
        .replace("{tag}", columns.text(LogLayout.TAG))
        .replace("{value_text}", MissingSql.withoutUsual(columns.value(LogLayout.VALUE)))
        .replace("{number}", columns.number(LogLayout.VALUE))
        .replace("{tags}", tags)
        .replace("{scan}", scan);
  }

  /** As the query names them. */
  private static int rank(Tag.Quantity quantity) {
    return switch (quantity) {
      case TEMPERATURE -> 0;
      case SPEED -> 1;
      case QUALITY -> 2;
    };
  }

  private int key(BearingKey bearing) {
    for (int index = 0; index < bearings.size(); index++) {
      if (bearings.get(index).key().equals(bearing)) {
        return index + 1;
      }
    }
    String nearest =
        NearestName.of(
                bearing.toString(), bearings.stream().map(known -> known.key().toString()).toList())
            .map(known -> "; the nearest name is '" + known + "'")
            .orElse("");
    throw new UnusableInputException(
        "kappatrail.yaml: temperatures: tags: the register has no bearing '"
            + bearing
            + "'"
            + nearest);
  }
}
