/**
 * Keyed rows that a step keeps between records. The steps see only the interface, so they run the same over
 * changelogged stores and over memory. Start from {@link org.seamwatch.processors.state.Shelf}.
 */
@NullMarked
package org.seamwatch.processors.state;

import org.jspecify.annotations.NullMarked;
