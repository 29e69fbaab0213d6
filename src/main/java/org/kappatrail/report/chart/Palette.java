package org.kappatrail.report.chart;

import java.awt.Color;

/**
 * Colours of quantities, the same on page, chart and slide; told apart by colour-blind readers and
 * in grey print.
 */
public final class Palette {
  public static final Color INK = new Color(0x26, 0x2B, 0x31);
  public static final Color QUIET_INK = new Color(0x6A, 0x71, 0x79);
  public static final Color RULE = new Color(0xD9, 0xDC, 0xDF);
  public static final Color PAPER = new Color(0xFC, 0xFB, 0xF8);

  public static final Color KAPPA = new Color(0x1D, 0x3F, 0x72);
  public static final Color VISCOSITY = new Color(0xB0, 0x7A, 0x14);
  public static final Color TEMPERATURE = new Color(0xA4, 0x3B, 0x2A);
  public static final Color WATER = new Color(0x12, 0x7C, 0x7A);
  public static final Color PARTICLES = new Color(0x70, 0x68, 0x91);
  public static final Color IRON = new Color(0x5E, 0x40, 0x26);

  /** Coefficients of what moves together, and of what moves against each other. */
  public static final Color TOGETHER = new Color(0x3F, 0x7A, 0x35);

  public static final Color AGAINST = new Color(0x97, 0x35, 0x70);

  /** Washes behind κ, from the boundary regime to the full film. */
  public static final Color BOUNDARY_WASH = new Color(0xD6, 0xDF, 0xEA);

  public static final Color MIXED_WASH = new Color(0xE3, 0xEA, 0xF2);
  public static final Color FILM_WASH = new Color(0xF6, 0xF8, 0xFA);

  private Palette() {}

  /** The same hue as a wash on paper: mixed with it, so that vector and raster look alike. */
  public static Color wash(Color colour, double share) {
    return new Color(
        mix(colour.getRed(), PAPER.getRed(), share),
        mix(colour.getGreen(), PAPER.getGreen(), share),
        mix(colour.getBlue(), PAPER.getBlue(), share));
  }

  /** A colour as a web page writes it. */
  public static String hex(Color colour) {
    return String.format(java.util.Locale.ROOT, "#%06x", colour.getRGB() & 0xFFFFFF);
  }

  private static int mix(int ink, int paper, double share) {
    return (int) Math.round(paper + share * (ink - paper));
  }
}
