package hissledger.twoport;

import static hissledger.Trials.forAll;
import static hissledger.Trials.logUniform;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import hissledger.physics.Constants;
import hissledger.physics.Printed;
import hissledger.physics.Thermal;
import java.util.function.Consumer;
import java.util.random.RandomGenerator;
import org.apache.commons.math3.complex.Complex;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.aggregator.ArgumentsAccessor;
import org.junit.jupiter.params.provider.CsvFileSource;

/** The identities of the theory of noisy two-ports, each with its source where it stands. */
class NoiseParametersTest {
    /** The reference table prints nine significant digits. */
    private static final int TABLE_DIGITS = 9;
    /** Some twenty roundings, and a difference of two near-equal terms costs up to two digits. */
    private static final Percentage ALGEBRA = Percentage.withPercentage(100.0 * 1e-12);
    /** Chains with resonances: a near-cancellation costs up to five digits. */
    private static final double CHAIN_ROUNDING = 1e-9;

    private static final Percentage CHAIN = Percentage.withPercentage(100.0 * CHAIN_ROUNDING);
    /**
     * A lossless network near a resonance turns the impedance over decades, and voltage and current come out of it all but
     * wholly correlated. What the correlation leaves, 1 − |c|², and Gcor + Gopt are then small differences of large
     * numbers: this is the rounding before them, and {@link #lossless} tells how they magnify it.
     */
    private static final double BEFORE_CANCELLATION = 1e-12;
    /** Excess of a bound over its own rounding. */
    private static final double BOUND_ROUNDING = 1e-12;

    /** Near |c| = 1 the ratio touches its bound, and Fmin - 1 may be a part in 1e10 of Fmin. */
    private static final double SMALL_DIFFERENCE = 1e-6;
    /** The correlation is what two sums of order one differ by. */
    private static final double CORRELATION_ROUNDING = 1e-12;

    private static final int TRIALS = 2_000;
    private static final double T0_KELVIN = Constants.STANDARD_NOISE_TEMPERATURE_KELVIN;

    private record Named(String name) implements Generator {}

    private static NoiseParameters randomParameters(RandomGenerator random) {
        double magnitude = Math.sqrt(random.nextDouble()) * 0.999;
        double angle = random.nextDouble(0.0, 2.0 * Math.PI);
        return new NoiseParameters(
                logUniform(random, 1e-10, 1e-7),
                logUniform(random, 1e-15, 1e-11),
                magnitude * Math.cos(angle),
                magnitude * Math.sin(angle));
    }

    private record SourceImpedance(double ohms, double reactance) {
        static SourceImpedance random(RandomGenerator random) {
            double ohms = logUniform(random, 1.0, 1e6);
            return new SourceImpedance(ohms, ohms * random.nextDouble(-3.0, 3.0));
        }

        Complex impedance() {
            return new Complex(ohms, reactance);
        }

        Complex admittance() {
            return impedance().reciprocal();
        }
    }

    private static Complex optimumAdmittance(NoiseParameters noise) {
        return new Complex(noise.optimumSiemens(), noise.optimumSusceptanceSiemens());
    }

    private static double square(double x) {
        return x * x;
    }

    // -------------------------------------------------------------------------------------------------- the table

