package org.kappatrail.intake;

import java.util.LinkedHashMap;
import java.util.Map;
import java.util.TreeMap;
import org.kappatrail.history.Measurement;
import org.kappatrail.history.PlantHistory;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import tech.tablesaw.api.DateTimeColumn;
import tech.tablesaw.api.DoubleColumn;
import tech.tablesaw.api.StringColumn;
import tech.tablesaw.api.Table;

/**
 * The samples of a history as one typed table: a row per sample, a column of numbers per quantity
 * and beside it one of its bounds, {@code <}, {@code >} or empty. Types are stated, never inferred;
 * a missing value is missing.
 */
public final class SampleTable {
  /** Ending of the column that holds the bounds of a quantity. */
  public static final String BOUND_SUFFIX = "_bound";

  private SampleTable() {}

  /** The table of all samples, asset by asset in time. */
  public static Table of(PlantHistory history) {
    StringColumn ids = StringColumn.create(SampleColumns.SAMPLE);
    StringColumn assets = StringColumn.create(SampleColumns.ASSET);
    DateTimeColumn times = DateTimeColumn.create(SampleColumns.SAMPLED_AT);
    StringColumn laboratories = StringColumn.create(SampleColumns.LABORATORY);
    StringColumn codes = StringColumn.create(SampleColumns.ISO_4406);
    Map<String, DoubleColumn> numbers = numberColumns(history);
    Map<String, StringColumn> bounds = new TreeMap<>();
    numbers.keySet().forEach(name -> bounds.put(name, StringColumn.create(name + BOUND_SUFFIX)));
    for (Sample sample : history.samples()) {
      ids.append(sample.id());
      assets.append(sample.asset());
      times.append(sample.sampledAt());
      laboratories.append(sample.laboratory());
      codes.append(sample.statedCode().map(Object::toString).orElse(""));
      for (Map.Entry<String, DoubleColumn> entry : numbers.entrySet()) {
        Measurement value = sample.find(entry.getKey()).orElse(null);
        StringColumn bound = bounds.get(entry.getKey());
        if (value == null) {
          entry.getValue().appendMissing();
        } else {
          entry.getValue().append(value.stated());
        }
        if (bound != null) {
          bound.append(sign(value));
        }
      }
    }
    Table table = Table.create("samples", ids, assets, times, laboratories, codes);
    for (Map.Entry<String, DoubleColumn> entry : numbers.entrySet()) {
      table.addColumns(entry.getValue());
    }
    bounds.values().forEach(table::addColumns);
    return table;
  }

  /** Columns of the program in the order of the contract, then the further ones by name. */
  private static Map<String, DoubleColumn> numberColumns(PlantHistory history) {
    TreeMap<String, DoubleColumn> found = new TreeMap<>();
    for (Sample sample : history.samples()) {
      for (String name : sample.values().keySet()) {
        found.computeIfAbsent(name, DoubleColumn::create);
      }
    }
    Map<String, DoubleColumn> ordered = new LinkedHashMap<>();
    for (String name : SampleColumns.NUMERIC) {
      DoubleColumn column = found.remove(name);
      if (column != null) {
        ordered.put(name, column);
      }
    }
    ordered.putAll(found);
    return ordered;
  }

  private static String sign(@org.jspecify.annotations.Nullable Measurement value) {
    if (value instanceof Measurement.Below) {
      return "<";
    }
    return value instanceof Measurement.Above ? ">" : "";
  }
}
