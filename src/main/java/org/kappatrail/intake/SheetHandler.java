package org.kappatrail.intake;

import java.math.BigDecimal;
import java.math.MathContext;
import java.time.LocalDateTime;
import java.time.LocalTime;
import java.util.ArrayList;
import java.util.BitSet;
import java.util.List;
import java.util.Optional;
import org.apache.poi.ss.usermodel.DateUtil;
import org.apache.poi.xssf.eventusermodel.ReadOnlySharedStringsTable;
import org.apache.poi.xssf.model.StylesTable;
import org.apache.poi.xssf.usermodel.XSSFCellStyle;
import org.jspecify.annotations.Nullable;
import org.xml.sax.Attributes;
import org.xml.sax.SAXException;
import org.xml.sax.helpers.DefaultHandler;

/**
 * Takes the rows of a sheet as they stream by. Numbers and dates come as the workbook holds them,
 * not as it shows them, so that no language of a program or machine plays a part; of a formula the
 * stored value is taken.
 */
final class SheetHandler extends DefaultHandler {
  static final int MOST_COLUMNS = 2_000;
  static final long MOST_CELLS = 10_000_000;
  private static final int SIGNIFICANT = 15;

  private final ReadOnlySharedStringsTable strings;
  private final StylesTable styles;
  private final boolean use1904;
  private final List<RawRow> rows = new ArrayList<>();
  private final StringBuilder text = new StringBuilder();

  private List<String> cells = new ArrayList<>();
  private BitSet plain = new BitSet();
  private long rowNumber;
  private int column;
  private long cellCount;
  private long firstFormulaRow;
  private long formulas;
  private String type = "";
  private int style = -1;
  private boolean inValue;
  private boolean inFormula;
  private boolean hasFormula;
  private boolean hasValue;
  private String formula = "";

  SheetHandler(ReadOnlySharedStringsTable strings, StylesTable styles, boolean use1904) {
    this.strings = strings;
    this.styles = styles;
    this.use1904 = use1904;
  }

  /** Rows that hold something, numbered as the sheet numbers them. */
  List<RawRow> rows() {
    return rows;
  }

  /** What is to be said about formulas; empty where there are none. */
  Optional<String> formulaNote() {
    return formulas == 0
        ? Optional.empty()
        : Optional.of(
            formulas
                + (formulas == 1 ? " cell holds a formula" : " cells hold formulas")
                + " (the first in row "
                + firstFormulaRow
                + "); the values stored with them are used");
  }

  @Override
  public void startElement(String uri, String local, String name, Attributes attributes)
      throws SAXException {
    switch (local) {
      case "row" -> startRow(attributes.getValue("r"));
      case "c" -> startCell(attributes);
      case "v", "t" -> {
        inValue = true;
        hasValue = true;
      }
      case "f" -> {
        inFormula = true;
        hasFormula = true;
        formula = "";
      }
      default -> {
        // Nothing else of a sheet bears on its values.
      }
    }
  }

  @Override
  public void endElement(String uri, String local, String name) throws SAXException {
    switch (local) {
      case "row" -> endRow();
      case "c" -> endCell();
      case "v", "t" -> inValue = false;
      case "f" -> inFormula = false;
      default -> {
        // As above.
      }
    }
  }

  @Override
  public void characters(char[] letters, int start, int length) {
    if (inValue && text.length() < TextLines.LONGEST_LINE) {
      text.append(letters, start, length);
    } else if (inFormula && formula.length() < 40) {
      formula += new String(letters, start, Math.min(length, 40));
    }
  }

  private void startRow(@Nullable String number) {
    rowNumber = number == null ? rowNumber + 1 : Long.parseLong(number);
    cells = new ArrayList<>();
    plain = new BitSet();
    column = -1;
  }

  private void endRow() {
    RawRow row = new RawRow(rowNumber, cells, plain, Optional.empty());
    if (!row.isBlank()) {
      rows.add(row);
    }
  }

  private void startCell(Attributes attributes) throws SAXException {
    String reference = attributes.getValue("r");
    column = reference == null ? column + 1 : columnOf(reference);
    String given = attributes.getValue("t");
    type = given == null ? "n" : given;
    String styled = attributes.getValue("s");
    style = styled == null ? -1 : Integer.parseInt(styled);
    text.setLength(0);
    hasFormula = false;
    hasValue = false;
    if (column >= MOST_COLUMNS) {
      throw new SAXException("row " + rowNumber + " has more than " + MOST_COLUMNS + " columns");
    }
  }

  private void endCell() throws SAXException {
    if (hasFormula) {
      formulas++;
      firstFormulaRow = firstFormulaRow == 0 ? rowNumber : firstFormulaRow;
    }
    if (!hasValue && !hasFormula) {
      return;
    }
    while (cells.size() <= column) {
      cells.add("");
      cellCount++;
    }
    if (cellCount > MOST_CELLS) {
      throw new SAXException("the sheet has more than " + MOST_CELLS + " cells");
    }
    cells.set(column, hasValue ? value() : "=" + formula);
  }

  private String value() throws SAXException {
    String stored = text.toString();
    return switch (type) {
      case "s" -> shared(stored);
      case "b" -> stored.strip().equals("1") ? "yes" : "no";
      case "d" -> {
        plain.set(column);
        yield stored;
      }
      case "n" -> number(stored.strip());
      default -> stored;
    };
  }

  private String shared(String index) throws SAXException {
    try {
      return strings.getItemAt(Integer.parseInt(index.strip())).getString();
    } catch (NumberFormatException | IndexOutOfBoundsException e) {
      throw new SAXException("row " + rowNumber + " names a text that the workbook lacks", e);
    }
  }

  private String number(String stored) {
    if (stored.isEmpty()) {
      return "";
    }
    double value;
    try {
      value = Double.parseDouble(stored);
    } catch (NumberFormatException e) {
      return stored;
    }
    if (!Double.isFinite(value)) {
      return stored;
    }
    plain.set(column);
    String format = "";
    short formatIndex = 0;
    if (style >= 0 && style < styles.getNumCellStyles()) {
      XSSFCellStyle cellStyle = styles.getStyleAt(style);
      formatIndex = cellStyle.getDataFormat();
      String given = cellStyle.getDataFormatString();
      format = given == null ? "" : given;
    }
    if (DateUtil.isADateFormat(formatIndex, format) && DateUtil.isValidExcelDate(value)) {
      LocalDateTime moment = DateUtil.getLocalDateTime(value, use1904, true);
      return moment.toLocalTime().equals(LocalTime.MIDNIGHT)
          ? moment.toLocalDate().toString()
          : moment.toString();
    }
    BigDecimal number = new BigDecimal(value).round(new MathContext(SIGNIFICANT));
    if (format.contains("%")) {
      return canonical(number.movePointRight(2)) + "%";
    }
    return canonical(number);
  }

  private static String canonical(BigDecimal number) {
    BigDecimal shortest = number.signum() == 0 ? BigDecimal.ZERO : number.stripTrailingZeros();
    boolean wide = Math.abs((long) shortest.precision() - shortest.scale()) > 20;
    return wide ? shortest.toString() : shortest.toPlainString();
  }

  private static int columnOf(String reference) {
    int index = 0;
    for (int at = 0; at < reference.length() && index <= MOST_COLUMNS; at++) {
      char letter = reference.charAt(at);
      if (letter < 'A' || letter > 'Z') {
        break;
      }
      index = index * 26 + (letter - 'A' + 1);
    }
    return index - 1;
  }
}
