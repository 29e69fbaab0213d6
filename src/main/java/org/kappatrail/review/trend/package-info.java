/** What a trail of κ says: how it drifts, what moved it, and where it leads. */
@NullMarked
package org.kappatrail.review.trend;

import org.jspecify.annotations.NullMarked;
