package org.seamwatch.schemas.record;

/**
 * What repeating a result needs beside the log.
 *
 * @param version version of this program
 * @param plan SHA-256 of the desk, the series and the geographies of the plan, in hexadecimal digits
 * @param tzdata version of the time-zone rules
 */
public record Repeat(String version, String plan, String tzdata) {}