    @ParameterizedTest
    @CsvFileSource(resources = "noise-parameters.csv", useHeadersInDisplayName = true)
    void matchesTheReferenceTable(ArgumentsAccessor row) {
        NoiseParameters noise =
                new NoiseParameters(row.getDouble(0), row.getDouble(1), row.getDouble(2), row.getDouble(3));
        assertThat(row.getDouble(4)).isEqualTo(T0_KELVIN);
        assertPrinted(noise.noiseResistanceOhms(), row.getDouble(5));
        assertPrinted(noise.correlationSiemens(), row.getDouble(6));
        assertPrinted(noise.correlationSusceptanceSiemens(), row.getDouble(7));
        assertPrinted(noise.uncorrelatedSiemens(), row.getDouble(8));
        assertPrinted(noise.optimumSiemens(), row.getDouble(9));
        assertPrinted(noise.optimumSusceptanceSiemens(), row.getDouble(10));
        assertPrinted(noise.minimumNoiseFactor(), row.getDouble(11));
        assertPrinted(noise.minimumNoiseFigureDecibels(), row.getDouble(12));
        assertPrinted(noise.noiseResistanceOhms() * noise.optimumSiemens(), row.getDouble(13));
        assertPrinted(noise.noiseFactor(row.getDouble(14), row.getDouble(15)), row.getDouble(16));
        assertPrinted(10.0 * Math.log10(noise.noiseFactor(row.getDouble(14), row.getDouble(15))), row.getDouble(17));
    }

    private static void assertPrinted(double ours, double printed) {
        assertThat(ours).isCloseTo(printed, within(Printed.halfUnit(printed, TABLE_DIGITS)));
    }

    // ---------------------------------------------------------------------------- IRE 1960, equations 27 to 31

    @Test
    void theNoiseFactorIsThatOfTheCorrelationAdmittance() {
        // (27) F = 1 + Gu/Gs + (Rn/Gs) [(Gs+Gcor)² + (Bs+Bcor)²]
        forAll(TRIALS, random -> {
            NoiseParameters noise = randomParameters(random);
            SourceImpedance source = SourceImpedance.random(random);
            double gs = source.admittance().getReal();
            double bs = source.admittance().getImaginary();
            double expected = 1.0
                    + noise.uncorrelatedSiemens() / gs
                    + noise.noiseResistanceOhms()
                            / gs
                            * (square(gs + noise.correlationSiemens())
                                    + square(bs + noise.correlationSusceptanceSiemens()));
            assertThat(noise.noiseFactor(source.ohms(), source.reactance())).isCloseTo(expected, ALGEBRA);
        });
    }

    @Test
    void theNoiseFactorGrowsWithTheDistanceFromTheOptimumAdmittance() {
        // (28) to (31) F = Fmin + (Rn/Gs) |Ys - Yopt|²
        forAll(TRIALS, random -> {
            NoiseParameters noise = randomParameters(random);
            SourceImpedance source = SourceImpedance.random(random);
            double distance =
                    source.admittance().subtract(optimumAdmittance(noise)).abs();
            double expected = noise.minimumNoiseFactor()
                    + noise.noiseResistanceOhms() / source.admittance().getReal() * square(distance);
            assertThat(noise.noiseFactor(source.ohms(), source.reactance())).isCloseTo(expected, ALGEBRA);
        });
    }

    @Test
    void theOptimumImpedanceGivesTheMinimum() {
        forAll(TRIALS, random -> {
            NoiseParameters noise = randomParameters(random);
            double ohms = noise.optimumResistanceOhms();
            double reactance = noise.optimumReactanceOhms();
            assertThat(noise.noiseFactor(ohms, reactance)).isCloseTo(noise.minimumNoiseFactor(), ALGEBRA);
            SourceImpedance other = SourceImpedance.random(random);
            assertThat(noise.noiseFactor(other.ohms(), other.reactance()))
                    .isGreaterThanOrEqualTo(noise.minimumNoiseFactor() * (1.0 - BOUND_ROUNDING));
        });
    }

    @Test
    void theReflectionFormIsTheSame() {
        // F = Fmin + 4 (Rn/Z0) |Γ - Γopt|² / ((1 - |Γ|²) |1 + Γopt|²)
        forAll(TRIALS, random -> {
            NoiseParameters noise = randomParameters(random);
            SourceImpedance source = SourceImpedance.random(random);
            double z0 = logUniform(random, 10.0, 1e5);
            Complex gamma = reflection(source.impedance(), z0);
            Complex optimum = reflection(optimumAdmittance(noise).reciprocal(), z0);
            // 1 - |Γ|² = 4 R Z0/|Z + Z0|², without the cancellation
            double transmitted =
                    4.0 * source.ohms() * z0 / square(source.impedance().add(z0).abs());
            double expected = noise.minimumNoiseFactor()
                    + 4.0
                            * noise.noiseResistanceOhms()
                            / z0
                            * square(gamma.subtract(optimum).abs())
                            / (transmitted * square(optimum.add(1.0).abs()));
            assertThat(noise.noiseFactor(source.ohms(), source.reactance())).isCloseTo(expected, CHAIN);
        });
    }

