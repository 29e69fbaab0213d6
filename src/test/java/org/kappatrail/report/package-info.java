/** The pack, the workbook and the slides, as the commands write them. */
@NullMarked
package org.kappatrail.report;

import org.jspecify.annotations.NullMarked;
