package hissledger.choose;

import hissledger.circuit.FrontEnd;
import hissledger.ledger.Accounting;
import hissledger.ledger.Headroom;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import java.util.ArrayList;
import java.util.List;
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
    /** A limit that a search ran into is kept, whatever its last bit. */
    private static final double ROUNDING = 1e-9;

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

    /**
     * Which of these limits a front end breaks.
     *
     * @param totalCurrent current of all its devices, A
     */
    public List<Kind> brokenBy(FrontEnd frontEnd, double totalCurrent) {
        List<Kind> broken = new ArrayList<>();
        if (totalCurrent > totalAmps.orElse(Double.POSITIVE_INFINITY) * (1.0 + ROUNDING)) {
            broken.add(Kind.TOTAL_CURRENT);
        }
        double watts = totalCurrent * supplyVolts.orElse(0.0);
        if (watts > powerWatts.orElse(Double.POSITIVE_INFINITY) * (1.0 + ROUNDING)) {
            broken.add(Kind.POWER);
        }
        if (headroomVolts.isPresent()
                && Headroom.emfVolts(frontEnd).orElse(Double.POSITIVE_INFINITY) < headroomVolts.getAsDouble()) {
            broken.add(Kind.HEADROOM);
        }
        if (inputFarads.isPresent() && inputFarads(frontEnd) > inputFarads.getAsDouble()) {
            broken.add(Kind.INPUT_CAPACITANCE);
        }
        return broken;
    }

    /** Input capacitance of the stage at 1 kHz, Im C/A over ω, F. */
    private static double inputFarads(FrontEnd frontEnd) {
        Frequencies at = Frequencies.of(Accounting.REFERENCE_HERTZ);
        ChainPass voltage = new ChainPass(at);
        voltage.beginWith(1.0, 0.0, 0.0);
        frontEnd.stage().walk(voltage);
        ChainPass current = new ChainPass(at);
        current.beginWith(0.0, 1.0, 0.0);
        frontEnd.stage().walk(current);
        double aRe = voltage.rowVoltageRe()[0];
        double aIm = voltage.rowVoltageIm()[0];
        double susceptance =
                (current.rowVoltageIm()[0] * aRe - current.rowVoltageRe()[0] * aIm) / (aRe * aRe + aIm * aIm);
        return susceptance / at.omega()[0];
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
