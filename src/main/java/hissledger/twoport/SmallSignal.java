package hissledger.twoport;

import hissledger.physics.Require;

/**
 * The admittances of a three-terminal device, common lead grounded, as five real numbers:
 * {@code y11 = g11 + jω(C1 + C12)}, {@code y12 = −jωC12}, {@code y21 = gm − jωC12}, {@code y22 = g22 + jωC12}.
 *
 * @param inputSiemens g11, S; ≥ 0
 * @param transconductanceSiemens gm, S; &gt; 0
 * @param outputSiemens g22, S; ≥ 0
 * @param inputFarads C1 from the input terminal to the common lead, F; ≥ 0
 * @param feedbackFarads C12 from the output terminal to the input terminal, F; ≥ 0
 * @param shieldedFarads capacitance from the input terminal to a fixed potential where a cascode shields it from the
 *     output, F; ≥ 0; it does not return to the common lead and is not part of the four admittances
 */
public record SmallSignal(
        double inputSiemens,
        double transconductanceSiemens,
        double outputSiemens,
        double inputFarads,
        double feedbackFarads,
        double shieldedFarads) {
    public SmallSignal {
        Require.notNegative("inputSiemens", inputSiemens, "S");
        Require.positive("transconductanceSiemens", transconductanceSiemens, "S");
        Require.notNegative("outputSiemens", outputSiemens, "S");
        Require.notNegative("inputFarads", inputFarads, "F");
        Require.notNegative("feedbackFarads", feedbackFarads, "F");
        Require.notNegative("shieldedFarads", shieldedFarads, "F");
    }

    /** A device whose input and output share no shield. */
    public static SmallSignal of(
            double inputSiemens,
            double transconductanceSiemens,
            double outputSiemens,
            double inputFarads,
            double feedbackFarads) {
        return new SmallSignal(inputSiemens, transconductanceSiemens, outputSiemens, inputFarads, feedbackFarads, 0.0);
    }

    /** The admittances of N equal devices in parallel, {@code N y}. */
    public SmallSignal parallel(int devices) {
        Require.atLeast("devices", devices, 1);
        return new SmallSignal(
                devices * inputSiemens,
                devices * transconductanceSiemens,
                devices * outputSiemens,
                devices * inputFarads,
                devices * feedbackFarads,
                devices * shieldedFarads);
    }

    /**
     * The same device with a cascode above it: its output terminal stands still, so that C12 loads the input to a fixed
     * potential and the output conductance carries no signal.
     */
    public SmallSignal cascoded() {
        return new SmallSignal(
                inputSiemens, transconductanceSiemens, 0.0, inputFarads, 0.0, shieldedFarads + feedbackFarads);
    }
}
