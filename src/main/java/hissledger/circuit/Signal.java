package hissledger.circuit;

import hissledger.physics.Require;
import java.util.OptionalDouble;

/**
 * The signal of a source.
 *
 * @param voltsPerUnit sensitivity, V of EMF per unit of the stimulus; empty where not stated
 * @param unit the unit of the stimulus: Pa, m/s, m/s², N, or empty where the sensitivity is a voltage at a stated level
 * @param referenceVolts EMF at the reference level, V rms; empty where not stated
 */
public record Signal(OptionalDouble voltsPerUnit, String unit, OptionalDouble referenceVolts) {
    /** The unit of a microphone's stimulus. */
    public static final String PASCAL = "Pa";

    public Signal {
        if (voltsPerUnit.isPresent()) {
            Require.positive("voltsPerUnit", voltsPerUnit.getAsDouble(), "V/" + unit);
        }
        if (referenceVolts.isPresent()) {
            Require.positive("referenceVolts", referenceVolts.getAsDouble(), "V");
        }
    }

    /** Nothing stated. */
    public static Signal none() {
        return new Signal(OptionalDouble.empty(), "", OptionalDouble.empty());
    }

    /** Whether the sensitivity is that of a microphone, V/Pa. */
    public boolean isAcoustic() {
        return voltsPerUnit.isPresent() && unit.equals(PASCAL);
    }
}
