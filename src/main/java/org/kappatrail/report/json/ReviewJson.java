package org.kappatrail.report.json;

import java.io.BufferedOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.OutputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.LocalDate;
import java.util.List;
import java.util.Optional;
import java.util.stream.Stream;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Settings;
import org.kappatrail.review.Finding;
import org.kappatrail.review.Level;
import org.kappatrail.review.Review;
import org.kappatrail.review.Since;
import org.kappatrail.review.correlation.Link;
import org.kappatrail.review.correlation.PairCorrelation;

/**
 * The review as one JSON document, for programs. Its schema lies beside it in the pack; within one
 * version of the schema fields are added, none is renamed or dropped. The daily κ is left to its
 * table.
 */
public final class ReviewJson {
  /** Version of the schema. */
  public static final int SCHEMA = 1;

  /** Name of the schema's file. */
  public static final String SCHEMA_FILE = "review-schema-" + SCHEMA + ".json";

  private final Review review;
  private final String programVersion;

  public ReviewJson(Review review, String programVersion) {
    this.review = review;
    this.programVersion = programVersion;
  }

  /** Writes the document and, beside it, its schema. */
  public void write(Path file) throws IOException {
    try (OutputStream out = new BufferedOutputStream(Files.newOutputStream(file));
        JsonOut json = new JsonOut(out)) {
      json.root(() -> body(json));
    }
    try (InputStream schema = ReviewJson.class.getResourceAsStream(SCHEMA_FILE)) {
      if (schema == null) {
        throw new IllegalStateException("the program lacks " + SCHEMA_FILE);
      }
      Files.write(file.resolveSibling(SCHEMA_FILE), schema.readAllBytes());
    }
  }

  private void body(JsonOut json) throws IOException {
    Settings settings = review.settings();
    json.text("$schema", SCHEMA_FILE)
        .whole("schema", SCHEMA)
        .text("program", "kappatrail")
        .text("version", programVersion)
        .text("site", settings.site())
        .text("as_of", review.asOf().toString())
        .text("timezone", settings.zone().getId())
        .object("limits", () -> limits(json, settings.limits()))
        .objects("assets", review.assets(), asset -> new AssetJson(json, asset).write())
        .objects("correlations", called(), test -> correlation(json, test))
        .object("since", review.since(), since -> since(json, since))
        .objects("problems", review.problems(), problem -> problem(json, problem));
  }

  /** What is called; the table has every test. */
  private List<PairCorrelation> called() {
    return Stream.concat(
            review.correlations().fleet().stream(), review.correlations().assets().stream())
        .filter(test -> test.q().isPresent() && test.q().getAsDouble() <= Link.LIMIT)
        .toList();
  }

  private static void correlation(JsonOut json, PairCorrelation test) throws IOException {
    json.text("scope", test.scope().label())
        .text("asset", test.asset())
        .text("x", test.x())
        .text("y", test.y())
        .whole("lag", test.lag())
        .text("form", test.form().label())
        .whole("n", test.n())
        .number("n_effective", test.nEffective())
        .number("coefficient", test.coefficient())
        .number("low", test.low())
        .number("high", test.high())
        .number("p", test.p())
        .number("q", test.q());
  }

  private static void limits(JsonOut json, Settings.Limits limits) throws IOException {
    json.number("kappa_floor", limits.kappaFloor())
        .number("water_ppm", limits.waterPpm())
        .text("iso_4406", limits.cleanliness().map(Object::toString))
        .number("acid_number_rise", limits.acidNumberRise());
  }

  private static void since(JsonOut json, Since since) throws IOException {
    json.text("date", since.date().toString())
        .objects(
            "items",
            since.items(),
            item -> {
              json.text("change", item.change().label())
                  .text("level_before", item.before().map(Level::label))
                  .text("asset", item.finding().asset());
              finding(json, item.finding());
            });
  }

  static void finding(JsonOut json, Finding finding) throws IOException {
    json.text("bearing", finding.bearing())
        .text("sample", finding.sample())
        .text("level", finding.level().label())
        .text("finding", finding.kind().label())
        .text("message", finding.message());
  }

  private static void problem(JsonOut json, Problem problem) throws IOException {
    json.text("file", problem.source().file());
    if (problem.source().line() > 0) {
      json.whole("line", problem.source().line());
    } else {
      json.unknown("line");
    }
    json.text("column", problem.column())
        .text("value", problem.value())
        .text("problem", problem.text());
  }

  static Optional<String> day(Optional<LocalDate> day) {
    return day.map(LocalDate::toString);
  }
}
