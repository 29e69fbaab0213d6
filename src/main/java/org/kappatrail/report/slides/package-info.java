/** The reliability meeting's slides. */
@NullMarked
package org.kappatrail.report.slides;

import org.jspecify.annotations.NullMarked;
