package org.kappatrail.duty;

import java.io.BufferedReader;
import java.io.BufferedWriter;
import java.io.IOException;
import java.nio.charset.CharacterCodingException;
import java.nio.file.Files;
import java.nio.file.Path;
import org.kappatrail.history.UnusableInputException;

/** Puts a CSV file in another encoding, or with a footer, into the form that the engine reads. */
final class Utf8Copy {
  private Utf8Copy() {}

  /** The table itself where nothing is to be changed, else with the path of a private copy. */
  static LogTable of(LogTable table, Path folder, int number) {
    LogFile file = table.file();
    if (file.mapping().footer().isEmpty() && CsvText.isUtf8(file)) {
      return table;
    }
    Path copy = folder.resolve("log-" + number + ".csv");
    try (BufferedReader text = CsvText.open(file);
        BufferedWriter out = Files.newBufferedWriter(copy)) {
      long lines = 0;
      String line = text.readLine();
      while (line != null) {
        lines++;
        if (lines > table.headerLines() && Footer.ends(file, unquoted(line))) {
          break;
        }
        out.write(line);
        out.write('\n');
        line = text.readLine();
      }
    } catch (CharacterCodingException e) {
      throw new UnusableInputException(
          file.name() + ": is not " + CsvText.charset(file) + " text; set encoding for this file",
          e);
    } catch (IOException e) {
      throw new UnusableInputException(
          file.name() + ": cannot be read (" + e.getMessage() + ")", e);
    }
    return new LogTable(
        file, copy, table.columns(), table.types(), table.delimiter(), table.headerLines());
  }

  private static String unquoted(String line) {
    return line.startsWith("\"") ? line.substring(1) : line;
  }
}
