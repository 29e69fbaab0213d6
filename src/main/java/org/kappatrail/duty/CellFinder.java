package org.kappatrail.duty;

import de.siegmar.fastcsv.reader.CsvParseException;
import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.io.BufferedReader;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.kappatrail.history.UnusableInputException;

/** Goes through a CSV file for the lines on which odd texts stand, as an editor numbers them. */
final class CellFinder {
  /** Takes a cell that was found. */
  interface Listener {
    void found(
        CellFault fault, String column, String text, OddTexts.Occurrence occurrence, long line);
  }

  private record Cell(String column, String text) {}

  private final LogTable table;
  private final LogLayout layout;
  private final OddTexts odd;
  private final Map<CellFault, Map<String, Boolean>> seen = new EnumMap<>(CellFault.class);

  CellFinder(LogTable table, LogLayout layout, OddTexts odd) {
    this.table = table;
    this.layout = layout;
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
        if (Footer.ends(table.file(), row.getField(0))) {
          return;
        }
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
      if (!texts.isEmpty()) {
        for (Cell cell : cells(fault, row)) {
          String text = OddTexts.key(cell.text());
          OddTexts.Occurrence occurrence = texts.get(text);
          if (occurrence != null && isNew(fault, text)) {
            listener.found(fault, cell.column(), text, occurrence, line);
          }
        }
      }
    }
  }

  private boolean isNew(CellFault fault, String text) {
    return !fault.isSummed()
        || seen.computeIfAbsent(fault, key -> new LinkedHashMap<>()).put(text, true) == null;
  }

  private List<Cell> cells(CellFault fault, CsvRecord row) {
    return switch (fault) {
      case CELLS -> overflows(row) ? List.of(new Cell("", "")) : List.of();
      case TIME -> List.of(new Cell(fault.column(), time(row)));
      case BEARING -> bearings(row).stream().map(name -> new Cell(fault.column(), name)).toList();
      default -> {
        List<Cell> cells = new ArrayList<>();
        layout
            .constant(fault.column())
            .ifPresent(text -> cells.add(new Cell(fault.column(), text)));
        for (int index : layout.places(fault.column(), row.getFields())) {
          cells.add(new Cell(name(fault, index), field(row, index)));
        }
        yield cells;
      }
    };
  }

  /** The tag where many columns carry the quantity, else the program's name. */
  private String name(CellFault fault, int index) {
    return layout.tagColumns().containsKey(index) ? table.columns().get(index) : fault.column();
  }

  private String time(CsvRecord row) {
    String day = cell(LogLayout.TIME, row);
    if (!layout.splitsTime()) {
      return day;
    }
    String time = cell(LogLayout.TIME_OF_DAY, row).strip();
    return day.strip() + ' ' + (time.isEmpty() ? "?" : time);
  }

  private List<String> bearings(CsvRecord row) {
    String asset = cell(LogLayout.ASSET, row);
    return switch (layout.form()) {
      case LONG -> List.of(asset + OddTexts.BETWEEN + cell(LogLayout.BEARING, row));
      case WIDE ->
          layout.bearingsOfRowAsset().stream()
              .map(name -> asset + OddTexts.BETWEEN + name)
              .toList();
      case TAGGED -> {
        String tag = cell(LogLayout.TAG, row);
        yield List.of(
            layout
                .bearingOfRowAsset(tag.strip())
                .map(name -> asset + OddTexts.BETWEEN + name)
                .orElse(tag + OddTexts.BETWEEN));
      }
    };
  }

  private boolean overflows(CsvRecord row) {
    int width = table.columns().size();
    return row.getFieldCount() > width && !row.getField(width).isBlank();
  }

  private String cell(String canonical, CsvRecord row) {
    return layout
        .constant(canonical)
        .or(() -> layout.find(canonical).map(index -> field(row, index)))
        .orElse("");
  }

  private static String field(CsvRecord row, int index) {
    return index < row.getFieldCount() ? row.getField(index) : "";
  }
}
