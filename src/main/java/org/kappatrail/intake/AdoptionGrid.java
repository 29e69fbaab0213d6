package org.kappatrail.intake;

import java.io.BufferedInputStream;
import java.io.IOException;
import java.io.InputStream;
import java.io.InputStreamReader;
import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.Charset;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.zip.GZIPInputStream;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.UnusableInputException;

/**
 * The cells of a foreign file before anything is known of it.
 *
 * @param rows its rows from the top; blank ones are passed over
 * @param delimiter delimiter of a text; empty for a workbook
 * @param encoding encoding of a text; empty for a workbook
 * @param sheet sheet of a workbook with several
 * @param whole true where the rows are all of the file's
 * @param tail last rows of a longer file
 * @param use1904 true for a workbook that counts days from 1904
 */
record AdoptionGrid(
    List<RawRow> rows,
    Optional<Character> delimiter,
    Optional<String> encoding,
    Optional<String> sheet,
    boolean whole,
    List<RawRow> tail,
    boolean use1904) {
  private static final int MOST_LINES = 5_000;
  private static final int TAIL_LINES = 30;
  private static final int PROBE_BYTES = 1 << 20;
  private static final char[] DELIMITERS = {';', '\t', '|', ','};

  AdoptionGrid {
    rows = List.copyOf(rows);
    tail = List.copyOf(tail);
  }

  static AdoptionGrid read(Path file) {
    String name = file.getFileName().toString();
    String lower = name.toLowerCase(Locale.ROOT);
    RegisterFolder.checkReadable(file, name);
    if (lower.endsWith(".parquet")) {
      throw new UnusableInputException(
          name + ": a Parquet file needs no more than columns: with the names that it holds");
    }
    if (lower.endsWith(".xlsx")) {
      return workbook(file, name);
    }
    try {
      Charset charset = charset(file);
      List<TextLines.Line> lines = new ArrayList<>();
      Deque<TextLines.Line> last = new ArrayDeque<>();
      try (TextLines text = new TextLines(new InputStreamReader(open(file), charset))) {
        TextLines.@Nullable Line line = text.next();
        while (line != null) {
          if (lines.size() < MOST_LINES) {
            lines.add(line);
          } else {
            last.add(line);
          }
          if (last.size() > TAIL_LINES) {
            last.remove();
          }
          line = text.next();
        }
      }
      char delimiter = delimiter(lines);
      return new AdoptionGrid(
          rows(lines, delimiter),
          Optional.of(delimiter),
          Optional.of(charset.name()),
          Optional.empty(),
          last.isEmpty(),
          rows(List.copyOf(last), delimiter),
          false);
    } catch (IOException e) {
      throw new UnusableInputException(name + ": cannot be read (" + e.getMessage() + ")", e);
    }
  }

  /** The sheet with most rows. */
  private static AdoptionGrid workbook(Path file, String name) {
    WorkbookFile.Sheet best = WorkbookFile.sheet(file, name, Optional.empty());
    List<String> all = best.all();
    for (String other : all) {
      WorkbookFile.Sheet sheet = WorkbookFile.sheet(file, name, Optional.of(other));
      best = sheet.rows().size() > best.rows().size() ? sheet : best;
    }
    return new AdoptionGrid(
        best.rows(),
        Optional.empty(),
        Optional.empty(),
        all.size() > 1 ? Optional.of(best.name()) : Optional.empty(),
        true,
        List.of(),
        best.use1904());
  }

  private static InputStream open(Path file) throws IOException {
    InputStream bytes = new BufferedInputStream(Files.newInputStream(file));
    return file.toString().toLowerCase(Locale.ROOT).endsWith(".gz")
        ? new GZIPInputStream(bytes)
        : bytes;
  }

  private static Charset charset(Path file) throws IOException {
    byte[] probe;
    try (InputStream bytes = open(file)) {
      probe = bytes.readNBytes(PROBE_BYTES);
    }
    if (probe.length >= 2) {
      int mark = (probe[0] & 0xFF) << 8 | (probe[1] & 0xFF);
      if (mark == 0xFFFE || mark == 0xFEFF) {
        return StandardCharsets.UTF_16;
      }
      boolean oddNul = probe[1] == 0 && probe[0] != 0;
      if (oddNul || (probe[0] == 0 && probe[1] != 0)) {
        return oddNul ? StandardCharsets.UTF_16LE : StandardCharsets.UTF_16BE;
      }
    }
    // The probe may end within a character: up to three bytes less are tried.
    for (int cut = 0; cut <= Math.min(3, probe.length); cut++) {
      try {
        StandardCharsets.UTF_8
            .newDecoder()
            .onMalformedInput(CodingErrorAction.REPORT)
            .decode(ByteBuffer.wrap(probe, 0, probe.length - cut));
        return StandardCharsets.UTF_8;
      } catch (CharacterCodingException e) {
        if (probe.length < PROBE_BYTES) {
          break;
        }
      }
    }
    return Charset.forName("windows-1252");
  }

  /** The delimiter that splits most lines into one and the same number of cells. */
  private static char delimiter(List<TextLines.Line> lines) {
    char best = ',';
    double most = 0;
    for (char candidate : DELIMITERS) {
      int[] widths = new int[400];
      int counted = 0;
      for (TextLines.Line line : lines.subList(0, Math.min(500, lines.size()))) {
        if (!line.text().isBlank()) {
          int width = CsvRows.fields(line.text(), candidate).map(List::size).orElse(1);
          widths[Math.min(width, widths.length - 1)]++;
          counted++;
        }
      }
      int common = 1;
      for (int width = 2; width < widths.length; width++) {
        common = widths[width] > widths[common] || common == 1 ? width : common;
      }
      double score = counted == 0 ? 0 : widths[common] / (double) counted * Math.sqrt(common);
      if (common > 1 && score > most) {
        most = score;
        best = candidate;
      }
    }
    return best;
  }

  private static List<RawRow> rows(List<TextLines.Line> lines, char delimiter) throws IOException {
    StringBuilder text = new StringBuilder();
    lines.forEach(line -> text.append(line.text()).append('\n'));
    List<RawRow> rows = new ArrayList<>();
    try (TextLines again = new TextLines(new java.io.StringReader(text.toString()))) {
      CsvRows source = new CsvRows(again, delimiter);
      @Nullable RawRow row = source.next();
      while (row != null) {
        if (!row.isBlank()) {
          rows.add(row);
        }
        row = source.next();
      }
    }
    return rows;
  }
}
