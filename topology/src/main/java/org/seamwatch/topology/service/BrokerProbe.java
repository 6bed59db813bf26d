package org.seamwatch.topology.service;

import java.time.Duration;
import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import org.apache.kafka.clients.admin.Admin;
import org.apache.kafka.clients.admin.DescribeClusterOptions;
import org.seamwatch.schemas.plan.Plan;

/** Asks whether the broker is there. The engine itself waits in silence for one that is not. */
public final class BrokerProbe implements AutoCloseable {

    private static final int LIMIT_MS = 5_000;

    private final Admin admin;

    private BrokerProbe(Admin admin) {
        this.admin = admin;
    }

    static BrokerProbe of(Plan plan) {
        return new BrokerProbe(Admin.create(StreamsSettings.client(plan)));
    }

    /** Whether a broker answers within seconds. */
    public boolean answers() {
        try {
            admin.describeCluster(new DescribeClusterOptions().timeoutMs(LIMIT_MS))
                    .clusterId()
                    .get(LIMIT_MS, TimeUnit.MILLISECONDS);
            return true;
        } catch (ExecutionException | TimeoutException e) {
            return false;
        } catch (InterruptedException e) {
            // The one who asks is being stopped: nothing is known of the broker.
            Thread.currentThread().interrupt();
            return true;
        }
    }

    @Override
    public void close() {
        admin.close(Duration.ZERO);
    }
}
