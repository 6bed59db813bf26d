package org.seamwatch.topology.service;

import org.seamwatch.schemas.plan.Plan;

/**
 * The id under which the engine keeps offsets, internal topics and state: {@code kafka: application.id} of the plan,
 * else the topics' prefix without its last dots and dashes, so that two prefixes never share state.
 */
final class ApplicationId {

    private static final String DEFAULT = "seamwatch";
    private static final String KEY = "application.id";

    private ApplicationId() {}

    static String of(Plan plan) {
        String given = plan.kafka().get(KEY);
        if (given != null) {
            return given;
        }
        String prefix = plan.topics().prefix().replaceAll("[._-]+$", "");
        return prefix.isEmpty() ? DEFAULT : prefix;
    }
}
