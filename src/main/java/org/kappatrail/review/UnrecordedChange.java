package org.kappatrail.review;

import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Event;
import org.kappatrail.history.EventKind;
import org.kappatrail.history.Oil;
import org.kappatrail.history.Sample;
import org.kappatrail.history.SampleColumns;
import org.kappatrail.tribology.AstmD445Precision;

/**
 * A jump of ν40 toward the registered oil's value by more than half of the shift, within one charge
 * and without a recorded top-up: an oil change that nobody wrote down. So that one odd sample does
 * not pass for it, the shift must stand in the two samples before the jump (as far as the charge
 * has them) and stay gone in the one after.
 */
final class UnrecordedChange {
  private UnrecordedChange() {}

  static List<Finding> in(Charge charge, Oil oil, List<Event> events) {
    List<Sample> samples =
        charge.samples().stream()
            .filter(sample -> sample.exact(SampleColumns.VISCOSITY_40C).isPresent())
            .toList();
    List<Finding> findings = new ArrayList<>();
    double fresh = oil.viscosity().viscosity40Cst();
    for (int i = 1; i < samples.size(); i++) {
      double before = shift(samples.get(i - 1), fresh);
      double steady = i >= 2 ? shift(samples.get(i - 2), fresh) : before;
      double after = shift(samples.get(i), fresh);
      double confirmed = i + 1 < samples.size() ? shift(samples.get(i + 1), fresh) : after;
      double real = AstmD445Precision.reproducibilityPercent(fresh) / 100 * fresh;
      boolean stood = Math.abs(before) > real && before * steady > 0 && Math.abs(steady) > real;
      boolean jumped = Math.abs(after) < Math.abs(before) / 2 && Math.abs(before - after) > real;
      if (stood
          && jumped
          && Math.abs(confirmed) < Math.abs(before) / 2
          && noTopUp(events, samples.get(i - 1), samples.get(i))) {
        findings.add(
            new Finding(
                charge.asset(),
                Optional.empty(),
                Optional.of(samples.get(i).id()),
                Level.ALERT,
                FindingKind.UNRECORDED_OIL_CHANGE,
                Say.text(
                    "viscosity at 40 °C went from %s to %s mm²/s between %s and %s, back to the"
                        + " fresh oil's %s, and no oil change is recorded",
                    Say.viscosity(fresh + before),
                    Say.viscosity(fresh + after),
                    samples.get(i - 1).day(),
                    samples.get(i).day(),
                    Say.viscosity(fresh))));
      }
    }
    return findings;
  }

  private static boolean noTopUp(List<Event> events, Sample before, Sample after) {
    return events.stream()
        .noneMatch(
            event ->
                event.kind() == EventKind.TOP_UP
                    && !event.date().isBefore(before.day())
                    && !event.date().isAfter(after.day()));
  }

  private static double shift(Sample sample, double fresh) {
    return sample.exact(SampleColumns.VISCOSITY_40C).getAsDouble() - fresh;
  }
}
