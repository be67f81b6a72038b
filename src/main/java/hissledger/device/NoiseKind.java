package hissledger.device;

/** The physical kind of a noise generator in a front end. */
public enum NoiseKind {
    SOURCE("source"),
    PATH_THERMAL("path thermal"),
    PATH_EXCESS("path excess"),
    SUPPLY("supply"),
    BASE_SHOT("base shot"),
    BASE_FLICKER("base flicker"),
    BASE_RESISTANCE("base resistance"),
    COLLECTOR_SHOT("collector shot"),
    EMITTER_RESISTANCE("emitter resistance"),
    CHANNEL("channel"),
    CHANNEL_FLICKER("channel flicker"),
    GATE_LEAKAGE("gate leakage"),
    INDUCED_GATE("induced gate"),
    COMMON_LEAD("common lead"),
    GAIN_RESISTOR("gain resistor"),
    FEEDBACK_RESISTOR("feedback resistor"),
    LOAD("load"),
    LOAD_EXCESS("load excess"),
    NEXT_STAGE_VOLTAGE("next stage voltage"),
    NEXT_STAGE_CURRENT("next stage current"),
    AMPLIFIER_VOLTAGE("amplifier voltage"),
    AMPLIFIER_CURRENT("amplifier current"),
    OTHER_SIDE("other side");

    private final String label;

    NoiseKind(String label) {
        this.label = label;
    }

    /** The words under which results name this kind. */
    public String label() {
        return label;
    }
}
