/** Viscosity, film and life of a rolling bearing: one file per published method, pure functions. */
@NullMarked
package org.kappatrail.tribology;

import org.jspecify.annotations.NullMarked;
