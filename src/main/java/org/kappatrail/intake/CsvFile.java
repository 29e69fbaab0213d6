package org.kappatrail.intake;

import java.io.IOException;
import java.nio.charset.Charset;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.ExportMapping;
import org.kappatrail.history.UnusableInputException;

/** Reads a CSV file of the register or of samples whole. */
final class CsvFile {
  /** Largest file that is read, bytes: registers and samples are small. */
  static final long LARGEST_BYTES = 256L << 20;

  private CsvFile() {}

  /**
   * The table of a file.
   *
   * @param path where it lies
   * @param file its name in messages
   * @param mapping how it is read
   * @throws UnusableInputException where it cannot be opened or has no header
   */
  static RawTable read(Path path, String file, ExportMapping mapping) {
    try {
      long bytes = Files.size(path);
      if (bytes > LARGEST_BYTES) {
        throw new UnusableInputException(
            file + ": is larger than " + LARGEST_BYTES + " bytes; logs belong into temperatures/");
      }
      Charset charset = mapping.encoding().flatMap(Encodings::find).orElse(StandardCharsets.UTF_8);
      try (TextLines lines = new TextLines(Encodings.open(path, charset))) {
        return read(lines, file, mapping);
      }
    } catch (IOException e) {
      throw new UnusableInputException(
          file + ": cannot be read (" + e.getMessage() + "); check that it is there and readable",
          e);
    }
  }

  private static RawTable read(TextLines lines, String file, ExportMapping mapping)
      throws IOException {
    HeadLines head = HeadLines.read(lines, mapping);
    if (head.rows().isEmpty()) {
      throw new UnusableInputException(
          file + ": is empty; the first line must name the columns, such as sample,asset");
    }
    List<RawTable.Header> header = Headers.of(head.rows());
    List<RawRow> rows = new ArrayList<>();
    CsvRows source = new CsvRows(lines, head.delimiter());
    @Nullable RawRow row = source.next();
    while (row != null && !isFooter(row, mapping)) {
      if (!row.isBlank()) {
        rows.add(row);
      }
      row = source.next();
    }
    return new RawTable(file, header, head.rows().get(0).line(), rows, List.of(), false);
  }

  /** True where the row starts the footer that the settings name. */
  static boolean isFooter(RawRow row, ExportMapping mapping) {
    return mapping
        .footer()
        .filter(
            start ->
                row.cell(0).toLowerCase(Locale.ROOT).startsWith(start.toLowerCase(Locale.ROOT)))
        .isPresent();
  }
}
