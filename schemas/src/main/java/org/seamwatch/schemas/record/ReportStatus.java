package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonProperty;

/** How sure a source is of its report. */
public enum ReportStatus {
    @JsonProperty("preliminary")
    PRELIMINARY,
    @JsonProperty("final")
    FINAL,
    @JsonProperty("corrected")
    CORRECTED,
    @JsonProperty("withdrawn")
    WITHDRAWN
}
