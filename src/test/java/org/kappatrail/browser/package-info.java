/** A headless Chromium, driven over its DevTools protocol, to use pages as a reader does. */
@NullMarked
package org.kappatrail.browser;

import org.jspecify.annotations.NullMarked;
