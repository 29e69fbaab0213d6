package org.kappatrail.demo;

import java.util.SplittableRandom;

/** Random numbers that depend on nothing but a name, so that one series never shifts another. */
final class Noise {
  private static final long SEED = 20240501L;

  private final SplittableRandom random;

  private Noise(long seed) {
    this.random = new SplittableRandom(seed);
  }

  /** The series of that name. */
  static Noise named(String... names) {
    return new Noise(SEED * 31 + String.join("/", names).hashCode());
  }

  double uniform() {
    return random.nextDouble();
  }

  double uniform(double low, double high) {
    return low + (high - low) * random.nextDouble();
  }

  boolean chance(double probability) {
    return random.nextDouble() < probability;
  }

  /** Standard normal number by Box and Muller, bit for bit the same on every machine. */
  double gaussian() {
    double radius = StrictMath.sqrt(-2 * StrictMath.log(1 - random.nextDouble()));
    return radius * StrictMath.cos(2 * Math.PI * random.nextDouble());
  }

  double exponential(double mean) {
    return -mean * StrictMath.log(1 - random.nextDouble());
  }

  /** Autocorrelated series of zero mean and the given deviation. */
  double[] series(int length, double deviation, double persistence) {
    double[] values = new double[length];
    double fresh = Math.sqrt(1 - persistence * persistence);
    double state = gaussian();
    for (int i = 0; i < length; i++) {
      values[i] = deviation * state;
      state = persistence * state + fresh * gaussian();
    }
    return values;
  }
}
