package hissledger.circuit;

import hissledger.device.BiasedJfet;
import hissledger.device.Transistor;
import hissledger.physics.Require;
import java.util.OptionalDouble;

/**
 * Distortion of a stage from the law of its device, voltage-driven, at low frequency, to the first order in which it appears.
 *
 * <p>The law of a bipolar transistor is exponential with V₀ = VT, that of a JFET is square with V₀ = |VGS − VGS(off)|. The
 * resistance RE in the common lead (series feedback, T = gm RE) divides the second harmonic at a given input by (1 + T)² and
 * the third harmonic of a balanced pair by (1 + T)³; the third harmonic that the second makes through the feedback is left
 * out, being zero in a balanced pair. The series are those of the laws themselves; the tests hold them against a numerical
 * Fourier analysis.
 */
public final class Harmonics {
    private static final double ONE_PERCENT = 0.01;
    /** exp: HD2 = Vp/(4 V₀); (1 + v/V₀)²: the same with V₀ the overdrive and gm = 2 ID/V₀. */
    private static final double SECOND = 4.0;
    /** tanh(v/2VT): HD3 = (Vp/VT)²/48. */
    private static final double BIPOLAR_PAIR_THIRD = 48.0;
    /** v √(1 − (v/2V₀)²): HD3 = (Vp/V₀)²/32. */
    private static final double JFET_PAIR_THIRD = 32.0;

    private Harmonics() {}

    /**
     * The level at which a harmonic reaches 1 %.
     *
     * @param harmonic 2 or 3; 0 where the device law does not tell
     * @param inputVolts level between the stage's input terminals, V rms; empty where the device law does not tell
     */
    public record Limit(int harmonic, OptionalDouble inputVolts) {
        /** No statement. */
        public static Limit none() {
            return new Limit(0, OptionalDouble.empty());
        }
    }

    /**
     * Second harmonic of a single device, {@code HD2 = Vp/(4 V₀ (1 + T)²)}, solved for 1 %.
     *
     * @param device the device at its quiescent point
     * @param degeneration T = gm RE, dimensionless; ≥ 0
     */
    public static Limit secondOfSingle(Transistor device, double degeneration) {
        Require.notNegative("degeneration", degeneration, "");
        double loop = 1.0 + degeneration;
        double peak = ONE_PERCENT * SECOND * device.lawVolts() * loop * loop;
        return new Limit(2, OptionalDouble.of(peak / Math.sqrt(2.0)));
    }

    /**
     * Third harmonic of a balanced pair, {@code HD3 = (Vp/VT)²/(48 (1 + T)³)} for bipolar transistors and
     * {@code (Vp/V₀)²/(32 (1 + T)³)} for JFETs, Vp between the two inputs, solved for 1 %.
     *
     * @param device one device at its quiescent point
     * @param degeneration T = gm RE of one half, dimensionless; ≥ 0
     */
    public static Limit thirdOfPair(Transistor device, double degeneration) {
        Require.notNegative("degeneration", degeneration, "");
        double loop = 1.0 + degeneration;
        double divisor = device instanceof BiasedJfet ? JFET_PAIR_THIRD : BIPOLAR_PAIR_THIRD;
        double peak = device.lawVolts() * Math.sqrt(ONE_PERCENT * divisor * loop * loop * loop);
        return new Limit(3, OptionalDouble.of(peak / Math.sqrt(2.0)));
    }
}
