package org.seamwatch.processors.learning;

import java.time.LocalDate;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import org.apache.commons.rng.sampling.distribution.ZigguratSampler;
import org.apache.commons.rng.simple.RandomSource;

/** Made series for the tests of learning. */
final class Series {

    static final LocalDate FIRST = LocalDate.of(2024, 2, 1);

    private Series() {}

    /** Seeded normal values about 10 with this lag-one correlation. */
    static double[] correlated(int count, double correlation, long seed) {
        var normal = ZigguratSampler.NormalizedGaussian.of(RandomSource.XO_RO_SHI_RO_128_PP.create(seed));
        double[] values = new double[count];
        double last = 0;
        for (int i = 0; i < count; i++) {
            last = correlation * last + normal.sample();
            values[i] = 10 + last;
        }
        return values;
    }

    /** The state after teaching all values on days in a row. */
    static LearningState taught(Learner learner, double... values) {
        LearningState state = learner.start();
        for (double value : values) {
            state = learner.teach(state, next(state), value);
        }
        return state;
    }

    static LocalDate next(LearningState state) {
        return state.lastDay() == null ? FIRST : state.lastDay().plusDays(1);
    }

    /** Score of each value before it teaches. */
    static List<OptionalDouble> scores(Learner learner, double... values) {
        List<OptionalDouble> scores = new ArrayList<>();
        LearningState state = learner.start();
        for (double value : values) {
            scores.add(learner.score(state, value));
            state = learner.teach(state, next(state), value);
        }
        return scores;
    }
}
