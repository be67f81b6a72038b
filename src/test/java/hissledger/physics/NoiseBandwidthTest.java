package hissledger.physics;

import static hissledger.Trials.forAll;
import static hissledger.Trials.logUniform;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvFileSource;

class NoiseBandwidthTest {
    /** Half a unit in the sixth decimal that the table prints. */
    private static final double TABLE_ROUNDING = 5e-7;
    /** The engine's quadrature stops at a part in 1e7; the band ends where less than that is left. */
    private static final double INTEGRATION = 2e-7;

    @ParameterizedTest
    @CsvFileSource(resources = "butterworth-noise-bandwidth.csv", useHeadersInDisplayName = true)
    void matchesThePublishedTable(int order, double bandwidthOverCorner, double identicalPoles) {
        assertThat(NoiseBandwidth.butterworthHertz(order, 1.0)).isCloseTo(bandwidthOverCorner, within(TABLE_ROUNDING));
        // poles spread over a circle fall more steeply than as many at one place
        assertThat(bandwidthOverCorner).isLessThanOrEqualTo(identicalPoles);
    }

    @ParameterizedTest
    @CsvFileSource(resources = "butterworth-noise-bandwidth.csv", useHeadersInDisplayName = true)
    void isTheIntegralOfTheFiltersPower(int order, double bandwidthOverCorner, double identicalPoles) {
        // below the band 1e-9 of a hertz is missing; above it the integral of f^-2n
        double top = 1e9;
        LogQuadrature quadrature = LogQuadrature.refine(new Band(1e-9, top), new double[] {1.0}, hertz ->
                new double[][] {butterworth(hertz, order), identical(hertz, order)});
        double missing = Math.pow(top, 1.0 - 2.0 * order) / (2.0 * order - 1.0);
        assertThat(quadrature.integrate(butterworth(quadrature.hertz(), order)) + missing)
                .isCloseTo(NoiseBandwidth.butterworthHertz(order, 1.0), within(INTEGRATION));
        assertThat(quadrature.integrate(identical(quadrature.hertz(), order)) + missing)
                .isCloseTo(identicalPoles, within(TABLE_ROUNDING + INTEGRATION));
        assertThat(bandwidthOverCorner).isPositive();
    }

    private static double[] butterworth(double[] hertz, int order) {
        double[] power = new double[hertz.length];
        for (int k = 0; k < hertz.length; k++) {
            power[k] = 1.0 / (1.0 + Math.pow(hertz[k], 2.0 * order));
        }
        return power;
    }

    /** n equal poles whose common −3 dB frequency is 1 Hz. */
    private static double[] identical(double[] hertz, int order) {
        double spread = Math.pow(2.0, 1.0 / order) - 1.0;
        double[] power = new double[hertz.length];
        for (int k = 0; k < hertz.length; k++) {
            power[k] = Math.pow(1.0 + spread * hertz[k] * hertz[k], -order);
        }
        return power;
    }

    @Test
    void shrinksTowardsTheCornerAsPolesAreAdded() {
        forAll(1_000, random -> {
            int order = random.nextInt(1, 1_000);
            double cornerHertz = logUniform(random, 1e-3, 1e9);
            assertThat(NoiseBandwidth.butterworthHertz(order + 1, cornerHertz))
                    .isBetween(cornerHertz, NoiseBandwidth.butterworthHertz(order, cornerHertz));
        });
    }

    @Test
    void refusesAFilterWithoutPolesOrCorner() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> NoiseBandwidth.butterworthHertz(0, 1.0))
                .withMessage("order must be >= 1, was 0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> NoiseBandwidth.butterworthHertz(1, Double.NaN))
                .withMessage("cornerHertz must be finite and > 0 Hz, was NaN");
    }
}
