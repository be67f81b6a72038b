package hissledger.circuit;

import hissledger.device.BiasedBipolar;
import hissledger.device.BipolarModel;
import hissledger.physics.Constants;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import hissledger.twoport.NoiseParameters;
import java.util.List;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.optim.MaxEval;
import org.apache.commons.math3.optim.nonlinear.scalar.GoalType;
import org.apache.commons.math3.optim.univariate.BrentOptimizer;
import org.apache.commons.math3.optim.univariate.SearchInterval;
import org.apache.commons.math3.optim.univariate.UnivariateObjectiveFunction;

/**
 * Noise factors, from the engine, of a bare transistor with rbb' and a flat gain behind a resistor at its own temperature:
 * the case for which the literature has closed forms. Here the noise factor is re the source at that temperature.
 *
 * @param gain β
 * @param baseOhms rbb', Ω
 * @param kelvin temperature of source and device, K
 */
record LowFrequencyBipolar(double gain, double baseOhms, double kelvin) {
    private static final double HERTZ = 1000.0;
    private static final int MOST_EVALUATIONS = 1_000;
    /** Brent's method cannot place a minimum closer than the square root of the rounding. */
    private static final double PLACED_TO = 1e-9;

    /** Everything, correlations included ("set X"): total over the source's own noise. */
    double noiseFactor(double sourceOhms, double collectorAmps) {
        ChainPass pass = walk(sourceOhms, baseOhms, collectorAmps);
        double[] total = new double[1];
        pass.total(total);
        return total[0] / entry(pass, "source");
    }

    /**
     * The textbook's simpler sum ("set S"): the collector's shot noise enters as a voltage 2q IC/gm² alone and does not
     * load the source through β.
     */
    double uncorrelatedNoiseFactor(double sourceOhms, double collectorAmps) {
        ChainPass whole = walk(sourceOhms, baseOhms, collectorAmps);
        ChainPass shorted = walk(0.0, 0.0, collectorAmps);
        return 1.0
                + (entry(whole, "base resistance") + entry(whole, "base shot") + entry(shorted, "collector shot"))
                        / entry(whole, "source");
    }

    double bestAmps(double sourceOhms) {
        return lowest(amps -> noiseFactor(sourceOhms, amps), 1e-8, 1.0);
    }

    double bestAmpsUncorrelated(double sourceOhms) {
        return lowest(amps -> uncorrelatedNoiseFactor(sourceOhms, amps), 1e-8, 1.0);
    }

    double bestOhms(double collectorAmps) {
        return lowest(ohms -> noiseFactor(ohms, collectorAmps), 1.0, 1e8);
    }

    /**
     * The crudest sum, en² = 4kT rbb' + 2q IC/gm² and in² = 2q IB without any correlation, as two-port noise parameters;
     * powers are scaled by T₀/T so that its noise factors are re a source at T.
     */
    NoiseParameters separateGenerators(double collectorAmps) {
        double ohms = 1_000.0;
        ChainPass withoutBase = walk(ohms, 0.0, collectorAmps);
        double scale = Constants.STANDARD_NOISE_TEMPERATURE_KELVIN / kelvin;
        double voltage = entry(walk(ohms, baseOhms, collectorAmps), "base resistance")
                + entry(walk(0.0, 0.0, collectorAmps), "collector shot");
        double current = entry(withoutBase, "base shot") / (ohms * ohms);
        return new NoiseParameters(Math.sqrt(scale * voltage), Math.sqrt(scale * current), 0.0, 0.0);
    }

    ChainPass walk(double sourceOhms, double rbb, double collectorAmps) {
        ChainPass pass = new ChainPass(Frequencies.of(HERTZ));
        new FrontEnd(
                        new ResistorSource(sourceOhms, kelvin, Signal.none()),
                        List.of(),
                        SingleStage.bare(new BiasedBipolar(BipolarModel.ideal(gain, rbb), collectorAmps, kelvin)))
                .walk(pass);
        return pass;
    }

    /** The contribution of one generator at the first frequency, V²/Hz; nothing where there is none of that name. */
    static double entry(ChainPass pass, String name) {
        double sum = 0.0;
        for (int g = 0; g < pass.generatorCount(); g++) {
            if (pass.generators().get(g).name().equals(name)) {
                sum += pass.power(g)[0];
            }
        }
        return sum;
    }

    /** Where a function of a positive number is lowest, searched over its logarithm. */
    static double lowest(DoubleUnaryOperator function, double from, double to) {
        double logarithm = new BrentOptimizer(PLACED_TO, PLACED_TO)
                .optimize(
                        new MaxEval(MOST_EVALUATIONS),
                        new UnivariateObjectiveFunction(x -> function.applyAsDouble(Math.exp(x))),
                        GoalType.MINIMIZE,
                        new SearchInterval(Math.log(from), Math.log(to)))
                .getPoint();
        return Math.exp(logarithm);
    }
}
