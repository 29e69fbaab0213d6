package org.kappatrail.intake;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.kappatrail.history.SampleColumns;

/** Names that columns commonly go by in exports of laboratories and historians, as keys. */
final class ColumnSynonyms {
  private static final Map<String, String> LAB = new LinkedHashMap<>();
  private static final Map<String, String> LOG = new LinkedHashMap<>();
  private static final Map<String, String> ELEMENTS = new LinkedHashMap<>();
  private static final Pattern TRAILING_UNIT =
      Pattern.compile(
          "(_(ppm|mg_kg|cst|mm2_s|percent|pct|%|wt%|degc|degf|hours|hrs|h|mg_koh_g))+$");
  private static final Set<String> WATER =
      Set.of(
          "water", "wasser", "kf", "karl", "fischer", "content", "total", "by", "nach", "in",
          "oil");
  private static final Pattern COUNT =
      Pattern.compile("(^|.*_)(4|6|14)_?(um|micron|microns|mu)(_.*|c|$)");

  static {
    put(
        LAB,
        "sample",
        "sample",
        "sample_no",
        "sample_number",
        "sample_id",
        "sampleid",
        "sample_nr");
    put(LAB, "sample", "lab_no", "lab_number", "lab_id", "report_no", "report_number", "bottle");
    put(LAB, "sample", "bottle_no", "bottle_id", "probe", "proben_nr", "probennummer", "probe_nr");
    put(LAB, "asset", "asset", "asset_id", "machine", "machine_id", "unit", "unit_id", "equipment");
    put(
        LAB,
        "asset",
        "equipment_id",
        "maschine",
        "anlage",
        "component",
        "sample_point",
        "aggregat");
    put(LAB, "sampled_at", "sampled_at", "sampled", "sample_date", "date_sampled", "sampled_on");
    put(
        LAB,
        "sampled_at",
        "sampling_date",
        "drawn",
        "drawn_on",
        "date_drawn",
        "taken",
        "date_taken");
    put(
        LAB,
        "sampled_at",
        "date",
        "datum",
        "probedatum",
        "probenahme",
        "entnahmedatum",
        "entnahme");
    put(LAB, "received_on", "received", "received_on", "date_received", "received_date", "receipt");
    put(LAB, "received_on", "reported", "report_date", "date_reported", "eingang", "eingangsdatum");
    put(LAB, "laboratory", "lab", "laboratory", "labor", "lab_name");
    put(LAB, "oil_hours", "oil_hours", "hours_on_oil", "hrs_on_oil", "oil_age", "oil_hrs", "oil_h");
    put(
        LAB,
        "oil_hours",
        "oil_running_hours",
        "fluid_hours",
        "oilstunden",
        "olstunden",
        "lube_hours");
    put(LAB, "water_ppm", "water", "water_ppm", "water_content", "karl_fischer", "kf", "moisture");
    put(LAB, "water_ppm", "h2o", "wasser", "wassergehalt", "water_kf", "water_karl_fischer");
    put(LAB, "iso_4406", "iso_4406", "iso4406", "iso_code", "cleanliness", "cleanliness_code");
    put(
        LAB,
        "iso_4406",
        "iso_cleanliness",
        "reinheitsklasse",
        "particle_code",
        "contamination_code");
    put(LAB, "acid_number_mg_koh_g", "acid_number_mg_koh_g", "acid_number", "acid_no", "tan", "an");
    put(LAB, "acid_number_mg_koh_g", "total_acid_number", "neutralisation_number", "nz", "sz");
    put(LAB, "acid_number_mg_koh_g", "neutralization_number", "saurezahl", "neutralisationszahl");
    put(
        LAB,
        "temperature_c",
        "temperature_c",
        "temperature",
        "temp",
        "oil_temperature",
        "oil_temp");
    put(LAB, "temperature_c", "sump_temperature", "sump_temp", "oltemperatur", "temperatur");

    put(LOG, "time", "time", "timestamp", "ts", "datetime", "date_time", "zeit", "zeitstempel");
    put(LOG, "time", "date", "time_stamp", "local_time", "datum", "datum_zeit", "reading_time");
    put(LOG, "asset", "asset", "asset_id", "machine", "unit", "equipment", "maschine", "anlage");
    put(LOG, "bearing", "bearing", "bearing_id", "brg", "lager", "lagerstelle", "bearing_position");
    put(LOG, "temperature_c", "temperature_c", "temperature", "temp", "bearing_temperature");
    put(LOG, "temperature_c", "bearing_temp", "temperatur", "lagertemperatur", "oil_temperature");
    put(LOG, "speed_rpm", "speed_rpm", "speed", "rpm", "shaft_speed", "drehzahl", "speed_rev_min");
    put(LOG, "quality", "quality", "status", "q", "data_quality", "qualitat", "opc_quality");
    put(LOG, "tag", "tag", "tag_name", "tagname", "point", "point_name", "signal", "sensor");
    put(LOG, "tag", "variable", "messstelle", "channel", "tag_id", "item");
    put(LOG, "value", "value", "val", "tag_value", "wert", "reading", "messwert", "pv");

    String[] elements = {
      "fe iron eisen",
      "cu copper kupfer",
      "cr chromium chrome chrom",
      "pb lead blei",
      "sn tin zinn",
      "al aluminium aluminum",
      "ni nickel",
      "ag silver silber",
      "ti titanium titan",
      "mo molybdenum molybdan",
      "si silicon silizium",
      "na sodium natrium",
      "k potassium kalium",
      "b boron bor",
      "mg magnesium",
      "ca calcium kalzium",
      "ba barium",
      "p phosphorus phosphor",
      "zn zinc zink",
      "v vanadium",
      "mn manganese mangan",
      "li lithium",
      "s sulfur sulphur schwefel",
      "w tungsten",
      "cd cadmium"
    };
    for (String element : elements) {
      String[] names = element.split(" ", -1);
      for (String name : names) {
        ELEMENTS.put(name, names[1] + SampleColumns.ELEMENT_SUFFIX);
      }
    }
  }

