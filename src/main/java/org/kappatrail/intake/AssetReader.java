package org.kappatrail.intake;

import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import org.kappatrail.history.Asset;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.SourceLine;
import org.kappatrail.tribology.OilSupply;

/** Reads {@code assets.csv}. */
final class AssetReader {
  static final String FILE = "assets.csv";

  private static final List<String> COLUMNS =
      List.of(
          "asset",
          "name",
          "area",
          "oil",
          "supply",
          "oil_volume_l",
          "contamination_factor",
          "change_cost",
          "cooling_cost",
          "failure_cost",
          "sampling_interval_days");
  private static final Limit VOLUME = new Limit(0.001, 1e7, "l");
  private static final Limit COST = new Limit(0, 1e12, "");

  private final RegisterFolder folder;
  private final Set<String> oils;
  private final Map<String, SourceLine> lostOils;
  private final Map<String, SourceLine> seen = new HashMap<>();
  private final Map<String, SourceLine> left = new HashMap<>();

  AssetReader(RegisterFolder folder, Set<String> oils, Map<String, SourceLine> lostOils) {
    this.folder = folder;
    this.oils = oils;
    this.lostOils = lostOils;
  }

  List<Asset> read() {
    RegisterTable table =
        folder.table(FILE, FileAccount.Kind.ASSETS, COLUMNS, List.of("asset", "oil"));
    List<Asset> assets =
        table.read(
            this::asset,
            folder.accounts(),
            List.copyOf(table.further()),
            asset -> Optional.empty());
    assets.forEach(asset -> left.remove(asset.id()));
    return assets;
  }

  /** Assets of the file that were left out, with their lines. */
  Map<String, SourceLine> left() {
    return Map.copyOf(left);
  }

  private Optional<Asset> asset(Row row) {
    Optional<String> id = row.requiredName("asset");
    id.ifPresent(name -> left.putIfAbsent(name, row.source()));
    Optional<String> oil = row.requiredName("oil");
    if (row.isRejected() || id.isEmpty() || oil.isEmpty()) {
      return Optional.empty();
    }
    if (!oils.contains(oil.get())) {
      row.reject(
          "oil",
          oil.get(),
          RegisterFolder.unknown(oil.get(), oils, lostOils, OilReader.FILE)
              + "; the asset is left out until then");
      return Optional.empty();
    }
    if (folder.isRepeated(seen, "asset", id.get(), row)) {
      return Optional.empty();
    }
    return Optional.of(
        new Asset(
            id.get(),
            row.text("name"),
            row.text("area"),
            oil.get(),
            supply(row),
            row.number("oil_volume_l", VOLUME),
            row.number("contamination_factor", new Limit(0, 1, "")),
            row.number("change_cost", COST),
            row.number("cooling_cost", COST),
            row.number("failure_cost", COST),
            row.wholeNumber("sampling_interval_days", new Limit(1, 3660, "days"))));
  }

  private static OilSupply supply(Row row) {
    String text = row.text("supply");
    Optional<OilSupply> supply = OilSupply.parse(text);
    if (supply.isEmpty() && !text.isEmpty()) {
      row.problem("supply", text, "neither bath nor inline-filter; taken as bath");
    }
    return supply.orElse(OilSupply.BATH);
  }
}
