package hissledger.circuit;

import hissledger.physics.Require;
import hissledger.twoport.Impedance;

/**
 * A source that is a plain resistance, Zs = R.
 *
 * @param resistanceOhms R, Ω; ≥ 0
 * @param temperatureKelvin temperature, K; &gt; 0
 * @param signal what it gives
 */
public record ResistorSource(double resistanceOhms, double temperatureKelvin, Signal signal) implements Source {
    public ResistorSource {
        Require.notNegative("resistanceOhms", resistanceOhms, "Ω");
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
    }

    @Override
    public Impedance impedance() {
        return Impedance.resistance(resistanceOhms);
    }

    @Override
    public ResistorSource withResistance(double ohms) {
        return new ResistorSource(ohms, temperatureKelvin, signal);
    }
}
