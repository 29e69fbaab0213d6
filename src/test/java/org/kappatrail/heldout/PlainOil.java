package org.kappatrail.heldout;

import java.util.OptionalDouble;

/**
 * Viscosity of an oil, written from the formulas: ASTM D341 with its published low-viscosity form
 * and inverse; ASTM D2270 by the quadratics of its Table X2.1 (not by Table 1, which the program
 * uses), solved by bisection.
 */
record PlainOil(double v40, double v100, String source, double a, double b) {
  private static final double KELVIN = 273.15;

  /** ASTM D2270, Table X2.1: upper end of the range of Y, then a, b, c of L and d, e, f of H. */
  private static final double[][] QUADRATICS = {
    {3.8, 1.14673, 1.7576, -0.109, 0.84155, 1.5521, -0.077},
    {4.4, 3.38095, -15.4952, 33.196, 0.78571, 1.7929, -0.183},
    {5, 2.5, -7.2143, 13.812, 0.82143, 1.5679, 0.119},
    {6.4, 0.101, 16.635, -45.469, 0.04985, 9.1613, -18.557},
    {7, 3.35714, -23.5643, 78.466, 0.22619, 7.7369, -16.656},
    {7.7, 0.01191, 21.475, -72.87, 0.79762, -0.7321, 14.61},
    {9, 0.41858, 16.1558, -56.04, 0.05794, 10.5156, -28.24},
    {12, 0.88779, 7.5527, -16.6, 0.26665, 6.7015, -10.81},
    {15, 0.7672, 10.7972, -38.18, 0.20073, 8.4658, -22.49},
    {18, 0.97305, 5.3135, -2.2, 0.28889, 5.9741, -4.93},
    {22, 0.97256, 5.25, -0.98, 0.24504, 7.416, -16.73},
    {28, 0.91413, 7.4759, -21.82, 0.20323, 9.1267, -34.23},
    {40, 0.87031, 9.7157, -50.77, 0.18411, 10.1015, -46.75},
    {55, 0.84703, 12.6752, -133.31, 0.17029, 11.4866, -80.62},
    {70, 0.85921, 11.1009, -83.19, 0.1713, 11.368, -76.94},
    {Double.POSITIVE_INFINITY, 0.83531, 14.6731, -216.246, 0.16841, 11.8493, -96.947}
  };

  static PlainOil measured(double v40, double v100) {
    return through(v40, v100, "measured");
  }

  static PlainOil ofIndex(double v40, double index) {
    return through(v40, v100(v40, index).orElseThrow(), "index");
  }

  /** A sampled oil without ν100, of a registered oil. */
  static PlainOil like(double v40, PlainOil registered) {
    OptionalDouble v100 =
        registered.v100 < 2 ? OptionalDouble.empty() : v100(v40, registered.index());
    if (v100.isPresent()) {
      return through(v40, v100.getAsDouble(), "index");
    }
    double a = loglog(v40) + registered.b * Math.log10(40 + KELVIN);
    return new PlainOil(v40, viscosity(a, registered.b, 100), "slope", a, registered.b);
  }

  /** Between two oils, linear in both viscosities. */
  static PlainOil between(PlainOil one, PlainOil other, double share) {
    return through(
        one.v40 + share * (other.v40 - one.v40), one.v100 + share * (other.v100 - one.v100), "");
  }

  double index() {
    return index(v40, v100);
  }

  double at(double temperatureC) {
    return viscosity(a, b, temperatureC);
  }

  private static PlainOil through(double v40, double v100, String source) {
    double cool = Math.log10(40 + KELVIN);
    double hot = Math.log10(100 + KELVIN);
    double b = (loglog(v40) - loglog(v100)) / (hot - cool);
    return new PlainOil(v40, v100, source, loglog(v40) + b * cool, b);
  }

  private static double loglog(double viscosity) {
    double z = viscosity + 0.7;
    if (viscosity < 2) {
      z += Math.exp(-1.47 - 1.84 * viscosity - 0.51 * viscosity * viscosity);
    }
    return Math.log10(Math.log10(z));
  }

  private static double viscosity(double a, double b, double temperatureC) {
    double z = Math.pow(10, Math.pow(10, a - b * Math.log10(temperatureC + KELVIN)));
    double y = z - 0.7;
    return y >= 2 ? y : y - Math.exp(-0.7487 - 3.295 * y + 0.6119 * y * y - 0.3193 * y * y * y);
  }

  private static double index(double v40, double y) {
    double[] row = QUADRATICS[0];
    for (int i = 0; row[0] < y; i++) {
      row = QUADRATICS[i + 1];
    }
    double low = row[1] * y * y + row[2] * y + row[3];
    double high = row[4] * y * y + row[5] * y + row[6];
    return v40 >= high
        ? 100 * (low - v40) / (low - high)
        : 100 + (Math.pow(10, Math.log(high / v40) / Math.log(y)) - 1) / 0.00715;
  }

  private static OptionalDouble v100(double v40, double index) {
    double low = 2;
    double high = v40;
    if (v40 <= 2 || index(v40, low) > index) {
      return OptionalDouble.empty();
    }
    for (int i = 0; i < 60; i++) {
      double middle = (low + high) / 2;
      if (index(v40, middle) < index) {
        low = middle;
      } else {
        high = middle;
      }
    }
    return OptionalDouble.of(low);
  }
}
