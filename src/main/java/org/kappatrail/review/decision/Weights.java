package org.kappatrail.review.decision;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.tribology.KappaUncertainty;
import org.kappatrail.tribology.OilViscosity;
import org.kappatrail.tribology.ViscosityRatio;

/** Weighs every act: failure probability, worth, price, net saving, break-even ratio. */
final class Weights {
  /** Below this, wear and smearing are outside the life model (tool convention). */
  static final double THIN_FILM = 0.4;

  private final AssetCase asset;

  private Weights(AssetCase asset) {
    this.asset = asset;
  }

  /** Remedies, best first: by net saving, else by worth, else by κ up to 4. */
  static List<Remedy> of(AssetCase asset) {
    Weights weights = new Weights(asset);
    List<Act> acts = Acts.of(asset);
    List<Outcome> stay = weights.outcomes(acts.get(0));
    OptionalDouble staying = any(stay);
    List<Remedy> remedies = new ArrayList<>();
    for (Act act : acts) {
      remedies.add(weights.remedy(act, weights.outcomes(act), stay, staying));
    }
    String governing = asset.governing().bearing().id();
    remedies.sort(
        Comparator.comparingDouble((Remedy remedy) -> -tier(remedy))
            .thenComparingDouble(remedy -> -rank(remedy, governing))
            .thenComparing(Remedy::kind)
            .thenComparing(Remedy::name));
    return remedies;
  }

  private static double tier(Remedy remedy) {
    return remedy.netSaving().isPresent() ? 2 : remedy.worth().isPresent() ? 1 : 0;
  }

  private static double rank(Remedy remedy, String governing) {
    if (remedy.netSaving().isPresent()) {
      return remedy.netSaving().getAsDouble();
    }
    return remedy
        .worth()
        .orElseGet(
            () ->
                Math.min(
                    ViscosityRatio.HIGHEST_FOR_LIFE,
                    remedy.outcome(governing).map(Outcome::kappa).orElse(0.0)));
  }

  private Remedy remedy(
      Act act, List<Outcome> outcomes, List<Outcome> stay, OptionalDouble before) {
    OptionalDouble failing = any(outcomes);
    OptionalDouble worth =
        failing.isPresent() && before.isPresent()
            ? OptionalDouble.of(before.getAsDouble() - failing.getAsDouble())
            : OptionalDouble.empty();
    OptionalDouble cost = asset.asset().failureCost();
    OptionalDouble net =
        worth.isPresent() && cost.isPresent() && act.price().isPresent()
            ? OptionalDouble.of(
                worth.getAsDouble() * cost.getAsDouble() - act.price().getAsDouble())
            : OptionalDouble.empty();
    OptionalDouble ratio =
        worth.isPresent() && worth.getAsDouble() > 0
            ? OptionalDouble.of(1 / worth.getAsDouble())
            : OptionalDouble.empty();
    boolean pays =
        act.kind() != RemedyKind.STAY
            && (paysByCost(worth, net, ratio) || cures(outcomes, stay, worth.isEmpty()));
    return new Remedy(
        act.kind(), name(act, outcomes), outcomes, failing, worth, act.price(), net, ratio, pays);
  }

  private static String name(Act act, List<Outcome> outcomes) {
    boolean thick =
        act.kind() != RemedyKind.STAY
            && outcomes.stream().anyMatch(o -> o.kappa() > ViscosityRatio.HIGHEST_FOR_LIFE);
    return thick ? act.name() + " (κ above 4: friction, heat)" : act.name();
  }

  private boolean paysByCost(OptionalDouble worth, OptionalDouble net, OptionalDouble ratio) {
    if (net.isPresent()) {
      return net.getAsDouble() > 0;
    }
    return worth.isPresent()
        && ratio.isPresent()
        && ratio.getAsDouble() <= asset.settings().failureCostRatio();
  }

  /**
   * Thin films: κ below 0.4 with its upper limit, lifted above it. Without loads, by κ alone: κ
   * below the floor, or on its way there within the horizon, and lifted clear of it with the lower
   * limit.
   */
  private boolean cures(List<Outcome> after, List<Outcome> before, boolean byKappaAlone) {
    for (int i = 0; i < after.size(); i++) {
      BearingCase bearing = asset.bearings().get(i);
      boolean thin = before.get(i).kappaHigh() < THIN_FILM && after.get(i).kappa() > THIN_FILM;
      boolean clears =
          byKappaAlone && low(bearing, before.get(i)) && after.get(i).kappaLow() >= bearing.floor();
      if (thin || clears) {
        return true;
      }
    }
    return false;
  }

  private boolean low(BearingCase bearing, Outcome before) {
    return before.kappa() < bearing.floor()
        || bearing
            .firstCrossing()
            .filter(day -> !day.isAfter(asset.sampled().plusDays(asset.settings().horizonDays())))
            .isPresent();
  }

  private List<Outcome> outcomes(Act act) {
    return asset.bearings().stream().map(bearing -> outcome(act, bearing)).toList();
  }

  private Outcome outcome(Act act, BearingCase bearing) {
    OilViscosity oil =
        act.oil().equals(asset.governing().now().oil()) ? bearing.now().oil() : act.oil();
    double temperatureC = bearing.now().temperatureC() + act.warmerC();
    double kappa =
        bearing
            .now()
            .with(oil)
            .at(temperatureC, bearing.now().speedRpm())
            .kappa(bearing.bearing().pitchMm());
    KappaUncertainty uncertainty =
        KappaUncertainty.of(
            kappa,
            asset.sigmaLnV40(),
            oil.sensitivityToV40(temperatureC),
            oil.sensitivityToTemperature(temperatureC),
            asset.uncertaintyC());
    Cleanliness cleanliness =
        act.cleanerBy() == 0
            ? bearing.cleanliness()
            : bearing.cleanliness().cleanerBy(act.cleanerBy()).orElseThrow();
    BearingLife life = new BearingLife(bearing.bearing());
    OptionalDouble hours = life.ratingLifeH(oil, bearing.duty(), act.warmerC(), cleanliness);
    OptionalDouble failing =
        hours.isPresent() && bearing.usedLife().isPresent()
            ? OptionalDouble.of(
                BearingLife.failureProbability(
                    bearing.usedLife().getAsDouble(),
                    bearing.duty(),
                    asset.settings().horizonDays(),
                    hours.getAsDouble()))
            : OptionalDouble.empty();
    return new Outcome(
        bearing.bearing().id(),
        kappa,
        uncertainty.low(),
        uncertainty.high(),
        uncertainty.probabilityBelow(bearing.floor()),
        life.modification(kappa, cleanliness),
        hours,
        failing);
  }

  /** Probability that any of the bearings fails; empty where one of them is unknown. */
  private static OptionalDouble any(List<Outcome> outcomes) {
    double surviving = 1;
    for (Outcome outcome : outcomes) {
      if (outcome.failureProbability().isEmpty()) {
        return OptionalDouble.empty();
      }
      surviving *= 1 - outcome.failureProbability().getAsDouble();
    }
    return OptionalDouble.of(1 - surviving);
  }

  /** The remedy of a kind; the best one where there are several. */
  static Optional<Remedy> find(List<Remedy> remedies, RemedyKind kind) {
    return remedies.stream().filter(remedy -> remedy.kind() == kind).findFirst();
  }
}