    private static Complex reflection(Complex impedance, double z0) {
        return impedance.subtract(z0).divide(impedance.add(z0));
    }

    @Test
    void theImpedanceDualIsTheSame() {
        // F = Fmin + (Rn |Yopt|²/Rs) |Zs - Zopt|²
        forAll(TRIALS, random -> {
            NoiseParameters noise = randomParameters(random);
            SourceImpedance source = SourceImpedance.random(random);
            Complex optimum = new Complex(noise.optimumResistanceOhms(), noise.optimumReactanceOhms());
            double expected = noise.minimumNoiseFactor()
                    + noise.noiseResistanceOhms()
                            * square(optimumAdmittance(noise).abs())
                            / source.ohms()
                            * square(source.impedance().subtract(optimum).abs());
            assertThat(noise.noiseFactor(source.ohms(), source.reactance())).isCloseTo(expected, ALGEBRA);
        });
    }

    @Test
    void withoutCorrelationTheOptimumIsTheRatioOfVoltageToCurrentNoise() {
        // N = en in/(4kT0), Fmin = 1 + 2N, Ropt = en/in
        forAll(TRIALS, random -> {
            double en = logUniform(random, 1e-10, 1e-7);
            double in = logUniform(random, 1e-15, 1e-11);
            NoiseParameters noise = new NoiseParameters(en, in, 0.0, 0.0);
            assertThat(noise.optimumResistanceOhms()).isCloseTo(en / in, ALGEBRA);
            assertThat(noise.optimumReactanceOhms()).isZero();
            assertThat(noise.minimumNoiseFactor()).isCloseTo(1.0 + 2.0 * en * in / Thermal.fourKt(T0_KELVIN), ALGEBRA);
        });
    }

    @Test
    void fourTimesNReachesAtLeastTheMinimumNoiseTemperature() {
        // 4N/(Fmin-1) = 2 Gopt/(Gopt+Gcor) >= 1; there is no upper bound for arbitrary correlation
        forAll(TRIALS, random -> {
            NoiseParameters noise = randomParameters(random);
            double n = noise.noiseResistanceOhms() * noise.optimumSiemens();
            assertThat(4.0 * n / (noise.minimumNoiseFactor() - 1.0)).isGreaterThanOrEqualTo(1.0 - SMALL_DIFFERENCE);
        });
    }

    // ------------------------------------------------------------------------------ two-ports made of two-ports

    /** A unilateral stage with its two generators, as random as one can be. */
    private record Stage(double gm, double outputSiemens, double inputSiemens, double farads, double en2, double in2) {
        static Stage random(RandomGenerator random) {
            return new Stage(
                    logUniform(random, 1e-4, 1.0),
                    logUniform(random, 1e-6, 1e-2),
                    logUniform(random, 1e-7, 1e-3),
                    logUniform(random, 1e-13, 1e-10),
                    logUniform(random, 1e-20, 1e-15),
                    logUniform(random, 1e-28, 1e-22));
        }

        void walk(ChainPass pass) {
            pass.seriesVoltage(new Named("voltage"), Spectrum.white(en2));
            pass.shuntCurrent(new Named("current"), Spectrum.white(in2));
            pass.device(SmallSignal.of(inputSiemens, gm, outputSiemens, farads, 0.0));
            pass.commonLead(Impedance.none());
            pass.inputCurrent(new Named("input"), Spectrum.white(in2 / 3.0));
            pass.outputCurrent(new Named("output"), Spectrum.white(en2 * gm * gm / 5.0));
            pass.leaveDevice();
        }
    }

