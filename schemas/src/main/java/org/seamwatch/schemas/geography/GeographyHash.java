package org.seamwatch.schemas.geography;

import java.nio.ByteBuffer;
import java.nio.charset.StandardCharsets;
import java.security.MessageDigest;
import java.util.HexFormat;
import java.util.List;
import org.jspecify.annotations.Nullable;
import org.locationtech.jts.io.ByteOrderValues;
import org.locationtech.jts.io.WKBWriter;
import org.seamwatch.schemas.Sha256;

/** Hash of what a geography says, whatever the order, spacing and further properties of its file. */
final class GeographyHash {

    private static final int DIMENSIONS = 2;

    private GeographyHash() {}

    /** SHA-256 over id, name, population and shape of each region, each with its length before it. */
    static String sha256(List<Region> sorted) {
        MessageDigest digest = Sha256.start();
        WKBWriter shapes = new WKBWriter(DIMENSIONS, ByteOrderValues.BIG_ENDIAN);
        for (Region region : sorted) {
            add(digest, region.id().getBytes(StandardCharsets.UTF_8));
            add(digest, region.name().getBytes(StandardCharsets.UTF_8));
            add(digest, population(region.population()));
            add(digest, shapes.write(region.shape().norm()));
        }
        return HexFormat.of().formatHex(digest.digest());
    }

    private static byte[] population(@Nullable Double population) {
        return population == null
                ? new byte[0]
                : ByteBuffer.allocate(Double.BYTES).putDouble(population).array();
    }

    private static void add(MessageDigest digest, byte[] part) {
        digest.update(ByteBuffer.allocate(Integer.BYTES).putInt(part.length).array());
        digest.update(part);
    }
}
