package hissledger.circuit;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hissledger.device.BiasedBipolar;
import hissledger.device.BiasedJfet;
import hissledger.device.BipolarModel;
import hissledger.device.JfetModel;
import hissledger.device.Transistor;
import hissledger.physics.Thermal;
import java.util.function.DoubleUnaryOperator;
import org.apache.commons.math3.analysis.solvers.BrentSolver;
import org.junit.jupiter.api.Test;

/** The closed forms of distortion against a numerical Fourier analysis of the device laws with their degeneration. */
class HarmonicsTest {
    private static final double KELVIN = 300.0;
    private static final double AMPS = 1e-3;
    private static final Transistor BIPOLAR = new BiasedBipolar(BipolarModel.ideal(1e9, 0.0), AMPS, KELVIN);
    private static final double IDSS = 8e-3;
    private static final double PINCH_OFF = 2.0;
    private static final Transistor JFET = new BiasedJfet(JfetModel.ideal(IDSS, PINCH_OFF), AMPS, KELVIN);

    /** The closed form is the first term of a series in the harmonic itself; at 1 % the next term is a few parts in 100. */
    private static final double FIRST_TERM = 0.03;

    private static final double ONE_PERCENT = 0.01;

    @Test
    void secondHarmonicOfABipolarTransistor() {
        double vt = Thermal.voltageVolts(KELVIN);
        for (double ohms : new double[] {0.0, 10.0, 50.0}) {
            double peak = Math.sqrt(2.0)
                    * Harmonics.secondOfSingle(BIPOLAR, ohms * AMPS / vt)
                            .inputVolts()
                            .getAsDouble();
            DoubleUnaryOperator current = v -> solve(i -> AMPS * Math.exp((v - (i - AMPS) * ohms) / vt) - i);
            assertThat(harmonic(current, peak, 2) / ONE_PERCENT).isCloseTo(1.0, within(FIRST_TERM));
        }
    }

    @Test
    void secondHarmonicOfAJfet() {
        double overdrive = PINCH_OFF * Math.sqrt(AMPS / IDSS);
        double gm = 2.0 * AMPS / overdrive;
        double peak = Math.sqrt(2.0)
                * Harmonics.secondOfSingle(JFET, 0.0).inputVolts().getAsDouble();
        DoubleUnaryOperator bare = v -> AMPS * (1.0 + v / overdrive) * (1.0 + v / overdrive);
        assertThat(harmonic(bare, peak, 2) / ONE_PERCENT).isCloseTo(1.0, within(FIRST_TERM));

        double ohms = 100.0;
        double degenerated = Math.sqrt(2.0)
                * Harmonics.secondOfSingle(JFET, gm * ohms).inputVolts().getAsDouble();
        DoubleUnaryOperator current = v -> solve(i -> {
            double drive = 1.0 + (v - (i - AMPS) * ohms) / overdrive;
            return AMPS * drive * drive - i;
        });
        assertThat(harmonic(current, degenerated, 2) / ONE_PERCENT).isCloseTo(1.0, within(FIRST_TERM));
    }

    /** HD3 = Vp²/(48 VT²) needs Vp = 0.69 VT for 1 %: the next term of tanh is 6 % there. */
    @Test
    void thirdHarmonicOfABipolarPair() {
        double vt = Thermal.voltageVolts(KELVIN);
        double secondTerm = 0.08;
        double peak = Math.sqrt(2.0)
                * Harmonics.thirdOfPair(BIPOLAR, 0.0).inputVolts().getAsDouble();
        DoubleUnaryOperator pair = v -> AMPS * Math.tanh(v / (2.0 * vt));
        assertThat(harmonic(pair, peak, 3) / ONE_PERCENT).isCloseTo(1.0, within(secondTerm));
        assertThat(harmonic(pair, peak, 2)).isLessThan(1e-12);

        double ohms = 25.0;
        double degeneration = ohms * AMPS / vt;
        double degenerated = Math.sqrt(2.0)
                * Harmonics.thirdOfPair(BIPOLAR, degeneration).inputVolts().getAsDouble();
        // each half carries i and drops i R; the differential drive is v − 2 i R
        DoubleUnaryOperator current = v -> solve(i -> AMPS * Math.tanh((v - 2.0 * i * ohms) / (2.0 * vt)) - i, AMPS);
        double measured = harmonic(current, degenerated, 3) / ONE_PERCENT;
        assertThat(measured).isCloseTo(1.0, within(3.0 * secondTerm));
    }