    @Test
    void aCascadeObeysFriis() {
        // F = F1 + (F2 - 1)/G1 + (F3 - 1)/(G1 G2), G available gains, each F at the output impedance before it
        // (H. T. Friis, Proc. IRE 32 (1944) 419, from memory)
        forAll(TRIALS / 2, random -> {
            double hertz = logUniform(random, 10.0, 1e6);
            SourceImpedance first = SourceImpedance.random(random);
            ChainPass whole = new ChainPass(Frequencies.of(hertz));
            whole.beginBehind(TwoPortNoise.fixed(first.ohms(), first.reactance()));
            whole.sourceNoise(new Named("source"), T0_KELVIN);
            Complex behind = first.impedance();
            double gain = 1.0;
            double friis = 1.0;
            for (int s = 0; s < 3; s++) {
                Stage stage = Stage.random(random);
                stage.walk(whole);
                ChainPass alone = new ChainPass(Frequencies.of(hertz));
                alone.beginBehind(TwoPortNoise.fixed(behind.getReal(), behind.getImaginary()));
                stage.walk(alone);
                double[] added = new double[1];
                alone.total(added);
                friis += added[0] / Thermal.voltsSquaredPerHertz(behind.getReal(), T0_KELVIN) / gain;
                Complex a = new Complex(alone.rowVoltageRe()[0], alone.rowVoltageIm()[0]);
                Complex output = new Complex(alone.rowCurrentRe()[0], alone.rowCurrentIm()[0]).divide(a);
                gain *= behind.getReal() / (square(a.abs()) * output.getReal());
                behind = output;
            }
            double[] total = new double[1];
            whole.total(total);
            assertThat(total[0] / Thermal.voltsSquaredPerHertz(first.ohms(), T0_KELVIN))
                    .isCloseTo(friis, CHAIN);
        });
    }

    @Test
    void aMatchedAttenuatorHasTheNoiseFactorOfItsLoss() {
        // F = 1 + (L - 1) T/T0
        forAll(TRIALS / 2, random -> {
            double z0 = logUniform(random, 10.0, 1e4);
            double loss = logUniform(random, 1.001, 1e4);
            double kelvin = random.nextDouble(4.0, 400.0);
            NoiseParameters noise = TwoPortNoise.of(1000.0, pass -> attenuator(pass, z0, loss, kelvin));
            assertThat(noise.noiseFactor(z0, 0.0)).isCloseTo(1.0 + (loss - 1.0) * kelvin / T0_KELVIN, CHAIN);
            assertThat(noise.noiseTemperatureKelvin(z0, 0.0)).isCloseTo((loss - 1.0) * kelvin, CHAIN);
        });
    }

    /** A T of resistors that matches Z0 at both ends and passes 1/L of the power. */
    private static void attenuator(ChainPass pass, double z0, double loss, double kelvin) {
        double ratio = Math.sqrt(loss);
        Impedance arm = Impedance.resistance(z0 * (ratio - 1.0) / (ratio + 1.0));
        pass.series(arm, new Named("first arm"), kelvin);
        pass.shunt(Impedance.resistance(2.0 * z0 * ratio / (loss - 1.0)), new Named("leg"), kelvin);
        pass.series(arm, new Named("second arm"), kelvin);
    }

