package org.kappatrail.intake;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** A node of a YAML text that knows its line. */
sealed interface YamlNode {
  /** Line as an editor shows it. */
  long line();

  /** A scalar as it is written; empty text for a null. */
  record Scalar(String text, long line) implements YamlNode {}

  /** A list. */
  record Sequence(List<YamlNode> items, long line) implements YamlNode {
    public Sequence {
      items = List.copyOf(items);
    }
  }

  /** A mapping in the order of its keys. */
  record Mapping(Map<String, Entry> entries, long line) implements YamlNode {
    public Mapping {
      entries = java.util.Collections.unmodifiableMap(new LinkedHashMap<>(entries));
    }
  }

  /** A value with the line of its key. */
  record Entry(YamlNode value, long line) {}
}
