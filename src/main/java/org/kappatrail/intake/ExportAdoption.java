package org.kappatrail.intake;

import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import org.kappatrail.history.UnusableInputException;

/**
 * Looks at a foreign export and writes the block for {@code kappatrail.yaml} that reads it. What
 * names and values do not settle is said in a comment; the first rows follow as the block reads
 * them.
 */
public final class ExportAdoption {
  private ExportAdoption() {}

  /**
   * The block for a file, with comments and its first rows; the whole text is valid YAML.
   *
   * @throws UnusableInputException where the file cannot be read or holds no table
   */
  public static String adopt(Path file) {
    if (file.getFileName() == null) {
      throw new UnusableInputException(file + ": is no file; give an export to adopt");
    }
    String name = file.getFileName().toString();
    AdoptionGrid grid = AdoptionGrid.read(file);
    GridShape shape =
        GridShape.of(grid)
            .orElseThrow(
                () ->
                    new UnusableInputException(
                        name
                            + ": no table is found: it needs a line that names the columns and below"
                            + " it lines with numbers or dates"));
    List<RawTable.Header> headers = Headers.of(shape.header());
    List<ColumnGuess> lab = ColumnGuess.ofSamples(headers, shape.body());
    List<ColumnGuess> log = ColumnGuess.ofReadings(headers, shape.body());
    AdoptionBlock block =
        isLog(lab, log, name)
            ? new AdoptionBlock(file, MappingReader.Kind.TEMPERATURES, grid, shape, log)
            : new AdoptionBlock(file, MappingReader.Kind.SAMPLES, grid, shape, lab);
    String yaml = block.yaml();
    return yaml + AdoptionPreview.of(block, grid, yaml);
  }

  /**
   * Time and no more than temperatures, speeds and tags make a log; anything of an oil does not.
   */
  private static boolean isLog(List<ColumnGuess> lab, List<ColumnGuess> log, String name) {
    List<String> ofOil = new ArrayList<>();
    for (ColumnGuess guess : lab) {
      Optional<String> column = guess.canonical().filter(found -> guess.doubt().isEmpty());
      column.filter(found -> !Units.of(found).isEmpty()).ifPresent(ofOil::add);
      column.filter(found -> found.equals("sample")).ifPresent(ofOil::add);
    }
    ofOil.removeIf(column -> column.equals("temperature_c"));
    String lower = name.toLowerCase(Locale.ROOT);
    if (lower.endsWith(".csv.gz")) {
      return true;
    }
    return ofOil.isEmpty()
        && !lower.endsWith(".xlsx")
        && log.stream().anyMatch(guess -> guess.is("time"));
  }
}
