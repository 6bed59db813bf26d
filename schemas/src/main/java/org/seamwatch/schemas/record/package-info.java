/**
 * The records that cross a topic or a file, one Java record for each JSON Schema under {@code schemas/}. They carry
 * values and check them; they compute nothing. Start from {@link org.seamwatch.schemas.record.CaseReport} (what comes
 * in) and {@link org.seamwatch.schemas.record.AlarmChange} (what goes out).
 */
@NullMarked
package org.seamwatch.schemas.record;

import org.jspecify.annotations.NullMarked;
