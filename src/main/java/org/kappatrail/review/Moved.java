package org.kappatrail.review;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.kappatrail.review.trend.Attribution;

/** What moved κ, in words whose whole percentages add up. */
public final class Moved {
  private Moved() {}

  /** Percentages of the change by oil, temperature and speed; they add up to the whole one. */
  public record Percentages(int whole, int oil, int temperature, int speed) {}

  private static final class Part {
    private final double exact;
    private int rounded;

    Part(double exact) {
      this.exact = exact;
      this.rounded = (int) Math.floor(exact);
    }

    double rest() {
      return exact - rounded;
    }
  }

  /** Rounds by the largest remainder, so that the sum stays true. */
  public static Percentages percentages(Attribution moved) {
    int whole = (int) Math.rint(moved.change() * 100);
    List<Part> parts = new ArrayList<>();
    for (double part : new double[] {moved.oil(), moved.temperature(), moved.speed()}) {
      parts.add(new Part(moved.share(part) * 100));
    }
    int missing = whole - parts.stream().mapToInt(part -> part.rounded).sum();
    List<Part> byRest = new ArrayList<>(parts);
    byRest.sort(Comparator.comparingDouble(Part::rest).reversed());
    for (int i = 0; i < missing && i < byRest.size(); i++) {
      byRest.get(i).rounded++;
    }
    return new Percentages(whole, parts.get(0).rounded, parts.get(1).rounded, parts.get(2).rounded);
  }

  /** For instance "κ fell by 34 %: oil 9 %, temperature 27 %, speed −2 %". */
  public static String words(Attribution moved) {
    Percentages found = percentages(moved);
    boolean fell = found.whole() <= 0;
    int sign = fell ? -1 : 1;
    String verb = found.whole() == 0 ? "κ stayed" : fell ? "κ fell by " : "κ rose by ";
    return verb
        + (found.whole() == 0 ? "" : Math.abs(found.whole()) + " %")
        + ": oil "
        + signed(sign * found.oil())
        + ", temperature "
        + signed(sign * found.temperature())
        + ", speed "
        + signed(sign * found.speed());
  }

  private static String signed(int percent) {
    return (percent < 0 ? "−" + -percent : Integer.toString(percent)) + " %";
  }
}
