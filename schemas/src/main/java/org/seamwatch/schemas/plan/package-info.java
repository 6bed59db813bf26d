/**
 * The plan: what is watched, how, and how often it may be wrong. Records hold checked values with their defaults; the
 * reader names file, line and key of what it refuses. Start from {@link org.seamwatch.schemas.plan.Plan}.
 */
@NullMarked
package org.seamwatch.schemas.plan;

import org.jspecify.annotations.NullMarked;
