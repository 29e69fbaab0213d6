/**
 * Reads the history folder's settings, register, samples and events into {@code history} records.
 */
@NullMarked
package org.kappatrail.intake;

import org.jspecify.annotations.NullMarked;
