package hissledger.physics;

/**
 * Excess (current) noise of a resistor that carries direct current, as IEC 60195 quotes it.
 *
 * <p>The noise index is the rms noise voltage in one decade of frequency per volt across the resistor. A 1/f spectrum
 * with power NI² V² in every decade has the density {@code S_v(f) = (NI V)² / (ln 10 · f)}.
 */
public final class ExcessNoise {
    private ExcessNoise() {}

    /** One microvolt per volt, the reference of a noise index in dB (IEC 60195). */
    private static final double INDEX_REFERENCE = 1e-6;

    /**
     * Noise index from its level: {@code NI = 1e-6 · 10^(dB/20)}.
     *
     * @param indexDecibels level re 1 µV/V per decade, dB; finite
     * @return V/V per decade
     */
    public static double indexFromDecibels(double indexDecibels) {
        Require.finite("indexDecibels", indexDecibels, "dB re 1 µV/V");
        return INDEX_REFERENCE * Decibels.toAmplitudeRatio(indexDecibels);
    }

    /**
     * Voltage noise density at one hertz, {@code (NI V)² / ln 10}; at f it is that over f.
     *
     * @param index NI, V/V per decade; ≥ 0
     * @param directVolts direct voltage across the resistor, V; sign does not matter
     * @return V²/Hz at 1 Hz
     */
    public static double voltsSquaredPerHertzAtOneHertz(double index, double directVolts) {
        Require.notNegative("index", index, "V/V");
        Require.finite("directVolts", directVolts, "V");
        double perDecadeVolts = index * directVolts;
        return perDecadeVolts * perDecadeVolts / Math.log(10.0);
    }
}
