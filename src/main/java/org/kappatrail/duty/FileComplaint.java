package org.kappatrail.duty;

import java.util.Locale;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** What is wrong with a file that the engine refuses, in the words of this program. */
final class FileComplaint {
  private static final Pattern LINE = Pattern.compile("on Line: (\\d+)");

  private FileComplaint() {}

  /** True where the file holds a quoted line break, which only the serial scan reads. */
  static boolean asksForSerialScan(String complaint) {
    return complaint.contains("parallel=false");
  }

  /** File, place, reason and remedy. */
  static String explain(String file, String complaint) {
    String lower = complaint.toLowerCase(Locale.ROOT);
    Matcher line = LINE.matcher(complaint);
    String place = line.find() ? file + ":" + line.group(1) : file;
    if (lower.contains("unicode") || lower.contains("not utf-8")) {
      return place + ": is not UTF-8 text; set encoding for this file";
    }
    if (lower.contains("maximum line size")) {
      return place + ": a line of more than 2,000,000 bytes; a quotation mark may be left open";
    }
    if (lower.contains("gzip")) {
      return file + ": is not a whole gzip file; copy it again from its source";
    }
    if (lower.contains("parquet") || lower.contains("magic bytes")) {
      return file + ": is not a whole Parquet file; copy it again from its source";
    }
    return place + ": cannot be read (" + complaint.lines().findFirst().orElse("") + ")";
  }
}
