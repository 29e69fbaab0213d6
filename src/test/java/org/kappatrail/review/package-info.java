@NullMarked
package org.kappatrail.review;

import org.jspecify.annotations.NullMarked;
