package hissledger.twoport;

import hissledger.physics.Constants;
import hissledger.physics.Decibels;
import hissledger.physics.Require;
import hissledger.physics.Thermal;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.function.Consumer;

/**
 * The noise of a linear two-port at one frequency: equivalent voltage, equivalent current and their correlation, with
 * everything that follows from them.
 *
 * <p>Source: IRE Subcommittee 7.9, <cite>Representation of noise in linear twoports</cite>, Proc. IRE 48 (1960) 69-74;
 * equation numbers below are its. T₀ = 290 K throughout.
 *
 * @param voltsPerRootHertz en, V/√Hz; ≥ 0
 * @param ampsPerRootHertz in, A/√Hz; ≥ 0
 * @param correlationRe Re of {@code <e i*>/(en in)}, dimensionless, within the unit circle
 * @param correlationIm Im of the same
 */
public record NoiseParameters(
        double voltsPerRootHertz, double ampsPerRootHertz, double correlationRe, double correlationIm) {
    public NoiseParameters {
        Require.notNegative("voltsPerRootHertz", voltsPerRootHertz, "V/√Hz");
        Require.notNegative("ampsPerRootHertz", ampsPerRootHertz, "A/√Hz");
        Require.finite("correlationRe", correlationRe, "");
        Require.finite("correlationIm", correlationIm, "");
    }

    /**
     * The parameters of a two-port at some frequencies, by walking it from four rows.
     *
     * <p>en² is the sum of all powers seen from the row (1, 0), in² from (0, 1), and 2z Re&lt;e i*&gt;, 2z Im&lt;e i*&gt; are what
     * the rows (1, z) and (1, jz) see beyond en² + z² in². With z = en/in nothing is lost to rounding.
     *
     * @param frequencies where
     * @param twoPort leads a walk, which stands at the two-port's input, through it
     * @return one set a frequency
     */
    public static List<NoiseParameters> of(Frequencies frequencies, Consumer<ChainPass> twoPort) {
        int n = frequencies.count();
        ChainPass pass = new ChainPass(frequencies);
        pass.beginWith(1.0, 0.0, 0.0);
        double[] voltsSquared = added(pass, twoPort);
        pass.beginWith(0.0, 1.0, 0.0);
        double[] ampsSquared = added(pass, twoPort);
        double[] z = new double[n];
        for (int k = 0; k < n; k++) {
            z[k] = ampsSquared[k] > 0.0 ? Math.sqrt(voltsSquared[k] / ampsSquared[k]) : 0.0;
        }
        pass.beginBehind((f, re, im) -> {
            System.arraycopy(z, 0, re, 0, n);
            Arrays.fill(im, 0.0);
        });
        double[] real = added(pass, twoPort);
        pass.beginBehind((f, re, im) -> {
            Arrays.fill(re, 0.0);
            System.arraycopy(z, 0, im, 0, n);
        });
        double[] imaginary = added(pass, twoPort);
        List<NoiseParameters> parameters = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            double twice = 2.0 * voltsSquared[k];
            parameters.add(new NoiseParameters(
                    Math.sqrt(voltsSquared[k]),
                    Math.sqrt(ampsSquared[k]),
                    z[k] > 0.0 ? (real[k] - twice) / twice : 0.0,
                    z[k] > 0.0 ? (imaginary[k] - twice) / twice : 0.0));
        }
        return parameters;
    }

    private static double[] added(ChainPass pass, Consumer<ChainPass> twoPort) {
        twoPort.accept(pass);
        double[] sum = new double[pass.frequencies().count()];
        pass.total(sum);
        return sum;
    }

    private static double fourKt0() {
        return Thermal.fourKt(Constants.STANDARD_NOISE_TEMPERATURE_KELVIN);
    }

    /** Equivalent noise resistance (25), {@code Rn = en²/(4kT₀)}, Ω. */
    public double noiseResistanceOhms() {
        return voltsPerRootHertz * voltsPerRootHertz / fourKt0();
    }

    /** Correlation conductance, Re of {@code Ycor = <i e*>/en²}, S; zero where en is zero. */
    public double correlationSiemens() {
        return voltsPerRootHertz == 0.0 ? 0.0 : correlationRe * ampsPerRootHertz / voltsPerRootHertz;
    }

    /** Correlation susceptance, Im of {@code Ycor = <i e*>/en²}, S; zero where en is zero. */
    public double correlationSusceptanceSiemens() {
        return voltsPerRootHertz == 0.0 ? 0.0 : -correlationIm * ampsPerRootHertz / voltsPerRootHertz;
    }

    /** Conductance of the uncorrelated current, {@code Gu = in² (1 − |c|²)/(4kT₀)}, S. */
    public double uncorrelatedSiemens() {
        double uncorrelated = 1.0 - correlationRe * correlationRe - correlationIm * correlationIm;
        return ampsPerRootHertz * ampsPerRootHertz * Math.max(0.0, uncorrelated) / fourKt0();
    }

    /** Optimum source conductance (28), {@code Gopt = √((Gu + Rn Gcor²)/Rn)}, S; infinite where en is zero. */
    public double optimumSiemens() {
        double correlation = correlationSiemens();
        return Math.sqrt(uncorrelatedSiemens() / noiseResistanceOhms() + correlation * correlation);
    }

    /** Optimum source susceptance (29), {@code Bopt = −Bcor}, S. */
    public double optimumSusceptanceSiemens() {
        return -correlationSusceptanceSiemens();
    }

    /** Real part of the optimum source impedance, {@code Re 1/(Gopt + j Bopt)}, Ω. */
    public double optimumResistanceOhms() {
        double g = optimumSiemens();
        double b = optimumSusceptanceSiemens();
        return g / (g * g + b * b);
    }

    /** Imaginary part of the optimum source impedance, {@code Im 1/(Gopt + j Bopt)}, Ω. */
    public double optimumReactanceOhms() {
        double g = optimumSiemens();
        double b = optimumSusceptanceSiemens();
        return -b / (g * g + b * b);
    }

    /** Minimum noise factor (30), {@code Fmin = 1 + 2 Rn (Gcor + Gopt)}, dimensionless. */
    public double minimumNoiseFactor() {
        return 1.0 + 2.0 * noiseResistanceOhms() * (correlationSiemens() + optimumSiemens());
    }

    /** Minimum noise figure, dB. */
    public double minimumNoiseFigureDecibels() {
        return Decibels.ofPowerRatio(minimumNoiseFactor());
    }

    /**
     * Density that the two-port adds to a source, {@code en² + |Zs|² in² + 2 Re(Zs* <e i*>)}, V²/Hz at the EMF.
     *
     * @param resistanceOhms Re Zs, Ω
     * @param reactanceOhms Im Zs, Ω
     */
    public double addedVoltsSquaredPerHertz(double resistanceOhms, double reactanceOhms) {
        double cross = voltsPerRootHertz * ampsPerRootHertz;
        return voltsPerRootHertz * voltsPerRootHertz
                + (resistanceOhms * resistanceOhms + reactanceOhms * reactanceOhms)
                        * ampsPerRootHertz
                        * ampsPerRootHertz
                + 2.0 * cross * (resistanceOhms * correlationRe + reactanceOhms * correlationIm);
    }

    /** Noise factor (27) with a source Zs, Re Zs &gt; 0 Ω: {@code F = 1 + added/(4kT₀ Re Zs)}. */
    public double noiseFactor(double resistanceOhms, double reactanceOhms) {
        Require.positive("resistanceOhms", resistanceOhms, "Ω");
        return 1.0 + addedVoltsSquaredPerHertz(resistanceOhms, reactanceOhms) / (fourKt0() * resistanceOhms);
    }

    /** Effective input noise temperature with a source Zs, {@code Te = (F − 1) T₀}, K. */
    public double noiseTemperatureKelvin(double resistanceOhms, double reactanceOhms) {
        return (noiseFactor(resistanceOhms, reactanceOhms) - 1.0) * Constants.STANDARD_NOISE_TEMPERATURE_KELVIN;
    }
}
