package org.kappatrail.demo;

import static java.time.LocalDate.parse;

import java.util.List;
import java.util.Map;
import org.kappatrail.demo.AssetStory.BearingHeat;
import org.kappatrail.demo.AssetStory.Speed;

/** The truth of Tarn Hollow, asset by asset. */
final class Stories {
  private static final String HABITS =
      """
      asset,hours_at_start,speed_low,speed_high,speed_hold_days,water_ppm,particles_4um,iron_ppm
      PM-DRY,21000,0.9,1,4,150,900,9
      PM-PRS,15000,0.9,1,4,110,700,7
      PM-WGB,9000,0.9,1,4,45,1000,22
      PM-RGB,6500,0.9,1,4,40,900,18
      PM-VP1,4200,1,1,1000,25,800,8
      PM-HXF,2000,1,1,1000,18,700,10
      PM-SUF,3100,0.338,1,5,14,600,6
      SP-CRP,5000,1,1,1000,30,1000,9
      SP-P3,6000,1,1,1000,28,800,8
      SP-AG4,8800,1,1,1000,60,1100,38
      SP-AG1,7000,1,1,1000,55,900,14
      SP-PGB,9500,1,1,1000,50,1000,20
      UT-AG2,8000,1,1,1000,70,900,12
      UT-SCR,7600,1,1,1000,45,800,9
      UT-WP1,4000,1,1,1000,35,600,5
      """;

  private static final String WARMTH =
      """
      asset,bearing,base_c,ambient_share,speed_c
      PM-DRY,D03-DS,61.5,0.12,3
      PM-DRY,D03-TS,62.5,0.12,3
      PM-DRY,D09-DS,60.5,0.12,3
      PM-PRS,P1-DS,61.0,0.20,3
      PM-PRS,P1-TS,61.5,0.20,3
      PM-WGB,OUT,67.5,0.25,5
      PM-RGB,OUT,60.0,0.25,5
      PM-VP1,DE,66.0,0.25,0
      PM-VP1,NDE,63.5,0.25,0
      PM-HXF,DE,82.0,0.20,0
      PM-HXF,NDE,79.5,0.20,0
      PM-SUF,DE,67.0,0.25,14
      SP-CRP,DE,75.0,0.25,0
      SP-CRP,NDE,72.5,0.25,0
      SP-P3,DE,62.5,0.25,0
      SP-P3,NDE,60.0,0.25,0
      SP-AG4,LOW,55.0,0.20,0
      SP-AG1,LOW,50.0,0.20,0
      SP-PGB,OUT,58.5,0.20,0
      UT-AG2,LOW,57.4,0.74,0
      UT-SCR,DRIVE,55.0,0.40,0
      UT-WP1,THRUST,50.5,0.30,0
      UT-WP1,GUIDE,47.5,0.30,0
      """;

  /** Water by round, mg/kg: each round a draw of its own, so that what follows it stands out. */
  private static final List<Integer> STEAM_AT_THE_DRYERS =
      List.of(
          150, 170, 140, 420, 80, 390, 190, 90, 115, 210, 110, 105, 120, 100, 230, 90, 95, 260, 140,
          120, 85, 310, 180, 360, 280, 240, 130, 75, 150, 350);

  private static final Map<String, List<Influence>> INFLUENCES =
      Map.of(
          "PM-DRY", List.of(new Influence.Steam(STEAM_AT_THE_DRYERS)),
          "PM-PRS",
              List.of(new Influence.FouledCooler(parse("2026-04-10"), parse("2026-10-20"), 18.5)),
          "PM-WGB", List.of(new Influence.WrongTopUp(parse("2026-04-14"), "hydraulic-46", 0.131)),
          "PM-VP1", List.of(new Influence.StuckSensor("NDE", parse("2026-05-19"), 216)),
          "PM-HXF",
              List.of(
                  new Influence.Oxidation(parse("2024-05-01"), parse("2026-02-10"), 0.17, 0.42),
                  new Influence.SilentChange(parse("2026-02-12"), false)),
          "SP-CRP",
              List.of(new Influence.Dilution(parse("2025-06-17"), parse("2026-10-31"), 0.075)),
          "SP-P3", List.of(new Influence.SilentChange(parse("2025-09-10"), true)),
          "SP-PGB", List.of(new Influence.Swap(parse("2026-10-01"), "SP-AG1")),
          "UT-SCR",
              List.of(new Influence.Shear(parse("2024-11-12"), parse("2026-10-31"), 0.185, 17)));

  private static final List<AssetStory> ALL = Rows.of(HABITS).stream().map(Stories::story).toList();

  private Stories() {}

  static List<AssetStory> all() {
    return ALL;
  }

  static AssetStory of(String asset) {
    return ALL.stream()
        .filter(story -> story.asset().equals(asset))
        .findFirst()
        .orElseThrow(() -> new IllegalArgumentException("no story of " + asset));
  }

  private static AssetStory story(Map<String, String> habits) {
    String asset = Rows.text(habits, "asset");
    return new AssetStory(
        asset,
        Rows.number(habits, "hours_at_start"),
        new Speed(
            Rows.number(habits, "speed_low"),
            Rows.number(habits, "speed_high"),
            Rows.number(habits, "speed_hold_days")),
        Rows.number(habits, "water_ppm"),
        Rows.number(habits, "particles_4um"),
        Rows.number(habits, "iron_ppm"),
        Rows.of(WARMTH).stream()
            .filter(row -> Rows.text(row, "asset").equals(asset))
            .map(Stories::heat)
            .toList(),
        INFLUENCES.getOrDefault(asset, List.of()));
  }

  private static BearingHeat heat(Map<String, String> row) {
    return new BearingHeat(
        Rows.text(row, "bearing"),
        Rows.number(row, "base_c"),
        Rows.number(row, "ambient_share"),
        Rows.number(row, "speed_c"));
  }
}