    @Test
    void aLosslessNetworkInFrontKeepsFminAndN() {
        // J. Lange, IEEE J. Solid-State Circuits 2 (1967) 37, from memory: Fmin and N = Rn Gopt
        forAll(TRIALS / 2, random -> {
            double hertz = logUniform(random, 10.0, 1e6);
            Stage stage = Stage.random(random);
            NoiseParameters bare = TwoPortNoise.of(hertz, stage::walk);
            double scale = bare.voltsPerRootHertz() / bare.ampsPerRootHertz();
            int elements = random.nextInt(1, 4);
            boolean[] series = new boolean[elements];
            double[] reactance = new double[elements];
            for (int e = 0; e < elements; e++) {
                series[e] = random.nextBoolean();
                reactance[e] = scale * logUniform(random, 0.1, 10.0) * (random.nextBoolean() ? 1.0 : -1.0);
            }
            double ratio = logUniform(random, 0.1, 10.0);
            Consumer<ChainPass> behindNetwork = pass -> {
                for (int e = 0; e < elements; e++) {
                    Impedance part = TwoPortNoise.fixed(0.0, reactance[e]);
                    if (series[e]) {
                        pass.series(part, new Named("part " + e), T0_KELVIN);
                    } else {
                        pass.shunt(part, new Named("part " + e), T0_KELVIN);
                    }
                }
                pass.stepUp(ratio);
                stage.walk(pass);
            };
            NoiseParameters imbedded = TwoPortNoise.of(hertz, behindNetwork);
            assertThat(imbedded.minimumNoiseFactor() - 1.0)
                    .isCloseTo(bare.minimumNoiseFactor() - 1.0, lossless(imbedded));
            assertThat(imbedded.noiseResistanceOhms() * imbedded.optimumSiemens())
                    .isCloseTo(bare.noiseResistanceOhms() * bare.optimumSiemens(), lossless(imbedded));
        });
    }

    private static Percentage lossless(NoiseParameters noise) {
        double uncorrelated = 1.0 - square(noise.correlationRe()) - square(noise.correlationIm());
        double conductances = (Math.abs(noise.correlationSiemens()) + noise.optimumSiemens())
                / (noise.correlationSiemens() + noise.optimumSiemens());
        return Percentage.withPercentage(100.0 * BEFORE_CANCELLATION * conductances / uncorrelated);
    }

    @Test
    void aStepUpDividesTheOptimumByTheSquareOfItsRatio() {
        forAll(TRIALS / 2, random -> {
            double hertz = logUniform(random, 10.0, 1e6);
            double ratio = logUniform(random, 0.05, 20.0);
            Stage stage = Stage.random(random);
            NoiseParameters bare = TwoPortNoise.of(hertz, stage::walk);
            NoiseParameters seen = TwoPortNoise.of(hertz, pass -> {
                pass.stepUp(ratio);
                stage.walk(pass);
            });
            assertThat(seen.optimumResistanceOhms()).isCloseTo(bare.optimumResistanceOhms() / (ratio * ratio), CHAIN);
            // the reactance may be a small part of the impedance: held against the whole
            double whole = Math.hypot(seen.optimumResistanceOhms(), seen.optimumReactanceOhms());
            assertThat(seen.optimumReactanceOhms())
                    .isCloseTo(bare.optimumReactanceOhms() / (ratio * ratio), within(CHAIN_ROUNDING * whole));
            assertThat(seen.voltsPerRootHertz()).isCloseTo(bare.voltsPerRootHertz() / ratio, CHAIN);
            assertThat(seen.ampsPerRootHertz()).isCloseTo(bare.ampsPerRootHertz() * ratio, CHAIN);
            assertThat(seen.minimumNoiseFactor()).isCloseTo(bare.minimumNoiseFactor(), CHAIN);
        });
    }

