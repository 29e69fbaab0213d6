package org.kappatrail.demo;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.NamedCsvRecord;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.Stream;

/** The committed files, read without the program. */
final class SampleHistory {
  private static final Path FOLDER = Path.of("sample-history");

  private SampleHistory() {}

  static List<NamedCsvRecord> rows(String file) {
    try (CsvReader<NamedCsvRecord> reader =
        CsvReader.builder().ofNamedCsvRecord(FOLDER.resolve(file))) {
      return reader.stream().toList();
    } catch (IOException e) {
      throw new UncheckedIOException(e);
    }
  }

  /** Samples of both laboratories in time. */
  static List<NamedCsvRecord> samples() {
    return Stream.of("fell-lab.csv", "north-lab-2024-2025.csv", "north-lab-2026.csv")
        .flatMap(file -> rows("samples/" + file).stream())
        .sorted(Comparator.comparing(row -> row.getField("sampled_at")))
        .toList();
  }

  static List<NamedCsvRecord> samplesOf(String asset) {
    return samples().stream().filter(row -> row.getField("asset").equals(asset)).toList();
  }

  /** A measured number; empty where missing or below a limit. */
  static OptionalDouble number(NamedCsvRecord row, String column) {
    String cell = row.findField(column).orElse("");
    return cell.isEmpty() || cell.equals("-") || cell.startsWith("<")
        ? OptionalDouble.empty()
        : OptionalDouble.of(Double.parseDouble(cell));
  }
}
