/** Placeholder. */
@NullMarked
package org.seamwatch.ops;

import org.jspecify.annotations.NullMarked;
