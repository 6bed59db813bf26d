/**
 * Episodes and the life of alarms. Start from {@link org.seamwatch.processors.alarms.Episodes}.
 */
@NullMarked
package org.seamwatch.processors.alarms;

import org.jspecify.annotations.NullMarked;
