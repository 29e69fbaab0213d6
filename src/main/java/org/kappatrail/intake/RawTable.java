package org.kappatrail.intake;

import java.util.List;

/**
 * A table as it was found.
 *
 * @param file path within the history folder
 * @param header its columns
 * @param headerLine line of the header's first row
 * @param rows rows below the header; blank ones are passed over
 * @param notes what is worth saying about how it was read
 * @param use1904 true for a workbook that counts days from 1904
 */
record RawTable(
    String file,
    List<Header> header,
    long headerLine,
    List<RawRow> rows,
    List<String> notes,
    boolean use1904) {

  /**
   * A column's header.
   *
   * @param name header rows joined with a blank
   * @param aliases other names it may go by where there are several header rows
   */
  record Header(String name, List<String> aliases) {
    Header {
      aliases = List.copyOf(aliases);
    }
  }

  RawTable {
    header = List.copyOf(header);
    rows = List.copyOf(rows);
    notes = List.copyOf(notes);
  }

  List<String> names() {
    return header.stream().map(Header::name).toList();
  }
}
