package org.kappatrail.report.page;

import java.util.Locale;

/**
 * A colour by lightness as it is perceived and by two opponent hues (Ottosson, A perceptual color
 * space for image processing, 2020, from memory).
 *
 * @param lightness 0 black, 1 white
 * @param greenRed below 0 greenish, above 0 reddish
 * @param blueYellow below 0 bluish, above 0 yellowish
 */
record Oklab(double lightness, double greenRed, double blueYellow) {

  /** A colour of sRGB, six hexadecimal digits. */
  static Oklab of(String hex) {
    int rgb = Integer.parseInt(hex, 16);
    double r = linear(rgb >> 16 & 0xFF);
    double g = linear(rgb >> 8 & 0xFF);
    double b = linear(rgb & 0xFF);
    double l = StrictMath.cbrt(0.4122214708 * r + 0.5363325363 * g + 0.0514459929 * b);
    double m = StrictMath.cbrt(0.2119034982 * r + 0.6806995451 * g + 0.1073969566 * b);
    double s = StrictMath.cbrt(0.0883024619 * r + 0.2817188376 * g + 0.6299787005 * b);
    return new Oklab(
        0.2104542553 * l + 0.7936177850 * m - 0.0040720468 * s,
        1.9779984951 * l - 2.4285922050 * m + 0.4505937099 * s,
        0.0259040371 * l + 0.7827717662 * m - 0.8086757660 * s);
  }

  /** The colour a share of the way toward another one. */
  Oklab toward(Oklab other, double share) {
    return new Oklab(
        lightness + share * (other.lightness - lightness),
        greenRed + share * (other.greenRed - greenRed),
        blueYellow + share * (other.blueYellow - blueYellow));
  }

  /** The nearest colour of sRGB, channel by channel. */
  String hex() {
    double l = cube(lightness + 0.3963377774 * greenRed + 0.2158037573 * blueYellow);
    double m = cube(lightness - 0.1055613458 * greenRed - 0.0638541728 * blueYellow);
    double s = cube(lightness - 0.0894841775 * greenRed - 1.2914855480 * blueYellow);
    int r = coded(4.0767416621 * l - 3.3077115913 * m + 0.2309699292 * s);
    int g = coded(-1.2684380046 * l + 2.6097574011 * m - 0.3413193965 * s);
    int b = coded(-0.0041960863 * l - 0.7034186147 * m + 1.7076147010 * s);
    return String.format(Locale.ROOT, "%06x", r << 16 | g << 8 | b);
  }

  private static double cube(double value) {
    return value * value * value;
  }

  private static double linear(int channel) {
    double value = channel / 255.0;
    return value <= 0.04045 ? value / 12.92 : StrictMath.pow((value + 0.055) / 1.055, 2.4);
  }

  private static int coded(double linear) {
    double value = Math.max(0, Math.min(1, linear));
    double coded =
        value <= 0.0031308 ? value * 12.92 : 1.055 * StrictMath.pow(value, 1 / 2.4) - 0.055;
    return (int) Math.round(coded * 255);
  }
}
