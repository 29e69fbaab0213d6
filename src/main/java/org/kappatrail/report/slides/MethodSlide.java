package org.kappatrail.report.slides;

import java.awt.geom.Rectangle2D;
import java.util.List;

/** How the numbers came about, and what they do not say. */
final class MethodSlide {
  private static final double GAP = 36;
  private static final double MOST = 17;
  private static final double LEAST = 14;

  private static final List<String> METHOD =
      List.of(
          "κ = ν/ν1: the sampled oil's viscosity at operating temperature (ASTM D341) over the rated"
              + " viscosity of ISO 281.",
          "Temperature and speed are those of the running hours of the days before the sample.",
          "The 95 % interval comes from the laboratory's reproducibility and the temperature's"
              + " uncertainty.",
          "What moved κ is split into oil, temperature and speed; the parts add up.",
          "An act is weighed by the failures it prevents (ISO 281 life) against its price.",
          "Code: the scale number of ISO 4406 for particles of that size and above.",
          "Level: alarm where κ is below the floor, alert where its interval reaches below.");

  private static final List<String> CAUTIONS =
      List.of(
          "Decision support: it does not replace the machine maker's manual, the site's rules or a"
              + " qualified lubrication engineer.",
          "κ says how thin the film is, not that a bearing is damaged. ISO 281 assumes clean"
              + " mounting, no overload, and κ from 0.1 to 4.",
          "Isolate and lock out before a machine is opened. Hot oil and pressure at sampling points"
              + " burn and inject.",
          "Used oil is waste under local law.");

  private MethodSlide() {}

  static void add(Stage stage) {
    Leaf leaf = stage.leaf("How the numbers came about, and what to keep in mind");
    Rectangle2D room = leaf.room();
    double width = (room.getWidth() - GAP) / 2;
    double points = MOST;
    while (points > LEAST
        && Math.max(height(leaf, METHOD, width, points), height(leaf, CAUTIONS, width, points))
            > room.getHeight()) {
      points--;
    }
    column(leaf, room.getX(), width, "Method", METHOD, points);
    column(leaf, room.getX() + width + GAP, width, "Cautions", CAUTIONS, points);
  }

  private static double height(Leaf leaf, List<String> items, double width, double points) {
    double height = 28;
    for (String item : items) {
      height += leaf.fit().lines(item, width, points, false).size() * points * TextFit.LINE + 8;
    }
    return height;
  }

  private static void column(
      Leaf leaf, double x, double width, String name, List<String> items, double points) {
    double y = leaf.room().getY();
    leaf.box(x, y, width, 24).line(name, 18, true);
    y += 28;
    for (String item : items) {
      double height = leaf.fit().lines(item, width, points, false).size() * points * TextFit.LINE;
      if (y + height <= leaf.room().getMaxY() + 1) {
        leaf.box(x, y, width, height).paragraph(item, points, false, 20);
      }
      y += height + 8;
    }
  }
}
