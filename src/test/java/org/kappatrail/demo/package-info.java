/** The invented paper mill of Tarn Hollow, from which the sample history is made. */
@NullMarked
package org.kappatrail.demo;

import org.jspecify.annotations.NullMarked;
