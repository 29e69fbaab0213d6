package org.kappatrail.cli;

import java.io.PrintWriter;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.report.page.Numbers;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.OilCause;
import org.kappatrail.review.decision.Outcome;
import org.kappatrail.review.decision.Remedy;
import org.kappatrail.review.decision.Reply;

/** A decision on one screen of the terminal. */
final class WeighScreen {
  private static final int WIDTH = 100;
  private static final int MOST_REMEDIES = 12;
  private static final int MOST_CAUSES = 3;
  private static final String INDENT = "                             ";

  private WeighScreen() {}

  static void print(
      AssetReview asset, Optional<Decision> decision, String whatIf, PrintWriter out) {
    out.println(
        asset.asset().id()
            + (asset.asset().name().equals(asset.asset().id()) ? "" : ", " + asset.asset().name())
            + (whatIf.isEmpty() ? "" : ": what if" + whatIf + "?"));
    if (decision.isEmpty()) {
      asset.story().forEach(out::println);
      asset.findings().forEach(found -> out.println("  " + found.message()));
      return;
    }
    Decision found = decision.get();
    if (whatIf.isEmpty()) {
      asset.story().stream().limit(2).forEach(line -> wrap(out, line, "", ""));
    }
    out.println();
    question(out, "Is the drop real?", found.real());
    question(out, "Does it matter?", found.matters());
    question(out, "Is it the oil's doing?", found.oilToBlame());
    question(out, "Would fresh oil cure it?", found.curable());
    question(out, "Is it urgent?", found.urgent());
    out.println();
    wrap(out, "Verdict: " + found.verdict().label() + ": " + found.reason() + ".", "", "  ");
    causes(out, asset.oilCauses());
    remedies(out, found);
    out.println();
    wrap(out, "Rests on: " + String.join("; ", found.assumptions()) + ".", "", "  ");
    wrap(
        out,
        "Decision support: the maker's manual, the site's rules and a qualified engineer come"
            + " first.",
        "",
        "  ");
  }

  private static void question(PrintWriter out, String question, Reply reply) {
    wrap(
        out,
        reply.why(),
        String.format(Locale.ROOT, "%-25s%-8s ", question, reply.answer().label()),
        INDENT + "     ");
  }

  private static void causes(PrintWriter out, List<OilCause> causes) {
    if (causes.isEmpty()) {
      return;
    }
    out.println();
    out.println("What may have happened to the oil, likeliest first; none is certain:");
    for (OilCause cause : causes.subList(0, Math.min(MOST_CAUSES, causes.size()))) {
      wrap(
          out,
          cause.name()
              + (cause.support().isEmpty() ? "" : "; for it: " + String.join(", ", cause.support()))
              + (cause.objections().isEmpty()
                  ? ""
                  : "; against it: " + String.join(", ", cause.objections())),
          "  ",
          "    ");
    }
  }

  private static void remedies(PrintWriter out, Decision decision) {
    out.println();
    out.printf(
        Locale.ROOT,
        "%-48s %6s %13s %9s %9s %7s %9s %s%n",
        "Remedies, best first",
        "κ",
        "95 %",
        "L10mh h",
        "fails",
        "price",
        "saving",
        "break-even");
    List<Remedy> remedies = decision.remedies();
    for (Remedy remedy : remedies.subList(0, Math.min(MOST_REMEDIES, remedies.size()))) {
      remedy.outcome(decision.bearing()).ifPresent(outcome -> remedy(out, remedy, outcome));
    }
    if (remedies.size() > MOST_REMEDIES) {
      out.println("and " + (remedies.size() - MOST_REMEDIES) + " more in remedies.csv");
    }
  }

  private static void remedy(PrintWriter out, Remedy remedy, Outcome outcome) {
    out.printf(
        Locale.ROOT,
        "%-48s %6s %13s %9s %9s %7s %9s %s%n",
        (remedy.pays() ? "* " : "  ") + cut(remedy.name(), 46),
        Numbers.significant(outcome.kappa(), 3),
        Numbers.significant(outcome.kappaLow(), 3)
            + "–"
            + Numbers.significant(outcome.kappaHigh(), 3),
        Numbers.grouped(outcome.ratingLifeH()),
        percent(remedy.failureProbability()),
        Numbers.grouped(remedy.price()),
        Numbers.grouped(remedy.netSaving()),
        Numbers.significant(remedy.breakEvenRatio(), 2));
  }

  private static String percent(OptionalDouble share) {
    return share.isPresent() ? Numbers.significant(share.getAsDouble() * 100, 2) + " %" : "";
  }

  private static String cut(String text, int most) {
    return text.length() <= most ? text : text.substring(0, most - 1) + "…";
  }

  /** Prints a text within the width of a screen. */
  private static void wrap(PrintWriter out, String text, String first, String rest) {
    StringBuilder line = new StringBuilder(first);
    boolean empty = true;
    for (String word : text.split(" ", -1)) {
      if (!empty && line.length() + 1 + word.length() > WIDTH) {
        out.println(line);
        line = new StringBuilder(rest);
        empty = true;
      }
      if (!empty) {
        line.append(' ');
      }
      line.append(word);
      empty = false;
    }
    out.println(line);
  }
}
