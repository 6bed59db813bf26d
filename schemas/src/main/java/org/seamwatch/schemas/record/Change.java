package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonProperty;

/** What happened to an alarm. */
public enum Change {
    @JsonProperty("raised")
    RAISED,
    @JsonProperty("strengthened")
    STRENGTHENED,
    @JsonProperty("responded")
    RESPONDED,
    @JsonProperty("overdue")
    OVERDUE,
    /** Back inside its limits; never "over". */
    @JsonProperty("ended")
    ENDED,
    @JsonProperty("withdrawn")
    WITHDRAWN
}
