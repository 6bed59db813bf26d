/**
 * Which regions are neighbours, and how strongly their values resemble each other: contiguity from polygons, spatial
 * weights, the measures that global Moran's I is computed on, the index itself with its two variances, and its seeded
 * permutation test. Everything here is a pure function of its arguments. Start from
 * {@link org.seamwatch.processors.spatial.Contiguity} and {@link org.seamwatch.processors.spatial.GlobalMoran}.
 */
@NullMarked
package org.seamwatch.processors.spatial;

import org.jspecify.annotations.NullMarked;
