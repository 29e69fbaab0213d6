package org.kappatrail.history;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.TreeMap;
import java.util.function.Function;

/** All records of a site: register, samples and events, consistent with each other. */
public final class PlantHistory {
  private final Map<String, Oil> oils;
  private final Map<String, Asset> assets;
  private final Map<String, List<Bearing>> bearings;
  private final Map<String, List<Sample>> samples;
  private final Map<String, List<Event>> events;

  /**
   * Puts the records together.
   *
   * @throws IllegalArgumentException where a record names an asset or oil that is not there
   */
  public PlantHistory(
      List<Oil> oils,
      List<Asset> assets,
      List<Bearing> bearings,
      List<Sample> samples,
      List<Event> events) {
    this.oils = index(oils, Oil::id);
    this.assets = index(assets, Asset::id);
    for (Asset asset : assets) {
      known("oil", asset.oil(), this.oils);
    }
    this.bearings = group(bearings, Bearing::asset);
    this.samples = group(samples.stream().sorted(Sample.IN_TIME).toList(), Sample::asset);
    this.events =
        group(
            events.stream().sorted(java.util.Comparator.comparing(Event::date)).toList(),
            Event::asset);
    for (Event event : events) {
      event.oil().ifPresent(oil -> known("oil", oil, this.oils));
    }
  }

  public List<Asset> assets() {
    return List.copyOf(assets.values());
  }

  public List<Oil> oils() {
    return List.copyOf(oils.values());
  }

  /** Every bearing, asset by asset in the order of the register. */
  public List<Bearing> bearings() {
    return assets.keySet().stream().flatMap(asset -> bearingsOf(asset).stream()).toList();
  }

  /** Every sample, asset by asset, each in time. */
  public List<Sample> samples() {
    return assets.keySet().stream().flatMap(asset -> samplesOf(asset).stream()).toList();
  }

  public Optional<Asset> findAsset(String id) {
    return Optional.ofNullable(assets.get(id));
  }

  public Optional<Oil> findOil(String id) {
    return Optional.ofNullable(oils.get(id));
  }

  /** The oil of that id. */
  public Oil getOil(String id) {
    return findOil(id)
        .orElseThrow(() -> new IllegalArgumentException("no oil '" + id + "' in the register"));
  }

  public List<Bearing> bearingsOf(String asset) {
    return bearings.getOrDefault(asset, List.of());
  }

  /** Samples of an asset in time. */
  public List<Sample> samplesOf(String asset) {
    return samples.getOrDefault(asset, List.of());
  }

  /** Events of an asset in time. */
  public List<Event> eventsOf(String asset) {
    return events.getOrDefault(asset, List.of());
  }

  private <T> Map<String, List<T>> group(List<T> records, Function<T, String> asset) {
    Map<String, List<T>> groups = new TreeMap<>();
    for (T item : records) {
      known("asset", asset.apply(item), assets);
      groups.computeIfAbsent(asset.apply(item), key -> new ArrayList<>()).add(item);
    }
    groups.replaceAll((key, list) -> List.copyOf(list));
    return groups;
  }

  private static <T> Map<String, T> index(List<T> records, Function<T, String> id) {
    Map<String, T> byId = new LinkedHashMap<>();
    for (T item : records) {
      if (byId.put(id.apply(item), item) != null) {
        throw new IllegalArgumentException("'" + id.apply(item) + "' stands twice in the register");
      }
    }
    return Collections.unmodifiableMap(byId);
  }

  private static void known(String what, String id, Map<String, ?> register) {
    if (!register.containsKey(id)) {
      throw new IllegalArgumentException("no " + what + " '" + id + "' in the register");
    }
  }
}
