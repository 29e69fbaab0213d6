package org.kappatrail.report.page;

import java.util.List;
import java.util.Locale;
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

  /** Lightness of paper and ink by day and by night: #fcfbf8, #262b31; #20242a, #e6e4de. */
  private static final double DAY_PAPER = 0.988;

  private static final double DAY_INK = 0.286;
  private static final double NIGHT_PAPER = 0.259;
  private static final double NIGHT_INK = 0.918;

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
    int rgb = Integer.parseInt(day, 16);
    double r = linear(rgb >> 16 & 0xFF);
    double g = linear(rgb >> 8 & 0xFF);
    double b = linear(rgb & 0xFF);
    double l = StrictMath.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * b);
    double m = StrictMath.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * b);
    double s = StrictMath.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * b);
    double lightness = 0.2104542553 * l + 0.7936177850 * m - 0.0040720468 * s;
    double greenRed = 1.9779984951 * l - 2.4285922050 * m + 0.4505937099 * s;
    double blueYellow = 0.0259040371 * l + 0.7827717662 * m - 0.8086757660 * s;
    return fromOklab(turned(lightness), greenRed, blueYellow);
  }

  private static double turned(double lightness) {
    double share = (DAY_PAPER - lightness) / (DAY_PAPER - DAY_INK);
    return NIGHT_PAPER + share * (NIGHT_INK - NIGHT_PAPER);
  }

  private static String fromOklab(double lightness, double greenRed, double blueYellow) {
    double l = cube(lightness + 0.3963377774 * greenRed + 0.2158037573 * blueYellow);
    double m = cube(lightness - 0.1055613458 * greenRed - 0.0638541728 * blueYellow);
    double s = cube(lightness - 0.0894841775 * greenRed - 1.2914855480 * blueYellow);
    int r = shown(4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s);
    int g = shown(-1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s);
    int b = shown(-0.0041960863 * l - 0.7034186147 * m + 1.7076147010 * s);
    return String.format(Locale.ROOT, "%06x", r << 16 | g << 8 | b);
  }

  private static double cube(double value) {
    return value * value * value;
  }

  private static double linear(int channel) {
    double value = channel / 255.0;
    return value <= 0.04045 ? value / 12.92 : StrictMath.pow((value + 0.055) / 1.055, 2.4);
  }

  private static int shown(double linear) {
    double value = Math.max(0, Math.min(1, linear));
    double coded =
        value <= 0.0031308 ? value * 12.92 : 1.055 * StrictMath.pow(value, 1 / 2.4) - 0.055;
    return (int) Math.round(coded * 255);
  }
}
