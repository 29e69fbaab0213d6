/** The pack's tables: typed columns, written as CSV. */
@NullMarked
package org.kappatrail.report.table;

import org.jspecify.annotations.NullMarked;
