package org.kappatrail.history;

/**
 * Where a record was read.
 *
 * @param file path within the history folder, with forward slashes
 * @param line line as an editor shows it, from 1; the row in a workbook; 0 where a file as a whole
 *     is meant
 */
public record SourceLine(String file, long line) {
  @Override
  public String toString() {
    return line > 0 ? file + ":" + line : file;
  }
}
