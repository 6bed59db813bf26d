package org.seamwatch.topology.service;

import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import org.apache.kafka.common.KafkaFuture;
import org.apache.kafka.common.errors.RetriableException;
import org.seamwatch.schemas.InputException;
import org.seamwatch.schemas.plan.Plan;

/** Waits for the broker's answers, and says in one line where none comes. */
final class Answers {

    private static final long LIMIT_SECONDS = 60;

    private final Plan plan;

    Answers(Plan plan) {
        this.plan = plan;
    }

    <T> T of(KafkaFuture<T> answer, String doing) {
        try {
            return answer.get(LIMIT_SECONDS, TimeUnit.SECONDS);
        } catch (ExecutionException e) {
            if (e.getCause() instanceof RetriableException) {
                throw silent(doing);
            }
            throw new IllegalStateException(doing + " failed: " + e.getCause(), e.getCause());
        } catch (TimeoutException e) {
            throw silent(doing);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(doing + " was interrupted", e);
        }
    }

    private InputException silent(String doing) {
        return new InputException(plan.file() + ": kafka.bootstrap.servers: no broker answers at "
                + plan.kafka().get("bootstrap.servers") + " (" + doing + ")");
    }
}
