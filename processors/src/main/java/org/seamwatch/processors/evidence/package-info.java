/**
 * What an alarm carries. Start from {@link org.seamwatch.processors.evidence.EvidenceMaker}.
 */
@NullMarked
package org.seamwatch.processors.evidence;

import org.jspecify.annotations.NullMarked;
