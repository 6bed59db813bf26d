package org.seamwatch.processors.flow;

/**
 * Cases, or a change of them.
 *
 * @param count all cases
 * @param preliminary of these, cases whose report is preliminary
 */
public record Cases(long count, long preliminary) {

    public static final Cases NONE = new Cases(0, 0);

    public Cases plus(Cases other) {
        return new Cases(count + other.count, preliminary + other.preliminary);
    }

    public Cases negated() {
        return new Cases(-count, -preliminary);
    }

    public boolean isNone() {
        return count == 0 && preliminary == 0;
    }
}
