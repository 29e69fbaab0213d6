package org.kappatrail.intake;

import java.util.BitSet;
import java.util.List;
import java.util.Optional;

/**
 * A row of a table as it was found.
 *
 * @param line line as an editor shows it, or row of the sheet
 * @param cells texts of the cells
 * @param plain cells whose text is a workbook's own number or date, in canonical form whatever the
 *     settings say about decimal sign and date format
 * @param fault what makes the whole row unreadable
 */
record RawRow(long line, List<String> cells, BitSet plain, Optional<String> fault) {
  RawRow {
    cells = List.copyOf(cells);
    plain = (BitSet) plain.clone();
  }

  static RawRow of(long line, List<String> cells) {
    return new RawRow(line, cells, new BitSet(), Optional.empty());
  }

  static RawRow faulty(long line, String text, String fault) {
    return new RawRow(line, List.of(text), new BitSet(), Optional.of(fault));
  }

  /** Cleaned text of a cell; empty where the row is shorter. */
  String cell(int index) {
    return index < cells.size() ? Texts.clean(cells.get(index)) : "";
  }

  boolean isPlain(int index) {
    return plain.get(index);
  }

  boolean isBlank() {
    return fault.isEmpty() && cells.stream().allMatch(cell -> Texts.clean(cell).isEmpty());
  }

  /** True where any cell from a place on holds something. */
  boolean hasMoreThan(int columns) {
    for (int index = columns; index < cells.size(); index++) {
      if (!cell(index).isEmpty()) {
        return true;
      }
    }
    return false;
  }
}
