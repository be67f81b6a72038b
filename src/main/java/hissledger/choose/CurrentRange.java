package hissledger.choose;

import hissledger.physics.Require;

/**
 * The currents that a search may try, and what sets each end.
 *
 * @param fromAmps lower end, A; &gt; 0
 * @param fromReason what sets it
 * @param toAmps upper end, A; not below the lower
 * @param toReason what sets it
 */
public record CurrentRange(double fromAmps, String fromReason, double toAmps, String toReason) {
    public CurrentRange {
        Require.positive("fromAmps", fromAmps, "A");
        Require.positive("toAmps", toAmps, "A");
        if (!(toAmps >= fromAmps)) {
            throw new IllegalArgumentException("no current is left to choose: at least " + fromAmps + " A ("
                    + fromReason + ") and at most " + toAmps + " A (" + toReason + ")");
        }
    }

    /** This range with its lower end raised, if the new one is higher. */
    public CurrentRange atLeast(double amps, String reason) {
        return amps > fromAmps ? new CurrentRange(amps, reason, toAmps, toReason) : this;
    }

    /** This range with its upper end lowered, if the new one is lower. */
    public CurrentRange atMost(double amps, String reason) {
        return amps < toAmps ? new CurrentRange(fromAmps, fromReason, amps, reason) : this;
    }

    /** The nearest current of this range, A. */
    public double clamp(double amps) {
        return Math.max(fromAmps, Math.min(toAmps, amps));
    }
}
