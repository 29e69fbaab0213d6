package org.kappatrail.review.correlation;

import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.Set;

/**
 * Says which variables go with which: a sentence per pair that is called, those of κ first, then
 * those that merely drift alike.
 */
public final class CorrelationSentences {
  /** What is said where no correlation is called. */
  public static final String NOTHING = "Nothing that could not be chance.";

  /** What is said where no test could be made. */
  public static final String TOO_FEW =
      "Too few samples: a correlation takes at least "
          + Correlations.LEAST_PAIRS
          + " pairs of values that vary.";

  private static final Set<Judgement> SAID = Set.of(Judgement.CALLED, Judgement.DRIFT);
  private static final Set<String> KAPPAS = Set.of(Names.KAPPA, Names.KAPPA_REFERENCE);
  private static final List<String> NUMBERS = List.of("no", "one", "two", "three");
  private static final double LEAST_SHOWN = 0.001;

  private static final Comparator<Link> ORDER =
      Comparator.comparing(Link::judgement)
          .thenComparing(link -> !KAPPAS.contains(link.measured().x()))
          .thenComparing(Link.SUREST);

  private CorrelationSentences() {}

  /** The links that are spoken of, in the order of their sentences. */
  public static List<Link> spokenOf(List<Link> links) {
    return Link.surestOfPairs(links).stream()
        .filter(link -> SAID.contains(link.judgement()))
        .sorted(ORDER)
        .toList();
  }

  /** Sentences on the links of one asset, or of the fleet; never empty. */
  public static List<String> of(List<Link> links) {
    if (links.isEmpty()) {
      return List.of(TOO_FEW);
    }
    List<Link> spokenOf = spokenOf(links);
    return spokenOf.isEmpty()
        ? List.of(NOTHING)
        : spokenOf.stream().map(CorrelationSentences::sentence).toList();
  }

  /** The sentence on a link that is called, or that merely drifts. */
  public static String sentence(Link link) {
    PairCorrelation test = link.measured();
    String numbers = coefficient(test.coefficient()) + ", " + certainty(test);
    String text =
        link.judgement() == Judgement.CALLED
            ? claim(test) + " (" + numbers + ")."
            : claim(test) + " (" + numbers + "), " + drift(link) + ".";
    return capital(text);
  }

  private static String claim(PairCorrelation test) {
    String x = Names.of(test.x());
    String y = Names.of(test.y());
    if (test.lag() == 0) {
      return y + verb(" move", test.y()) + (test.coefficient() > 0 ? " with " : " against ") + x;
    }
    String samples =
        NUMBERS.get(Math.abs(test.lag())) + (Math.abs(test.lag()) == 1 ? " sample" : " samples");
    return (test.lag() > 0
            ? y + verb(" follow", test.y()) + " " + x
            : x + verb(" follow", test.x()) + " " + y)
        + " by "
        + samples;
  }

  private static String verb(String stem, String variable) {
    return Names.plural(variable) ? stem : stem + "s";
  }

  private static String certainty(PairCorrelation test) {
    String assets = test.scope() == Scope.FLEET ? test.assets() + " assets, " : "";
    return assets
        + "N* "
        + String.format(Locale.ROOT, "%.0f", test.nEffective())
        + ", q "
        + probability(test.q().orElseThrow());
  }

  private static String drift(Link link) {
    double measured = link.measured().coefficient();
    return link.detrended()
        .map(left -> drift(measured, left))
        .orElse("but without the drift of both nothing can be tested");
  }

  /** Half of the coefficient gone tells that the drift made it; else there is too little left. */
  private static String drift(double measured, PairCorrelation left) {
    String number = "detrended " + coefficient(left.coefficient());
    if (Math.abs(left.coefficient()) < Math.abs(measured) / 2) {
      return "but both drift with age (" + number + ")";
    }
    String ending = " (" + number + ", p " + probability(left.p()) + ")";
    return "but without the drift of both "
        + (left.p() <= Link.LIMIT ? "they go the other way" : "it could be chance")
        + ending;
  }

  /** A coefficient with two decimals; the minus is U+2212. */
  public static String coefficient(double value) {
    String number = String.format(Locale.ROOT, "%.2f", Math.abs(value));
    return value < 0 && !number.equals("0.00") ? "−" + number : number;
  }

  /** A probability with two digits; "below 0.001" where it is. */
  public static String probability(double p) {
    if (p < LEAST_SHOWN) {
      return "below 0.001";
    }
    return p == 1
        ? "1"
        : BigDecimal.valueOf(p).round(new MathContext(2, RoundingMode.HALF_EVEN)).toPlainString();
  }

  /** κ stays as it is: its capital would be read as a Latin letter. */
  private static String capital(String text) {
    return text.startsWith("κ")
        ? text
        : text.substring(0, 1).toUpperCase(Locale.ROOT) + text.substring(1);
  }
}
