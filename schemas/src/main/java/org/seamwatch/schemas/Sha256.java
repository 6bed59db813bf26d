package org.seamwatch.schemas;

import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/** SHA-256, which every Java platform has. */
public final class Sha256 {

    private Sha256() {}

    /** A digest that has taken nothing yet. */
    public static MessageDigest start() {
        try {
            return MessageDigest.getInstance("SHA-256");
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }

    /** The hash of bytes in hexadecimal digits. */
    public static String hex(byte[] bytes) {
        return HexFormat.of().formatHex(start().digest(bytes));
    }
}
