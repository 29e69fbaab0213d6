package org.kappatrail.review.decision;

import java.time.LocalDate;
import java.util.List;
import java.util.OptionalDouble;
import org.kappatrail.history.Asset;
import org.kappatrail.history.Oil;
import org.kappatrail.history.Settings;

/**
 * What the decision needs to know of one asset.
 *
 * @param asset the asset with its costs
 * @param oil the oil of the present charge, as registered
 * @param candidate the oil that a change would bring: the same, unless another is asked about
 * @param oils every registered oil
 * @param bearings its bearings that have a κ, the governing one first
 * @param record what the samples say of the oil
 * @param sample id of the latest sample
 * @param sampled its day
 * @param waterPpm its water, mg/kg
 * @param settings how acts are weighed
 * @param uncertaintyC standard uncertainty of temperature, °C
 * @param sigmaLnV40 standard uncertainty of ln ν40
 * @param otherGrounds what else speaks for a change: water, dirt, acid beyond the site's limits
 */
public record AssetCase(
    Asset asset,
    Oil oil,
    Oil candidate,
    List<Oil> oils,
    List<BearingCase> bearings,
    OilRecord record,
    String sample,
    LocalDate sampled,
    OptionalDouble waterPpm,
    Settings.Decision settings,
    double uncertaintyC,
    double sigmaLnV40,
    List<String> otherGrounds) {
  public AssetCase {
    oils = List.copyOf(oils);
    bearings = List.copyOf(bearings);
    otherGrounds = List.copyOf(otherGrounds);
    if (bearings.isEmpty()) {
      throw new IllegalArgumentException("nothing to decide for " + asset.id() + " without a κ");
    }
  }

  /** The same asset, its governing bearing at another temperature and the others moved with it. */
  public AssetCase atTemperature(double temperatureC) {
    double warmer = temperatureC - governing().now().temperatureC();
    return with(
        candidate,
        bearings.stream().map(item -> item.at(item.now().temperatureC() + warmer)).toList(),
        settings);
  }

  /** The same asset, with another oil for a change. */
  public AssetCase changingTo(Oil other) {
    return with(other, bearings, settings);
  }

  /** The same asset over another horizon. */
  public AssetCase over(int horizonDays) {
    return with(
        candidate, bearings, new Settings.Decision(horizonDays, settings.failureCostRatio()));
  }

  private AssetCase with(Oil change, List<BearingCase> cases, Settings.Decision decision) {
    return new AssetCase(
        asset,
        oil,
        change,
        oils,
        cases,
        record,
        sample,
        sampled,
        waterPpm,
        decision,
        uncertaintyC,
        sigmaLnV40,
        otherGrounds);
  }

  /** The bearing with the least κ over its floor. */
  public BearingCase governing() {
    return bearings.get(0);
  }
}
