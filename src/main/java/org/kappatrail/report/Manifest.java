package org.kappatrail.report;

import com.fasterxml.jackson.databind.ObjectMapper;
import com.fasterxml.jackson.databind.SerializationFeature;
import com.fasterxml.jackson.databind.node.ArrayNode;
import com.fasterxml.jackson.databind.node.ObjectNode;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.FileAccount;
import org.kappatrail.history.Settings;
import org.kappatrail.review.Review;

/**
 * What a pack was made from: program version, settings in force, and every input file with its
 * SHA-256.
 *
 * @param programVersion version of the program
 * @param inputs input files in order
 */
public record Manifest(String programVersion, List<Input> inputs) {

  /**
   * An input file.
   *
   * @param file path within the history folder
   * @param bytes size
   * @param sha256 fingerprint, hexadecimal
   */
  public record Input(String file, long bytes, String sha256) {}

  public Manifest {
    inputs = List.copyOf(inputs);
  }

  void write(Path file, Review review) throws IOException {
    ObjectMapper json = new ObjectMapper().enable(SerializationFeature.INDENT_OUTPUT);
    ObjectNode root = json.createObjectNode();
    root.put("program", "kappatrail");
    root.put("version", programVersion);
    root.put("as_of", review.asOf().toString());
    settings(root.putObject("settings"), review.settings());
    ArrayNode files = root.putArray("inputs");
    for (Input input : inputs) {
      ObjectNode node = files.addObject();
      node.put("file", input.file());
      node.put("bytes", input.bytes());
      node.put("sha256", input.sha256());
    }
    ArrayNode accounts = root.putArray("rows");
    for (FileAccount account : review.files()) {
      ObjectNode node = accounts.addObject();
      node.put("file", account.file());
      node.put("kind", account.kind().name().toLowerCase(Locale.ROOT));
      node.put("read", account.rowsRead());
      node.put("used", account.rowsUsed());
      node.put("rejected", account.rowsRejected());
      ObjectNode reasons = node.putObject("reasons");
      account.rejected().forEach(reasons::put);
      node.put("counted", account.fileRows().isPresent() ? "readings" : "rows");
      account.fileRows().ifPresent(rows -> node.put("file_rows", rows));
    }
    root.put("problems", review.problems().size());
    String text = json.writeValueAsString(root).replace("\r\n", "\n") + "\n";
    Files.writeString(file, text, StandardCharsets.UTF_8);
  }

  private static void settings(ObjectNode node, Settings settings) {
    node.put("site", settings.site());
    node.put("timezone", settings.zone().getId());
    ObjectNode limits = node.putObject("limits");
    limits.put("kappa-floor", settings.limits().kappaFloor());
    put(limits, "water-ppm", settings.limits().waterPpm());
    Optional<String> code = settings.limits().cleanliness().map(Object::toString);
    limits.put("iso-4406", code.orElse(null));
    put(limits, "acid-number-rise", settings.limits().acidNumberRise());
    node.putObject("outlook").put("horizon-days", settings.outlookDays());
    ObjectNode decision = node.putObject("decision");
    decision.put("horizon-days", settings.decision().horizonDays());
    decision.put("failure-cost-ratio", settings.decision().failureCostRatio());
    ObjectNode duty = node.putObject("temperature");
    duty.put("window-days", settings.duty().windowDays());
    duty.put("gap-minutes", settings.duty().gapMinutes());
    duty.put("running-speed-percent", settings.duty().runningSpeedPercent());
    duty.put("uncertainty-c", settings.duty().uncertaintyC());
    ObjectNode laboratory = node.putObject("laboratory");
    put(
        laboratory,
        "viscosity-reproducibility-percent",
        settings.laboratory().reproducibilityPercent());
    put(laboratory, "same-laboratory-percent", settings.laboratory().sameLaboratoryPercent());
  }

  private static void put(ObjectNode node, String name, OptionalDouble value) {
    if (value.isPresent()) {
      node.put(name, value.getAsDouble());
    } else {
      node.putNull(name);
    }
  }
}
