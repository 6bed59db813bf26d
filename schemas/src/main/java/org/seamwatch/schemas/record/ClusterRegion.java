package org.seamwatch.schemas.record;

import com.fasterxml.jackson.annotation.JsonInclude;
import org.jspecify.annotations.Nullable;

/**
 * One region of a cluster.
 *
 * @param region id
 * @param name name
 * @param cases its own cases in the period
 * @param expected its own expected cases in the period
 * @param neighbourCases cases of its neighbours in the period
 * @param neighbourExpected expected cases of its neighbours in the period
 * @param ratePer100000 cases in the period for each 100,000 people; absent without a population
 * @param populationYear year of that population, where the plan gives it
 */
@JsonInclude(JsonInclude.Include.NON_NULL)
public record ClusterRegion(
        String region,
        String name,
        long cases,
        double expected,
        long neighbourCases,
        double neighbourExpected,
        @Nullable Double ratePer100000,
        @Nullable Integer populationYear) {}
