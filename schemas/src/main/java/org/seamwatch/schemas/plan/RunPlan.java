package org.seamwatch.schemas.plan;

/**
 * How the service runs.
 *
 * @param threads stream threads, at least 1
 * @param standbys warm copies of each store, from 0
 */
public record RunPlan(int threads, int standbys) {

    public static RunPlan defaults() {
        return new RunPlan(2, 0);
    }
}
