package org.kappatrail.report.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import org.kappatrail.history.Sample;

/** Panels under each other on one shared time axis, with marks of events through all of them. */
final class PanelStack implements Drawing {
  static final int WIDTH = 1180;
  private static final int HEAD = 66;
  private static final int FOOT = 62;
  private static final double HALF_STRIP = 14;
  private static final double LEAST_HALF_STRIP = 3;

  private final String title;
  private final String subtitle;
  private final String source;
  private final TimeSpan span;
  private final List<Panel> panels = new ArrayList<>();
  private final List<EventMark> marks;
  private List<Sample> samples = List.of();

  /**
   * A stack.
   *
   * @param title what it shows
   * @param subtitle the reading of it
   * @param source where the numbers come from
   * @param span stretch of time
   * @param marks events to mark
   */
  PanelStack(String title, String subtitle, String source, TimeSpan span, List<EventMark> marks) {
    this.title = title;
    this.subtitle = subtitle;
    this.source = source;
    this.span = span;
    this.marks = List.copyOf(marks);
  }

  /** Adds a panel unless it has nothing to show. */
  void add(Panel panel) {
    if (!panel.empty()) {
      panels.add(panel);
    }
  }

  /** Says which sample stands at which day; each gets a strip through all panels. */
  void samples(List<Sample> inTime) {
    samples = List.copyOf(inTime);
  }

  @Override
  public List<Spot> spots() {
    List<Spot> spots = new ArrayList<>();
    double top = HEAD;
    double height = panels.stream().mapToInt(Panel::height).sum();
    for (int i = 0; i < samples.size(); i++) {
      double x = x(samples.get(i).day());
      double left = x - HALF_STRIP;
      double right = x + HALF_STRIP;
      if (i > 0) {
        left = Math.max(left, (x(samples.get(i - 1).day()) + x) / 2);
      }
      if (i + 1 < samples.size()) {
        right = Math.min(right, (x(samples.get(i + 1).day()) + x) / 2);
      }
      left = Math.min(left, x - LEAST_HALF_STRIP);
      right = Math.max(right, x + LEAST_HALF_STRIP);
      spots.add(new Spot(samples.get(i).id(), left, top, right - left, height));
    }
    return spots;
  }

  List<Panel> panels() {
    return List.copyOf(panels);
  }

  @Override
  public int width() {
    return WIDTH;
  }

  @Override
  public int height() {
    return HEAD + panels.stream().mapToInt(Panel::height).sum() + FOOT;
  }

  @Override
  public void paint(Graphics2D g) {
    Quality.set(g);
    g.setColor(Palette.PAPER);
    g.fill(new Rectangle2D.Double(0, 0, width(), height()));
    head(g);
    int top = HEAD;
    for (Panel panel : panels) {
      g.translate(0, top);
      panel.paint(g, WIDTH, span.ticks());
      g.translate(0, -top);
      top += panel.height();
    }
    calendar(g, top);
    events(g, top);
    titles(g);
    g.setFont(ChartFont.of(11));
    g.setColor(Palette.QUIET_INK);
    g.drawString(Fitted.to(g, source, WIDTH - Panel.LEFT - 20), Panel.LEFT, height() - 12);
  }

  private void titles(Graphics2D g) {
    int top = HEAD;
    for (Panel panel : panels) {
      g.translate(0, top);
      panel.paintTitle(g, WIDTH);
      g.translate(0, -top);
      top += panel.height();
    }
  }

  private void head(Graphics2D g) {
    g.setColor(Palette.INK);
    g.setFont(ChartFont.bold(17));
    g.drawString(Fitted.to(g, title, WIDTH - Panel.LEFT - 20), Panel.LEFT, 24);
    g.setFont(ChartFont.of(12.5f));
    g.setColor(Palette.QUIET_INK);
    g.drawString(Fitted.to(g, subtitle, WIDTH - Panel.LEFT - 20), Panel.LEFT, 42);
  }

  private void calendar(Graphics2D g, int top) {
    g.setFont(ChartFont.of(11.5f));
    boolean first = true;
    for (TimeSpan.Tick tick : span.ticks()) {
      double x = x(tick.day());
      g.setColor(Palette.QUIET_INK);
      g.draw(new Line2D.Double(x, top - 6, x, top - 1));
      centred(g, tick.label(), x, top + 12);
      if (tick.year() || first) {
        g.setColor(Palette.INK);
        centred(g, Integer.toString(tick.day().getYear()), x, top + 27);
      }
      first = false;
    }
  }

  private void events(Graphics2D g, int bottom) {
    double freeFrom = 0;
    for (EventMark mark : marks) {
      if (mark.day().isBefore(span.from()) || mark.day().isAfter(span.to())) {
        continue;
      }
      double x = x(mark.day());
      Color ink = Palette.INK;
      switch (mark.kind()) {
        case OIL_CHANGE -> vertical(g, x, HEAD - 6, bottom - 6, ink, new BasicStroke(1.1f));
        case INFERRED_CHANGE ->
            vertical(
                g,
                x,
                HEAD - 6,
                bottom - 6,
                ink,
                new BasicStroke(1.1f, 0, 0, 10, new float[] {5, 4}, 0));
        case BEARING_REPLACED -> {
          vertical(g, x - 1.6, HEAD - 6, bottom - 6, ink, new BasicStroke(0.9f));
          vertical(g, x + 1.6, HEAD - 6, bottom - 6, ink, new BasicStroke(0.9f));
        }
        case SHORT -> vertical(g, x, HEAD - 6, HEAD + 12, ink, new BasicStroke(1.1f));
      }
      g.setFont(ChartFont.of(11));
      double width = g.getFontMetrics().stringWidth(mark.label());
      double start = Math.max(Panel.LEFT, Math.min(x - width / 2, WIDTH - width - 4));
      if (start >= freeFrom) {
        g.setColor(ink);
        g.drawString(mark.label(), (float) start, HEAD - 9);
        freeFrom = start + width + 8;
      }
    }
  }

  private static void vertical(
      Graphics2D g, double x, double from, double to, Color ink, BasicStroke stroke) {
    g.setColor(ink);
    g.setStroke(stroke);
    g.draw(new Line2D.Double(x, from, x, to));
    g.setStroke(new BasicStroke(1f));
  }

  private double x(LocalDate day) {
    double share = (day.toEpochDay() - span.fromX()) / (span.toX() - span.fromX());
    return Panel.LEFT + share * (WIDTH - Panel.LEFT - Panel.RIGHT);
  }

  private static void centred(Graphics2D g, String text, double x, double y) {
    double width = g.getFontMetrics().stringWidth(text);
    g.drawString(text, (float) (x - width / 2), (float) y);
  }
}
