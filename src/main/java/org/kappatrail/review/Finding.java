package org.kappatrail.review;

import java.util.Comparator;
import java.util.Optional;

/**
 * Something the analyst should know.
 *
 * @param asset asset it concerns
 * @param bearing bearing it concerns; empty where the whole asset is meant
 * @param sample sample it concerns; empty where none is meant
 * @param level {@link Level#CLEAR} for a note that asks for no act
 * @param kind its name in files
 * @param message what was found, with its evidence
 */
public record Finding(
    String asset,
    Optional<String> bearing,
    Optional<String> sample,
    Level level,
    FindingKind kind,
    String message) {

  /** By asset, worst first, then kind, bearing, sample. */
  public static final Comparator<Finding> ORDER =
      Comparator.comparing(Finding::asset)
          .thenComparing(Finding::level, Comparator.reverseOrder())
          .thenComparing(Finding::kind)
          .thenComparing(finding -> finding.bearing().orElse(""))
          .thenComparing(finding -> finding.sample().orElse(""))
          .thenComparing(Finding::message);

  static Finding ofAsset(String asset, Level level, FindingKind kind, String message) {
    return new Finding(asset, Optional.empty(), Optional.empty(), level, kind, message);
  }

  static Finding ofSample(
      String asset, String sample, Level level, FindingKind kind, String message) {
    return new Finding(asset, Optional.empty(), Optional.of(sample), level, kind, message);
  }
}
