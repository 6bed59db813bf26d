package org.seamwatch.schemas.record;

import java.nio.ByteBuffer;
import java.nio.charset.CharacterCodingException;
import java.nio.charset.StandardCharsets;
import java.util.Base64;
import org.jspecify.annotations.Nullable;

/**
 * Bytes in a JSON file: as text where they are UTF-8, else as Base64; neither where they are null. Both forms give the
 * same bytes back.
 *
 * @param text the bytes as text
 * @param base64 the bytes in Base64 (RFC 4648, section 4)
 */
record TextOrBytes(@Nullable String text, @Nullable String base64) {

    static TextOrBytes of(byte @Nullable [] bytes) {
        if (bytes == null) {
            return new TextOrBytes(null, null);
        }
        try {
            return new TextOrBytes(
                    StandardCharsets.UTF_8
                            .newDecoder()
                            .decode(ByteBuffer.wrap(bytes))
                            .toString(),
                    null);
        } catch (CharacterCodingException e) {
            return new TextOrBytes(null, Base64.getEncoder().encodeToString(bytes));
        }
    }

    byte @Nullable [] bytes() {
        if (text != null) {
            return text.getBytes(StandardCharsets.UTF_8);
        }
        return base64 == null ? null : Base64.getDecoder().decode(base64);
    }
}
