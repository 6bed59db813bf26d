package org.seamwatch.schemas;

/** The version of this program. A test holds it to the build's. */
public final class ProductVersion {

    public static final String CURRENT = "0.1.0";

    private ProductVersion() {}
}
