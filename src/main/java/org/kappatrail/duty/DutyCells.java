package org.kappatrail.duty;

import java.util.Arrays;

/**
 * What one bearing did, as columns of primitives: a row per calendar day and cell of temperature
 * and speed while running, and a row per day of standstill. Rows are in order of day, running
 * first, then temperature and speed cell.
 */
public final class DutyCells {
  private final int[] epochDays;
  private final boolean[] running;
  private final long[] millis;
  private final long[] readings;
  private final double[] temperaturesC;
  private final double[] lowestC;
  private final double[] highestC;
  private final boolean[] speedLogged;
  private final double[] speedsRpm;

  private DutyCells(Builder rows) {
    epochDays = Arrays.copyOf(rows.epochDays, rows.size);
    running = Arrays.copyOf(rows.running, rows.size);
    millis = Arrays.copyOf(rows.millis, rows.size);
    readings = Arrays.copyOf(rows.readings, rows.size);
    temperaturesC = Arrays.copyOf(rows.temperaturesC, rows.size);
    lowestC = Arrays.copyOf(rows.lowestC, rows.size);
    highestC = Arrays.copyOf(rows.highestC, rows.size);
    speedLogged = Arrays.copyOf(rows.speedLogged, rows.size);
    speedsRpm = Arrays.copyOf(rows.speedsRpm, rows.size);
  }

  /** Cells of a bearing without any log. */
  public static DutyCells none() {
    return new Builder().build();
  }

  public int size() {
    return epochDays.length;
  }

  /** Local calendar day, days since 1970-01-01. */
  public int epochDay(int row) {
    return epochDays[row];
  }

  /** False for the day's standstill. */
  public boolean running(int row) {
    return running[row];
  }

  /** Time that the cell's readings count for, ms. */
  public long millis(int row) {
    return millis[row];
  }

  /** Number of readings in the cell. */
  public long readings(int row) {
    return readings[row];
  }

  /** Time-weighted mean of the logged temperature, °C; the bearing's offset is not in it. */
  public double temperatureC(int row) {
    return temperaturesC[row];
  }

  /** Lowest reading of the cell, °C. */
  public double lowestC(int row) {
    return lowestC[row];
  }

  /** Highest reading of the cell, °C. */
  public double highestC(int row) {
    return highestC[row];
  }

  /** True where the speed was logged; otherwise the speed is the bearing's nominal one. */
  public boolean speedLogged(int row) {
    return speedLogged[row];
  }

  /** Time-weighted mean speed, r/min. */
  public double speedRpm(int row) {
    return speedsRpm[row];
  }

  /** Collects rows in their order. */
  public static final class Builder {
    private int size;
    private int[] epochDays = new int[64];
    private boolean[] running = new boolean[64];
    private long[] millis = new long[64];
    private long[] readings = new long[64];
    private double[] temperaturesC = new double[64];
    private double[] lowestC = new double[64];
    private double[] highestC = new double[64];
    private boolean[] speedLogged = new boolean[64];
    private double[] speedsRpm = new double[64];

    /** Adds a row; see the accessors of {@link DutyCells} for units. */
    public Builder add(
        int epochDay,
        boolean isRunning,
        long cellMillis,
        long cellReadings,
        double temperatureC,
        double lowestInCellC,
        double highestInCellC,
        boolean isSpeedLogged,
        double speedRpm) {
      if (size == epochDays.length) {
        grow();
      }
      epochDays[size] = epochDay;
      running[size] = isRunning;
      millis[size] = cellMillis;
      readings[size] = cellReadings;
      temperaturesC[size] = temperatureC;
      lowestC[size] = lowestInCellC;
      highestC[size] = highestInCellC;
      speedLogged[size] = isSpeedLogged;
      speedsRpm[size] = speedRpm;
      size++;
      return this;
    }

    /** Starts anew. */
    public void clear() {
      size = 0;
    }

    public DutyCells build() {
      return new DutyCells(this);
    }

    private void grow() {
      int capacity = size * 2;
      epochDays = Arrays.copyOf(epochDays, capacity);
      running = Arrays.copyOf(running, capacity);
      millis = Arrays.copyOf(millis, capacity);
      readings = Arrays.copyOf(readings, capacity);
      temperaturesC = Arrays.copyOf(temperaturesC, capacity);
      lowestC = Arrays.copyOf(lowestC, capacity);
      highestC = Arrays.copyOf(highestC, capacity);
      speedLogged = Arrays.copyOf(speedLogged, capacity);
      speedsRpm = Arrays.copyOf(speedsRpm, capacity);
    }
  }
}
