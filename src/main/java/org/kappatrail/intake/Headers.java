package org.kappatrail.intake;

import java.util.ArrayList;
import java.util.Collections;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** Makes column headers of one or several header rows. */
final class Headers {
  private Headers() {}

  /**
   * Headers: the rows joined with a blank. With several rows a column also goes by each row's own
   * text, and by the joined text with a group title carried on to the columns it spans.
   */
  static List<RawTable.Header> of(List<RawRow> rows) {
    int width = 0;
    for (RawRow row : rows) {
      for (int column = 0; column < row.cells().size(); column++) {
        if (!row.cell(column).isEmpty()) {
          width = Math.max(width, column + 1);
        }
      }
    }
    List<RawTable.Header> headers = new ArrayList<>();
    String[] carried = new String[rows.size()];
    java.util.Arrays.fill(carried, "");
    for (int column = 0; column < width; column++) {
      headers.add(header(rows, column, carried));
    }
    return numbered(headers);
  }

  /** Gives headers of one and the same name a further one, {@code Fe #1} and {@code Fe #2}. */
  private static List<RawTable.Header> numbered(List<RawTable.Header> headers) {
    List<String> names = headers.stream().map(RawTable.Header::name).toList();
    List<RawTable.Header> numbered = new ArrayList<>();
    for (int column = 0; column < headers.size(); column++) {
      String name = names.get(column);
      if (name.isEmpty() || Collections.frequency(names, name) == 1) {
        numbered.add(headers.get(column));
      } else {
        List<String> aliases = new ArrayList<>(headers.get(column).aliases());
        aliases.add(name + " #" + Collections.frequency(names.subList(0, column + 1), name));
        numbered.add(new RawTable.Header(name, aliases));
      }
    }
    return numbered;
  }

  private static RawTable.Header header(List<RawRow> rows, int column, String[] carried) {
    List<String> own = new ArrayList<>();
    List<String> filled = new ArrayList<>();
    for (int row = 0; row < rows.size(); row++) {
      String text = oneLine(rows.get(row).cell(column));
      if (!text.isEmpty()) {
        own.add(text);
        carried[row] = text;
      }
      boolean isLast = row == rows.size() - 1;
      String spanned = text.isEmpty() && !isLast ? carried[row] : text;
      if (!spanned.isEmpty()) {
        filled.add(spanned);
      }
    }
    Set<String> aliases = new LinkedHashSet<>();
    if (rows.size() > 1) {
      aliases.add(String.join(" ", filled));
      for (int part = own.size() - 1; part >= 0; part--) {
        aliases.add(own.get(part));
      }
    }
    String name = String.join(" ", own);
    aliases.remove(name);
    return new RawTable.Header(name, List.copyOf(aliases));
  }

  private static String oneLine(String text) {
    return text.replaceAll("\\s*[\\r\\n]+\\s*", " ");
  }
}
