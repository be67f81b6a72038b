package hissledger.twoport;

import java.util.function.Consumer;

/**
 * The noise parameters of whatever a walk passes through, from four walks at one frequency: the rows (1, 0) and (0, 1) give
 * en² and in², the rows (1, R) and (1, jR) with R = en/in add twice the real and imaginary parts of the correlation.
 */
public final class TwoPortNoise {
    private TwoPortNoise() {}

    /** The noise of the two-port at a frequency, Hz. */
    public static NoiseParameters of(double hertz, Consumer<ChainPass> walk) {
        double voltsSquared = total(hertz, walk, 1.0, 0.0, 0.0);
        double ampsSquared = total(hertz, walk, 0.0, 1.0, 0.0);
        double volts = Math.sqrt(voltsSquared);
        double amps = Math.sqrt(ampsSquared);
        if (volts == 0.0 || amps == 0.0) {
            return new NoiseParameters(volts, amps, 0.0, 0.0);
        }
        double ohms = volts / amps;
        double real = total(hertz, walk, 1.0, ohms, 0.0) / voltsSquared - 2.0;
        double imaginary = total(hertz, walk, 1.0, 0.0, ohms) / voltsSquared - 2.0;
        return new NoiseParameters(volts, amps, 0.5 * real, 0.5 * imaginary);
    }

    /** An impedance that is the same at every frequency. */
    public static Impedance fixed(double resistanceOhms, double reactanceOhms) {
        return (frequencies, re, im) -> {
            for (int k = 0; k < frequencies.count(); k++) {
                re[k] = resistanceOhms;
                im[k] = reactanceOhms;
            }
        };
    }

    private static double total(
            double hertz, Consumer<ChainPass> walk, double voltage, double currentRe, double currentIm) {
        ChainPass pass = new ChainPass(Frequencies.of(hertz));
        pass.beginWith(voltage, currentRe, currentIm);
        walk.accept(pass);
        double[] sum = new double[1];
        pass.total(sum);
        return sum[0];
    }
}
