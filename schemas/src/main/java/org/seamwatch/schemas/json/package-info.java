/**
 * One set-up of Jackson for every record this program writes. Start from {@link org.seamwatch.schemas.json.Json}.
 */
@NullMarked
package org.seamwatch.schemas.json;

import org.jspecify.annotations.NullMarked;
