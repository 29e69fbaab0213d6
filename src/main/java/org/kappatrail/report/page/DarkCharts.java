package org.kappatrail.report.page;

import java.util.List;
import java.util.Set;
import java.util.TreeSet;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/**
 * Colours of charts for a dark page: the same hues with their lightness turned over. The perceptual
 * lightness of Oklab (Ottosson 2020, from memory) runs from the paper's to the ink's; hue and
 * chroma are kept.
 */
final class DarkCharts {
  private static final Pattern INK = Pattern.compile("\\b(fill|stroke)=\"#([0-9a-f]{6})\"");

  /** Paper and ink by day as charts have them, by night as the page has them. */
  private static final Oklab DAY_PAPER = Oklab.of("fcfbf8");

  private static final Oklab DAY_INK = Oklab.of("262b31");
  private static final Oklab NIGHT_PAPER = Oklab.of("20242a");
  private static final Oklab NIGHT_INK = Oklab.of("e6e4de");

  private DarkCharts() {}

  /** Rules for every colour that the charts of a page paint with. */
  static String rules(List<Picture> pictures) {
    Set<String> found = new TreeSet<>();
    for (Picture picture : pictures) {
      Matcher matcher = INK.matcher(picture.text().get());
      while (matcher.find()) {
        found.add(matcher.group(1) + matcher.group(2));
      }
    }
    if (found.isEmpty()) {
      return "";
    }
    StringBuilder rules = new StringBuilder("@media screen and (prefers-color-scheme: dark) {\n");
    for (String use : found) {
      String property = use.startsWith("fill") ? "fill" : "stroke";
      String colour = use.substring(property.length());
      rules
          .append(".chart [" + property + "=\"#" + colour + "\"] { " + property + ": #")
          .append(night(colour))
          .append("; }\n");
    }
    return rules.append("}\n").toString();
  }

  /** The colour of the night for one of the day, both as six hexadecimal digits. */
  static String night(String day) {
    Oklab colour = Oklab.of(day);
    double share =
        (DAY_PAPER.lightness() - colour.lightness())
            / (DAY_PAPER.lightness() - DAY_INK.lightness());
    Oklab dayGrey = DAY_PAPER.toward(DAY_INK, share);
    Oklab nightGrey = NIGHT_PAPER.toward(NIGHT_INK, share);
    return new Oklab(
            nightGrey.lightness(),
            colour.greenRed() - dayGrey.greenRed() + nightGrey.greenRed(),
            colour.blueYellow() - dayGrey.blueYellow() + nightGrey.blueYellow())
        .hex();
  }
}
