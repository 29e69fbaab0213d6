package org.kappatrail.intake;

import java.util.List;
import java.util.Optional;
import java.util.regex.Pattern;

/**
 * Where a table lies in a grid of cells.
 *
 * @param skipLines lines above the header
 * @param header the header rows
 * @param body the rows below it
 * @param footer beginning of the row that ends the table
 */
record GridShape(int skipLines, List<RawRow> header, List<RawRow> body, Optional<String> footer) {
  private static final int MOST_HEADER_ROWS = 3;
  private static final int SHORTEST_FOOTER = 5;
  private static final Pattern FOOTER_WORDS = Pattern.compile("\\d.*", Pattern.DOTALL);
  private static final Pattern NUMBER =
      Pattern.compile(
          "[<>≤≥=\\s]*[+-]?[.,]?\\d[\\d.,'’ \\u00A0\\u202F\\u2009]*([eE][+-]?\\d+)?\\s*%?");
  private static final Pattern DATE =
      Pattern.compile(
          "\\d{1,4}[-/.]\\d{1,2}[-/.]\\d{1,4}.*|\\d{1,2}[- ./]\\p{L}{3,9}\\.?[- ./]\\d{2,4}.*"
              + "|\\p{L}{3,9} \\d{1,2},? ?\\d{4}.*");

  GridShape {
    header = List.copyOf(header);
    body = List.copyOf(body);
  }

  /** The shape of a grid; empty where no row of values is found. */
  static Optional<GridShape> of(AdoptionGrid grid) {
    List<RawRow> rows = grid.rows();
    int width = commonWidth(rows);
    int first = 0;
    while (first < rows.size() && !isData(rows.get(first), width)) {
      first++;
    }
    if (first == 0 || first == rows.size()) {
      return Optional.empty();
    }
    int header = first - 1;
    while (header > 0
        && first - header < MOST_HEADER_ROWS
        && isSecondHeader(rows.get(header - 1), rows.get(header), width)) {
      header--;
    }
    boolean valueFirst = isValue(rows.get(first).cell(0));
    int end = rows.size();
    while (grid.whole() && end > first + 1 && isFooter(rows.get(end - 1), width, valueFirst)) {
      end--;
    }
    Optional<String> footer = Optional.empty();
    if (end < rows.size()) {
      footer = Optional.of(beginning(rows.get(end).cell(0)));
    }
    for (int at = grid.tail().size() - 1; at >= 0; at--) {
      RawRow row = grid.tail().get(at);
      if (!isFooter(row, width, valueFirst)) {
        break;
      }
      footer = Optional.of(beginning(row.cell(0)));
    }
    return Optional.of(
        new GridShape(
            (int) rows.get(header).line() - 1,
            rows.subList(header, first),
            rows.subList(first, end),
            footer));
  }

  static boolean isNumber(String text) {
    return NUMBER.matcher(text).matches();
  }

  static boolean isDate(String text) {
    return DATE.matcher(text).matches();
  }

  private static int filled(RawRow row) {
    return (int) row.cells().stream().filter(cell -> !Texts.isMissing(Texts.clean(cell))).count();
  }

  private static int commonWidth(List<RawRow> rows) {
    return rows.stream()
        .mapToInt(GridShape::filled)
        .sorted()
        .skip(rows.size() / 2)
        .findFirst()
        .orElse(0);
  }

  private static boolean isData(RawRow row, int width) {
    List<String> cells =
        row.cells().stream().map(Texts::clean).filter(cell -> !Texts.isMissing(cell)).toList();
    int filled = cells.size();
    long values = cells.stream().filter(cell -> isNumber(cell) || isDate(cell)).count();
    return filled * 2 >= width && values >= 1 && values * 4 >= filled && filled > 1;
  }

  /** True where the row above the last header row holds group titles or names, and no title. */
  private static boolean isSecondHeader(RawRow above, RawRow last, int width) {
    boolean adjacent = above.line() + 1 == last.line();
    return adjacent && filled(above) >= 2 && filled(above) * 4 >= width && !isData(above, width);
  }

  /**
   * True for a row of few cells that begins with a text.
   *
   * @param valueFirst true where the table's rows begin with a number or date
   */
  private static boolean isFooter(RawRow row, int width, boolean valueFirst) {
    String first = row.cell(0);
    boolean few = width > 3 ? filled(row) * 3 < width : valueFirst && filled(row) < width;
    return few && !first.isEmpty() && !isValue(first);
  }

  private static boolean isValue(String text) {
    return isNumber(text) || isDate(text);
  }

  /** A footer without the number or date in it, which will be another one in the next export. */
  private static String beginning(String footer) {
    String words = FOOTER_WORDS.matcher(footer).replaceAll("");
    return Texts.clean(words).length() < SHORTEST_FOOTER ? footer : Texts.clean(words);
  }
}
