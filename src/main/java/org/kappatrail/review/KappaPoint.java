package org.kappatrail.review;

import java.util.Optional;
import java.util.OptionalDouble;
import org.kappatrail.history.Charge;
import org.kappatrail.history.Sample;
import org.kappatrail.tribology.OilViscosity;

/**
 * One sample seen from one bearing.
 *
 * @param sample the sample
 * @param charge the oil charge it belongs to
 * @param viscosity viscosity of the sampled oil; empty where ν40 was not measured
 * @param point temperature and speed that stand for it
 * @param film κ and what belongs to it; empty without viscosity or temperature
 * @param kappaReference κ of this oil at the bearing's reference conditions
 * @param life life figures at the operating point
 * @param runningHours running hours since the previous sample, for the first since the log began
 * @param mixedHours hours of them with κ below 1
 */
public record KappaPoint(
    Sample sample,
    Charge charge,
    Optional<OilViscosity> viscosity,
    OperatingPoint point,
    Optional<Film> film,
    OptionalDouble kappaReference,
    LifeAtPoint life,
    OptionalDouble runningHours,
    OptionalDouble mixedHours) {}
