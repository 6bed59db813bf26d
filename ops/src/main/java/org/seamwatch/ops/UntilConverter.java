package org.seamwatch.ops;

import java.time.DateTimeException;
import java.time.Instant;
import java.time.LocalDate;
import java.time.OffsetDateTime;
import java.time.ZoneOffset;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Reads an end in time: an instant, or a date, whose last millisecond (UTC) is meant. */
final class UntilConverter implements ITypeConverter<Long> {

    @Override
    public Long convert(String text) {
        try {
            if (text.length() == "2024-02-03".length()) {
                Instant end = LocalDate.parse(text)
                        .plusDays(1)
                        .atStartOfDay(ZoneOffset.UTC)
                        .toInstant();
                return end.toEpochMilli() - 1;
            }
            return OffsetDateTime.parse(text).toInstant().toEpochMilli();
        } catch (DateTimeException e) {
            throw new TypeConversionException(
                    "must be an instant such as 2024-02-03T06:00:00Z or a date such as 2024-02-03, was \"" + text
                            + "\"");
        }
    }
}
