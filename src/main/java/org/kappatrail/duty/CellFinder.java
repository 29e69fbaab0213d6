package org.kappatrail.duty;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.Map;
import org.jspecify.annotations.Nullable;
import org.kappatrail.history.UnusableInputException;

/** Goes through a CSV file for the lines on which odd texts stand, as an editor numbers them. */
final class CellFinder {
  /** Takes a cell that was found. */
  interface Listener {
    void found(CellFault fault, String text, OddTexts.Occurrence occurrence, long line);
  }

  private final LogTable table;
  private final LogLayout layout;
  private final Map<String, String> constants;
  private final OddTexts odd;
  private final Map<CellFault, Map<String, Boolean>> seen = new EnumMap<>(CellFault.class);

  CellFinder(LogTable table, LogLayout layout, OddTexts odd) {
    this.table = table;
    this.layout = layout;
    this.constants = table.file().mapping().constants();
    this.odd = odd;
  }

  /** Tells every cell of the listed kinds, and of the summed kinds the first one of each text. */
  void find(Listener listener) {
    try (BufferedReader text = CsvText.open(table.file());
        CsvReader<CsvRecord> rows = CsvText.records(text, table.delimiter())) {
      long offset = table.file().mapping().skipLines();
      for (int line = 0; line < offset; line++) {
        text.readLine();
      }
      for (CsvRecord row : rows) {
        long line = offset + row.getStartingLineNumber();
        if (line > table.headerLines()) {
          look(row, line, listener);
        }
      }
    } catch (CsvParseException e) {
      // Quotation marks that only the engine makes sense of: the caller counts what was not found.
      return;
    } catch (IOException | UncheckedIOException e) {
      throw new UnusableInputException(
          table.file().name() + ": cannot be read (" + e.getMessage() + ")", e);
    }
  }

  private void look(CsvRecord row, long line, Listener listener) {
    for (CellFault fault : CellFault.values()) {
      Map<String, OddTexts.Occurrence> texts = odd.of(fault);
      String text = texts.isEmpty() ? null : text(fault, row);
      OddTexts.Occurrence occurrence = text == null ? null : texts.get(text);
      if (text != null && occurrence != null && isNew(fault, text)) {
        listener.found(fault, text, occurrence, line);
      }
    }
  }

  private boolean isNew(CellFault fault, String text) {
    return !fault.isSummed()
        || seen.computeIfAbsent(fault, key -> new LinkedHashMap<>()).put(text, true) == null;
  }

  private @Nullable String text(CellFault fault, CsvRecord row) {
    return switch (fault) {
      case CELLS -> overflows(row) ? "" : null;
      case BEARING -> cell(LogLayout.ASSET, row) + OddTexts.BETWEEN + cell(LogLayout.BEARING, row);
      default -> cell(fault.column(), row);
    };
  }

  private boolean overflows(CsvRecord row) {
    int width = table.columns().size();
    return row.getFieldCount() > width && !row.getField(width).isBlank();
  }

  private String cell(String canonical, CsvRecord row) {
    String constant = constants.get(canonical);
    if (constant != null) {
      return constant;
    }
    return layout
        .find(canonical)
        .filter(index -> index < row.getFieldCount())
        .map(row::getField)
        .orElse("");
  }
}
