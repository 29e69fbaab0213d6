/** The self-contained page. */
@NullMarked
package org.kappatrail.report.page;

import org.jspecify.annotations.NullMarked;
