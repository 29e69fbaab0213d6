/** Whether a viscosity drop justifies an oil change, and what else could be done. */
@NullMarked
package org.kappatrail.review.decision;

import org.jspecify.annotations.NullMarked;
