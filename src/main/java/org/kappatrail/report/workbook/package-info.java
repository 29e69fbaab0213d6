/** The pack's tables as a workbook. */
@NullMarked
package org.kappatrail.report.workbook;

import org.jspecify.annotations.NullMarked;
