package org.kappatrail.history;

import java.time.LocalDate;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A recorded act on an asset.
 *
 * @param asset asset it was done to
 * @param date day it was done, site time
 * @param kind what was done
 * @param oil oil that went in, where oil did
 * @param litres how much went in
 * @param bearing bearing it concerns, where it concerns one
 * @param note free text
 */
public record Event(
    String asset,
    LocalDate date,
    EventKind kind,
    Optional<String> oil,
    OptionalDouble litres,
    Optional<String> bearing,
    String note) {
  public Event {
    Names.require("asset", asset);
    Quantity.positive("litres", litres);
  }
}
