package org.kappatrail.intake;

import java.util.Optional;
import java.util.OptionalDouble;
import java.util.regex.Pattern;
import org.kappatrail.history.ExportMapping;

/**
 * Reads numbers as one kind of file writes them. Nothing is guessed: a text that is not a number in
 * the stated form is none.
 *
 * @param decimalComma true where the comma is the decimal sign
 * @param thousands separator of groups of three digits
 */
record NumberText(boolean decimalComma, Optional<String> thousands) {
  /** Plain decimal numbers with a point. */
  static final NumberText PLAIN = new NumberText(false, Optional.empty());

  private static final int LONGEST = 60;
  private static final Pattern NUMBER =
      Pattern.compile("[+-]?(\\d++(\\.\\d*+)?|\\.\\d++)([eE][+-]?\\d{1,3})?");
  private static final Pattern POINT_NUMBER = Pattern.compile("[+-]?[\\d,']*\\.\\d+");
  private static final Pattern COMMA_NUMBER = Pattern.compile("[+-]?[\\d.']*,\\d+");

  static NumberText of(ExportMapping mapping) {
    return new NumberText(mapping.decimalComma(), mapping.thousands());
  }

  /** The number; empty where the text is none or is not finite. */
  OptionalDouble parse(String text) {
    if (text.isEmpty() || text.length() > LONGEST) {
      return OptionalDouble.empty();
    }
    String plain = text.replace('\u2212', '-');
    if (thousands.isPresent()) {
      Optional<String> joined = withoutThousands(plain, thousands.get());
      if (joined.isEmpty()) {
        return OptionalDouble.empty();
      }
      plain = joined.get();
    }
    if (decimalComma) {
      if (plain.indexOf('.') >= 0) {
        return OptionalDouble.empty();
      }
      plain = plain.replace(',', '.');
    }
    if (!NUMBER.matcher(plain).matches()) {
      return OptionalDouble.empty();
    }
    double value = Double.parseDouble(plain);
    return Double.isFinite(value) ? OptionalDouble.of(value) : OptionalDouble.empty();
  }

  /** Why a text is no number, with the remedy. */
  String complaint(String text) {
    if (text.indexOf('\0') >= 0) {
      return "holds a NUL byte; the file is damaged or in UTF-16; export it again or set encoding";
    }
    if (text.indexOf(Texts.REPLACEMENT) >= 0) {
      return "holds a byte that is no character; set encoding for this file, such as windows-1252";
    }
    if (text.startsWith("=")) {
      return "a formula without a stored value; open the workbook, let it calculate and save it";
    }
    if (decimalComma) {
      return POINT_NUMBER.matcher(text).matches()
          ? "not a number with a decimal comma; set thousands: \".\" or take decimal: comma out"
              + " for this file"
          : "not a number; correct it or leave the cell empty";
    }
    if (COMMA_NUMBER.matcher(text).matches()) {
      return "not a number with a decimal point; set decimal: comma for this file";
    }
    return "not a number; correct it or leave the cell empty";
  }

  private Optional<String> withoutThousands(String text, String separator) {
    String blank = separator.isBlank() ? " " : separator;
    String even =
        separator.isBlank()
            ? text.replace('\u00A0', ' ').replace('\u202F', ' ').replace('\u2009', ' ')
            : text;
    if (!even.contains(blank)) {
      return Optional.of(even);
    }
    int end = even.indexOf(decimalComma ? ',' : '.');
    String whole = end < 0 ? even : even.substring(0, end);
    String rest = end < 0 ? "" : even.substring(end);
    if (rest.contains(blank)) {
      return Optional.empty();
    }
    String[] groups = whole.split(Pattern.quote(blank), -1);
    for (int group = 1; group < groups.length; group++) {
      if (groups[group].length() != 3) {
        return Optional.empty();
      }
    }
    String first = groups[0].replace("-", "").replace("+", "");
    return first.isEmpty() || first.length() > 3
        ? Optional.empty()
        : Optional.of(whole.replace(blank, "") + rest);
  }
}
