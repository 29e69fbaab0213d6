package org.kappatrail.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Event;
import org.kappatrail.history.EventKind;
import org.kappatrail.history.Oil;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.review.decision.OilCause;
import org.kappatrail.tribology.AstmD2270;
import org.kappatrail.tribology.AstmD445Precision;
import org.kappatrail.tribology.AstmD7152Blend;

/**
 * What may have happened to an oil whose viscosity has really shifted: a blend with a registered
 * oil or a thin diluent, shear of a VI-improved oil, water, oxidation. Each comes with evidence for
 * and against it from the viscosity at 100 °C, the additive elements, the top-ups on record, water
 * and acid number, and is ranked by it; none is certain. The limits are tool conventions.
 */
final class OilCauses {
  private static final double DILUENT_40_CST = 2.5;
  private static final double DILUENT_100_CST = 1.05;

  /** Scatter of an element between oil batches and tests, as a fraction. */
  private static final double ELEMENT_SCATTER = 0.15;

  /** Elements below this are traces, mg/kg. */
  private static final double TRACE_PPM = 10;

  private static final double SCATTER_100 = 0.02;
  private static final double WET_PPM = 500;
  private static final double ACID_RISE = 0.2;
  private static final double INDEX_LOSS = 5;

  private final Oil oil;
  private final Sample latest;
  private final Charge charge;
  private final List<Event> events;
  private final double v40;
  private final List<OilCause> causes = new ArrayList<>();

  private OilCauses(Oil oil, Sample latest, Charge charge, List<Event> events) {
    this.oil = oil;
    this.latest = latest;
    this.charge = charge;
    this.events = events;
    this.v40 = latest.exact(SampleColumns.VISCOSITY_40C).getAsDouble();
  }

  /** Causes, likeliest first; none without a shift beyond measuring. */
  static List<OilCause> of(
      Charge charge, Oil oil, List<Oil> oils, List<Event> events, OptionalDouble volumeL) {
    Optional<Sample> latest =
        charge.samples().stream()
            .filter(sample -> sample.exact(SampleColumns.VISCOSITY_40C).isPresent())
            .reduce((a, b) -> b);
    double fresh = oil.viscosity().viscosity40Cst();
    if (latest.isEmpty()) {
      return List.of();
    }
    OilCauses search = new OilCauses(oil, latest.get(), charge, events);
    double limit = AstmD445Precision.reproducibilityPercent(fresh) / 100 * fresh;
    if (Math.abs(search.v40 - fresh) <= limit) {
      return List.of();
    }
    for (Oil other : oils) {
      if (!other.id().equals(oil.id())) {
        search.blend(other, volumeL);
      }
    }
    if (search.v40 < fresh) {
      search.diluent();
      search.shear();
    } else {
      search.oxidation();
    }
    search.water();
    search.causes.sort(
        Comparator.comparingInt((OilCause cause) -> -cause.weight()).thenComparing(OilCause::name));
    return List.copyOf(search.causes);
  }

  /** Evidence as it is gathered. */
  private static final class Evidence {
    private final List<String> support = new ArrayList<>();
    private final List<String> objections = new ArrayList<>();

    void add(boolean supports, String text) {
      (supports ? support : objections).add(text);
    }

    OilCause cause(String name) {
      return new OilCause(name, support, objections, support.size() - objections.size());
    }
  }

  private void blend(Oil other, OptionalDouble volumeL) {
    OptionalDouble fraction =
        AstmD7152Blend.fractionExplaining(
            oil.viscosity().viscosity40Cst(), other.viscosity().viscosity40Cst(), v40);
    if (fraction.isEmpty() || fraction.getAsDouble() > 0.95) {
      return;
    }
    double share = fraction.getAsDouble();
    Evidence evidence = new Evidence();
    at100(evidence, other.viscosity().viscosity100Cst(), share);
    elements(evidence, other.elementsPpm(), share);
    topUps(evidence, other, share, volumeL);
    if (oil.viImproved() || other.viImproved()) {
      evidence.add(false, "the blend rule does not hold for VI-improved oils");
    }
    causes.add(
        evidence.cause(
            Say.text("%s %% of %s by volume", Say.significant(share * 100, 2), other.id())));
  }

