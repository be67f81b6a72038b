package hissledger.circuit;

import hissledger.device.NoiseKind;
import hissledger.device.NoiseSource;
import hissledger.physics.Require;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import hissledger.twoport.Spectrum;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/**
 * A part across the signal, once or from each leg of a balanced line to ground or to a supply.
 *
 * @param name the name of its entry
 * @param part the part
 * @param legs 1, or 2 where it stands from each leg to ground: its impedance then counts twice between the terminals
 * @param temperatureKelvin temperature, K; &gt; 0
 * @param supply the noisy supply at its far end, of a resistor; empty where that end is quiet
 */
public record ShuntElement(String name, Passive part, int legs, double temperatureKelvin, Optional<Supply> supply)
        implements PathElement {
    private static final String SUPPLY_SUFFIX = ", supply";

    public ShuntElement {
        Require.atLeast("legs", legs, 1);
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
        if (supply.isPresent() && !(part instanceof Passive.Resistor)) {
            throw new IllegalArgumentException("only a resistor leads to a noisy supply");
        }
    }

    /** A part whose far end is quiet. */
    public ShuntElement(String name, Passive part, int legs, double temperatureKelvin) {
        this(name, part, legs, temperatureKelvin, Optional.empty());
    }

    @Override
    public void walk(ChainPass pass) {
        if (part.hasExcessNoise() && part instanceof Passive.Resistor resistor) {
            // legs parts in series carry the noise voltages of all against legs times the resistance: S/legs as a
            // current
            Spectrum each = resistor.excessCurrent();
            pass.shuntCurrent(Excess.source(name), Excess.times(each, 1.0 / legs));
        }
        pass.shunt(part.impedance().times(legs), new NoiseSource(name, NoiseKind.PATH_THERMAL), temperatureKelvin);
    }

    /**
     * The supply's noise e reaches the line as a current: {@code e/R} with one leg. With a leg each side it cancels but for
     * the mismatch d: the legs' common voltage follows the supply up to {@code 1/(1 + R Y)}, Y being the admittance of all
     * other parts from each leg to ground, and the rest, {@code e R Y/(1 + R Y)}, drives {@code d/(2R)} between the legs.
     * Parts in series with the legs are left out of Y's path.
     */
    @Override
    public void walkSupply(ChainPass pass, List<PathElement> path) {
        if (supply.isEmpty() || !(part instanceof Passive.Resistor resistor)) {
            return;
        }
        double ohms = resistor.ohms();
        double volts = supply.get().voltsPerRootHertz();
        NoiseSource source = new NoiseSource(name + SUPPLY_SUFFIX, NoiseKind.SUPPLY);
        if (legs == 1) {
            double amps = volts / ohms;
            pass.shuntCurrent(source, Spectrum.white(amps * amps));
            return;
        }
        List<ShuntElement> others = new ArrayList<>();
        for (PathElement element : path) {
            if (element instanceof ShuntElement shunt && shunt.legs == legs && !shunt.equals(this)) {
                others.add(shunt);
            }
        }
        double amps = volts * supply.get().mismatch() / (2.0 * ohms);
        pass.shuntCurrent(source, (frequencies, density) -> residue(frequencies, others, ohms, amps, density));
    }

    private static void residue(
            Frequencies frequencies, List<ShuntElement> others, double ohms, double amps, double[] density) {
        int n = frequencies.count();
        double[] conductance = new double[n];
        double[] susceptance = new double[n];
        double[] re = new double[n];
        double[] im = new double[n];
        for (ShuntElement other : others) {
            other.part.impedance().fill(frequencies, re, im);
            for (int k = 0; k < n; k++) {
                double square = re[k] * re[k] + im[k] * im[k];
                conductance[k] += re[k] / square;
                susceptance[k] -= im[k] / square;
            }
        }
        for (int k = 0; k < n; k++) {
            double g = ohms * conductance[k];
            double b = ohms * susceptance[k];
            density[k] = amps * amps * (g * g + b * b) / ((1.0 + g) * (1.0 + g) + b * b);
        }
    }
}
