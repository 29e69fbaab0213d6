/** The judgement: from records and duty cells to one immutable review. */
@NullMarked
package org.kappatrail.review;

import org.jspecify.annotations.NullMarked;
