package org.kappatrail.report.chart;

/**
 * A place on a drawing that stands for something a reader may want to know more about.
 *
 * @param key what it stands for: a sample's id, or an asset's
 * @param x left edge, px
 * @param y upper edge, px
 * @param width px
 * @param height px
 */
public record Spot(String key, double x, double y, double width, double height) {}
