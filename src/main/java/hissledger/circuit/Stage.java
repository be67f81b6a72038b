package hissledger.circuit;

import hissledger.twoport.ChainPass;
import java.util.OptionalDouble;

/** The active stage in one of its arrangements. */
public sealed interface Stage permits SingleStage, FollowerStage, BalancedPair, SingleEndedPair, AmplifierStage {
    /** Lets the walk pass through the stage, its load and the next stage's generators. */
    void walk(ChainPass pass);

    /** Quiescent current of each device, A; empty for an amplifier. */
    OptionalDouble deviceAmps();

    /** Quiescent current of all devices together, A. */
    double totalAmps();

    /**
     * The input level at which the stage's own lowest harmonic (the third for a balanced pair, else the second) reaches 1 %.
     */
    Harmonics.Limit onePercent();

    /** Whether the input impedance of the open stage loads the source; not where feedback lifts it out of sight. */
    default boolean loadsSource() {
        return true;
    }
}
