package hissledger.circuit;

import hissledger.device.DeviceKind;

/** The circuit form of the active stage. */
public enum Arrangement {
    COMMON_EMITTER("common-emitter"),
    COMMON_SOURCE("common-source"),
    FOLLOWER("follower"),
    /** Two halves driven between their inputs by a floating source. */
    DIFFERENTIAL_PAIR("differential-pair"),
    /** Two halves, one driven, a resistor at the input of the other. */
    SINGLE_ENDED_PAIR("single-ended-pair"),
    /** Two halves with a resistor between their emitters or sources and feedback to each. */
    GAIN_RESISTOR_PAIR("gain-resistor-pair"),
    /** A behavioural amplifier. */
    AMPLIFIER("amplifier");

    private final String label;

    Arrangement(String label) {
        this.label = label;
    }

    /** The word used in files and results. */
    public String label() {
        return label;
    }

    /** Whether a device of this kind can be used so: the two that name an electrode want the device that has it. */
    public boolean fits(DeviceKind kind) {
        return switch (this) {
            case COMMON_EMITTER -> kind == DeviceKind.BIPOLAR;
            case COMMON_SOURCE -> kind == DeviceKind.JFET;
            case AMPLIFIER -> kind == DeviceKind.AMPLIFIER;
            case FOLLOWER, DIFFERENTIAL_PAIR, SINGLE_ENDED_PAIR, GAIN_RESISTOR_PAIR -> kind != DeviceKind.AMPLIFIER;
        };
    }

    /** Whether it is built of two halves. */
    public boolean isPair() {
        return this == DIFFERENTIAL_PAIR || this == SINGLE_ENDED_PAIR || this == GAIN_RESISTOR_PAIR;
    }
}
