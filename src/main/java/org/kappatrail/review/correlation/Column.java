package org.kappatrail.review.correlation;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import org.kappatrail.statistics.Detrend;

/** A variable of an asset with what is left of it when its own drift is taken out. */
final class Column {
  private final Variable variable;
  private final Optional<double[]> residuals;

  Column(Variable variable, List<Double> days) {
    this.variable = variable;
    residuals = residuals(variable, days);
  }

  String name() {
    return variable.name();
  }

  /** Pairs in the order of rank: places in the order as measured, residuals as detrended. */
  static Paired ranked(Column x, Column y, int lag, Form form) {
    return form == Form.MEASURED
        ? Paired.of(
            x.variable.size(),
            lag,
            x.variable::has,
            x.variable::order,
            y.variable::has,
            y.variable::order)
        : left(x, y, lag);
  }

  /** Pairs of numbers to calculate with. */
  static Paired numbers(Column x, Column y, Form form) {
    return form == Form.MEASURED
        ? Paired.of(
            x.variable.size(),
            0,
            x.variable::has,
            x.variable::arithmetic,
            y.variable::has,
            y.variable::arithmetic)
        : left(x, y, 0);
  }

  private static Paired left(Column x, Column y, int lag) {
    double[] ofX = x.residuals.orElse(new double[0]);
    double[] ofY = y.residuals.orElse(new double[0]);
    return Paired.of(
        x.variable.size(),
        lag,
        i -> ofX.length > 0 && x.variable.has(i),
        i -> ofX[i],
        i -> ofY.length > 0 && y.variable.has(i),
        i -> ofY[i]);
  }

  /** Residuals at their samples' places; empty where the days do not allow a line. */
  private static Optional<double[]> residuals(Variable variable, List<Double> days) {
    double[] t = new double[days.size()];
    double[] values = new double[days.size()];
    int count = 0;
    for (int i = 0; i < days.size(); i++) {
      if (variable.has(i)) {
        t[count] = days.get(i);
        values[count++] = variable.arithmetic(i);
      }
    }
    return Detrend.residuals(Arrays.copyOf(t, count), Arrays.copyOf(values, count))
        .map(known -> spread(variable, known));
  }

  private static double[] spread(Variable variable, double[] known) {
    double[] places = new double[variable.size()];
    int next = 0;
    for (int i = 0; i < places.length; i++) {
      if (variable.has(i)) {
        places[i] = known[next++];
      }
    }
    return places;
  }
}
