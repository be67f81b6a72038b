package hissledger.device;

import static hissledger.Trials.forAll;
import static hissledger.Trials.logUniform;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import java.util.random.RandomGenerator;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

class GainCurveTest {
    /** An exponential of a rounded logarithm, and the cubic's four terms. */
    private static final double ROUNDING = 1e-13;

    private static final Percentage ROUNDED = Percentage.withPercentage(100.0 * ROUNDING);

    /** A step in ln IC for slopes. */
    private static final double STEP = 1e-5;
    /** A one-sided slope is off by half a step times the curvature, at most some ln 50/0.1² here. */
    private static final double ONE_SIDED = 0.05;

    /** Small-signal transistors, hFE at 10 µA, 1 mA and 100 mA; invented. */
    private static final double[] AMPS = {1e-5, 1e-3, 1e-1};

    private static final double[] GAIN = {200.0, 400.0, 100.0};

    private static final class Points {
        private final double[] amps;
        private final double[] gain;

        private Points(double[] amps, double[] gain) {
            this.amps = amps;
            this.gain = gain;
        }

        static Points random(RandomGenerator random) {
            double[] amps = new double[random.nextInt(2, 8)];
            double[] gain = new double[amps.length];
            amps[0] = logUniform(random, 1e-7, 1e-4);
            for (int k = 0; k < amps.length; k++) {
                if (k > 0) {
                    amps[k] = amps[k - 1] * logUniform(random, 1.1, 30.0);
                }
                gain[k] = logUniform(random, 20.0, 1000.0);
            }
            return new Points(amps, gain);
        }
    }

    @Test
    void passesThroughItsPoints() {
        forAll(500, random -> {
            Points points = Points.random(random);
            GainCurve curve = GainCurve.through(points.amps, points.gain);
            for (int k = 0; k < points.amps.length; k++) {
                assertThat(curve.at(points.amps[k])).isCloseTo(points.gain[k], ROUNDED);
                assertThat(curve.isContinuedAt(points.amps[k])).isFalse();
            }
        });
    }

    @Test
    void isMonotoneBetweenTwoPoints() {
        forAll(500, random -> {
            Points points = Points.random(random);
            GainCurve curve = GainCurve.through(points.amps, points.gain);
            for (int k = 1; k < points.amps.length; k++) {
                double before = points.gain[k - 1];
                double sign = Math.signum(points.gain[k] - before);
                for (int step = 1; step <= 50; step++) {
                    double amps = points.amps[k - 1] * Math.pow(points.amps[k] / points.amps[k - 1], step / 50.0);
                    double gain = curve.at(amps);
                    assertThat(sign * (gain - before)).isGreaterThanOrEqualTo(-ROUNDING * before);
                    before = gain;
                }
            }
        });
    }

    @Test
    void isContinuousAndSmoothAtItsPoints() {
        forAll(200, random -> {
            Points points = Points.random(random);
            GainCurve curve = GainCurve.through(points.amps, points.gain);
            for (int k = 1; k < points.amps.length - 1; k++) {
                double left = slope(curve, points.amps[k] / (1.0 + STEP), points.amps[k]);
                double right = slope(curve, points.amps[k], points.amps[k] * (1.0 + STEP));
                assertThat(left).isCloseTo(right, within(ONE_SIDED));
            }
        });
    }

    private static double slope(GainCurve curve, double from, double to) {
        return Math.log(curve.at(to) / curve.at(from)) / Math.log(to / from);
    }

    @Test
    void continuesForOneDecadeAndThenHolds() {
        GainCurve curve = GainCurve.through(AMPS, GAIN);
        // below: a factor of 2 in two decades, so √2 a decade; above: a factor of 4 in two decades, so 2 a decade
        assertThat(curve.at(1e-6)).isCloseTo(200.0 / Math.sqrt(2.0), ROUNDED);
        assertThat(curve.at(1e-5 / Math.sqrt(10.0))).isCloseTo(200.0 / Math.pow(2.0, 0.25), ROUNDED);
        assertThat(curve.at(1e-9)).isCloseTo(200.0 / Math.sqrt(2.0), ROUNDED);
        assertThat(curve.at(1.0)).isCloseTo(50.0, ROUNDED);
        assertThat(curve.at(100.0)).isCloseTo(50.0, ROUNDED);
        assertThat(curve.isContinuedAt(9e-6)).isTrue();
        assertThat(curve.isContinuedAt(1e-4)).isFalse();
        assertThat(curve.isContinuedAt(0.2)).isTrue();
    }

    @Test
    void onePointMakesItFlat() {
        GainCurve curve = GainCurve.flat(321.0);
        for (double amps : new double[] {1e-9, 1e-3, 10.0}) {
            assertThat(curve.at(amps)).isCloseTo(321.0, ROUNDED);
            assertThat(curve.isContinuedAt(amps)).isFalse();
        }
    }

    @Test
    void aPowerLawStaysAPowerLaw() {
        // equal slopes on either side: the cubic is the straight line through the points
        GainCurve curve = GainCurve.through(new double[] {1e-6, 1e-5, 1e-3}, new double[] {100.0, 200.0, 800.0});
        forAll(100, random -> {
            double amps = logUniform(random, 1e-7, 1e-2);
            assertThat(curve.at(amps)).isCloseTo(100.0 * Math.pow(amps / 1e-6, Math.log10(2.0)), ROUNDED);
        });
    }

    @Test
    void scalesAsAWhole() {
        GainCurve curve = GainCurve.through(AMPS, GAIN);
        GainCurve scaled = curve.scaled(0.7);
        forAll(100, random -> {
            double amps = logUniform(random, 1e-8, 10.0);
            assertThat(scaled.at(amps)).isCloseTo(0.7 * curve.at(amps), ROUNDED);
        });
        assertThatIllegalArgumentException()
                .isThrownBy(() -> curve.scaled(0.0))
                .withMessage("factor must be finite and > 0, was 0.0");
    }

    @Test
    void keepsNoHoldOnTheArraysItWasGiven() {
        double[] amps = AMPS.clone();
        double[] gain = GAIN.clone();
        GainCurve curve = GainCurve.through(amps, gain);
        Arrays.fill(amps, 1.0);
        Arrays.fill(gain, 1.0);
        assertThat(curve.at(1e-3)).isCloseTo(400.0, ROUNDED);
    }

    @Test
    void refusesPointsThatMakeNoCurve() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> GainCurve.through(new double[0], new double[0]))
                .withMessage("a gain curve needs as many gains as currents, and at least one; had 0 and 0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> GainCurve.through(AMPS, new double[] {100.0}))
                .withMessage("a gain curve needs as many gains as currents, and at least one; had 1 and 3");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> GainCurve.through(new double[] {1e-3, 1e-3}, new double[] {100.0, 200.0}))
                .withMessageStartingWith("the currents of a gain curve must rise, but ");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> GainCurve.through(new double[] {Double.NaN}, new double[] {100.0}))
                .withMessage("currentAmps must be finite and > 0 A, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> GainCurve.flat(-1.0))
                .withMessage("gain must be finite and > 0, was -1.0");
    }
}
