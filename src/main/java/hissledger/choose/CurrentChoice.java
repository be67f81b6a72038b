package hissledger.choose;

import hissledger.ledger.Figure;
import hissledger.physics.Require;
import java.util.OptionalDouble;

/** The quiescent current of each device: given, left to a search, or of no meaning. */
public sealed interface CurrentChoice {
    /**
     * A given current.
     *
     * @param amps A; &gt; 0
     */
    record Given(double amps) implements CurrentChoice {
        public Given {
            Require.positive("current", amps, "A");
        }
    }

    /**
     * The current that makes a figure least.
     *
     * @param fromAmps lower end of the range, A; empty for the default
     * @param toAmps upper end of the range, A; empty for the default
     * @param figure what is minimised
     */
    record Optimum(OptionalDouble fromAmps, OptionalDouble toAmps, Figure figure) implements CurrentChoice {
        /** The best current for the flat EIN over the default range. */
        public static Optimum usual() {
            return new Optimum(OptionalDouble.empty(), OptionalDouble.empty(), Figure.EIN_FLAT);
        }
    }

    /** No current of the user's: a behavioural amplifier. */
    record None() implements CurrentChoice {}
}
