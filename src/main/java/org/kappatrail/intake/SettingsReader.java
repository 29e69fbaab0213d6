package org.kappatrail.intake;

import java.io.IOException;
import java.io.Reader;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.DateTimeException;
import java.time.ZoneId;
import java.time.ZoneOffset;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Settings;
import org.kappatrail.history.UnusableInputException;
import org.kappatrail.tribology.CleanlinessCode;

/** Reads {@code kappatrail.yaml}. Whatever does not fit ends the reading with line and remedy. */
final class SettingsReader {
  static final String FILE = "kappatrail.yaml";

  private static final long LARGEST_BYTES = 4L << 20;
  private static final double TINY = 1e-9;

  private SettingsReader() {}

  /** The settings of a file. */
  static Settings read(Path path) {
    try {
      if (Files.size(path) > LARGEST_BYTES) {
        throw new UnusableInputException(FILE + ": is larger than " + LARGEST_BYTES + " bytes");
      }
      try (Reader reader = Encodings.open(path, StandardCharsets.UTF_8)) {
        StringBuilder text = new StringBuilder();
        char[] buffer = new char[8192];
        for (int count = reader.read(buffer); count > 0; count = reader.read(buffer)) {
          text.append(buffer, 0, count);
        }
        return parse(text.toString());
      }
    } catch (IOException e) {
      throw new UnusableInputException(
          FILE + ": cannot be read (" + e.getMessage() + "); check that it is a readable file", e);
    }
  }

  /** The settings of a text. */
  static Settings parse(String text) {
    String bare = text.startsWith("\uFEFF") ? text.substring(1) : text;
    SettingsNode root =
        SettingsNode.root(FILE, YamlTree.parse(FILE, bare))
            .only(
                List.of(
                    "site",
                    "timezone",
                    "limits",
                    "outlook",
                    "decision",
                    "temperature",
                    "laboratory",
                    "samples",
                    "temperatures"));
    Settings.Duty duty = Settings.Duty.DEFAULT;
    SettingsNode outlook = root.child("outlook").only(List.of("horizon-days"));
    return new Settings(
        root.text("site").orElse(""),
        zone(root),
        limits(root.child("limits")),
        outlook.wholeNumber(
            "horizon-days", new Limit(1, 3660, "days"), Settings.defaults().outlookDays(), "120"),
        decision(root.child("decision")),
        duty(root.child("temperature"), duty),
        laboratory(root.child("laboratory")),
        blocks(root, "samples", MappingReader.Kind.SAMPLES),
        blocks(root, "temperatures", MappingReader.Kind.TEMPERATURES));
  }

  static ZoneId zone(SettingsNode node) {
    Optional<String> name = node.text("timezone");
    if (name.isEmpty()) {
      return ZoneOffset.UTC;
    }
    try {
      return ZoneId.of(name.get().strip());
    } catch (DateTimeException e) {
      throw node.bad("timezone", "is no time zone; write an IANA name or UTC", "Europe/London");
    }
  }

  private static Settings.Limits limits(SettingsNode node) {
    node.only(List.of("kappa-floor", "water-ppm", "iso-4406", "acid-number-rise"));
    Optional<CleanlinessCode> code = Optional.empty();
    Optional<String> written = node.text("iso-4406");
    if (written.isPresent()) {
      try {
        code = Optional.of(CleanlinessCode.parse(written.get()));
      } catch (IllegalArgumentException e) {
        throw node.bad("iso-4406", e.getMessage() + "; numbers from 0 to 30", "18/16/13");
      }
    }
    return new Settings.Limits(
        node.number("kappa-floor", new Limit(0.1, 10, ""), "1.0")
            .orElse(Settings.defaults().limits().kappaFloor()),
        node.number("water-ppm", new Limit(TINY, 1e6, "ppm"), "300"),
        code,
        node.number("acid-number-rise", new Limit(TINY, 100, "mg KOH/g"), "0.5"));
  }

  private static Settings.Decision decision(SettingsNode node) {
    node.only(List.of("horizon-days", "failure-cost-ratio"));
    Settings.Decision usual = Settings.defaults().decision();
    return new Settings.Decision(
        node.wholeNumber("horizon-days", new Limit(1, 36_600, "days"), usual.horizonDays(), "365"),
        node.number("failure-cost-ratio", new Limit(TINY, 1e9, ""), "60")
            .orElse(usual.failureCostRatio()));
  }

  private static Settings.Duty duty(SettingsNode node, Settings.Duty usual) {
    node.only(List.of("window-days", "gap-minutes", "running-speed-percent", "uncertainty-c"));
    return new Settings.Duty(
        node.wholeNumber("window-days", new Limit(1, 366, "days"), usual.windowDays(), "7"),
        node.wholeNumber("gap-minutes", new Limit(1, 527_040, "minutes"), usual.gapMinutes(), "60"),
        node.number("running-speed-percent", new Limit(0, 100, "%"), "10")
            .orElse(usual.runningSpeedPercent()),
        node.number("uncertainty-c", new Limit(0, 50, "°C"), "1.5").orElse(usual.uncertaintyC()));
  }

  private static Settings.Laboratory laboratory(SettingsNode node) {
    node.only(List.of("viscosity-reproducibility-percent", "same-laboratory-percent"));
    Limit percent = new Limit(TINY, 100, "%");
    OptionalDouble between = node.number("viscosity-reproducibility-percent", percent, "1.2");
    return new Settings.Laboratory(between, node.number("same-laboratory-percent", percent, "0.8"));
  }

  private static List<ExportMapping> blocks(
      SettingsNode root, String key, MappingReader.Kind kind) {
    List<ExportMapping> blocks = new ArrayList<>();
    for (SettingsNode block : root.children(key)) {
      blocks.add(MappingReader.read(block, kind));
    }
    return blocks;
  }
}
