@NullMarked
package org.kappatrail.review.decision;

import org.jspecify.annotations.NullMarked;
