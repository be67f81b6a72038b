package hissledger.twoport;

import hissledger.physics.Require;

/** The one-sided power spectral density of a generator, V²/Hz or A²/Hz, as a function of frequency. */
@FunctionalInterface
public interface Spectrum {
    /** Writes S(f) at every frequency. */
    void fill(Frequencies frequencies, double[] density);

    /** S constant; {@code density} ≥ 0, V²/Hz or A²/Hz. */
    static Spectrum white(double density) {
        Require.notNegative("density", density, "V²/Hz or A²/Hz");
        return (frequencies, out) -> {
            for (int k = 0; k < frequencies.count(); k++) {
                out[k] = density;
            }
        };
    }

    /**
     * A power law, {@code S(f) = S₀ (f₀/f)^α}.
     *
     * @param density S₀ at f₀, V²/Hz or A²/Hz; ≥ 0
     * @param hertz f₀, Hz; &gt; 0
     * @param exponent α, dimensionless; 1 for flicker noise, −2 for noise that grows as ω²
     */
    static Spectrum powerLaw(double density, double hertz, double exponent) {
        Require.notNegative("density", density, "V²/Hz or A²/Hz");
        Require.positive("hertz", hertz, "Hz");
        Require.finite("exponent", exponent, "");
        if (exponent == 1.0) {
            double atOneRadian = density * 2.0 * Math.PI * hertz;
            return (frequencies, out) -> {
                double[] inverseOmega = frequencies.inverseOmega();
                for (int k = 0; k < frequencies.count(); k++) {
                    out[k] = atOneRadian * inverseOmega[k];
                }
            };
        }
        return (frequencies, out) -> {
            double[] f = frequencies.hertz();
            for (int k = 0; k < frequencies.count(); k++) {
                out[k] = density * Math.pow(hertz / f[k], exponent);
            }
        };
    }

    /**
     * White noise with a flicker corner, {@code S(f) = S (1 + f_c/f)}.
     *
     * @param density S, V²/Hz or A²/Hz; ≥ 0
     * @param cornerHertz f_c, Hz; ≥ 0
     */
    static Spectrum whiteWithCorner(double density, double cornerHertz) {
        Require.notNegative("density", density, "V²/Hz or A²/Hz");
        Require.notNegative("cornerHertz", cornerHertz, "Hz");
        double cornerOmega = 2.0 * Math.PI * cornerHertz;
        return (frequencies, out) -> {
            double[] inverseOmega = frequencies.inverseOmega();
            for (int k = 0; k < frequencies.count(); k++) {
                out[k] = density * (1.0 + cornerOmega * inverseOmega[k]);
            }
        };
    }
}
