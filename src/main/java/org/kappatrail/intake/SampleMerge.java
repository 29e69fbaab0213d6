package org.kappatrail.intake;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SourceLine;

/**
 * Puts samples of several files together. A sample that stands twice with the same values is used
 * once; of differing ones the later received is used, and both are told.
 */
final class SampleMerge {
  private final Map<String, Sample> used = new LinkedHashMap<>();
  private final Map<SourceLine, String> left = new LinkedHashMap<>();
  private final List<Problem> problems;

  SampleMerge(List<Problem> problems) {
    this.problems = problems;
  }

  /** Takes a sample; samples must come in the order of files and lines. */
  void add(Sample sample) {
    Sample before = used.get(sample.id());
    if (before == null) {
      used.put(sample.id(), sample);
    } else if (isSame(before, sample)) {
      left.put(sample.source(), "repeated with the same values");
      tell(sample, "stands already at " + before.source() + " with the same values; used once");
    } else if (isLater(before, sample)) {
      used.put(sample.id(), sample);
      tellBoth(sample, before);
    } else {
      tellBoth(before, sample);
    }
  }

  /** The samples that are used. */
  List<Sample> samples() {
    return new ArrayList<>(used.values());
  }

  /** Why a sample is not used; empty where it is. */
  Optional<String> whyNot(Sample sample) {
    return Optional.ofNullable(left.get(sample.source()));
  }

  private void tellBoth(Sample winner, Sample loser) {
    left.put(loser.source(), "sample that stands with other values elsewhere");
    tell(
        winner,
        "stands with other values at "
            + loser.source()
            + "; this one is used, as the later received or later listed; keep one of them");
    tell(
        loser,
        "stands with other values at "
            + winner.source()
            + ", which is used, as the later received or later listed; keep one of them");
  }

  private void tell(Sample sample, String text) {
    problems.add(new Problem(sample.source(), "sample", sample.id(), text));
  }

  private static boolean isSame(Sample a, Sample b) {
    return a.asset().equals(b.asset())
        && a.sampledAt().equals(b.sampledAt())
        && a.values().equals(b.values())
        && a.statedCode().equals(b.statedCode());
  }

  private static boolean isLater(Sample before, Sample sample) {
    return before.receivedOn().isEmpty()
        || sample.receivedOn().isEmpty()
        || !sample.receivedOn().get().isBefore(before.receivedOn().get());
  }
}
