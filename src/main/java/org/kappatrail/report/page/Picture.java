package org.kappatrail.report.page;

import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.function.Supplier;
import org.kappatrail.report.chart.Spot;

/**
 * A chart for the page. Its text is read when it is wanted, so that the charts of a large fleet are
 * not all in memory at once.
 *
 * @param text gives its SVG
 * @param spots places on it that a reader may point at
 */
public record Picture(Supplier<String> text, List<Spot> spots) {
  public Picture {
    spots = List.copyOf(spots);
  }

  /** A chart in a file of the pack. */
  public static Picture ofFile(Path file, List<Spot> spots) {
    return new Picture(
        () -> {
          try {
            return Files.readString(file);
          } catch (IOException e) {
            throw new UncheckedIOException(e);
          }
        },
        spots);
  }

  /** A chart given as its SVG. */
  public static Picture ofText(String svg) {
    return new Picture(() -> svg, List.of());
  }
}
