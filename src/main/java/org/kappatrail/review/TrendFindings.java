package org.kappatrail.review;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Settings;
import org.kappatrail.review.trend.Attribution;
import org.kappatrail.review.trend.ChargeDrift;
import org.kappatrail.review.trend.Crossing;
import org.kappatrail.review.trend.Direction;
import org.kappatrail.review.trend.Drift;
import org.kappatrail.review.trend.FilmState;
import org.kappatrail.review.trend.Forecast;
import org.kappatrail.review.trend.OilShift;
import org.kappatrail.review.trend.Outlook;
import org.kappatrail.review.trend.SampleAttribution;
import org.kappatrail.review.trend.SeasonalDip;

/**
 * Findings about where a bearing's film is going over the present charge. A drift is a finding
 * where the trail falls or rises and the change exceeds what two samples of one oil may differ by
 * at 95 %; a warm season that was as warm a year ago is not called heat or drift.
 */
final class TrendFindings {
  /** 95 % limit of the difference of two values in standard deviations. */
  private static final double DIFFERENCE_95 = 1.96 * Math.sqrt(2);

  private final BearingReview review;
  private final KappaPoint latest;
  private final Film film;
  private final Settings settings;
  private final Optional<Outlook> outlook;
  private final Optional<Attribution> sinceStart;
  private final List<Finding> findings = new ArrayList<>();

  private TrendFindings(BearingReview review, KappaPoint latest, Settings settings) {
    this.review = review;
    this.latest = latest;
    this.film = latest.film().orElseThrow();
    this.settings = settings;
    this.outlook = review.trend().outlook();
    this.sinceStart =
        review.trend().attribution(latest.sample().id(), SampleAttribution.CHARGE_START);
  }

  /**
   * Findings of one bearing.
   *
   * @param trusted false where the charge holds an oil change that nobody recorded, so that its
   *     trend means nothing
   */
  static List<Finding> of(BearingReview review, Settings settings, boolean trusted) {
    Optional<KappaPoint> latest = review.latestFilm();
    if (latest.isEmpty()) {
      return List.of();
    }
    TrendFindings search = new TrendFindings(review, latest.get(), settings);
    Optional<ChargeDrift> drift = review.trend().drift(latest.get().charge().number());
    boolean oilDrifts = trusted && drift.isPresent() && search.oil(drift.get());
    if (trusted) {
      drift.ifPresent(found -> search.film(found.achieved(), oilDrifts));
      if (oilDrifts) {
        search.crossing();
      }
    }
    search.heat();
    search.seasonalDip();
    return search.findings;
  }

  private boolean oil(ChargeDrift drift) {
    Drift trail = drift.reference();
    double limit = DIFFERENCE_95 * film.sigmaLnV40() * film.sensitivityToV40();
    boolean moves = trail.direction() == Direction.FALLING || trail.direction() == Direction.RISING;
    if (moves && Math.abs(trail.change()) > limit) {
      boolean falls = trail.direction() == Direction.FALLING;
      add(
          Level.ALERT,
          FindingKind.OIL_DRIFT,
          Say.text(
              "the oil %s: κ at reference conditions %s over the charge's %d samples, %s a month"
                  + "%s (Mann–Kendall p %s); %s mm²/s at 40 °C now",
              falls ? "thins" : "thickens",
              Say.percent(Math.expm1(trail.change())),
              trail.samples(),
              monthly(trail.slopePer30Days()),
              limits(trail),
              Say.significant(trail.p().getAsDouble(), 2),
              Say.viscosity(latest.viscosity().orElseThrow().viscosity40Cst())));
      return falls;
    }
    drift.oilShift().filter(OilShift::lasting).ifPresent(shift -> oilShift(trail, shift.day()));
    return false;
  }

  private void oilShift(Drift trail, LocalDate day) {
    add(
        Level.CLEAR,
        FindingKind.OIL_SHIFT,
        Say.text(
            "the oil has stood below the register's for the charge's %d samples, by less than a"
                + " single pair of them can show: the cumulative sum signals on %s (k 0.5, h 5)",
            trail.samples(), day));
  }

  private void film(Drift trail, boolean oilDrifts) {
    double limit = DIFFERENCE_95 * film.uncertainty().sigmaLn();
    if (trail.direction() != Direction.FALLING || -trail.change() <= limit) {
      return;
    }
    boolean temperatureMostly =
        sinceStart
            .filter(parts -> parts.temperature() < Math.min(parts.oil(), parts.speed()))
            .isPresent();
    if (!oilDrifts && temperatureMostly && asWarmAsLastYear()) {
      return;
    }
    add(
        Level.ALERT,
        FindingKind.FILM_DRIFT,
        Say.text(
            "κ falls, %s over the charge's %d samples, %s a month%s (Mann–Kendall p %s)%s",
            Say.percent(Math.expm1(trail.change())),
            trail.samples(),
            monthly(trail.slopePer30Days()),
            limits(trail),
            Say.significant(trail.p().getAsDouble(), 2),
            sinceStart.map(parts -> "; since its first sample: " + Moved.words(parts)).orElse("")));
  }

