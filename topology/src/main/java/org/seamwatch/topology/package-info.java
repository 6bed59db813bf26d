/** Placeholder. */
@NullMarked
package org.seamwatch.topology;

import org.jspecify.annotations.NullMarked;
