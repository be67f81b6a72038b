package hissledger.circuit;

import hissledger.device.Transistor;
import hissledger.physics.Require;

/**
 * A stage whose quiescent current is still open: everything but the device at its operating point.
 *
 * @param arrangement the circuit form
 * @param inParallel devices in parallel, per side for a pair; ≥ 1
 * @param around the parts around the device
 * @param pair the parts that only pairs have
 */
public record StagePlan(Arrangement arrangement, int inParallel, Surroundings around, PairParts pair) {
    public StagePlan {
        Require.atLeast("inParallel", inParallel, 1);
    }

    /** A plan of an arrangement that is no pair. */
    public StagePlan(Arrangement arrangement, int inParallel, Surroundings around) {
        this(arrangement, inParallel, around, PairParts.none());
    }

    /** The stage with this device at its quiescent point. */
    public Stage with(Transistor device) {
        return switch (arrangement) {
            case COMMON_EMITTER, COMMON_SOURCE -> new SingleStage(device, inParallel, around);
            case FOLLOWER -> new FollowerStage(device, inParallel, around);
            case DIFFERENTIAL_PAIR, GAIN_RESISTOR_PAIR ->
                new BalancedPair(device, inParallel, around, pair.gainOhms(), pair.feedbackOhms());
            case SINGLE_ENDED_PAIR -> new SingleEndedPair(device, inParallel, around, pair.otherOhms());
            case AMPLIFIER -> throw new IllegalArgumentException("an amplifier has no transistor of the user's");
        };
    }
}
