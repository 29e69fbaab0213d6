/** What workbook and slides share: files whose bytes follow from their content, and safe text. */
@NullMarked
package org.kappatrail.report.office;

import org.jspecify.annotations.NullMarked;
