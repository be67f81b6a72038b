package hissledger.circuit;

import hissledger.physics.Require;
import hissledger.twoport.Impedance;

/**
 * A coil: Zs = (R + jωL) with an optional resistance (its losses) and capacitance (its winding) across it.
 *
 * @param resistanceOhms DC resistance R, Ω; ≥ 0
 * @param inductanceHenries L, H; ≥ 0
 * @param parallelOhms resistance across it, Ω; &gt; 0, infinite for none
 * @param parallelFarads capacitance across it, F; ≥ 0
 * @param temperatureKelvin temperature, K; &gt; 0
 * @param signal what it gives
 */
public record CoilSource(
        double resistanceOhms,
        double inductanceHenries,
        double parallelOhms,
        double parallelFarads,
        double temperatureKelvin,
        Signal signal)
        implements Source {
    public CoilSource {
        Require.notNegative("resistanceOhms", resistanceOhms, "Ω");
        Require.notNegative("inductanceHenries", inductanceHenries, "H");
        if (!(parallelOhms > 0.0)) {
            throw new IllegalArgumentException("parallelOhms must be > 0 Ω, was " + parallelOhms);
        }
        Require.notNegative("parallelFarads", parallelFarads, "F");
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
    }

    @Override
    public Impedance impedance() {
        Impedance winding = Impedance.resistanceAndInductance(resistanceOhms, inductanceHenries);
        boolean bare = Double.isInfinite(parallelOhms) && parallelFarads == 0.0;
        return bare ? winding : winding.across(parallelOhms, parallelFarads);
    }

    @Override
    public CoilSource withResistance(double ohms) {
        return new CoilSource(ohms, inductanceHenries, parallelOhms, parallelFarads, temperatureKelvin, signal);
    }
}
