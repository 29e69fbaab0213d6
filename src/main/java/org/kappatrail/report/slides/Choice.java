package org.kappatrail.report.slides;

import java.util.List;
import org.kappatrail.review.AssetReview;
import org.kappatrail.review.Level;
import org.kappatrail.review.Review;
import org.kappatrail.review.decision.Verdict;

/**
 * Which assets get a slide.
 *
 * @param shown those that do, worst first
 * @param more how many more need a decision
 */
record Choice(List<AssetReview> shown, int more) {
  /** Slides of assets beyond which a meeting does not look. */
  private static final int MOST = 12;

  Choice {
    shown = List.copyOf(shown);
  }

  /** The named assets; where none is named, those that need a decision, at most twelve. */
  static Choice of(Review review, List<String> named) {
    if (!named.isEmpty()) {
      return new Choice(
          review.worstFirst().stream().filter(asset -> named.contains(asset.asset().id())).toList(),
          0);
    }
    List<AssetReview> all = review.worstFirst().stream().filter(Choice::needsDecision).toList();
    List<AssetReview> shown = all.subList(0, Math.min(MOST, all.size()));
    return new Choice(shown, all.size() - shown.size());
  }

  /** At alarm or alert, or with a verdict other than to keep the oil. */
  static boolean needsDecision(AssetReview asset) {
    boolean low = asset.level().filter(level -> level != Level.CLEAR).isPresent();
    boolean act = asset.decision().filter(found -> found.verdict() != Verdict.KEEP).isPresent();
    return low || act;
  }
}
