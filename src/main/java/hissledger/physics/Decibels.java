package hissledger.physics;

/** Ratios and levels on the decibel scale. A ratio of zero gives −∞ dB, never a substitute number. */
public final class Decibels {
    private Decibels() {}

    /** Level of a power ratio, {@code 10 log10(ratio)} dB; the ratio is dimensionless and ≥ 0. */
    public static double ofPowerRatio(double ratio) {
        return 10.0 * Math.log10(ratio);
    }

    /** Level of a voltage or current ratio, {@code 20 log10(ratio)} dB; the ratio is dimensionless and ≥ 0. */
    public static double ofAmplitudeRatio(double ratio) {
        return 20.0 * Math.log10(ratio);
    }

    /** Power ratio of a level, {@code 10^(dB/10)}, dimensionless. */
    public static double toPowerRatio(double decibels) {
        return Math.pow(10.0, decibels / 10.0);
    }

    /** Voltage or current ratio of a level, {@code 10^(dB/20)}, dimensionless. */
    public static double toAmplitudeRatio(double decibels) {
        return Math.pow(10.0, decibels / 20.0);
    }

    /** Level of an rms voltage in dBu, {@code 20 log10(V / √0.6 V)}. */
    public static double dbu(double volts) {
        return ofAmplitudeRatio(volts / Constants.DBU_REFERENCE_VOLTS);
    }

    /** Level of an rms voltage in dBV, {@code 20 log10(V / 1 V)}. */
    public static double dbv(double volts) {
        return ofAmplitudeRatio(volts);
    }

    /** The rms voltage, V, of a level in dBu: {@code √0.6 V · 10^(dBu/20)}. */
    public static double dbuToVolts(double dbu) {
        return Constants.DBU_REFERENCE_VOLTS * toAmplitudeRatio(dbu);
    }
}
