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
 * out, being zero in a balanced pair. With much degeneration the formula would pass the level at which the current of a device
 * reaches zero; the law ends there, and so does the level that is stated (cut-off). The series are those of the laws themselves; the tests hold them against a numerical
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
     * @param cutOff whether a device is cut off at that level, before the harmonic reaches 1 % by the formula
     */
    public record Limit(int harmonic, OptionalDouble inputVolts, boolean cutOff) {
        /** No statement. */
        public static Limit none() {
            return new Limit(0, OptionalDouble.empty(), false);
        }
    }

    /**
     * Second harmonic of a single device, {@code HD2 = Vp/(4 V₀ (1 + T)²)}, solved for 1 %; at most the peak that takes the
     * current to zero, {@code V₀ (1 + T)} of a bipolar transistor (a VT beyond RE times its current) and
     * {@code V₀ (1 + T/2)} of a JFET.
     *
     * @param device the device at its quiescent point
     * @param degeneration T = gm RE, dimensionless; ≥ 0
     */
    public static Limit secondOfSingle(Transistor device, double degeneration) {
        Require.notNegative("degeneration", degeneration, "");
        double loop = 1.0 + degeneration;
        double peak = ONE_PERCENT * SECOND * device.lawVolts() * loop * loop;
        double cutOff = device.lawVolts() * (device instanceof BiasedJfet ? 1.0 + 0.5 * degeneration : loop);
        return limit(2, peak, cutOff);
    }

    /**
     * Third harmonic of a balanced pair, {@code HD3 = (Vp/VT)²/(48 (1 + T)³)} for bipolar transistors and
     * {@code (Vp/V₀)²/(32 (1 + T)³)} for JFETs, Vp between the two inputs, solved for 1 %; at most the peak that steers all the current to one side,
     * {@code 2 VT (1 + T)} for bipolar transistors (2 VT beyond RE times the current of both halves) and
     * {@code V₀ (√2 + T)} for JFETs.
     *
     * @param device one device at its quiescent point
     * @param degeneration T = gm RE of one half, dimensionless; ≥ 0
     */
    public static Limit thirdOfPair(Transistor device, double degeneration) {
        Require.notNegative("degeneration", degeneration, "");
        double loop = 1.0 + degeneration;
        double divisor = device instanceof BiasedJfet ? JFET_PAIR_THIRD : BIPOLAR_PAIR_THIRD;
        double peak = device.lawVolts() * Math.sqrt(ONE_PERCENT * divisor * loop * loop * loop);
        double cutOff = device.lawVolts()
                * (device instanceof BiasedJfet ? Math.sqrt(2.0) + degeneration : 2.0 * (1.0 + degeneration));
        return limit(3, peak, cutOff);
    }

    private static Limit limit(int harmonic, double peak, double cutOff) {
        return new Limit(harmonic, OptionalDouble.of(Math.min(peak, cutOff) / Math.sqrt(2.0)), peak > cutOff);
    }
}
