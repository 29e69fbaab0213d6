/**
 * A history that the program has never seen, reviewed once by the program and once by plain loops
 * over the raw readings that share no code with it.
 */
@NullMarked
package org.kappatrail.heldout;

import org.jspecify.annotations.NullMarked;
