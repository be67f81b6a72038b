package hissledger.circuit;

import hissledger.physics.Require;
import hissledger.twoport.Impedance;

/**
 * A capacitive source (condenser capsule, hydrophone): Zs = tan δ/(ωC) − j/(ωC) with an optional resistance across it.
 *
 * @param capacitanceFarads C, F; &gt; 0
 * @param lossTangent tan δ, dimensionless; ≥ 0
 * @param parallelOhms leakage resistance across it, Ω; &gt; 0, infinite for none
 * @param temperatureKelvin temperature, K; &gt; 0
 * @param signal what it gives
 */
public record CapacitorSource(
        double capacitanceFarads, double lossTangent, double parallelOhms, double temperatureKelvin, Signal signal)
        implements Source {
    public CapacitorSource {
        Require.positive("capacitanceFarads", capacitanceFarads, "F");
        Require.notNegative("lossTangent", lossTangent, "");
        if (!(parallelOhms > 0.0)) {
            throw new IllegalArgumentException("parallelOhms must be > 0 Ω, was " + parallelOhms);
        }
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
    }

    @Override
    public Impedance impedance() {
        Impedance capacitor = Impedance.capacitance(capacitanceFarads, lossTangent, 0.0);
        return Double.isInfinite(parallelOhms) ? capacitor : capacitor.across(parallelOhms, 0.0);
    }

    @Override
    public ResistorSource withResistance(double ohms) {
        return new ResistorSource(ohms, temperatureKelvin, signal);
    }
}
