package org.kappatrail.review.decision;

/**
 * The one table that maps answers to a verdict.
 *
 * <table>
 *   <caption>First row that fits</caption>
 *   <tr><th>situation</th><th>verdict</th></tr>
 *   <tr><td>nothing pays</td><td>keep</td></tr>
 *   <tr><td>putting the cause right pays and is worth more than fresh oil, and the oil is not to
 *       blame</td><td>fix-cause-first</td></tr>
 *   <tr><td>fresh oil pays, but the shift is not shown to be real</td><td>resample</td></tr>
 *   <tr><td>fresh oil pays, urgent</td><td>change-now</td></tr>
 *   <tr><td>fresh oil pays</td><td>plan-change</td></tr>
 *   <tr><td>only putting the cause right pays</td><td>fix-cause-first</td></tr>
 * </table>
 */
final class DecisionTable {
  private DecisionTable() {}

  /**
   * The verdict.
   *
   * @param real answer to the first question
   * @param matters answer to the second
   * @param oilToBlame answer to the third
   * @param freshPays whether a fresh charge of the registered oil pays
   * @param causePays whether putting temperature, speed or grade right pays
   * @param causeWorthMore whether that is worth more than fresh oil
   * @param urgent answer to the fifth
   */
  static Verdict verdict(
      Answer real,
      Answer matters,
      Answer oilToBlame,
      boolean freshPays,
      boolean causePays,
      boolean causeWorthMore,
      Answer urgent) {
    if (matters == Answer.NO) {
      return Verdict.KEEP;
    }
    if (causePays && causeWorthMore && oilToBlame != Answer.YES) {
      return Verdict.FIX_CAUSE_FIRST;
    }
    if (freshPays) {
      if (real != Answer.YES) {
        return Verdict.RESAMPLE;
      }
      return urgent == Answer.YES ? Verdict.CHANGE_NOW : Verdict.PLAN_CHANGE;
    }
    return causePays ? Verdict.FIX_CAUSE_FIRST : Verdict.KEEP;
  }
}
