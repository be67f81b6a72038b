package hissledger.circuit;

import hissledger.physics.ExcessNoise;
import hissledger.physics.Require;
import hissledger.twoport.Impedance;
import hissledger.twoport.Spectrum;

/** A resistor, capacitor or inductor as a part: its impedance and the noise that it makes beyond the thermal. */
public sealed interface Passive permits Passive.Resistor, Passive.Capacitor, Passive.Inductor {
    /** Z against frequency. */
    Impedance impedance();

    /** Whether it carries excess noise. */
    default boolean hasExcessNoise() {
        return false;
    }

    /** Open-circuit voltage density of its excess noise, V²/Hz. */
    default Spectrum excessVoltage() {
        return Spectrum.white(0.0);
    }

    /**
     * A resistor.
     *
     * @param ohms R, Ω; &gt; 0
     * @param noiseIndex NI, V/V per decade; ≥ 0
     * @param directVolts direct voltage across it, V
     */
    record Resistor(double ohms, double noiseIndex, double directVolts) implements Passive {
        /** Excess noise falls as 1/f; its density is stated at one hertz. */
        private static final double ONE_HERTZ = 1.0;

        public Resistor {
            Require.positive("ohms", ohms, "Ω");
            Require.notNegative("noiseIndex", noiseIndex, "V/V");
            Require.finite("directVolts", directVolts, "V");
        }

        /** A resistor without excess noise. */
        public static Resistor of(double ohms) {
            return new Resistor(ohms, 0.0, 0.0);
        }

        @Override
        public Impedance impedance() {
            return Impedance.resistance(ohms);
        }

        @Override
        public boolean hasExcessNoise() {
            return noiseIndex > 0.0 && directVolts != 0.0;
        }

        @Override
        public Spectrum excessVoltage() {
            return Spectrum.powerLaw(
                    ExcessNoise.voltsSquaredPerHertzAtOneHertz(noiseIndex, directVolts), ONE_HERTZ, 1.0);
        }

        /** Short-circuit current density of its excess noise, A²/Hz. */
        public Spectrum excessCurrent() {
            double volts = ExcessNoise.voltsSquaredPerHertzAtOneHertz(noiseIndex, directVolts);
            return Spectrum.powerLaw(volts / (ohms * ohms), ONE_HERTZ, 1.0);
        }
    }

    /**
     * A capacitor.
     *
     * @param farads C, F; &gt; 0
     * @param lossTangent tan δ, dimensionless; ≥ 0
     * @param seriesOhms ESR, Ω; ≥ 0
     */
    record Capacitor(double farads, double lossTangent, double seriesOhms) implements Passive {
        public Capacitor {
            Require.positive("farads", farads, "F");
            Require.notNegative("lossTangent", lossTangent, "");
            Require.notNegative("seriesOhms", seriesOhms, "Ω");
        }

        /** A capacitor without losses. */
        public static Capacitor of(double farads) {
            return new Capacitor(farads, 0.0, 0.0);
        }

        @Override
        public Impedance impedance() {
            return Impedance.capacitance(farads, lossTangent, seriesOhms);
        }
    }

    /**
     * An inductor without losses.
     *
     * @param henries L, H; &gt; 0
     */
    record Inductor(double henries) implements Passive {
        public Inductor {
            Require.positive("henries", henries, "H");
        }

        @Override
        public Impedance impedance() {
            return Impedance.resistanceAndInductance(0.0, henries);
        }
    }
}
