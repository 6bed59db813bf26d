package org.seamwatch.topology.service;

import java.util.concurrent.ExecutionException;
import java.util.concurrent.TimeUnit;
import java.util.concurrent.TimeoutException;
import java.util.concurrent.locks.LockSupport;
import java.util.function.Supplier;
import org.apache.kafka.common.KafkaFuture;
import org.apache.kafka.common.errors.DisconnectException;
import org.apache.kafka.common.errors.RetriableException;
import org.jspecify.annotations.Nullable;
import org.seamwatch.schemas.plan.Plan;

/** Waits for the broker's answers, and says in one line where none comes. */
final class Answers {

    /** A broker that is there says so in less; one that has may take its time over the rest. */
    static final int FIRST_SECONDS = 12;

    private static final int LIMIT_SECONDS = 60;
    private static final long PAUSE_NANOS = TimeUnit.MILLISECONDS.toNanos(50);

    private final Plan plan;
    private boolean answered;

    Answers(Plan plan) {
        this.plan = plan;
    }

    /** The answer to a question that is asked once. */
    <T> T of(KafkaFuture<T> answer, String doing) {
        int limit = answered ? LIMIT_SECONDS : FIRST_SECONDS;
        try {
            T value = answer.get(limit, TimeUnit.SECONDS);
            answered = true;
            return value;
        } catch (ExecutionException e) {
            if (isSilence(e.getCause())) {
                throw new NoBrokerException(plan, doing);
            }
            throw new IllegalStateException(doing + " failed: " + e.getCause(), e.getCause());
        } catch (TimeoutException e) {
            throw new NoBrokerException(plan, doing);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new IllegalStateException(doing + " was interrupted", e);
        }
    }

    /** The answer to a question that is asked again for as long as the broker says that it cannot know it yet. */
    <T> T ofAgain(Supplier<KafkaFuture<T>> question, String doing) {
        long end = System.nanoTime() + TimeUnit.SECONDS.toNanos(LIMIT_SECONDS);
        while (true) {
            try {
                return of(question.get(), doing);
            } catch (IllegalStateException e) {
                if (!(e.getCause() instanceof RetriableException) || System.nanoTime() > end) {
                    throw e;
                }
                LockSupport.parkNanos(PAUSE_NANOS);
            }
        }
    }

    private static boolean isSilence(@Nullable Throwable cause) {
        return cause instanceof org.apache.kafka.common.errors.TimeoutException || cause instanceof DisconnectException;
    }
}
