/** The plant's records, validated and immutable; no input or output. */
@NullMarked
package org.kappatrail.history;

import org.jspecify.annotations.NullMarked;
