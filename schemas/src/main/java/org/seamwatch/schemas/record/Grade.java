package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonProperty;

/** What a chart says of a day. */
public enum Grade {
    /** The series is too young to be judged. */
    @JsonProperty("learning")
    LEARNING,
    /** Inside its warning limits. */
    @JsonProperty("none")
    NONE,
    /** Beyond a warning limit; shown, never paged. */
    @JsonProperty("warning")
    WARNING,
    /** Beyond an action limit. */
    @JsonProperty("action")
    ACTION
}