  private boolean asWarmAsLastYear() {
    OptionalDouble then = outlook.map(Outlook::yearAgoC).orElse(OptionalDouble.empty());
    return then.isPresent()
        && Forecast.asLastYear(
            latest.point().temperatureC().getAsDouble(),
            then.getAsDouble(),
            settings.duty().uncertaintyC());
  }

  /**
   * Hotter than a year ago at this season, where the log reaches back so far; else than at the
   * charge's first sample, which may be the season's doing.
   */
  private void heat() {
    OptionalDouble then = outlook.map(Outlook::yearAgoC).orElse(OptionalDouble.empty());
    if (then.isPresent()) {
      hotterThanAYearAgo(then.getAsDouble());
    } else {
      sinceStart.ifPresent(this::hotterThanAtTheStart);
    }
  }

  private double measurableHeat() {
    return DIFFERENCE_95
        * Math.abs(film.sensitivityToTemperature())
        * settings.duty().uncertaintyC();
  }

  private void hotterThanAYearAgo(double thenC) {
    FilmState now = TrendOfTrail.state(latest);
    double part = Attribution.between(now.at(thenC, now.speedRpm()), now).temperature();
    double oil = sinceStart.map(Attribution::oil).orElse(0.0);
    if (part >= -measurableHeat() || part >= oil) {
      return;
    }
    add(
        Level.ALERT,
        FindingKind.HEAT,
        Say.text(
            "%s °C now, %s °C a year ago at this season: the heat costs %s %% of κ%s",
            Say.oneDecimal(now.temperatureC()),
            Say.oneDecimal(thenC),
            Say.whole(-Math.expm1(part) * 100),
            sinceStart.map(parts -> "; since the charge began " + Moved.words(parts)).orElse("")));
  }

  private void hotterThanAtTheStart(Attribution parts) {
    double limit = measurableHeat();
    boolean hotter =
        parts.temperature() < -limit
            && parts.temperature() < Math.min(parts.oil(), parts.speed())
            && parts.total() < -limit;
    if (!hotter) {
      return;
    }
    add(
        film.level() == Level.CLEAR ? Level.CLEAR : Level.ALERT,
        FindingKind.HEAT,
        Say.text(
            "since the charge began %s; %s °C now, and the log is too short to tell a season from"
                + " a fault",
            Moved.words(parts), Say.oneDecimal(latest.point().temperatureC().getAsDouble())));
  }

  private void seasonalDip() {
    Optional<SeasonalDip> found = outlook.flatMap(Outlook::dip);
    if (found.isEmpty()) {
      return;
    }
    SeasonalDip dip = found.get();
    LocalDate horizon = latest.sample().day().plusDays(settings.outlookDays());
    String least = Say.kappa(dip.leastKappa());
    add(
        dip.present() || !dip.from().isAfter(horizon) ? Level.ALERT : Level.CLEAR,
        FindingKind.SEASONAL_DIP,
        dip.present()
            ? Say.text(
                "κ is below the floor with the season: as warm as a year ago, and with last year's"
                    + " temperatures this same oil is back above it after %s",
                dip.to())
            : Say.text(
                "with last year's temperatures this same oil goes below the floor from %s to %s"
                    + " (least κ %s) and comes back",
                dip.from(), dip.to(), least));
  }

  private void crossing() {
    Optional<LocalDate> first = outlook.flatMap(Outlook::firstCrossing);
    LocalDate horizon = latest.sample().day().plusDays(settings.outlookDays());
    if (first.isEmpty() || first.get().isAfter(horizon) || film.kappa() < review.floor()) {
      return;
    }
    Crossing present = outlook.orElseThrow().atPresentPoint();
    String seasonal =
        outlook
            .flatMap(Outlook::withLastYear)
            .filter(crossing -> !crossing.equals(Crossing.NONE))
            .map(crossing -> "; with last year's temperatures " + dates(crossing))
            .orElse("");
    add(
        Level.ALERT,
        FindingKind.CROSSING_FORESEEN,
        "if the oil goes on thinning, κ reaches the floor "
            + Say.kappa(review.floor())
            + " at the present operating point "
            + dates(present)
            + seasonal);
  }

  /** A crossing in words. */
  static String dates(Crossing crossing) {
    if (crossing.likely().isEmpty() && crossing.earliest().isEmpty()) {
      return "not within ten years";
    }
    String likely = crossing.likely().map(LocalDate::toString).orElse("not within ten years");
    return "on "
        + likely
        + " (earliest "
        + crossing.earliest().map(LocalDate::toString).orElse("unknown")
        + ", latest "
        + crossing.latest().map(LocalDate::toString).orElse("never by this slope")
        + ")";
  }

  private static String monthly(OptionalDouble slope) {
    return Say.signedPercent(Math.expm1(slope.getAsDouble()), 1);
  }

  private static String limits(Drift trail) {
    OptionalDouble low = trail.slopeLowPer30Days();
    OptionalDouble high = trail.slopeHighPer30Days();
    return low.isPresent() && high.isPresent()
        ? " (95 %: " + monthly(low) + " to " + monthly(high) + ")"
        : "";
  }

  private void add(Level level, FindingKind kind, String message) {
    findings.add(
        new Finding(
            review.bearing().asset(),
            Optional.of(review.bearing().id()),
            Optional.of(latest.sample().id()),
            level,
            kind,
            message));
  }
}
