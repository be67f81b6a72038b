package hissledger.physics;

import static hissledger.Trials.forAll;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.within;

import java.util.random.RandomGenerator;
import org.junit.jupiter.api.Test;

class MonotoneCubicTest {
    /** Four terms of order one to ten, each rounded a few times. */
    private static final double ROUNDING = 1e-13;

    /** Half a step of 1e-6 times a curvature of order ten. */
    private static final double ONE_SIDED = 1e-5;

    private static final class Points {
        private final double[] x;
        private final double[] y;

        private Points(double[] x, double[] y) {
            this.x = x;
            this.y = y;
        }

        static Points random(RandomGenerator random) {
            double[] x = new double[random.nextInt(2, 9)];
            double[] y = new double[x.length];
            for (int k = 0; k < x.length; k++) {
                x[k] = k == 0 ? random.nextDouble(-5.0, 5.0) : x[k - 1] + random.nextDouble(0.05, 3.0);
                y[k] = random.nextInt(4) == 0 && k > 0 ? y[k - 1] : random.nextDouble(-5.0, 5.0);
            }
            return new Points(x, y);
        }
    }

    @Test
    void passesThroughItsPointsAndNeverLeavesTheStepBetweenTwo() {
        forAll(1_000, random -> {
            Points points = Points.random(random);
            MonotoneCubic curve = MonotoneCubic.through(points.x, points.y);
            assertThat(curve.size()).isEqualTo(points.x.length);
            assertThat(curve.first()).isEqualTo(points.x[0]);
            assertThat(curve.last()).isEqualTo(points.x[points.x.length - 1]);
            for (int k = 0; k < points.x.length; k++) {
                assertThat(curve.at(points.x[k])).isCloseTo(points.y[k], within(ROUNDING));
            }
            for (int k = 1; k < points.x.length; k++) {
                double before = points.y[k - 1];
                double sign = Math.signum(points.y[k] - before);
                for (int step = 1; step <= 40; step++) {
                    double at = points.x[k - 1] + (points.x[k] - points.x[k - 1]) * step / 40.0;
                    double y = curve.at(at);
                    if (sign == 0.0) {
                        assertThat(y).isCloseTo(before, within(ROUNDING));
                    } else {
                        assertThat(sign * (y - before)).isGreaterThanOrEqualTo(-ROUNDING);
                    }
                    before = y;
                }
            }
        });
    }

    @Test
    void aStraightLineStaysStraight() {
        MonotoneCubic curve = MonotoneCubic.through(new double[] {0.0, 1.0, 4.0}, new double[] {2.0, 4.0, 10.0});
        forAll(100, random -> {
            double x = random.nextDouble(0.0, 4.0);
            assertThat(curve.at(x)).isCloseTo(2.0 + 2.0 * x, within(ROUNDING));
            assertThat(curve.plus(-3.0).at(x)).isCloseTo(2.0 * x - 1.0, within(ROUNDING));
        });
        assertThat(curve.segmentSlope(0)).isEqualTo(2.0);
        assertThat(curve.segmentSlope(1)).isEqualTo(2.0);
    }

    @Test
    void theInnerTangentIsTheWeightedHarmonicMeanOfItsNeighbours() {
        // Fritsch and Butland, equal spacing: 2/(1/s1 + 1/s2); slopes 1 and 3 give 1.5, read off as a derivative
        MonotoneCubic curve = MonotoneCubic.through(new double[] {0.0, 1.0, 2.0}, new double[] {0.0, 1.0, 4.0});
        double step = 1e-6;
        assertThat((curve.at(1.0 + step) - curve.at(1.0)) / step).isCloseTo(1.5, within(ONE_SIDED));
        assertThat((curve.at(1.0) - curve.at(1.0 - step)) / step).isCloseTo(1.5, within(ONE_SIDED));
    }

    @Test
    void beyondThePointsTheNearestHolds() {
        MonotoneCubic curve = MonotoneCubic.through(new double[] {0.0, 1.0}, new double[] {5.0, 7.0});
        assertThat(curve.at(-100.0)).isEqualTo(5.0);
        assertThat(curve.at(100.0)).isEqualTo(7.0);
        assertThat(MonotoneCubic.through(new double[] {3.0}, new double[] {8.0}).at(17.0))
                .isEqualTo(8.0);
    }

    @Test
    void refusesPointsThatMakeNoCurve() {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> MonotoneCubic.through(new double[] {0.0, 1.0}, new double[] {1.0}))
                .withMessage("a curve needs as many ordinates as abscissas, and at least one; had 1 and 2");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> MonotoneCubic.through(new double[] {1.0, 1.0}, new double[] {1.0, 2.0}))
                .withMessage("abscissas must rise, but 1.0 follows 1.0");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> MonotoneCubic.through(new double[] {Double.NaN}, new double[] {1.0}))
                .withMessage("x must be finite, was NaN");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> MonotoneCubic.through(new double[] {1.0}, new double[] {Double.POSITIVE_INFINITY}))
                .withMessage("y must be finite, was Infinity");
    }
}