    @Test
    void equalDevicesInParallelMoveTheOptimumAndKeepTheMinimum() {
        // en/√n, in √n, Ropt/n, Rn/n; Fmin, N and the correlation coefficient unchanged
        forAll(TRIALS / 2, random -> {
            double hertz = logUniform(random, 10.0, 1e6);
            int n = random.nextInt(2, 9);
            double rbb = logUniform(random, 1.0, 500.0);
            double gm = logUniform(random, 1e-3, 0.5);
            double base = logUniform(random, 1e-25, 1e-22);
            double collector = logUniform(random, 1e-23, 1e-20);
            NoiseParameters one = TwoPortNoise.of(hertz, pass -> transistors(pass, 1, rbb, gm, base, collector));
            NoiseParameters many = TwoPortNoise.of(hertz, pass -> transistors(pass, n, rbb, gm, base, collector));
            assertThat(many.voltsPerRootHertz()).isCloseTo(one.voltsPerRootHertz() / Math.sqrt(n), CHAIN);
            assertThat(many.ampsPerRootHertz()).isCloseTo(one.ampsPerRootHertz() * Math.sqrt(n), CHAIN);
            assertThat(many.correlationRe()).isCloseTo(one.correlationRe(), within(CORRELATION_ROUNDING));
            assertThat(many.correlationIm()).isCloseTo(one.correlationIm(), within(CORRELATION_ROUNDING));
            assertThat(many.optimumResistanceOhms()).isCloseTo(one.optimumResistanceOhms() / n, CHAIN);
            assertThat(many.noiseResistanceOhms()).isCloseTo(one.noiseResistanceOhms() / n, CHAIN);
            assertThat(many.minimumNoiseFactor()).isCloseTo(one.minimumNoiseFactor(), CHAIN);
        });
    }

    private static void transistors(ChainPass pass, int n, double rbb, double gm, double base, double collector) {
        pass.series(Impedance.resistance(rbb / n), new Named("rbb"), T0_KELVIN);
        pass.device(SmallSignal.of(gm / 150.0, gm, gm / 2_000.0, 1e-10, 5e-12).parallel(n));
        pass.commonLead(Impedance.none());
        pass.inputCurrent(new Named("base"), Spectrum.white(n * base));
        pass.outputCurrent(new Named("collector"), Spectrum.white(n * collector));
        pass.leaveDevice();
    }

    @Test
    void parametersAndWalkGiveTheSameNoiseBehindAnySource() {
        forAll(TRIALS / 2, random -> {
            double hertz = logUniform(random, 10.0, 1e6);
            Stage stage = Stage.random(random);
            SourceImpedance source = SourceImpedance.random(random);
            ChainPass pass = new ChainPass(Frequencies.of(hertz));
            pass.beginBehind(TwoPortNoise.fixed(source.ohms(), source.reactance()));
            stage.walk(pass);
            double[] added = new double[1];
            pass.total(added);
            assertThat(TwoPortNoise.of(hertz, stage::walk).addedVoltsSquaredPerHertz(source.ohms(), source.reactance()))
                    .isCloseTo(added[0], CHAIN);
        });
    }

    // --------------------------------------------------------------------------------------------------- edges

    @Test
    void aTwoPortWithoutVoltageNoiseHasNoCorrelation() {
        NoiseParameters noise = new NoiseParameters(0.0, 1e-12, 0.0, 0.0);
        assertThat(noise.correlationSiemens()).isZero();
        assertThat(noise.correlationSusceptanceSiemens()).isZero();
        assertThat(noise.optimumSiemens()).isEqualTo(Double.POSITIVE_INFINITY);
    }

    @Test
    void refusesWhatIsNoDensityOrSource() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new NoiseParameters(Double.NaN, 1e-12, 0.0, 0.0))
                .withMessage("voltsPerRootHertz must be finite and >= 0 V/√Hz, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new NoiseParameters(1e-9, -1e-12, 0.0, 0.0))
                .withMessage("ampsPerRootHertz must be finite and >= 0 A/√Hz, was -1.0E-12");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new NoiseParameters(1e-9, 1e-12, Double.NaN, 0.0))
                .withMessage("correlationRe must be finite, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new NoiseParameters(1e-9, 1e-12, 0.0, Double.POSITIVE_INFINITY))
                .withMessage("correlationIm must be finite, was Infinity");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> new NoiseParameters(1e-9, 1e-12, 0.0, 0.0).noiseFactor(0.0, 100.0))
                .withMessage("resistanceOhms must be finite and > 0 Ω, was 0.0");
    }
}
