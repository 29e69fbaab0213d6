package org.kappatrail.report.chart;

import java.awt.Graphics2D;
import java.util.List;

/** Something that can be painted at a fixed size, as raster or vector. */
public interface Drawing {
  /** Width, px. */
  int width();

  /** Height, px. */
  int height();

  void paint(Graphics2D g);

  /** Places that stand for something, in reading order. */
  default List<Spot> spots() {
    return List.of();
  }
}
