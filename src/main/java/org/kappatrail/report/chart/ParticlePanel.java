package org.kappatrail.report.chart;

import java.awt.Color;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.DoubleStream;
import org.kappatrail.history.Sample;
import org.kappatrail.tribology.CleanlinessCode;
import org.knowm.xchart.style.markers.Marker;
import org.knowm.xchart.style.markers.SeriesMarkers;

/** Scale numbers of ISO 4406 for 4, 6 and 14 µm(c), told apart by marker and direct label. */
final class ParticlePanel {
  private static final int HEIGHT = 140;

  private ParticlePanel() {}

  private record Size(
      String name,
      Function<CleanlinessCode, CleanlinessCode.Part> part,
      Color ink,
      Marker marker) {}

  static Panel of(List<Sample> samples, TimeSpan span) {
    List<Size> sizes =
        List.of(
            new Size(
                "4 µm",
                CleanlinessCode::c4,
                Palette.wash(Palette.PARTICLES, 0.68),
                SeriesMarkers.TRIANGLE_UP),
            new Size(
                "6 µm",
                CleanlinessCode::c6,
                Palette.wash(Palette.PARTICLES, 0.85),
                SeriesMarkers.DIAMOND),
            new Size("14 µm", CleanlinessCode::c14, Palette.PARTICLES, SeriesMarkers.CIRCLE));
    List<Points> lines =
        sizes.stream()
            .map(
                size ->
                    Points.of(
                        samples,
                        sample -> sample.day().toEpochDay(),
                        sample -> number(sample, size.part())))
            .toList();
    double[] all = lines.stream().flatMapToDouble(line -> DoubleStream.of(line.values())).toArray();
    Axis axis =
        all.length == 0
            ? Axis.whole(0, 1)
            : Axis.whole(
                (int) DoubleStream.of(all).min().getAsDouble(),
                (int) DoubleStream.of(all).max().getAsDouble());
    Panel panel =
        new Panel("Particles, ISO 4406 scale number", Palette.PARTICLES, HEIGHT, span, axis);
    for (int i = 0; i < sizes.size(); i++) {
      panel.series(
          sizes.get(i).name(),
          lines.get(i).days(),
          lines.get(i).values(),
          sizes.get(i).ink(),
          1.2f,
          sizes.get(i).marker());
    }
    return panel.over(
        canvas -> {
          List<Double> taken = new ArrayList<>();
          for (int i = 0; i < sizes.size(); i++) {
            Points line = lines.get(i);
            if (!line.isEmpty()) {
              double y = canvas.y(line.values()[line.values().length - 1]) + 4;
              double free = Labels.free(taken, y);
              canvas.text(
                  sizes.get(i).name(),
                  canvas.plot().getMaxX() + 6,
                  free,
                  sizes.get(i).ink(),
                  11.5f);
            }
          }
        });
  }

  private static OptionalDouble number(
      Sample sample, Function<CleanlinessCode, CleanlinessCode.Part> part) {
    return sample
        .cleanliness()
        .map(part)
        .filter(found -> found.effectiveNumber().isPresent())
        .map(found -> OptionalDouble.of(found.effectiveNumber().getAsInt()))
        .orElse(OptionalDouble.empty());
  }
}
