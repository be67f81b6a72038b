package hissledger.choose;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hissledger.device.GainCurve;
import hissledger.physics.Constants;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class OperatingPointTest {
    /** Brent stops at 1e-10 in ln I: a part of 1e-8 in the current leaves room for both solvers. */
    private static final Percentage SOLVERS = Percentage.withPercentage(1e-6);

    private static final int STEPS = 200;
    /** Volts computed from currents alike to a part of 1e-8. */
    private static final double VOLTS = 1e-6;

    /** Newton on the exponential law in VBE: KVL round base and emitter, IC = IS exp(VBE/VT), written out independently. */
    private static double newtonBipolar(
            double r1, double r2, double re, int count, double gain, double bulk, double kelvin, double supply) {
        double vt = Constants.BOLTZMANN_JOULES_PER_KELVIN * kelvin / Constants.ELEMENTARY_CHARGE_COULOMBS;
        double is = 1e-3 * Math.exp(-(0.65 - 2e-3 * (kelvin - 298.15)) / vt);
        double vbe = 0.65;
        for (int k = 0; k < STEPS; k++) {
            double ic = is * Math.exp(vbe / vt);
            // currents into the base node: from the supply, to ground, into the bases
            double emitterVolts = (ic + ic / gain) * (count * re + bulk);
            double base = vbe + emitterVolts;
            double f = (supply - base) / r1 - base / r2 - count * ic / gain;
            double slopeBase = 1.0 + (ic + ic / gain) / vt * (count * re + bulk);
            double slope = -slopeBase / r1 - slopeBase / r2 - count * ic / gain / vt;
            vbe -= Math.max(-vt, Math.min(vt, f / slope));
        }
        return is * Math.exp(vbe / vt);
    }

    @ParameterizedTest
    @CsvSource({
        "47e3, 10e3, 1e3, 1, 200, 0, 300, 12",
        "100e3, 22e3, 470, 1, 60, 0.5, 273.15, 9",
        "100e3, 22e3, 470, 4, 600, 0.5, 323.15, 9",
        "1e6, 220e3, 33e3, 2, 400, 0, 300, 24"
    })
    void bipolarAgreesWithNewtonOnTheExponentialLaw(
            double r1, double r2, double re, int count, double gain, double bulk, double kelvin, double supply) {
        BiasNetwork network = new BiasNetwork(r1, r2, 0.0, re, 1.0);
        OperatingPoint point = OperatingPoint.bipolar(network, count, GainCurve.flat(gain), bulk, kelvin, supply);
        assertThat(point.amps()).isCloseTo(newtonBipolar(r1, r2, re, count, gain, bulk, kelvin, supply), SOLVERS);
    }

    @ParameterizedTest
    @CsvSource({"6e-3, 1.5, 100, 1, 12", "12e-3, 0.6, 39, 4, 9", "0.2e-3, 0.8, 4700, 1, 9"})
    void jfetAgreesWithNewtonOnTheSquareLaw(double idss, double pinchOff, double rs, int count, double supply) {
        double x = 0.5; // √(ID/IDSS)
        for (int k = 0; k < STEPS; k++) {
            double f = count * rs * idss * x * x - pinchOff * (1.0 - x);
            x -= f / (2.0 * count * rs * idss * x + pinchOff);
        }
        BiasNetwork network = new BiasNetwork(Double.POSITIVE_INFINITY, 1e6, 0.0, rs, 1.0);
        OperatingPoint point = OperatingPoint.jfet(network, count, idss, pinchOff, supply);
        assertThat(point.amps()).isCloseTo(idss * x * x, SOLVERS);
        assertThat(point.leadVolts()).isCloseTo(pinchOff * (1.0 - x), within(VOLTS));
    }

    @Test
    void voltagesOfTheLoopAddUpToTheSupply() {
        BiasNetwork network = new BiasNetwork(47e3, 10e3, 10.0, 1e3, 3.3e3);
        OperatingPoint point = OperatingPoint.bipolar(network, 1, GainCurve.flat(200), 0.0, 300.0, 12.0);
        assertThat(point.leadVolts() + point.deviceVolts() + point.loadVolts()).isCloseTo(12.0, within(VOLTS));
        assertThat(point.swingVolts()).isCloseTo(Math.min(point.loadVolts(), point.deviceVolts() - 0.5), within(VOLTS));
    }
}
