/**
 * What flows between the two stages: an hour's differences, watermarks and responses, with their byte form. Start
 * from {@link org.seamwatch.processors.flow.SeriesMessage}.
 */
@NullMarked
package org.seamwatch.processors.flow;

import org.jspecify.annotations.NullMarked;
