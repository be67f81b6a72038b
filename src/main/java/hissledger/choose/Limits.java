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
    /** What a limit is set on; in the order in which a scenario names them. */
    public enum Kind {
        TOTAL_CURRENT("limits.totalCurrent", "A", false),
        POWER("limits.power", "W", false),
        HEADROOM("limits.headroom", "V", true),
        INPUT_CAPACITANCE("limits.inputCapacitance", "F", false);

        private final String path;
        private final String unit;
        private final boolean least;

        Kind(String path, String unit, boolean least) {
            this.path = path;
            this.unit = unit;
            this.least = least;
        }

        /** Its dotted path in a scenario. */
        public String path() {
            return path;
        }

        /** Symbol of its unit. */
        public String unit() {
            return unit;
        }

        /** Whether it is the least accepted value, not the greatest. */
        public boolean isLeast() {
            return least;
        }
    }

    /** The limit of a kind in its unit; empty where none is set. */
    public OptionalDouble of(Kind kind) {
        return switch (kind) {
            case TOTAL_CURRENT -> totalAmps;
            case POWER -> powerWatts;
            case HEADROOM -> headroomVolts;
            case INPUT_CAPACITANCE -> inputFarads;
        };
    }

    /** These limits with one of them set or, where {@code value} is empty, dropped. */
    public Limits with(Kind kind, OptionalDouble value) {
        return switch (kind) {
            case TOTAL_CURRENT -> new Limits(value, supplyVolts, powerWatts, headroomVolts, inputFarads);
            case POWER -> new Limits(totalAmps, supplyVolts, value, headroomVolts, inputFarads);
            case HEADROOM -> new Limits(totalAmps, supplyVolts, powerWatts, value, inputFarads);
            case INPUT_CAPACITANCE -> new Limits(totalAmps, supplyVolts, powerWatts, headroomVolts, value);
        };
    }

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
