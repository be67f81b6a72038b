package hissledger.choose;

import java.util.OptionalDouble;

/**
 * What a design may use and must keep free.
 *
 * @param totalAmps greatest current of all devices together, A
 * @param supplyVolts supply voltage, V; for the power
 * @param powerWatts greatest power of all devices together at that supply, W
 * @param headroomVolts least EMF at 1 kHz, V rms, before the device law makes 1 % of its lowest harmonic
 * @param inputFarads greatest input capacitance of the stage at 1 kHz, F
 */
public record Limits(
        OptionalDouble totalAmps,
        OptionalDouble supplyVolts,
        OptionalDouble powerWatts,
        OptionalDouble headroomVolts,
        OptionalDouble inputFarads) {
    /** No limit. */
    public static Limits none() {
        OptionalDouble free = OptionalDouble.empty();
        return new Limits(free, free, free, free, free);
    }

    /** The greatest total current that the limits of current and power leave, A; infinite for none. */
    public double mostAmps() {
        double amps = totalAmps.orElse(Double.POSITIVE_INFINITY);
        return powerWatts.isPresent() && supplyVolts.isPresent()
                ? Math.min(amps, powerWatts.getAsDouble() / supplyVolts.getAsDouble())
                : amps;
    }
}
