package org.kappatrail.heldout;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.HashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** An asset's oil charges and its oil from day to day. */
final class PlainCharges {
  private record Anchor(LocalDate day, PlainOil oil) {}

  private record Charge(Optional<LocalDate> start, String oil, List<Anchor> anchors) {}

  private final List<Charge> charges = new ArrayList<>();
  private final Map<String, Integer> numbers = new HashMap<>();
  private final Map<String, PlainOil> measured = new HashMap<>();
  private final List<Site.Bottle> bottles;

  PlainCharges(Site site, Site.Asset asset) {
    Map<String, PlainOil> fresh = new HashMap<>();
    site.oils().forEach(oil -> fresh.put(oil.id(), oil.law()));
    bottles =
        site.samples().stream()
            .filter(bottle -> bottle.asset().equals(asset.id()))
            .filter(bottle -> !bottle.day().isAfter(site.asOf()))
            .sorted(Comparator.comparing(Site.Bottle::day))
            .toList();
    List<Site.Change> changes =
        site.changes().stream()
            .filter(change -> change.asset().equals(asset.id()))
            .filter(change -> !change.day().isAfter(site.asOf()))
            .toList();
    String oil = asset.oil();
    int next = 0;
    double hoursBefore = 0;
    for (Site.Bottle bottle : bottles) {
      for (; next < changes.size() && changes.get(next).day().isBefore(bottle.day()); next++) {
        Site.Change change = changes.get(next);
        oil = change.oil().isEmpty() ? oil : change.oil();
        Charge charge = new Charge(Optional.of(change.day()), oil, new ArrayList<>());
        charge.anchors().add(new Anchor(change.day(), known(fresh, oil)));
        charges.add(charge);
        hoursBefore = 0;
      }
      if (charges.isEmpty()) {
        charges.add(new Charge(Optional.empty(), oil, new ArrayList<>()));
      } else if (bottle.oilHours() < hoursBefore) {
        charges.add(new Charge(Optional.of(bottle.day()), oil, new ArrayList<>()));
      }
      hoursBefore = bottle.oilHours();
      numbers.put(bottle.id(), charges.size());
      Charge charge = charges.get(charges.size() - 1);
      sampled(bottle, known(fresh, charge.oil()))
          .ifPresent(
              found -> {
                measured.put(bottle.id(), found);
                charge.anchors().add(new Anchor(bottle.day(), found));
              });
    }
  }

  private static PlainOil known(Map<String, PlainOil> oils, String id) {
    return Optional.ofNullable(oils.get(id)).orElseThrow();
  }

  private static Optional<PlainOil> sampled(Site.Bottle bottle, PlainOil fresh) {
    if (bottle.v40().isEmpty() || bottle.v40().startsWith(">")) {
      return Optional.empty();
    }
    double v40 = Double.parseDouble(bottle.v40());
    return Optional.of(
        bottle.v100().isEmpty()
            ? PlainOil.like(v40, fresh)
            : PlainOil.measured(v40, Double.parseDouble(bottle.v100())));
  }

  List<Site.Bottle> bottles() {
    return bottles;
  }

  int number(Site.Bottle bottle) {
    return numbers.getOrDefault(bottle.id(), 0);
  }

  String oil(Site.Bottle bottle) {
    return charges.get(number(bottle) - 1).oil();
  }

  Optional<PlainOil> measured(Site.Bottle bottle) {
    return Optional.ofNullable(measured.get(bottle.id()));
  }

  /** The oil on a day. */
  Optional<PlainOil> on(LocalDate day) {
    List<Anchor> anchors = List.of();
    for (Charge charge : charges) {
      if (charge.start().isEmpty() || !day.isBefore(charge.start().get())) {
        anchors = charge.anchors();
      }
    }
    Anchor before = null;
    for (Anchor anchor : anchors) {
      if (anchor.day().isAfter(day)) {
        if (before == null) {
          return Optional.of(anchor.oil());
        }
        double length = anchor.day().toEpochDay() - before.day().toEpochDay();
        double share = (day.toEpochDay() - before.day().toEpochDay()) / length;
        return Optional.of(PlainOil.between(before.oil(), anchor.oil(), share));
      }
      before = anchor;
    }
    return Optional.ofNullable(before).map(Anchor::oil);
  }
}
