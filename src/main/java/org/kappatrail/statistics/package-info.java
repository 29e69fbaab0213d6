/**
 * Statistics of short, serially correlated, censored series: one file per published method, pure
 * functions.
 */
@NullMarked
package org.kappatrail.statistics;

import org.jspecify.annotations.NullMarked;
