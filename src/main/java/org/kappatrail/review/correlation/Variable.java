package org.kappatrail.review.correlation;

import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.TreeMap;

/** One quantity of one asset, a place for each of its samples in time. */
public final class Variable {

  /**
   * Values below a limit come before all measured ones and are equal to each other, also those of
   * different limits, whose order nobody knows; values above a limit come after all measured ones.
   */
  private static final Comparator<Value> ORDER =
      Comparator.comparing(Value::range)
          .thenComparingDouble(
              value -> value.range() == Value.Range.MEASURED ? value.arithmetic() + 0.0 : 0);

  private final String name;
  private final boolean[] present;
  private final double[] arithmetic;
  private final double[] order;

  private Variable(String name, List<Optional<Value>> values) {
    this.name = name;
    present = new boolean[values.size()];
    arithmetic = new double[values.size()];
    order = new double[values.size()];
    TreeMap<Value, Double> places = new TreeMap<>(ORDER);
    values.forEach(value -> value.ifPresent(known -> places.put(known, 0.0)));
    double place = 0;
    for (var entry : places.entrySet()) {
      entry.setValue(++place);
    }
    for (int i = 0; i < present.length; i++) {
      Optional<Value> value = values.get(i);
      if (value.isPresent()) {
        present[i] = true;
        arithmetic[i] = value.get().arithmetic();
        order[i] = places.getOrDefault(value.get(), 0.0);
      }
    }
  }

  /**
   * A variable.
   *
   * @param name its name, as columns are named
   * @param values a place per sample of the asset, empty where the value is missing
   */
  public static Variable of(String name, List<Optional<Value>> values) {
    if (name.isBlank()) {
      throw new IllegalArgumentException("a variable must have a name");
    }
    return new Variable(name, values);
  }

  public String name() {
    return name;
  }

  /** Samples, with or without a value. */
  public int size() {
    return present.length;
  }

  /** True where the sample has a value. */
  public boolean has(int sample) {
    return present[sample];
  }

  /** Number to calculate with, of a sample that has a value. */
  public double arithmetic(int sample) {
    return known(arithmetic, sample);
  }

  /**
   * Number that stands for the value's place in the order of all: equal for equal values; of a
   * sample that has a value.
   */
  public double order(int sample) {
    return known(order, sample);
  }

  private double known(double[] numbers, int sample) {
    if (!present[sample]) {
      throw new IllegalStateException(name + " has no value at sample " + sample);
    }
    return numbers[sample];
  }
}
