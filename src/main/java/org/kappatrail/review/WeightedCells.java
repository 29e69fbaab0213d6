package org.kappatrail.review;

import java.util.Arrays;
import java.util.Comparator;
import java.util.OptionalDouble;

/**
 * Weighted quantiles of grouped values: cells are ordered by their mean, and within the cell that
 * holds the quantile the value runs evenly from its lowest to its highest reading. For cells of one
 * value this is the weighted quantile of the values themselves.
 */
final class WeightedCells {
  private double[] lowest;
  private double[] means;
  private double[] highest;
  private double[] weights;
  private int size;
  private boolean sorted;

  WeightedCells(int capacity) {
    int room = Math.max(capacity, 4);
    lowest = new double[room];
    means = new double[room];
    highest = new double[room];
    weights = new double[room];
  }

  void add(double value, double weight) {
    add(value, value, value, weight);
  }

  void add(double low, double mean, double high, double weight) {
    if (weight <= 0) {
      return;
    }
    if (size == means.length) {
      lowest = Arrays.copyOf(lowest, size * 2);
      means = Arrays.copyOf(means, size * 2);
      highest = Arrays.copyOf(highest, size * 2);
      weights = Arrays.copyOf(weights, size * 2);
    }
    lowest[size] = low;
    means[size] = mean;
    highest[size] = high;
    weights[size] = weight;
    size++;
    sorted = false;
  }

  OptionalDouble median() {
    return quantile(0.5);
  }

  /** Quantile of the weight, 0 to 1; empty without any weight. */
  OptionalDouble quantile(double share) {
    if (size == 0) {
      return OptionalDouble.empty();
    }
    sort();
    double total = 0;
    for (int i = 0; i < size; i++) {
      total += weights[i];
    }
    double target = share * total;
    double below = 0;
    for (int i = 0; i < size; i++) {
      if (below + weights[i] >= target) {
        double within = Math.max(0, (target - below) / weights[i]);
        return OptionalDouble.of(lowest[i] + within * (highest[i] - lowest[i]));
      }
      below += weights[i];
    }
    return OptionalDouble.of(highest[size - 1]);
  }

  private void sort() {
    if (sorted) {
      return;
    }
    Integer[] order = new Integer[size];
    Arrays.setAll(order, i -> i);
    Arrays.sort(order, Comparator.comparingDouble(i -> means[i]));
    lowest = pick(lowest, order);
    highest = pick(highest, order);
    weights = pick(weights, order);
    means = pick(means, order);
    sorted = true;
  }

  private static double[] pick(double[] values, Integer[] order) {
    double[] picked = new double[order.length];
    for (int i = 0; i < order.length; i++) {
      picked[i] = values[order[i]];
    }
    return picked;
  }
}
