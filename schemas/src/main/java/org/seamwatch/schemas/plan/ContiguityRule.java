package org.seamwatch.schemas.plan;

/** Which regions are neighbours. */
public sealed interface ContiguityRule {

    /** How the rule reads in words. */
    String words();

    /** They share a line. */
    record Edge() implements ContiguityRule {
        @Override
        public String words() {
            return "edge";
        }
    }

    /** They share at least a point. */
    record Corner() implements ContiguityRule {
        @Override
        public String words() {
            return "corner";
        }
    }

    /**
     * One is among the nearest of the other.
     *
     * @param count how many nearest, at least 1
     */
    record Nearest(int count) implements ContiguityRule {
        @Override
        public String words() {
            return "nearest " + count;
        }
    }

    /**
     * They lie within a distance.
     *
     * @param kilometres the distance, above 0
     */
    record Within(double kilometres) implements ContiguityRule {
        @Override
        public String words() {
            return "within " + kilometres + " km";
        }
    }
}
