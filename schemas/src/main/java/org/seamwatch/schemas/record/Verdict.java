package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonProperty;

/** What a person says of an alarm. */
public enum Verdict {
    @JsonProperty("acknowledged")
    ACKNOWLEDGED(false),
    @JsonProperty("under-investigation")
    UNDER_INVESTIGATION(false),
    @JsonProperty("outbreak")
    OUTBREAK(true),
    @JsonProperty("known-event")
    KNOWN_EVENT(true),
    @JsonProperty("no-outbreak")
    NO_OUTBREAK(true),
    @JsonProperty("data-fault")
    DATA_FAULT(true),
    @JsonProperty("baseline-changed")
    BASELINE_CHANGED(true);

    private final boolean closing;

    Verdict(boolean closing) {
        this.closing = closing;
    }

    /** Whether it answers the question the alarm asks, rather than saying that someone looks at it. */
    public boolean isAnswer() {
        return closing;
    }
}
