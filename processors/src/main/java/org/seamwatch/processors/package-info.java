/** Placeholder. */
@NullMarked
package org.seamwatch.processors;

import org.jspecify.annotations.NullMarked;
