package org.kappatrail.heldout;

import java.time.Instant;
import java.time.LocalDate;
import java.util.List;
import java.util.OptionalDouble;

/** The records of a history as plain data; an absent number is an absent cell. */
record Site(
    List<Oil> oils,
    List<Asset> assets,
    List<Ring> bearings,
    List<Bottle> samples,
    List<Change> changes,
    List<Reading> readings,
    LocalDate asOf) {

  record Oil(String id, double v40, OptionalDouble v100, OptionalDouble index) {
    PlainOil law() {
      return v100.isPresent()
          ? PlainOil.measured(v40, v100.getAsDouble())
          : PlainOil.ofIndex(v40, index.getAsDouble());
    }
  }

  record Asset(String id, String oil, boolean filtered, OptionalDouble contamination) {}

  record Ring(
      String asset,
      String id,
      String type,
      OptionalDouble bore,
      OptionalDouble outside,
      OptionalDouble pitch,
      double rpm,
      OptionalDouble c,
      OptionalDouble c0,
      OptionalDouble cu,
      OptionalDouble p,
      OptionalDouble floor,
      double offset) {
    double meanDiameter() {
      return pitch.orElseGet(() -> (bore.getAsDouble() + outside.getAsDouble()) / 2);
    }
  }

  /** A sample; texts are cells as they stand in the file. */
  record Bottle(
      String id,
      String asset,
      LocalDate day,
      double oilHours,
      String v40,
      String v100,
      String water,
      String code,
      String count4,
      String count6,
      String count14,
      String temperature) {}

  record Change(String asset, LocalDate day, String oil) {}

  /** A reading; texts are cells as they stand in the file. */
  record Reading(
      Instant at, String asset, String bearing, String temperature, String speed, String quality) {}
}