    @Test
    void thirdHarmonicOfAJfetPair() {
        double overdrive = PINCH_OFF * Math.sqrt(AMPS / IDSS);
        double secondTerm = 0.08;
        double peak =
                Math.sqrt(2.0) * Harmonics.thirdOfPair(JFET, 0.0).inputVolts().getAsDouble();
        DoubleUnaryOperator pair = v -> {
            double x = v / (2.0 * overdrive);
            return 2.0 * AMPS * x * Math.sqrt(1.0 - x * x);
        };
        assertThat(harmonic(pair, peak, 3) / ONE_PERCENT).isCloseTo(1.0, within(secondTerm));
    }

    @Test
    void degenerationIsWorthItsLoopGainSquared() {
        double bare = Harmonics.secondOfSingle(BIPOLAR, 0.0).inputVolts().getAsDouble();
        assertThat(Harmonics.secondOfSingle(BIPOLAR, 9.0).cutOff()).isFalse();
        double loop = Harmonics.secondOfSingle(BIPOLAR, 9.0).inputVolts().getAsDouble();
        assertThat(loop / bare).isCloseTo(100.0, within(1e-9));
    }

    /** No level beyond the one that takes the current of a device to zero: RE times the current, and little more. */
    @Test
    void cutOffLimitsAMuchDegeneratedStage() {
        double vt = Thermal.voltageVolts(KELVIN);
        double ohms = 10e3;
        double degeneration = ohms * AMPS / vt;
        Harmonics.Limit single = Harmonics.secondOfSingle(BIPOLAR, degeneration);
        assertThat(single.cutOff()).isTrue();
        double peak = Math.sqrt(2.0) * single.inputVolts().getAsDouble();
        // beyond RE times the current one VT is left: the device carries 1/e of its current there and falls off
        assertThat(peak).isCloseTo(ohms * AMPS + vt, within(1e-9));
        Harmonics.Limit pair = Harmonics.thirdOfPair(BIPOLAR, degeneration);
        assertThat(pair.cutOff()).isTrue();
        assertThat(Math.sqrt(2.0) * pair.inputVolts().getAsDouble()).isCloseTo(2.0 * (ohms * AMPS + vt), within(1e-9));
        double overdrive = PINCH_OFF * Math.sqrt(AMPS / IDSS);
        Harmonics.Limit jfet = Harmonics.secondOfSingle(JFET, 2.0 * AMPS / overdrive * ohms);
        assertThat(jfet.cutOff()).isTrue();
        assertThat(Math.sqrt(2.0) * jfet.inputVolts().getAsDouble()).isCloseTo(ohms * AMPS + overdrive, within(1e-9));
    }

    /** Common practice, no source: a bipolar transistor reaches 1 % at 1 mV peak; the closed form gives 1.03 mV at 300 K. */
    @Test
    void aBipolarTransistorReachesOnePercentAtAMillivolt() {
        double peak = Math.sqrt(2.0)
                * Harmonics.secondOfSingle(BIPOLAR, 0.0).inputVolts().getAsDouble();
        assertThat(peak).isCloseTo(1e-3, within(0.1e-3));
    }

    private static double solve(DoubleUnaryOperator balance) {
        return new BrentSolver(1e-16, 1e-18).solve(500, balance::applyAsDouble, 0.0, 100.0 * AMPS);
    }

    private static double solve(DoubleUnaryOperator balance, double bound) {
        return new BrentSolver(1e-16, 1e-18).solve(500, balance::applyAsDouble, -bound, bound);
    }

    /** Amplitude of a harmonic over that of the fundamental for a sine of the given peak, by a discrete Fourier sum. */
    private static double harmonic(DoubleUnaryOperator law, double peak, int order) {
        int samples = 256;
        double[] re = new double[order + 1];
        double[] im = new double[order + 1];
        for (int k = 0; k < samples; k++) {
            double phase = 2.0 * Math.PI * k / samples;
            double value = law.applyAsDouble(peak * Math.sin(phase));
            for (int h = 1; h <= order; h++) {
                re[h] += value * Math.cos(h * phase);
                im[h] += value * Math.sin(h * phase);
            }
        }
        return Math.hypot(re[order], im[order]) / Math.hypot(re[1], im[1]);
    }
}
