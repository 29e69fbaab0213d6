package org.kappatrail.demo;

import java.time.LocalDate;

/**
 * What an oil sample truly holds.
 *
 * @param oil the oil itself
 * @param waterPpm mg/kg
 * @param particles4um per ml
 * @param particles6um per ml
 * @param particles14um per ml
 * @param ironPpm mg/kg
 * @param copperPpm mg/kg
 * @param siliconPpm mg/kg
 */
record Bottle(
    OilState oil,
    double waterPpm,
    double particles4um,
    double particles6um,
    double particles14um,
    double ironPpm,
    double copperPpm,
    double siliconPpm) {

  private static final double YEAR_H = 8000;
  private static final double WEAR_CARRIED_BY_STEAM = 0.85;

  /** Drawn at an asset in a round. */
  static Bottle at(AssetStory story, OilTruth truth, int round) {
    LocalDate day = Rounds.of(story.asset()).get(round);
    double moist = wander(story, "water", 0.22, 0.5)[round];
    double dust = wander(story, "particles", 0.16, 0.4)[round];
    double wear = wander(story, "wear", 0.14, 0.6)[round];
    double water = story.waterPpm() * Math.exp(moist);
    double carried = 0;
    for (Influence.Steam steam : story.influences(Influence.Steam.class)) {
      water = steam.waterAt(round);
      carried = WEAR_CARRIED_BY_STEAM * steam.strength(round - 1);
    }
    double age = truth.trueHours(day) / YEAR_H;
    double four = story.particles4um() * Math.exp(dust + carried);
    double metal = story.ironPpm() * (0.25 + 0.75 * age / (0.5 + 0.5 * age));
    return new Bottle(
        truth.at(day),
        water,
        four,
        four * 0.34 * Math.exp(0.5 * wander(story, "six", 0.16, 0.2)[round]),
        four * 0.036 * Math.exp(wander(story, "fourteen", 0.16, 0.2)[round]),
        metal * Math.exp(wear + carried),
        0.3 * metal * Math.exp(wander(story, "copper", 0.16, 0.6)[round] + 0.4 * carried),
        4 * Math.exp(wander(story, "silicon", 0.2, 0.3)[round] + 0.5 * dust));
  }

  private static double[] wander(
      AssetStory story, String what, double deviation, double persistence) {
    return Noise.named(what, story.asset()).series(Timeline.MONTHS, deviation, persistence);
  }
}
