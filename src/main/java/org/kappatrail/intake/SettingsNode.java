package org.kappatrail.intake;

import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.NearestName;
import org.kappatrail.history.Problem;
import org.kappatrail.history.SourceLine;
import org.kappatrail.history.UnusableInputException;

/** A mapping of the settings with its dotted path; whatever does not fit ends the reading. */
final class SettingsNode {
  private final String file;
  private final String path;
  private final YamlNode.Mapping mapping;

  private SettingsNode(String file, String path, YamlNode.Mapping mapping) {
    this.file = file;
    this.path = path;
    this.mapping = mapping;
  }

  static SettingsNode root(String file, YamlNode node) {
    return of(file, "", node);
  }

  private static SettingsNode of(String file, String path, YamlNode node) {
    if (node instanceof YamlNode.Mapping mapping) {
      return new SettingsNode(file, path, mapping);
    }
    if (node instanceof YamlNode.Scalar scalar && scalar.text().isEmpty()) {
      return new SettingsNode(file, path, new YamlNode.Mapping(Map.of(), node.line()));
    }
    throw unusable(file, node.line(), path, shown(node), "must be keys with values, key: value");
  }

  /** Refuses every key that is not among the valid ones. */
  SettingsNode only(List<String> keys) {
    for (Map.Entry<String, YamlNode.Entry> entry : mapping.entries().entrySet()) {
      if (!keys.contains(entry.getKey())) {
        String nearest = NearestName.of(entry.getKey(), keys).orElse("");
        throw unusable(
            file,
            entry.getValue().line(),
            dotted(entry.getKey()),
            "",
            "is no setting; the nearest is "
                + dotted(nearest)
                + "; valid here: "
                + String.join(", ", keys));
      }
    }
    return this;
  }

  /** Mapping of a key; an empty one where it is missing. */
  SettingsNode child(String key) {
    YamlNode.Entry entry = mapping.entries().get(key);
    YamlNode node = entry == null ? new YamlNode.Mapping(Map.of(), mapping.line()) : entry.value();
    return of(file, dotted(key), node);
  }

  /** Mappings of a list. */
  List<SettingsNode> children(String key) {
    List<SettingsNode> children = new ArrayList<>();
    for (YamlNode item : items(key)) {
      children.add(of(file, dotted(key) + "[" + (children.size() + 1) + "]", item));
    }
    return children;
  }

  /** Texts of a list, or the one text. */
  List<String> texts(String key) {
    YamlNode.Entry entry = mapping.entries().get(key);
    if (entry != null && entry.value() instanceof YamlNode.Scalar) {
      return text(key).map(List::of).orElse(List.of());
    }
    List<String> texts = new ArrayList<>();
    for (YamlNode item : items(key)) {
      if (!(item instanceof YamlNode.Scalar scalar)) {
        throw unusable(file, item.line(), dotted(key), shown(item), "must be a list of texts");
      }
      texts.add(scalar.text());
    }
    return texts;
  }

  private List<YamlNode> items(String key) {
    YamlNode.Entry entry = mapping.entries().get(key);
    if (entry == null
        || (entry.value() instanceof YamlNode.Scalar scalar && scalar.text().isEmpty())) {
      return List.of();
    }
    if (entry.value() instanceof YamlNode.Sequence sequence) {
      return sequence.items();
    }
    throw unusable(
        file, entry.line(), dotted(key), shown(entry.value()), "must be a list; begin with '- '");
  }

  /** Text of a key; empty where missing or blank. */
  Optional<String> text(String key) {
    YamlNode.Entry entry = mapping.entries().get(key);
    if (entry == null) {
      return Optional.empty();
    }
    if (!(entry.value() instanceof YamlNode.Scalar scalar)) {
      throw unusable(file, entry.line(), dotted(key), shown(entry.value()), "must be one text");
    }
    return scalar.text().isEmpty() ? Optional.empty() : Optional.of(scalar.text());
  }

  /** Number of a key, within its range. */
  OptionalDouble number(String key, Limit limit, String example) {
    Optional<String> text = text(key);
    if (text.isEmpty()) {
      return OptionalDouble.empty();
    }
    OptionalDouble number = NumberText.PLAIN.parse(Texts.clean(text.get()));
    if (number.isEmpty() || limit.complaint(number.getAsDouble()).isPresent()) {
      throw bad(key, "must be a number " + limit.text(), example);
    }
    return number;
  }

  /** Whole number of a key, within its range. */
  int wholeNumber(String key, Limit limit, int otherwise, String example) {
    OptionalDouble number = number(key, limit, example);
    if (number.isEmpty()) {
      return otherwise;
    }
    if (number.getAsDouble() != Math.rint(number.getAsDouble())) {
      throw bad(key, "must be a whole number " + limit.text(), example);
    }
    return (int) number.getAsDouble();
  }

  /** Texts by key of a mapping. */
  Map<String, String> textsByKey(String key) {
    SettingsNode child = child(key);
    Map<String, String> texts = new LinkedHashMap<>();
    for (String name : child.keys()) {
      texts.put(name, child.text(name).orElse(""));
    }
    return texts;
  }

  List<String> keys() {
    return List.copyOf(mapping.entries().keySet());
  }

  /** A value that does not fit, with its line, an example and what would fit. */
  UnusableInputException bad(String key, String text, String example) {
    YamlNode.Entry entry = mapping.entries().get(key);
    return unusable(
        file,
        entry == null ? mapping.line() : entry.value().line(),
        dotted(key),
        entry == null ? "" : shown(entry.value()),
        text + (example.isEmpty() ? "" : ", for example " + key + ": " + example));
  }

  private String dotted(String key) {
    return path.isEmpty() ? key : path + "." + key;
  }

  private static String shown(YamlNode node) {
    return node instanceof YamlNode.Scalar scalar ? scalar.text() : "";
  }

  private static UnusableInputException unusable(
      String file, long line, String path, String value, String text) {
    return new UnusableInputException(new Problem(new SourceLine(file, line), path, value, text));
  }
}
