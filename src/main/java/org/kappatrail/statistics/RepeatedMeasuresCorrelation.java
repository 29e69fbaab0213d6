package org.kappatrail.statistics;

import java.util.List;
import java.util.Optional;

/**
 * Correlation within subjects: what x and y do together inside each subject, the differences
 * between subjects taken out. Equal to the analysis of covariance with one slope and an intercept
 * for each subject. Sources: Bland and Altman, BMJ 310 (1995) 446; Bakdash and Marusich, Frontiers
 * in Psychology 8 (2017) 456.
 *
 * @param r −1 to 1
 * @param df observations less subjects less one
 * @param p two-sided, from t with df degrees of freedom
 * @param low lower 95 % limit, from Fisher's z with standard error 1/√(df − 1); −1 where df is 1
 * @param high upper 95 % limit; 1 where df is 1
 * @param subjects subjects with two observations or more; others say nothing and are left out
 * @param n observations of those subjects
 */
public record RepeatedMeasuresCorrelation(
    double r, int df, double p, double low, double high, int subjects, int n) {

  public RepeatedMeasuresCorrelation {
    if (!(r >= -1 && r <= 1) || !(p >= 0 && p <= 1) || !(low <= r && r <= high)) {
      throw new IllegalArgumentException(
          "r " + r + ", p " + p + ", limits " + low + " and " + high);
    }
  }

  /**
   * Correlation over subjects, whose arrays pair off. Empty where fewer than one degree of freedom
   * is left and where x or y never changes within any subject. NaN is refused.
   */
  public static Optional<RepeatedMeasuresCorrelation> of(
      List<double[]> xBySubject, List<double[]> yBySubject) {
    if (xBySubject.size() != yBySubject.size()) {
      throw new IllegalArgumentException(
          "x has " + xBySubject.size() + " subjects and y " + yBySubject.size());
    }
    int subjects = 0;
    int n = 0;
    double squaresX = 0;
    double squaresY = 0;
    double products = 0;
    for (int subject = 0; subject < xBySubject.size(); subject++) {
      Inputs.requireFinitePairs(xBySubject.get(subject), yBySubject.get(subject));
      double[] x = deviations(xBySubject.get(subject));
      double[] y = deviations(yBySubject.get(subject));
      if (x.length < 2) {
        continue;
      }
      subjects++;
      n += x.length;
      for (int i = 0; i < x.length; i++) {
        squaresX += x[i] * x[i];
        squaresY += y[i] * y[i];
        products += x[i] * y[i];
      }
    }
    int df = n - subjects - 1;
    if (df < 1 || squaresX == 0 || squaresY == 0) {
      return Optional.empty();
    }
    double r = products / (Math.sqrt(squaresX) * Math.sqrt(squaresY));
    CorrelationTest test = CorrelationTest.withDegrees(Math.max(-1, Math.min(1, r)), df + 2.0, df);
    return Optional.of(
        new RepeatedMeasuresCorrelation(
            test.coefficient(), df, test.p(), test.low(), test.high(), subjects, n));
  }

  private static double[] deviations(double[] values) {
    double[] deviations = new double[values.length];
    if (Inputs.constant(values)) {
      return deviations;
    }
    double mean = 0;
    for (double value : values) {
      mean += value / values.length;
    }
    for (int i = 0; i < values.length; i++) {
      deviations[i] = values[i] - mean;
    }
    return deviations;
  }
}
