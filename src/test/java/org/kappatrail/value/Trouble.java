package org.kappatrail.value;

/** What goes wrong with a machine of the simulated fleet. */
enum Trouble {
  NONE,
  SHEAR,
  DILUTION,
  WRONG_TOP_UP,
  OXIDATION,
  FOULED_COOLER
}
