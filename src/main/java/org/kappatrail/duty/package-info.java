/** Turns temperature and speed logs into day cells by one SQL statement. */
@NullMarked
package org.kappatrail.duty;

import org.jspecify.annotations.NullMarked;
