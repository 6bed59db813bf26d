package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonProperty;

/** Whether a statistic can be used on a day. Only usable values move charts and learning. */
public enum StatisticStatus {
    @JsonProperty("usable")
    USABLE,
    /** Undefined: no variation between the regions. */
    @JsonProperty("flat")
    FLAT,
    /** Too few cases in the window. */
    @JsonProperty("thin")
    THIN,
    /** Regions that cannot be judged hold over a third of the population. */
    @JsonProperty("incomplete")
    INCOMPLETE
}
