package org.seamwatch.processors.learning;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Self-starting learning of one statistic: a recursive regression on 1 and its own previous usable values. Each new
 * value's one-step predictive residual e / (s sqrt(1 + x'(X'X)^-1 x)) follows Student's t with rows - columns degrees of
 * freedom and is mapped to a normal score. With order 0 and normal data this is exact and equals the Q statistic, mean
 * and variance unknown, of Quesenberry (1991, J. Qual. Technol. 23:213-224); with order 1 and more it is approximate.
 *
 * <p>There is no score before the first residual degree of freedom, after values that do not vary, or after lags that do
 * not vary, each up to rounding (1e-12 of their size). A statistic must be well inside +-1e150.
 *
 * <p><b>Winsorising.</b> A value whose score is beyond the bound enters learning as the value whose score is the bound;
 * as Student's t is wide at few degrees of freedom, so are the bounds of a young series. Scores use the previous values
 * as they were, the regression's rows take them winsorised. A row with a winsorised lag teaches the same residual in
 * standard errors as was scored, seen from the winsorised lag: otherwise the day after an extreme one, ordinary when seen
 * from it, would teach a residual without bound.
 *
 * @param order how many previous values the regression has, from 0
 * @param winsor bound of the score, above 0 and at most 30, or infinite for none
 * @param maxWaiting how many waiting values still teach when an alarm ends
 */
public record Learner(int order, double winsor, int maxWaiting) {

    /** Bound of the score in learning. */
    public static final double DEFAULT_WINSOR = 3;

    /** So many days of an open alarm still teach when it ends. */
    public static final int DEFAULT_MAX_WAITING = 18;

    private static final double LARGEST = 1e150;

    public Learner {
        if (order < 0) {
            throw new IllegalArgumentException("order must be at least 0, was " + order);
        }
        if (!(winsor > 0 && (winsor <= 30 || winsor == Double.POSITIVE_INFINITY))) {
            throw new IllegalArgumentException("winsor must be in (0, 30] or infinite, was " + winsor);
        }
        if (maxWaiting < 0) {
            throw new IllegalArgumentException("maxWaiting must be at least 0, was " + maxWaiting);
        }
    }

    /** A learner with the default bound and waiting rule. */
    public static Learner of(int order) {
        return new Learner(order, DEFAULT_WINSOR, DEFAULT_MAX_WAITING);
    }

    /** The state before the first value. */
    public LearningState start() {
        return new LearningState(0, Regression.empty(order + 1), Lags.NONE, null, List.of());
    }

    /** Normal score of the next value; empty while it cannot be judged. Teaches nothing. */
    public OptionalDouble score(LearningState state, double y) {
        requireValue(y);
        requireOrder(state);
        Regression regression = state.regression();
        return canScore(regression, state.lags())
                ? OptionalDouble.of(regression.at(state.lags().scoringRow()).score(y))
                : OptionalDouble.empty();
    }

    /** The state after a value that teaches at once. Waiting values go on waiting. */
    public LearningState teach(LearningState state, LocalDate day, double y) {
        requireNext(state, day, y);
        Lags lags = state.lags();
        Regression regression = state.regression();
        return new LearningState(
                state.days() + 1,
                taught(regression, lags, y),
                lags.next(y, winsorised(regression, lags, y), order),
                day,
                state.waiting());
    }

    /** The state after a value that waits while an alarm is open: lags move on, the regression does not. */
    public LearningState hold(LearningState state, LocalDate day, double y) {
        requireNext(state, day, y);
        Lags lags = state.lags();
        List<WaitingDay> waiting = new ArrayList<>(state.waiting());
        waiting.add(new WaitingDay(day, y, lags));
        return new LearningState(
                state.days(),
                state.regression(),
                lags.next(y, winsorised(state.regression(), lags, y), order),
                day,
                waiting);
    }

    /** The state after an alarm has ended: its values teach, oldest first, or stay out when too many waited. */
    public LearningState release(LearningState state) {
        List<WaitingDay> teaching = state.waiting().size() <= maxWaiting ? state.waiting() : List.of();
        Regression regression = state.regression();
        for (WaitingDay day : teaching) {
            regression = taught(regression, day.lags(), day.value());
        }
        return new LearningState(state.days() + teaching.size(), regression, state.lags(), state.lastDay(), List.of());
    }

    private boolean canScore(Regression regression, Lags lags) {
        return lags.size() == order && regression.degreesOfFreedom().isPresent();
    }

    /** The value held within the bounds of its prediction; as it is where there is no score. */
    private double winsorised(Regression regression, Lags lags, double y) {
        if (!canScore(regression, lags)) {
            return y;
        }
        Prediction prediction = regression.at(lags.scoringRow());
        double score = prediction.score(y);
        return StrictMath.abs(score) > winsor ? prediction.value(StrictMath.copySign(winsor, score)) : y;
    }

    private Regression taught(Regression regression, Lags lags, double y) {
        if (lags.size() < order) {
            return regression;
        }
        double response = winsorised(regression, lags, y);
        double[] row = lags.learningRow();
        if (lags.altered() && canScore(regression, lags)) {
            response = regression.at(row).alike(response, regression.at(lags.scoringRow()));
        }
        return regression.with(row, response);
    }

    private void requireNext(LearningState state, LocalDate day, double y) {
        requireValue(y);
        requireOrder(state);
        if (state.lastDay() != null && !day.isAfter(state.lastDay())) {
            throw new IllegalArgumentException("day must be after " + state.lastDay() + ", was " + day);
        }
    }

    private void requireOrder(LearningState state) {
        int stateOrder = state.regression().columns() - 1;
        if (stateOrder != order) {
            throw new IllegalArgumentException("state must be of order " + order + ", was of order " + stateOrder);
        }
    }

    private static void requireValue(double y) {
        if (!(StrictMath.abs(y) <= LARGEST)) {
            throw new IllegalArgumentException("value must be in [-1.0E150, 1.0E150], was " + y);
        }
    }
}
