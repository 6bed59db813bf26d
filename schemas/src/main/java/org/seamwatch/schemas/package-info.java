/**
 * The contracts of Seamwatch: records, plan, geographies and their readers. Nothing here computes. Start from
 * {@link org.seamwatch.schemas.record}, {@link org.seamwatch.schemas.plan} and
 * {@link org.seamwatch.schemas.geography}.
 */
@NullMarked
package org.seamwatch.schemas;

import org.jspecify.annotations.NullMarked;
