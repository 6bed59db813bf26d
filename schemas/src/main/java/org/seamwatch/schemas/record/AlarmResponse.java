package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import java.time.Instant;
import java.time.LocalDate;
import org.jspecify.annotations.Nullable;

/**
 * A person's answer to an alarm, {@code alarm-response/1}; the record's key is the series.
 *
 * @param version version of the contract, 1
 * @param alarm id of the alarm
 * @param verdict what is said of it
 * @param from first day the verdict speaks of; by default the alarm's
 * @param to last day the verdict speaks of; by default the alarm's
 * @param by who answers
 * @param at when, by the responder's clock; content, never a clock
 * @param note free text; may hold personal data, so it stays out of deliveries and logs
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record AlarmResponse(
        int version,
        String alarm,
        Verdict verdict,
        @Nullable LocalDate from,
        @Nullable LocalDate to,
        String by,
        Instant at,
        @Nullable String note) {}
