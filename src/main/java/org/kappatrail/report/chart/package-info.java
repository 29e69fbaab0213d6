/** Charts of one visual language, drawn with XChart. */
@NullMarked
package org.kappatrail.report.chart;

import org.jspecify.annotations.NullMarked;
