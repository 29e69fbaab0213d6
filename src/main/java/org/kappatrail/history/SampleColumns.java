package org.kappatrail.history;

import java.util.List;

/**
 * Names of the sample columns that the program itself knows; every other numeric column is kept.
 */
public final class SampleColumns {
  public static final String SAMPLE = "sample";
  public static final String ASSET = "asset";
  public static final String SAMPLED_AT = "sampled_at";
  public static final String RECEIVED_ON = "received_on";
  public static final String LABORATORY = "laboratory";
  public static final String ISO_4406 = "iso_4406";

  public static final String OIL_HOURS = "oil_hours";
  public static final String VISCOSITY_40C = "viscosity_40c_cst";
  public static final String VISCOSITY_100C = "viscosity_100c_cst";
  public static final String WATER = "water_ppm";
  public static final String PARTICLES_4UM = "particles_4um_per_ml";
  public static final String PARTICLES_6UM = "particles_6um_per_ml";
  public static final String PARTICLES_14UM = "particles_14um_per_ml";
  public static final String ACID_NUMBER = "acid_number_mg_koh_g";
  public static final String TEMPERATURE = "temperature_c";
  public static final String IRON = "iron_ppm";

  /** Particle counts, smallest size first. */
  public static final List<String> PARTICLES =
      List.of(PARTICLES_4UM, PARTICLES_6UM, PARTICLES_14UM);

  /** Ending of every element column, in mg/kg. */
  public static final String ELEMENT_SUFFIX = "_ppm";

  /** Columns that name, date or describe a sample. */
  public static final List<String> DESCRIPTIVE =
      List.of(SAMPLE, ASSET, SAMPLED_AT, RECEIVED_ON, LABORATORY, ISO_4406);

  /** Columns of numbers that have a meaning here, in the order of the contract. */
  public static final List<String> NUMERIC =
      List.of(
          OIL_HOURS,
          VISCOSITY_40C,
          VISCOSITY_100C,
          WATER,
          PARTICLES_4UM,
          PARTICLES_6UM,
          PARTICLES_14UM,
          ACID_NUMBER,
          TEMPERATURE);

  private SampleColumns() {}
}
