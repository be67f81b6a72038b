package hissledger.circuit;

import hissledger.physics.Band;
import hissledger.physics.MonotoneCubic;
import hissledger.physics.Require;
import hissledger.twoport.Frequencies;
import hissledger.twoport.Impedance;
import java.util.List;

/**
 * A source whose impedance has been measured: Re Z and Im Z through given points, smooth in ln f and without overshoot, so
 * that Re Z stays ≥ 0. It is never continued beyond its points.
 *
 * @param hertz frequencies, Hz; &gt; 0 and strictly rising, at least two
 * @param resistanceOhms Re Z at them, Ω; ≥ 0
 * @param reactanceOhms Im Z at them, Ω
 * @param temperatureKelvin temperature, K; &gt; 0
 * @param signal what it gives
 */
public record TableSource(
        List<Double> hertz,
        List<Double> resistanceOhms,
        List<Double> reactanceOhms,
        double temperatureKelvin,
        Signal signal)
        implements Source {
    /** Rounding of a band edge that is equal to the edge of the table. */
    private static final double EDGE = 1.0 + 1e-12;

    public TableSource {
        hertz = List.copyOf(hertz);
        resistanceOhms = List.copyOf(resistanceOhms);
        reactanceOhms = List.copyOf(reactanceOhms);
        Require.atLeast("hertz.size", hertz.size(), 2);
        if (resistanceOhms.size() != hertz.size() || reactanceOhms.size() != hertz.size()) {
            throw new IllegalArgumentException("a table needs as many impedances as frequencies");
        }
        hertz.forEach(f -> Require.positive("hertz", f, "Hz"));
        resistanceOhms.forEach(r -> Require.notNegative("resistanceOhms", r, "Ω"));
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
    }

    /** The band that the table covers. */
    public Band band() {
        return new Band(hertz.get(0), hertz.get(hertz.size() - 1));
    }

    @Override
    public Impedance impedance() {
        double[] lnHertz = hertz.stream().mapToDouble(Math::log).toArray();
        MonotoneCubic resistance = curve(lnHertz, resistanceOhms);
        MonotoneCubic reactance = curve(lnHertz, reactanceOhms);
        return (frequencies, re, im) -> fill(frequencies, resistance, reactance, re, im);
    }

    private static MonotoneCubic curve(double[] lnHertz, List<Double> values) {
        return MonotoneCubic.through(
                lnHertz, values.stream().mapToDouble(Double::doubleValue).toArray());
    }

    private void fill(
            Frequencies frequencies, MonotoneCubic resistance, MonotoneCubic reactance, double[] re, double[] im) {
        for (int k = 0; k < frequencies.count(); k++) {
            double f = frequencies.hertz()[k];
            if (f * EDGE < hertz.get(0) || f > hertz.get(hertz.size() - 1) * EDGE) {
                throw new IllegalArgumentException("the impedance table covers " + hertz.get(0) + " Hz to "
                        + hertz.get(hertz.size() - 1) + " Hz, not " + f + " Hz");
            }
            double x = Math.log(f);
            re[k] = resistance.at(x);
            im[k] = reactance.at(x);
        }
    }

    @Override
    public ResistorSource withResistance(double ohms) {
        return new ResistorSource(ohms, temperatureKelvin, signal);
    }
}
