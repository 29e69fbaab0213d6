/** The commands. */
@NullMarked
package org.kappatrail.cli;

import org.jspecify.annotations.NullMarked;