  private ColumnSynonyms() {}

  /** Column of samples that a header stands for. */
  static Optional<String> ofSamples(RawTable.Header header) {
    for (String key : keys(header)) {
      Optional<String> found = sampleColumn(key);
      if (found.isPresent()) {
        return found;
      }
    }
    return Optional.empty();
  }

  /** Column of readings that a header stands for. */
  static Optional<String> ofReadings(RawTable.Header header) {
    return keys(header).stream().filter(LOG::containsKey).map(LOG::get).findFirst();
  }

  private static Optional<String> sampleColumn(String key) {
    String known = LAB.get(key);
    if (known != null) {
      return Optional.of(known);
    }
    if (key.matches("(.*_)?(visc|visk|kv|kin|v_?\\d).*")) {
      boolean hot = key.matches(".*(^|\\D)100(\\D|$).*");
      boolean warm = key.matches(".*(^|\\D)40(\\D|$).*");
      if (hot != warm && !key.contains("index")) {
        return Optional.of(hot ? SampleColumns.VISCOSITY_100C : SampleColumns.VISCOSITY_40C);
      }
    }
    if ((key.contains("water") || key.contains("wasser") || key.startsWith("karl"))
        && WATER.containsAll(List.of(key.split("_", -1)))) {
      return Optional.of(SampleColumns.WATER);
    }
    if (key.contains("4406")) {
      return Optional.of(SampleColumns.ISO_4406);
    }
    Matcher count = COUNT.matcher(key);
    if (count.matches()) {
      return Optional.of("particles_" + count.group(2) + "um_per_ml");
    }
    return Optional.ofNullable(ELEMENTS.get(key));
  }

  private static List<String> keys(RawTable.Header header) {
    List<String> names = new ArrayList<>();
    names.add(header.name());
    names.addAll(header.aliases());
    List<String> keys = new ArrayList<>();
    for (String name : names) {
      for (String key : List.of(Texts.key(name), Texts.keyWithoutBrackets(name))) {
        keys.add(key);
        keys.add(TRAILING_UNIT.matcher(key).replaceAll(""));
      }
    }
    return keys.stream().filter(key -> !key.isEmpty()).distinct().toList();
  }

  private static void put(Map<String, String> map, String canonical, String... names) {
    for (String name : names) {
      map.put(name, canonical);
    }
  }
}
