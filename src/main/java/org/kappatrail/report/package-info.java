/** Writes a review as tables, charts, page, slides and workbook. */
@NullMarked
package org.kappatrail.report;

import org.jspecify.annotations.NullMarked;
