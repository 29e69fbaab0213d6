/** The review as JSON. */
@NullMarked
package org.kappatrail.report.json;

import org.jspecify.annotations.NullMarked;
