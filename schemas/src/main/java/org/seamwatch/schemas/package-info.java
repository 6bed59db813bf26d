/** Placeholder. */
@NullMarked
package org.seamwatch.schemas;

import org.jspecify.annotations.NullMarked;
