package org.kappatrail.report.page;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.kappatrail.review.correlation.Form;
import org.kappatrail.review.correlation.PairCorrelation;
import org.kappatrail.review.correlation.Scope;
import org.kappatrail.statistics.CorrelationTest;

class CorrelationSectionTest {

  @Test
  void sentencesNumbersAndTheCautionStandTogether() {
    String html =
        html(
            List.of(pair(Form.MEASURED, 0.02), pair(Form.DETRENDED, 0.04)),
            Optional.of(Picture.ofText("<svg></svg>")));
    assertThat(html)
        .contains("<li>Lead&lt;b&gt; follows κ by one sample (−0.61, N* 22, q 0.02).</li>")
        .contains("Correlation is not cause")
        .contains("<svg class=\"chart\" role=\"img\" aria-label=\"Correlations of PM-DRY;")
        .contains("<td class=\"n\">−0.81 to −0.20</td>")
        .doesNotContain("<b> follows");
  }

  @Test
  void withoutAnyTestOnlyThatIsSaid() {
    assertThat(html(List.of(), Optional.empty()))
        .contains("Too few samples")
        .doesNotContain("<table");
  }

  private static String html(List<PairCorrelation> tests, Optional<Picture> picture) {
    Html html = new Html();
    new CorrelationSection(tests, picture, false).write(html, "PM-DRY", "c1");
    return html.toString();
  }

  private static PairCorrelation pair(Form form, double q) {
    return new PairCorrelation(
        Scope.ASSET,
        Optional.of("PM-DRY"),
        "kappa",
        "lead<b>_ppm",
        1,
        form,
        30,
        1,
        new CorrelationTest(-0.61, 22.4, 0.003, -0.81, -0.2),
        OptionalDouble.of(q),
        false);
  }
}
