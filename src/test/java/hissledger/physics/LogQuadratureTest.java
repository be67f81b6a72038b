package hissledger.physics;

import static hissledger.Trials.forAll;
import static hissledger.Trials.logUniform;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatExceptionOfType;

import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.complex.Complex;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

class LogQuadratureTest {
    /** What the class promises: two orders agree to 1e-7 of the whole integral. */
    private static final double PROMISE = 1e-7;

    private static final Percentage PROMISED = Percentage.withPercentage(100.0 * PROMISE);
    /** A power law is an exponential of ln f; 12 Gauss points in a panel leave only the rounding of some hundred sums. */
    private static final Percentage ROUNDING = Percentage.withPercentage(100.0 * 1e-12);

    private static final Band WIDE = new Band(1e-9, 1e12);
    private static final double[] NO_BREAKS = {};

    private static double integral(Band band, double[] breaks, DoubleUnaryOperator density) {
        LogQuadrature quadrature = LogQuadrature.refine(band, breaks, hertz -> new double[][] {values(hertz, density)});
        return quadrature.integrate(values(quadrature.hertz(), density));
    }

    private static double[] values(double[] hertz, DoubleUnaryOperator density) {
        double[] values = new double[hertz.length];
        for (int k = 0; k < hertz.length; k++) {
            values[k] = density.applyAsDouble(hertz[k]);
        }
        return values;
    }

    @Test
    void whiteNoiseGivesTheWidthOfTheBand() {
        forAll(200, random -> {
            double from = logUniform(random, 1e-3, 1e6);
            Band band = new Band(from, from * logUniform(random, 1.001, 1e6));
            assertThat(integral(band, NO_BREAKS, f -> 1.0)).isCloseTo(band.widthHertz(), ROUNDING);
        });
    }

    @Test
    void flickerNoiseGivesTheLogarithmOfTheBand() {
        assertThat(integral(Band.AUDIO, NO_BREAKS, f -> 1.0 / f)).isCloseTo(Math.log(1000.0), ROUNDING);
    }

    @Test
    void anyPowerLawGivesItsPrimitive() {
        forAll(200, random -> {
            double alpha = random.nextDouble(-2.5, 2.5);
            double closed = (Math.pow(20_000.0, 1.0 - alpha) - Math.pow(20.0, 1.0 - alpha)) / (1.0 - alpha);
            assertThat(integral(Band.AUDIO, NO_BREAKS, f -> Math.pow(f, -alpha)))
                    .isCloseTo(closed, PROMISED);
        });
    }

    @Test
    void aResistorOnACapacitorGivesKToverC() {
        forAll(100, random -> {
            double ohms = logUniform(random, 1.0, 1e10);
            double farads = logUniform(random, 1.0, 1e3) * 1e-3 / ohms;
            double kelvin = random.nextDouble(4.0, 400.0);
            double whole = Constants.BOLTZMANN_JOULES_PER_KELVIN * kelvin / farads;
            double ohmFarads = 2.0 * Math.PI * ohms * farads;
            DoubleUnaryOperator density =
                    f -> Thermal.voltsSquaredPerHertz(ohms, kelvin) / (1.0 + square(ohmFarads * f));
            // from zero to infinity; outside the wide band lie 2/π of ωRC at its foot and of 1/ωRC at its top
            assertThat(integral(WIDE, new double[] {1.0 / ohmFarads}, density)).isCloseTo(whole, PROMISED);
            // over a band, the arc tangents
            double part = 2.0 / Math.PI * (Math.atan(ohmFarads * 20_000.0) - Math.atan(ohmFarads * 20.0));
            assertThat(integral(Band.AUDIO, NO_BREAKS, density)).isCloseTo(whole * part, PROMISED);
        });
    }

    /** Bandwidths of weightings, from the closed gain curves by another program; ten significant digits or as printed. */
    @ParameterizedTest
    @CsvSource({
        "A, 20, 20e3, 0, 12467.18382",
        "A, 22, 22e3, 0, 12669.26",
        "A, 20, 20e3, 1, 3.576625997",
        "A, 1e-3, 1e8, 0, 13462.15",
        "ITU_468, 20, 20e3, 0, 106921.7"
    })
    void weightedNoiseGivesTheKnownBandwidths(
            Weighting weighting, double from, double to, double flickerExponent, String derived) {
        double ours =
                integral(new Band(from, to), NO_BREAKS, f -> weighting.powerGain(f) * Math.pow(f, -flickerExponent));
        double value = Double.parseDouble(derived);
        assertThat(Math.abs(ours - value)).isLessThan(Printed.halfUnit(derived) + PROMISE * value);
    }

    @Test
    void aWeightingThroughARolledOffAmplifierGivesTheKnownBandwidth() {
        double ours =
                integral(new Band(1e-3, 1e8), NO_BREAKS, f -> Weighting.A.powerGain(f) / (1.0 + square(f / 20_000.0)));
        assertThat(ours).isCloseTo(11300.41111, PROMISED);
    }

