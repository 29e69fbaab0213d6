/**
 * What the verdicts are worth: a simulated fleet whose truth is known, decided month by month by
 * the program and by rules of thumb.
 */
@NullMarked
package org.kappatrail.value;

import org.jspecify.annotations.NullMarked;
