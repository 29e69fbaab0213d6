package org.kappatrail.review;

import org.kappatrail.tribology.KappaUncertainty;
import org.kappatrail.tribology.LubricationRegime;

/**
 * The oil film of one bearing at one sample.
 *
 * @param operatingCst kinematic viscosity at the operating temperature, mm²/s
 * @param ratedCst rated viscosity ν1, mm²/s
 * @param kappa viscosity ratio, unclipped
 * @param uncertainty its uncertainty
 * @param sensitivityToV40 ∂ln ν/∂ln ν40
 * @param sensitivityToTemperature ∂ln ν/∂T, 1/°C
 * @param sigmaLnV40 standard uncertainty of ln ν40
 * @param probabilityBelowFloor probability that κ lies below the bearing's floor
 * @param regime lubrication regime
 * @param level alarm below the floor, alert where the interval reaches below it
 * @param extrapolated true outside 10…130 °C
 */
public record Film(
    double operatingCst,
    double ratedCst,
    double kappa,
    KappaUncertainty uncertainty,
    double sensitivityToV40,
    double sensitivityToTemperature,
    double sigmaLnV40,
    double probabilityBelowFloor,
    LubricationRegime regime,
    Level level,
    boolean extrapolated) {}
