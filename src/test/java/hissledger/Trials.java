package hissledger;

import java.util.SplittableRandom;
import java.util.function.Consumer;
import java.util.random.RandomGenerator;

/**
 * Property checks on seeded random cases. Case number s draws from the seed s, so a failure is repeated alone with
 * {@code -Dtrials.seed=s}.
 */
public final class Trials {
    private static final String SEED_PROPERTY = "trials.seed";

    private Trials() {}

    /** Runs the property on the seeds 0 to {@code count} − 1, or on the one seed that the system property names. */
    public static void forAll(int count, Consumer<RandomGenerator> property) {
        Long only = Long.getLong(SEED_PROPERTY);
        long from = only == null ? 0L : only;
        long to = only == null ? count : only + 1L;
        for (long seed = from; seed < to; seed++) {
            try {
                property.accept(new SplittableRandom(seed));
            } catch (AssertionError | RuntimeException failure) {
                throw new AssertionError(
                        "falsified; re-run with -D" + SEED_PROPERTY + "=" + seed + ": " + failure.getMessage(),
                        failure);
            }
        }
    }

    /** A number between two positive bounds, uniform in its logarithm. */
    public static double logUniform(RandomGenerator random, double from, double to) {
        return from * Math.exp(random.nextDouble() * Math.log(to / from));
    }
}
