package hissledger.device;

/** The parameters and ratings that a device sheet may state, beside the current gain curve of a bipolar transistor. */
public enum DeviceParameter {
    BASE_RESISTANCE("baseResistance", "base spreading resistance rbb'", DeviceKind.BIPOLAR),
    EMITTER_RESISTANCE("emitterResistance", "bulk emitter resistance", DeviceKind.BIPOLAR),
    EARLY_VOLTAGE("earlyVoltage", "Early voltage", DeviceKind.BIPOLAR),
    TRANSITION_FREQUENCY("transitionFrequency", "transition frequency fT", DeviceKind.BIPOLAR),
    COLLECTOR_BASE_CAPACITANCE("collectorBaseCapacitance", "collector-base capacitance", DeviceKind.BIPOLAR),
    EMITTER_BASE_CAPACITANCE("emitterBaseCapacitance", "emitter-base capacitance", DeviceKind.BIPOLAR),
    BASE_FLICKER_CORNER("baseFlickerCorner", "flicker corner of the base current", DeviceKind.BIPOLAR),

    DRAIN_SATURATION_CURRENT("drainSaturationCurrent", "drain saturation current IDSS", DeviceKind.JFET),
    PINCH_OFF_VOLTAGE("pinchOffVoltage", "pinch-off voltage VGS(off)", DeviceKind.JFET),
    TRANSCONDUCTANCE("transconductance", "transconductance gm", DeviceKind.JFET),
    CHANNEL_NOISE_FACTOR("channelNoiseFactor", "channel noise factor gamma", DeviceKind.JFET),
    OUTPUT_CONDUCTANCE_FACTOR("outputConductanceFactor", "output conductance factor lambda", DeviceKind.JFET),
    GATE_LEAKAGE("gateLeakage", "gate leakage IG", DeviceKind.JFET),
    GATE_SOURCE_CAPACITANCE("gateSourceCapacitance", "gate-source capacitance", DeviceKind.JFET),
    GATE_DRAIN_CAPACITANCE("gateDrainCapacitance", "gate-drain capacitance", DeviceKind.JFET),
    FLICKER_DENSITY("flickerDensity", "flicker voltage density", DeviceKind.JFET),
    INDUCED_GATE_NOISE("inducedGateNoise", "induced gate noise", DeviceKind.JFET),

    VOLTAGE_NOISE("voltageNoise", "voltage noise en", DeviceKind.AMPLIFIER),
    VOLTAGE_NOISE_CORNER("voltageNoiseCorner", "flicker corner of the voltage noise", DeviceKind.AMPLIFIER),
    CURRENT_NOISE("currentNoise", "current noise in", DeviceKind.AMPLIFIER),
    CURRENT_NOISE_CORNER("currentNoiseCorner", "flicker corner of the current noise", DeviceKind.AMPLIFIER),
    INPUT_RESISTANCE("inputResistance", "input resistance", DeviceKind.AMPLIFIER),
    INPUT_CAPACITANCE("inputCapacitance", "input capacitance", DeviceKind.AMPLIFIER),

    COLLECTOR_EMITTER_VOLTAGE(
            "collectorEmitterVoltage", "collector-emitter voltage rating", DeviceKind.BIPOLAR, DeviceKind.BIPOLAR),
    GATE_VOLTAGE("gateVoltage", "gate voltage rating", DeviceKind.JFET, DeviceKind.JFET),
    DRAIN_SOURCE_VOLTAGE("drainSourceVoltage", "drain-source voltage rating", DeviceKind.JFET, DeviceKind.JFET),
    CURRENT("current", "current rating", DeviceKind.BIPOLAR, DeviceKind.JFET),
    POWER("power", "power rating", DeviceKind.BIPOLAR, DeviceKind.JFET);

    private final String key;
    private final String words;
    private final DeviceKind kind;
    private final DeviceKind otherKind;
    private final boolean rating;

    /** A parameter of one kind of device. */
    DeviceParameter(String key, String words, DeviceKind kind) {
        this(key, words, kind, kind, false);
    }

    /** A rating, which two kinds of device may share. */
    DeviceParameter(String key, String words, DeviceKind kind, DeviceKind otherKind) {
        this(key, words, kind, otherKind, true);
    }

    DeviceParameter(String key, String words, DeviceKind kind, DeviceKind otherKind, boolean rating) {
        this.key = key;
        this.words = words;
        this.kind = kind;
        this.otherKind = otherKind;
        this.rating = rating;
    }

    /** The key in a device file. */
    public String key() {
        return key;
    }

    /** The parameter in words, for messages. */
    public String words() {
        return words;
    }

    /** Whether a device of this kind may state it. */
    public boolean fits(DeviceKind device) {
        return kind == device || otherKind == device;
    }

    /** Whether it is a rating, stated in the file's ratings and not in its parameters. */
    public boolean isRating() {
        return rating;
    }
}
