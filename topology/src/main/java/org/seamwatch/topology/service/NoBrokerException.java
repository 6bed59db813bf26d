package org.seamwatch.topology.service;

import org.seamwatch.schemas.plan.Plan;

/** No broker answers where the plan says that there is one. The message is one clear line; the plan may be right. */
public final class NoBrokerException extends RuntimeException {

    private static final long serialVersionUID = 1L;

    NoBrokerException(Plan plan, String doing) {
        super(plan.file() + ": kafka.bootstrap.servers: no broker answers at "
                + plan.kafka().get("bootstrap.servers") + " (" + doing + ")");
    }
}
