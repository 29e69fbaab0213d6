package org.kappatrail.review.correlation;

import org.kappatrail.statistics.EffectiveSampleSize;

/**
 * How many independent pairs the samples of several assets are worth together for their
 * repeated-measures correlation.
 *
 * <p>With Sxx and Syy the sums of squares within an asset and N* the pairs it is worth by itself
 * ({@link EffectiveSampleSize}), the coefficient of two unrelated variables scatters with variance
 * Σ(Sxx·Syy/N*)/(ΣSxx·ΣSyy), so that together they are worth the inverse of that, at most ΣN*:
 * samples of an asset that swings ten times as far as the others count for nearly all of the
 * coefficient, and the others' add little to its certainty. Each asset then spends its mean, or its
 * mean and its slope where drift was taken out, as a share of its pairs. Assets alike in spread and
 * without serial correlation give the n − k − 1 degrees of freedom of Bakdash and Marusich
 * (Frontiers in Psychology 8 (2017) 456) for n pairs of k assets; the rest is this tool's
 * convention.
 */
final class FleetSampleSize {
  private final Form form;
  private int assets;
  private int pairs;
  private double worth;
  private double squaresX;
  private double squaresY;
  private double scatter;

  FleetSampleSize(Form form) {
    this.form = form;
  }

  /** Adds an asset; false where it says nothing of the two, and is left out. */
  boolean add(double[] x, double[] y) {
    double ofX = squares(x);
    double ofY = squares(y);
    if (x.length <= spent() || ofX == 0 || ofY == 0) {
      return false;
    }
    double own =
        form == Form.MEASURED
            ? EffectiveSampleSize.pyperPeterman(x, y)
            : EffectiveSampleSize.detrended(x, y);
    assets++;
    pairs += x.length;
    worth += own;
    squaresX += ofX;
    squaresY += ofY;
    scatter += ofX * ofY / own;
    return true;
  }

  int assets() {
    return assets;
  }

  int pairs() {
    return pairs;
  }

  /** Effective sample size, two more than the degrees of freedom; 0 where there is no asset. */
  double effective() {
    if (assets == 0) {
      return 0;
    }
    double together = Math.min(worth, squaresX * squaresY / scatter);
    double left = (pairs - (double) spent() * assets) / pairs;
    return together * left + 1;
  }

  /** Pairs that each asset spends. */
  private int spent() {
    return form == Form.MEASURED ? 1 : 2;
  }

  private static double squares(double[] values) {
    double least = Double.POSITIVE_INFINITY;
    double most = Double.NEGATIVE_INFINITY;
    double mean = 0;
    for (double value : values) {
      least = Math.min(least, value);
      most = Math.max(most, value);
      mean += value / values.length;
    }
    if (!(least < most)) {
      return 0;
    }
    double sum = 0;
    for (double value : values) {
      sum += (value - mean) * (value - mean);
    }
    return sum;
  }
}
