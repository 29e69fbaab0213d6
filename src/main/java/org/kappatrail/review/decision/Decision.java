package org.kappatrail.review.decision;

import java.util.List;

/**
 * The five questions of an asset, the verdict, and the acts that were weighed.
 *
 * @param bearing the governing bearing: least κ over its floor
 * @param sample its latest sample with a κ
 * @param verdict the verdict
 * @param reason one or two sentences with the figures that made it
 * @param real is the viscosity drop real?
 * @param matters does some act pay?
 * @param oilToBlame is it the oil's doing?
 * @param curable would fresh oil cure it?
 * @param urgent is it urgent?
 * @param remedies acts, best first, with staying as it is among them
 * @param assumptions what the figures rest on: duty, running hours, loads, horizon
 * @param basis the case that was decided
 */
public record Decision(
    String bearing,
    String sample,
    Verdict verdict,
    String reason,
    Reply real,
    Reply matters,
    Reply oilToBlame,
    Reply curable,
    Reply urgent,
    List<Remedy> remedies,
    List<String> assumptions,
    AssetCase basis) {
  public Decision {
    remedies = List.copyOf(remedies);
    assumptions = List.copyOf(assumptions);
  }
}
