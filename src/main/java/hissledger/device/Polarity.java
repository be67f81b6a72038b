package hissledger.device;

/** Polarity of a transistor. Noise does not depend on it; the circuit around it does. */
public enum Polarity {
    NPN("npn", DeviceKind.BIPOLAR),
    PNP("pnp", DeviceKind.BIPOLAR),
    N_CHANNEL("n-channel", DeviceKind.JFET),
    P_CHANNEL("p-channel", DeviceKind.JFET),
    /** A behavioural amplifier has none. */
    NONE("", DeviceKind.AMPLIFIER);

    private final String label;
    private final DeviceKind kind;

    Polarity(String label, DeviceKind kind) {
        this.label = label;
        this.kind = kind;
    }

    /** The word used in files and results. */
    public String label() {
        return label;
    }

    /** The kind of device that has this polarity. */
    public DeviceKind kind() {
        return kind;
    }
}
