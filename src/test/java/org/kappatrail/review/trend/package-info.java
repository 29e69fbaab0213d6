@NullMarked
package org.kappatrail.review.trend;

import org.jspecify.annotations.NullMarked;
