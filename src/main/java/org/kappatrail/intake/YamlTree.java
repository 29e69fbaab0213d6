package org.kappatrail.intake;

import com.fasterxml.jackson.core.JsonLocation;
import com.fasterxml.jackson.core.JsonProcessingException;
import com.fasterxml.jackson.core.JsonToken;
import com.fasterxml.jackson.dataformat.yaml.YAMLFactory;
import com.fasterxml.jackson.dataformat.yaml.YAMLParser;
import java.io.IOException;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.UnusableInputException;

/** Reads a YAML text into nodes that know their lines, without taking any scalar for a type. */
final class YamlTree {
  private static final int DEEPEST = 20;
  private static final Pattern PLACE = Pattern.compile("line (\\d+), column (\\d+)");

  private final String file;
  private final YAMLParser parser;

  private YamlTree(String file, YAMLParser parser) {
    this.file = file;
    this.parser = parser;
  }

  /**
   * The one document of a text; an empty mapping for an empty text.
   *
   * @throws UnusableInputException with line and column where the text is no YAML
   */
  static YamlNode parse(String file, String text) {
    try (YAMLParser parser = new YAMLFactory().createParser(text)) {
      YamlTree tree = new YamlTree(file, parser);
      @Nullable JsonToken token = parser.nextToken();
      if (token == null || (token == JsonToken.VALUE_NULL && parser.getText().isBlank())) {
        return new YamlNode.Mapping(Map.of(), 1);
      }
      YamlNode root = tree.node(token, 0);
      if (parser.nextToken() != null) {
        throw tree.unusable(parser.currentTokenLocation(), "a second document; keep one only");
      }
      return root;
    } catch (JsonProcessingException e) {
      throw malformed(file, e);
    } catch (IOException e) {
      throw new UnusableInputException(file + ": cannot be read (" + e.getMessage() + ")", e);
    }
  }

  private YamlNode node(JsonToken token, int depth) throws IOException {
    if (depth > DEEPEST) {
      throw unusable(parser.currentTokenLocation(), "nested deeper than settings ever are");
    }
    long line = Math.max(1, parser.currentTokenLocation().getLineNr());
    if (parser.isCurrentAlias()) {
      throw unusable(parser.currentTokenLocation(), "an alias (*name); write the value out");
    }
    return switch (token) {
      case START_OBJECT -> mapping(line, depth);
      case START_ARRAY -> sequence(line, depth);
      case VALUE_NULL -> new YamlNode.Scalar("", line);
      default -> new YamlNode.Scalar(parser.getText(), line);
    };
  }

  private YamlNode mapping(long line, int depth) throws IOException {
    Map<String, YamlNode.Entry> entries = new LinkedHashMap<>();
    while (parser.nextToken() == JsonToken.FIELD_NAME) {
      JsonLocation place = parser.currentTokenLocation();
      String key = parser.currentName();
      YamlNode value = node(parser.nextToken(), depth + 1);
      YamlNode.Entry entry = new YamlNode.Entry(value, place.getLineNr());
      if (entries.put(key, entry) != null) {
        throw unusable(place, "the key '" + key + "' stands twice; keep one of them");
      }
    }
    return new YamlNode.Mapping(entries, line);
  }

  private YamlNode sequence(long line, int depth) throws IOException {
    List<YamlNode> items = new ArrayList<>();
    JsonToken token = parser.nextToken();
    while (token != JsonToken.END_ARRAY) {
      items.add(node(token, depth + 1));
      token = parser.nextToken();
    }
    return new YamlNode.Sequence(items, line);
  }

  private UnusableInputException unusable(JsonLocation place, String text) {
    return new UnusableInputException(
        file + ":" + place.getLineNr() + ":" + place.getColumnNr() + ": " + text);
  }

  /** The last place and reason that the parser names: where it could not go on. */
  private static UnusableInputException malformed(String file, JsonProcessingException e) {
    String message = e.getOriginalMessage();
    Matcher place = PLACE.matcher(message);
    String where = "";
    while (place.find()) {
      where = ":" + place.group(1) + ":" + place.group(2);
    }
    if (where.isEmpty() && e.getLocation() != null) {
      where = ":" + e.getLocation().getLineNr() + ":" + e.getLocation().getColumnNr();
    }
    String reason =
        message
            .lines()
            .filter(line -> !line.isBlank() && !line.startsWith(" "))
            .reduce((first, last) -> last)
            .orElse("");
    return new UnusableInputException(
        file
            + where
            + ": not well-formed YAML ("
            + reason
            + "); check indentation, colons and quotes there",
        e);
  }
}
