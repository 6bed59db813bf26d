/**
 * The first stage: reports and responses in, what they change out. Start from {@link
 * org.seamwatch.processors.intake.ReportIntake}.
 */
@NullMarked
package org.seamwatch.processors.intake;

import org.jspecify.annotations.NullMarked;
