package org.kappatrail.duty;

import java.util.Collections;
import java.util.EnumMap;
import java.util.Map;
import java.util.TreeMap;

/**
 * Why the readings of a file were used or left out.
 *
 * @param file path within the history folder, or the table of a database
 * @param counts readings by what became of them; none where a state is absent
 */
public record ReadingFates(String file, Map<ReadingState, Long> counts) {
  public ReadingFates {
    EnumMap<ReadingState, Long> copy = new EnumMap<>(ReadingState.class);
    copy.putAll(counts);
    counts = Collections.unmodifiableMap(copy);
  }

  public long count(ReadingState state) {
    return counts.getOrDefault(state, 0L);
  }

  public long total() {
    return counts.values().stream().mapToLong(Long::longValue).sum();
  }

  /** Readings left out, by reason. */
  public Map<String, Long> rejected() {
    Map<String, Long> rejected = new TreeMap<>();
    counts.forEach(
        (state, readings) -> {
          if (!state.isUsed()) {
            rejected.put(state.label(), readings);
          }
        });
    return rejected;
  }

  public long used() {
    return counts.entrySet().stream()
        .filter(entry -> entry.getKey().isUsed())
        .mapToLong(Map.Entry::getValue)
        .sum();
  }
}
