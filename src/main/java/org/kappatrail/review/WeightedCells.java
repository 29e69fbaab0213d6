package org.kappatrail.review;

import java.util.Arrays;
import java.util.OptionalDouble;

/**
 * Weighted quantiles of grouped values. Cells are ordered by their mean; within the cell that holds
 * the quantile the readings are put back as well as its lowest, mean and highest value allow: one
 * and two readings exactly, three by taking their weights as equal, more by a line from the lowest
 * over a bend to the highest that keeps the mean. For cells of one reading this is the weighted
 * quantile of the readings themselves; where it falls between two readings, the lower one.
 */
final class WeightedCells {
  /** Shares are quotients of whole milliseconds; this is far below one of them. */
  private static final double ROUNDING = 1e-9;

  private double[] lowest;
  private double[] means;
  private double[] highest;
  private double[] weights;
  private long[] readings;
  private int size;
  private boolean sorted;
  private final StableOrder order = new StableOrder();

  WeightedCells(int capacity) {
    int room = Math.max(capacity, 4);
    lowest = new double[room];
    means = new double[room];
    highest = new double[room];
    weights = new double[room];
    readings = new long[room];
  }

  /** Takes all cells out. */
  void clear() {
    size = 0;
    sorted = false;
  }

  void add(double value, double weight) {
    add(value, value, value, 1, weight);
  }

  void add(double low, double mean, double high, long count, double weight) {
    if (weight <= 0) {
      return;
    }
    if (size == means.length) {
      lowest = Arrays.copyOf(lowest, size * 2);
      means = Arrays.copyOf(means, size * 2);
      highest = Arrays.copyOf(highest, size * 2);
      weights = Arrays.copyOf(weights, size * 2);
      readings = Arrays.copyOf(readings, size * 2);
    }
    lowest[size] = low;
    means[size] = mean;
    highest[size] = high;
    weights[size] = weight;
    readings[size] = count;
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
    if (!sorted) {
      order.sort(means, size);
      sorted = true;
    }
    double total = 0;
    for (int rank = 0; rank < size; rank++) {
      total += weights[order.place(rank)];
    }
    double target = share * total;
    double below = 0;
    for (int rank = 0; rank < size; rank++) {
      int cell = order.place(rank);
      if (below + weights[cell] >= target) {
        return OptionalDouble.of(within(cell, Math.max(0, (target - below) / weights[cell])));
      }
      below += weights[cell];
    }
    return OptionalDouble.of(highest[order.place(size - 1)]);
  }

  /** The value up to which a share of a cell's weight lies. */
  private double within(int cell, double share) {
    double low = lowest[cell];
    double high = highest[cell];
    double mean = means[cell];
    if (readings[cell] == 1 || high <= low) {
      return mean;
    }
    if (readings[cell] == 2) {
      return share <= (high - mean) / (high - low) + ROUNDING ? low : high;
    }
    if (readings[cell] == 3) {
      double middle = Math.min(high, Math.max(low, 3 * mean - low - high));
      return share <= 1.0 / 3 + ROUNDING ? low : share <= 2.0 / 3 + ROUNDING ? middle : high;
    }
    double bend = Math.min(high, Math.max(low, 2 * mean - (low + high) / 2));
    return share <= 0.5 ? low + 2 * share * (bend - low) : bend + (2 * share - 1) * (high - bend);
  }
}
