package org.seamwatch.processors.series;

import org.seamwatch.processors.state.Shelf;

/**
 * What a task of the series stage keeps.
 *
 * @param progress how far each input partition is, and the hour applied
 * @param pending changes and responses of hours not applied yet
 * @param counts cases by series and day
 * @param days closed days by series and day, with what was learned after them
 * @param books one row for each series and one for each alarm
 */
public record SeriesShelves(Shelf progress, Shelf pending, Shelf counts, Shelf days, Shelf books) {}
