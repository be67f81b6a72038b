package hissledger.twoport;

import hissledger.physics.Require;

/** A passive two-terminal impedance as a function of frequency. */
@FunctionalInterface
public interface Impedance {
    /**
     * Writes Z = re + j im at every frequency.
     *
     * @param frequencies where to evaluate
     * @param re receives Re Z, Ω, each ≥ 0
     * @param im receives Im Z, Ω
     */
    void fill(Frequencies frequencies, double[] re, double[] im);

    /** Z = 0. */
    static Impedance none() {
        return resistance(0.0);
    }

    /** Z = R, with R ≥ 0 Ω. */
    static Impedance resistance(double ohms) {
        Require.notNegative("ohms", ohms, "Ω");
        return (frequencies, re, im) -> {
            for (int k = 0; k < frequencies.count(); k++) {
                re[k] = ohms;
                im[k] = 0.0;
            }
        };
    }

    /** Z = R + jωL, with R ≥ 0 Ω and L ≥ 0 H. */
    static Impedance resistanceAndInductance(double ohms, double henries) {
        Require.notNegative("ohms", ohms, "Ω");
        Require.notNegative("henries", henries, "H");
        return (frequencies, re, im) -> {
            double[] omega = frequencies.omega();
            for (int k = 0; k < frequencies.count(); k++) {
                re[k] = ohms;
                im[k] = omega[k] * henries;
            }
        };
    }

    /**
     * A capacitor with its losses, {@code Z = ESR + tan δ/(ωC) − j/(ωC)}.
     *
     * @param farads C, F; &gt; 0
     * @param lossTangent tan δ, dimensionless; ≥ 0
     * @param seriesOhms ESR, Ω; ≥ 0
     */
    static Impedance capacitance(double farads, double lossTangent, double seriesOhms) {
        Require.positive("farads", farads, "F");
        Require.notNegative("lossTangent", lossTangent, "");
        Require.notNegative("seriesOhms", seriesOhms, "Ω");
        double elastance = 1.0 / farads;
        return (frequencies, re, im) -> {
            double[] inverseOmega = frequencies.inverseOmega();
            for (int k = 0; k < frequencies.count(); k++) {
                double reactance = inverseOmega[k] * elastance;
                re[k] = seriesOhms + lossTangent * reactance;
                im[k] = -reactance;
            }
        };
    }

    /** This impedance {@code times} over in series, as an element that stands once in each leg of a balanced line does. */
    default Impedance times(int times) {
        Require.atLeast("times", times, 1);
        if (times == 1) {
            return this;
        }
        return (frequencies, re, im) -> {
            fill(frequencies, re, im);
            for (int k = 0; k < frequencies.count(); k++) {
                re[k] *= times;
                im[k] *= times;
            }
        };
    }

    /**
     * This impedance with a resistance and a capacitance across it, {@code Z / (1 + Z (1/R + jωC))}.
     *
     * @param parallelOhms R, Ω; &gt; 0, infinite for none
     * @param parallelFarads C, F; ≥ 0
     */
    default Impedance across(double parallelOhms, double parallelFarads) {
        if (!(parallelOhms > 0.0)) {
            throw new IllegalArgumentException("parallelOhms must be > 0 Ω, was " + parallelOhms);
        }
        Require.notNegative("parallelFarads", parallelFarads, "F");
        double conductance = 1.0 / parallelOhms;
        return (frequencies, re, im) -> {
            fill(frequencies, re, im);
            double[] omega = frequencies.omega();
            for (int k = 0; k < frequencies.count(); k++) {
                double susceptance = omega[k] * parallelFarads;
                double r = re[k];
                double x = im[k];
                double denominatorRe = 1.0 + r * conductance - x * susceptance;
                double denominatorIm = x * conductance + r * susceptance;
                double square = denominatorRe * denominatorRe + denominatorIm * denominatorIm;
                // Re Z' = (R + |Z|² G)/|1 + ZY|² is a sum of non-negative terms: no cancellation at high Q
                re[k] = (r + (r * r + x * x) * conductance) / square;
                im[k] = (x * denominatorRe - r * denominatorIm) / square;
            }
        };
    }
}