  private void diluent() {
    OptionalDouble fraction =
        AstmD7152Blend.fractionExplaining(oil.viscosity().viscosity40Cst(), DILUENT_40_CST, v40);
    if (fraction.isEmpty()) {
      return;
    }
    double share = fraction.getAsDouble();
    Evidence evidence = new Evidence();
    at100(evidence, DILUENT_100_CST, share);
    elements(evidence, Map.of(), share);
    gradual(evidence, "as a leak does");
    if (oil.viImproved()) {
      evidence.add(false, "the blend rule does not hold for VI-improved oils");
    }
    causes.add(
        evidence.cause(
            Say.text(
                "%s %% of a thin diluent (2.5 mm²/s at 40 °C) by volume",
                Say.significant(share * 100, 2))));
  }

  private void at100(Evidence evidence, double other100, double share) {
    OptionalDouble measured = latest.exact(SampleColumns.VISCOSITY_100C);
    if (measured.isEmpty()) {
      return;
    }
    double expected =
        AstmD7152Blend.viscosityCst(oil.viscosity().viscosity100Cst(), other100, share);
    boolean fits = Math.abs(measured.getAsDouble() / expected - 1) <= SCATTER_100;
    evidence.add(
        fits,
        Say.text(
            "at 100 °C it would be %s mm²/s, %s measured",
            Say.significant(expected, 3), Say.significant(measured.getAsDouble(), 3)));
  }

  /** Elements that the blend would move by more than their scatter. */
  private void elements(Evidence evidence, Map<String, Double> others, double share) {
    java.util.TreeSet<String> names = new java.util.TreeSet<>(oil.elementsPpm().keySet());
    names.addAll(others.keySet());
    for (String name : names) {
      double fresh = oil.elementsPpm().getOrDefault(name, 0.0);
      double other = others.getOrDefault(name, 0.0);
      double expected = fresh + share * (other - fresh);
      OptionalDouble found = latest.arithmetic(name);
      double scatter = Math.max(TRACE_PPM, ELEMENT_SCATTER * Math.max(fresh, expected));
      if (found.isEmpty() || Math.abs(expected - fresh) < scatter) {
        continue;
      }
      double toBlend = Math.abs(found.getAsDouble() - expected);
      double toFresh = Math.abs(found.getAsDouble() - fresh);
      evidence.add(
          toBlend < toFresh,
          Say.text(
              "%s would be %s mg/kg instead of %s, %s measured",
              name.replace(SampleColumns.ELEMENT_SUFFIX, ""),
              Say.significant(expected, 2),
              Say.significant(fresh, 2),
              Say.significant(found.getAsDouble(), 2)));
    }
  }

  private void topUps(Evidence evidence, Oil other, double share, OptionalDouble volumeL) {
    List<Event> topUps =
        events.stream()
            .filter(event -> event.kind() == EventKind.TOP_UP)
            .filter(event -> charge.covers(event.date()))
            .filter(event -> !event.date().isAfter(latest.day()))
            .filter(event -> event.oil().isEmpty() || event.oil().get().equals(other.id()))
            .toList();
    if (topUps.isEmpty()) {
      evidence.add(false, "no top-up with it, or with an unnamed oil, is on record");
      return;
    }
    double litres = topUps.stream().mapToDouble(event -> event.litres().orElse(0)).sum();
    if (volumeL.isEmpty() || litres == 0) {
      evidence.add(true, "a top-up on " + topUps.get(0).date() + " could have brought it in");
      return;
    }
    double brought = litres / volumeL.getAsDouble();
    boolean enough = share <= 1.5 * brought && share >= brought / 2;
    evidence.add(
        enough,
        Say.text(
            "the %s l topped up since %s are %s %% of the charge",
            Say.significant(litres, 2), topUps.get(0).date(), Say.significant(brought * 100, 2)));
  }

