package org.kappatrail.report.table;

import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.Review;
import org.kappatrail.review.decision.Decision;
import org.kappatrail.review.decision.Outcome;
import org.kappatrail.review.decision.Remedy;
import tech.tablesaw.api.Table;

/** Verdicts, and the acts that were weighed. */
final class DecisionTables {
  private DecisionTables() {}

  private record Row(String asset, Decision decision) {}

  private record Weighed(String asset, int rank, Remedy remedy, Outcome outcome) {}

  /** A row per asset that has a κ. */
  static Table verdicts(Review review) {
    return new TableOf<Row>("verdicts")
        .text("asset", Row::asset)
        .text("bearing", row -> row.decision().bearing())
        .text("sample", row -> row.decision().sample())
        .text("verdict", row -> row.decision().verdict().label())
        .text("real", row -> row.decision().real().answer().label())
        .text("matters", row -> row.decision().matters().answer().label())
        .text("oil_to_blame", row -> row.decision().oilToBlame().answer().label())
        .text("curable", row -> row.decision().curable().answer().label())
        .text("urgent", row -> row.decision().urgent().answer().label())
        .text("reason", row -> row.decision().reason())
        .from(decisions(review));
  }

  /** A row per act and bearing; rank, price, saving and ratio are the asset's. */
  static Table remedies(Review review) {
    List<Weighed> rows = new ArrayList<>();
    for (Row row : decisions(review)) {
      int rank = 0;
      for (Remedy remedy : row.decision().remedies()) {
        rank++;
        for (Outcome outcome : remedy.outcomes()) {
          rows.add(new Weighed(row.asset(), rank, remedy, outcome));
        }
      }
    }
    return new TableOf<Weighed>("remedies")
        .text("asset", Weighed::asset)
        .text("bearing", row -> row.outcome().bearing())
        .whole("rank", Weighed::rank)
        .text("remedy", row -> row.remedy().name())
        .number("kappa", row -> OptionalDouble.of(row.outcome().kappa()))
        .number("kappa_low", row -> OptionalDouble.of(row.outcome().kappaLow()))
        .number("kappa_high", row -> OptionalDouble.of(row.outcome().kappaHigh()))
        .number(
            "probability_below_floor",
            row -> OptionalDouble.of(row.outcome().probabilityBelowFloor()))
        .number("life_modification", row -> row.outcome().lifeModification())
        .number("rating_life_h", row -> row.outcome().ratingLifeH())
        .number("failure_probability", row -> row.outcome().failureProbability())
        .number("price", row -> row.remedy().price())
        .number("net_saving", row -> row.remedy().netSaving())
        .number("break_even_ratio", row -> row.remedy().breakEvenRatio())
        .from(rows);
  }

  private static List<Row> decisions(Review review) {
    List<Row> rows = new ArrayList<>();
    for (AssetReview asset : review.assets()) {
      asset.decision().ifPresent(decision -> rows.add(new Row(asset.asset().id(), decision)));
    }
    return rows;
  }
}
