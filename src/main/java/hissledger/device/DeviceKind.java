package hissledger.device;

/** What kind of active device a sheet describes. */
public enum DeviceKind {
    BIPOLAR("bipolar"),
    JFET("jfet"),
    AMPLIFIER("amplifier");

    private final String label;

    DeviceKind(String label) {
        this.label = label;
    }

    /** The word used in files and results. */
    public String label() {
        return label;
    }
}
