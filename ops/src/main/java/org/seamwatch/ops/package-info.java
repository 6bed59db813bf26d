/**
 * The edges: the command line and what it prints. Start from {@link org.seamwatch.ops.Seamwatch}.
 */
@NullMarked
package org.seamwatch.ops;

import org.jspecify.annotations.NullMarked;