    @ParameterizedTest
    @ValueSource(doubles = {0.6, 1.0, 10.0, 1e2, 1e3, 1e4, 1e5})
    void aResonanceThatIsNamedIsNotMissed(double q) {
        forAll(50, random -> {
            double resonanceHertz = logUniform(random, 25.0, 15_000.0);
            double ours = integral(Band.AUDIO, new double[] {resonanceHertz}, f -> resonance(f / resonanceHertz, q));
            double closed = resonanceHertz
                    * (resonancePrimitive(20_000.0 / resonanceHertz, q) - resonancePrimitive(20.0 / resonanceHertz, q));
            assertThat(ours).isCloseTo(closed, PROMISED);
        });
    }

    @Test
    void aWholeResonanceGivesHalfPiTimesQ() {
        double q = 1e5;
        // below the band lies 1e-6 of a hertz against 157 kHz, above it 1e-36
        assertThat(integral(new Band(1e-6, 1e12), new double[] {1.0}, f -> resonance(f, q)))
                .isCloseTo(0.5 * Math.PI * q, PROMISED);
    }

    private static double resonance(double u, double q) {
        return 1.0 / (square((1.0 - u) * (1.0 + u)) + square(u / q));
    }

    /** ∫ du/((1−u²)² + (u/Q)²) = Im[ln((u−s)/(u+s))/(2s)]/Im p with the root p = s² of the denominator in u². */
    private static double resonancePrimitive(double u, double q) {
        Complex p = new Complex(1.0 - 0.5 / (q * q), Math.sqrt(1.0 - 0.25 / (q * q)) / q);
        Complex s = p.sqrt();
        Complex logarithm =
                new Complex(u).subtract(s).log().subtract(new Complex(u).add(s).log());
        return logarithm.divide(s.multiply(2.0)).getImaginary() / p.getImaginary();
    }

    @Test
    void everyQuantityConverges() {
        // a smooth quantity and one with two narrow resonances share one set of nodes
        DoubleUnaryOperator narrow = f -> resonance(f / 777.0, 3e3) + resonance(f / 5_000.0, 2e4);
        LogQuadrature quadrature = LogQuadrature.refine(Band.AUDIO, new double[] {777.0, 5_000.0}, hertz ->
                new double[][] {values(hertz, f -> 1.0), values(hertz, narrow)});
        double closed = 777.0 * (resonancePrimitive(20_000.0 / 777.0, 3e3) - resonancePrimitive(20.0 / 777.0, 3e3))
                + 5_000.0 * (resonancePrimitive(4.0, 2e4) - resonancePrimitive(20.0 / 5_000.0, 2e4));
        assertThat(quadrature.integrate(values(quadrature.hertz(), narrow))).isCloseTo(closed, PROMISED);
        assertThat(quadrature.integrate(values(quadrature.hertz(), f -> 1.0))).isCloseTo(19_980.0, ROUNDING);
        assertThat(quadrature.integrate(values(quadrature.hertz(), f -> 1.0), values(quadrature.hertz(), narrow)))
                .isCloseTo(closed, PROMISED);
    }

    @Test
    void breakPointsOutsideTheBandAreAsGoodAsNone() {
        LogQuadrature plain =
                LogQuadrature.refine(Band.AUDIO, NO_BREAKS, hertz -> new double[][] {values(hertz, f -> 1.0 / f)});
        LogQuadrature withOutsiders = LogQuadrature.refine(Band.AUDIO, new double[] {1.0, 20.0, 20_000.0, 1e6}, hertz ->
                new double[][] {values(hertz, f -> 1.0 / f)});
        assertThat(withOutsiders.hertz()).containsExactly(plain.hertz());
        assertThat(withOutsiders.weights()).containsExactly(plain.weights());
        assertThat(withOutsiders.size()).isEqualTo(withOutsiders.hertz().length);
    }

    @Test
    void theNodesAscendWithinTheBandAndTheirWeightsArePositive() {
        LogQuadrature quadrature =
                LogQuadrature.refine(Band.AUDIO, new double[] {1_234.5}, hertz -> new double[][] {hertz});
        assertThat(quadrature.hertz()).isSorted();
        assertThat(quadrature.hertz()[0]).isGreaterThan(Band.AUDIO.fromHertz());
        assertThat(quadrature.hertz()[quadrature.size() - 1]).isLessThan(Band.AUDIO.toHertz());
        for (double weight : quadrature.weights()) {
            assertThat(weight).isPositive();
        }
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void refusesADensityThatIsNotFinite(double value) {
        assertThatExceptionOfType(ArithmeticException.class)
                .isThrownBy(() -> integral(Band.AUDIO, NO_BREAKS, f -> f > 1000.0 ? value : 1.0))
                .withMessage("a density to be integrated is not finite");
    }

    @Test
    void saysSoWhenTheHalvingDoesNotConverge() {
        // white noise that changes its mind between any two frequencies, however near
        assertThatExceptionOfType(ArithmeticException.class)
                .isThrownBy(() -> integral(Band.AUDIO, NO_BREAKS, f -> Double.doubleToLongBits(f) % 7L))
                .withMessageStartingWith("the integral over 20.0 Hz to 20000.0 Hz did not converge after ");
    }

    private static double square(double x) {
        return x * x;
    }
}
