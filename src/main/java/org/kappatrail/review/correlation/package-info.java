/** What goes with what in the samples, and what is no more than chance. */
@NullMarked
package org.kappatrail.review.correlation;

import org.jspecify.annotations.NullMarked;