  /** Whether the viscosity went step by step rather than at once. */
  private void gradual(Evidence evidence, String how) {
    List<Sample> samples =
        charge.samples().stream()
            .filter(sample -> sample.exact(SampleColumns.VISCOSITY_40C).isPresent())
            .toList();
    int n = samples.size();
    if (n < 4) {
      return;
    }
    double whole = v40 - value(samples.get(0));
    double largest = 0;
    for (int i = 1; i < n; i++) {
      double step = value(samples.get(i)) - value(samples.get(i - 1));
      largest = Math.max(largest, Math.signum(whole) * step);
    }
    boolean atOnce = largest > 0.7 * Math.abs(whole);
    evidence.add(
        !atOnce, atOnce ? "it came at once between two samples" : "it came step by step, " + how);
  }

  private static double value(Sample sample) {
    return sample.exact(SampleColumns.VISCOSITY_40C).getAsDouble();
  }

  private void shear() {
    Evidence evidence = new Evidence();
    evidence.add(
        oil.viImproved(),
        oil.viImproved() ? "the oil is VI-improved" : "the oil is not VI-improved");
    OptionalDouble v100 = latest.exact(SampleColumns.VISCOSITY_100C);
    OptionalDouble fresh = oil.viscosity().viscosityIndex();
    if (v100.isPresent() && fresh.isPresent() && v100.getAsDouble() >= AstmD2270.LOWEST_100_CST) {
      double index = AstmD2270.viscosityIndex(v40, v100.getAsDouble());
      evidence.add(
          index < fresh.getAsDouble() - INDEX_LOSS,
          Say.text(
              "viscosity index %s, %s when fresh",
              Say.whole(index), Say.whole(fresh.getAsDouble())));
    }
    keepsElements(evidence);
    gradual(evidence, "as shear does");
    causes.add(evidence.cause("shear of the viscosity index improver"));
  }

  private void keepsElements(Evidence evidence) {
    for (Map.Entry<String, Double> element : oil.elementsPpm().entrySet()) {
      OptionalDouble found = latest.arithmetic(element.getKey());
      if (element.getValue() >= TRACE_PPM && found.isPresent()) {
        boolean kept = Math.abs(found.getAsDouble() / element.getValue() - 1) <= ELEMENT_SCATTER;
        evidence.add(
            kept,
            Say.text(
                "%s %s mg/kg, %s when fresh",
                element.getKey().replace(SampleColumns.ELEMENT_SUFFIX, ""),
                Say.significant(found.getAsDouble(), 2),
                Say.significant(element.getValue(), 2)));
        return;
      }
    }
  }

  private void oxidation() {
    Evidence evidence = new Evidence();
    OptionalDouble now = latest.arithmetic(SampleColumns.ACID_NUMBER);
    OptionalDouble first =
        charge.samples().stream()
            .map(sample -> sample.arithmetic(SampleColumns.ACID_NUMBER))
            .filter(OptionalDouble::isPresent)
            .findFirst()
            .orElse(OptionalDouble.empty());
    if (now.isPresent() && first.isPresent()) {
      double rise = now.getAsDouble() - first.getAsDouble();
      evidence.add(
          rise >= ACID_RISE,
          Say.text(
              "acid number %s mg KOH/g after %s",
              Say.significant(now.getAsDouble(), 2), Say.significant(first.getAsDouble(), 2)));
    }
    gradual(evidence, "as ageing does");
    causes.add(evidence.cause("oxidation: the oil thickens with age and heat"));
  }

  private void water() {
    OptionalDouble water = latest.arithmetic(SampleColumns.WATER);
    if (water.isEmpty() || water.getAsDouble() < WET_PPM) {
      return;
    }
    Evidence evidence = new Evidence();
    evidence.add(true, Say.text("water %s mg/kg", Say.significant(water.getAsDouble(), 3)));
    evidence.add(
        v40 > oil.viscosity().viscosity40Cst(),
        v40 > oil.viscosity().viscosity40Cst()
            ? "an emulsion is thicker than its oil"
            : "an emulsion is thicker than its oil, and this one is thinner");
    causes.add(evidence.cause("emulsified water"));
  }
}
