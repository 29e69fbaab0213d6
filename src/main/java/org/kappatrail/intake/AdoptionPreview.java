package org.kappatrail.intake;

import java.math.BigDecimal;
import java.math.MathContext;
import java.time.ZoneId;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.Set;
import java.util.stream.Collectors;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.Measurement;
import org.kappatrail.history.Problem;
import org.kappatrail.history.Sample;
import org.kappatrail.history.Settings;
import org.kappatrail.history.UnusableInputException;

/** The first rows of a foreign export as the block reads them, as comments. */
final class AdoptionPreview {
  private static final int ROWS = 5;

  private AdoptionPreview() {}

  static String of(AdoptionBlock block, AdoptionGrid grid, String yaml) {
    Settings settings = SettingsReader.parse(yaml);
    StringBuilder out = new StringBuilder("# First rows as this block reads them:\n");
    List<String> lines =
        block.kind() == MappingReader.Kind.SAMPLES
            ? samples(block, grid, settings)
            : readings(block, settings);
    for (String line : lines) {
      out.append("#   ").append(line.replaceAll("[\\r\\n]+", " ")).append('\n');
    }
    return out.toString();
  }

  private static List<String> samples(AdoptionBlock block, AdoptionGrid grid, Settings settings) {
    ExportMapping mapping = settings.sampleExports().get(0);
    List<RawRow> first = block.shape().body().stream().limit(ROWS).toList();
    RawTable table =
        new RawTable(
            block.name(),
            Headers.of(block.shape().header()),
            block.shape().header().get(0).line(),
            first,
            List.of(),
            grid.use1904());
    Set<String> assets =
        block.columns().stream()
            .filter(guess -> guess.is("asset"))
            .flatMap(guess -> guess.values().stream())
            .collect(Collectors.toSet());
    List<Problem> problems = new ArrayList<>();
    SampleReader.Context context =
        new SampleReader.Context(settings.zone(), assets, Map.of(), Optional.empty(), problems);
    List<String> lines = new ArrayList<>();
    try {
      SampleFile read = new SampleReader(table, mapping, context).read();
      read.samples().forEach(sample -> lines.add(words(sample)));
      problems.forEach(problem -> lines.add("not used: " + problem));
      read.notes().forEach(lines::add);
    } catch (UnusableInputException e) {
      lines.add("none yet: " + e.getMessage());
    }
    return lines;
  }

  private static String words(Sample sample) {
    StringBuilder words = new StringBuilder();
    words.append("sample ").append(sample.id());
    words.append(", asset ").append(sample.asset());
    words.append(", sampled_at ").append(sample.sampledAtText());
    sample.receivedOn().ifPresent(day -> words.append(", received_on ").append(day));
    if (!sample.laboratory().isEmpty()) {
      words.append(", laboratory ").append(sample.laboratory());
    }
    for (Map.Entry<String, Measurement> entry : sample.values().entrySet()) {
      words.append(", ").append(entry.getKey()).append(' ').append(shown(entry.getValue()));
    }
    sample.statedCode().ifPresent(code -> words.append(", iso_4406 ").append(code));
    return words.toString();
  }

  private static List<String> readings(AdoptionBlock block, Settings settings) {
    ExportMapping mapping = settings.logExports().get(0);
    ZoneId zone = mapping.timezone().map(ZoneId::of).orElse(settings.zone());
    DateText dates = new DateText(mapping.dateFormat(), zone, settings.zone(), false);
    NumberText numbers = NumberText.of(mapping);
    List<String> lines = new ArrayList<>();
    for (RawRow row : block.shape().body().stream().limit(ROWS).toList()) {
      List<String> words = new ArrayList<>();
      for (ColumnGuess guess : block.columns()) {
        String text = row.cell(guess.position());
        String name = guess.canonical().orElse(guess.header().name());
        boolean tag = guess.canonical().isEmpty() && block.isWide() && guess.isMostlyNumbers();
        if (guess.is("time")) {
          text = block.timeText(row, guess);
          words.add("time " + dates.parse(text, false).map(m -> m.at().toString()).orElse("?"));
        } else if (tag || List.of("temperature_c", "speed_rpm", "value").contains(name)) {
          words.add(name + " " + number(text, name, mapping, numbers));
        } else if (guess.canonical().isPresent() && !guess.is("time_of_day")) {
          words.add(name + " " + text);
        }
      }
      lines.add(String.join(", ", words));
    }
    return lines;
  }

  private static String number(
      String text, String name, ExportMapping mapping, NumberText numbers) {
    if (Texts.isMissing(text)) {
      return "missing";
    }
    return MeasurementText.parse(text, numbers)
        .map(
            value -> {
              String unit = mapping.units().get(name);
              double inside =
                  unit == null
                      ? value.stated()
                      : Units.toInside(name, unit).applyAsDouble(value.stated());
              return shown(inside);
            })
        .orElse("? ('" + text + "')");
  }

  private static String shown(Measurement value) {
    String bound =
        value instanceof Measurement.Below ? "<" : value instanceof Measurement.Above ? ">" : "";
    return bound + shown(value.stated());
  }

  private static String shown(double value) {
    return new BigDecimal(value).round(new MathContext(6)).stripTrailingZeros().toPlainString();
  }
}
