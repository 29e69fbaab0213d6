package org.kappatrail.intake;

import java.time.LocalDate;
import org.kappatrail.history.BearingKey;

/**
 * The days that the logs have of a bearing.
 *
 * @param bearing bearing that the readings name
 * @param from first day with a reading
 * @param to last day with a reading
 */
public record LogSpan(BearingKey bearing, LocalDate from, LocalDate to) {}
