package hissledger.circuit;

import hissledger.physics.Require;
import hissledger.physics.Thermal;
import hissledger.twoport.Frequencies;
import hissledger.twoport.Impedance;
import hissledger.twoport.Spectrum;

/**
 * What stands between the emitter or source and ground: {@code Ze = Ru + R || (ESR + 1/jωC)}.
 *
 * @param unbypassedOhms Ru, Ω; ≥ 0
 * @param resistorOhms R, Ω; ≥ 0
 * @param bypassFarads C, F; ≥ 0, where 0 means no bypass
 * @param bypassSeriesOhms ESR of the bypass capacitor, Ω; ≥ 0
 */
public record CommonLead(double unbypassedOhms, double resistorOhms, double bypassFarads, double bypassSeriesOhms) {
    public CommonLead {
        Require.notNegative("unbypassedOhms", unbypassedOhms, "Ω");
        Require.notNegative("resistorOhms", resistorOhms, "Ω");
        Require.notNegative("bypassFarads", bypassFarads, "F");
        Require.notNegative("bypassSeriesOhms", bypassSeriesOhms, "Ω");
    }

    /** The emitter or source at ground. */
    public static CommonLead grounded() {
        return new CommonLead(0.0, 0.0, 0.0, 0.0);
    }

    /** A resistor without bypass. */
    public static CommonLead of(double ohms) {
        return new CommonLead(ohms, 0.0, 0.0, 0.0);
    }

    /** Whether there is nothing in the lead. */
    public boolean isGrounded() {
        return unbypassedOhms == 0.0 && resistorOhms == 0.0;
    }

    /** Direct-current resistance from emitter or source to ground, Ω. */
    public double directOhms() {
        return unbypassedOhms + resistorOhms;
    }

    /**
     * Ze with another resistance in series, at every frequency.
     *
     * @param seriesOhms bulk emitter resistance of the device or devices, Ω; ≥ 0
     */
    public Impedance impedance(double seriesOhms) {
        return (frequencies, re, im) -> fill(frequencies, seriesOhms, re, im);
    }

    /** Thermal noise of the lead without the device's own resistance, {@code 4kT Re Ze}, V²/Hz. */
    public Spectrum thermal(double temperatureKelvin) {
        double fourKt = Thermal.fourKt(temperatureKelvin);
        return (frequencies, density) -> {
            double[] inverseOmega = frequencies.inverseOmega();
            for (int k = 0; k < frequencies.count(); k++) {
                density[k] = fourKt * resistanceOhms(inverseOmega[k]);
            }
        };
    }

    private void fill(Frequencies frequencies, double seriesOhms, double[] re, double[] im) {
        double[] inverseOmega = frequencies.inverseOmega();
        for (int k = 0; k < frequencies.count(); k++) {
            re[k] = seriesOhms + resistanceOhms(inverseOmega[k]);
            im[k] = reactanceOhms(inverseOmega[k]);
        }
    }

    private double resistanceOhms(double inverseOmega) {
        if (bypassFarads == 0.0 || resistorOhms == 0.0) {
            return unbypassedOhms + resistorOhms;
        }
        // Re of R (E − jX)/(R + E − jX)
        double x = inverseOmega / bypassFarads;
        double sum = resistorOhms + bypassSeriesOhms;
        return unbypassedOhms + resistorOhms * (bypassSeriesOhms * sum + x * x) / (sum * sum + x * x);
    }

    private double reactanceOhms(double inverseOmega) {
        if (bypassFarads == 0.0 || resistorOhms == 0.0) {
            return 0.0;
        }
        double x = inverseOmega / bypassFarads;
        double sum = resistorOhms + bypassSeriesOhms;
        return -resistorOhms * resistorOhms * x / (sum * sum + x * x);
    }
}
