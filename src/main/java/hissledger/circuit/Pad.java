package hissledger.circuit;

import hissledger.device.NoiseKind;
import hissledger.device.NoiseSource;
import hissledger.physics.Require;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Impedance;

/**
 * A pad of two arms: the series arm, once or in each leg of a balanced line, then the shunt arm across the line.
 *
 * @param name the beginning of the names of its entries
 * @param seriesOhms resistance of the series arm in one leg, Ω; &gt; 0
 * @param shuntOhms resistance of the shunt arm across the line, Ω; &gt; 0
 * @param legs 1, or 2 where the series arm stands in each leg
 * @param temperatureKelvin temperature, K; &gt; 0
 */
public record Pad(String name, double seriesOhms, double shuntOhms, int legs, double temperatureKelvin)
        implements PathElement {
    public Pad {
        Require.positive("seriesOhms", seriesOhms, "Ω");
        Require.positive("shuntOhms", shuntOhms, "Ω");
        Require.atLeast("legs", legs, 1);
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
    }

    @Override
    public void walk(ChainPass pass) {
        pass.series(Impedance.resistance(legs * seriesOhms), arm("series arm"), temperatureKelvin);
        pass.shunt(Impedance.resistance(shuntOhms), arm("shunt arm"), temperatureKelvin);
    }

    private NoiseSource arm(String arm) {
        return new NoiseSource(name + ", " + arm, NoiseKind.PATH_THERMAL);
    }
}
