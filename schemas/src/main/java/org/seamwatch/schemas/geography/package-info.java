/**
 * Regions with boundaries and populations, read from GeoJSON (RFC 7946). Start from
 * {@link org.seamwatch.schemas.geography.Geography}.
 */
@NullMarked
package org.seamwatch.schemas.geography;

import org.jspecify.annotations.NullMarked;
