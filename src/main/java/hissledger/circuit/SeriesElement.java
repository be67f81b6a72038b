package hissledger.circuit;

import hissledger.device.NoiseKind;
import hissledger.device.NoiseSource;
import hissledger.physics.Require;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Impedance;
import hissledger.twoport.Spectrum;

/**
 * A part in series with the signal, once or in each leg of a balanced line.
 *
 * @param name the name of its entry
 * @param part the part
 * @param legs 1, or 2 where it stands once in each leg: its impedance and its noise power then count twice
 * @param temperatureKelvin temperature, K; &gt; 0
 */
public record SeriesElement(String name, Passive part, int legs, double temperatureKelvin) implements PathElement {
    public SeriesElement {
        Require.atLeast("legs", legs, 1);
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
    }

    @Override
    public void walk(ChainPass pass) {
        Impedance impedance = part.impedance().times(legs);
        if (part.hasExcessNoise()) {
            Spectrum each = part.excessVoltage();
            pass.seriesVoltage(Excess.source(name), Excess.times(each, legs));
        }
        pass.series(impedance, new NoiseSource(name, NoiseKind.PATH_THERMAL), temperatureKelvin);
    }
}
