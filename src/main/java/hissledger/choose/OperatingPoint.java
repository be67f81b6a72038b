package hissledger.choose;

import hissledger.device.GainCurve;
import hissledger.physics.Thermal;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The quiescent point of a single stage on one supply, magnitudes: PNP and p-channel devices are the same with all signs
 * turned.
 *
 * @param amps collector or drain current of each device, A
 * @param baseVolts at base or gate, from ground, V
 * @param leadVolts across emitter or source resistance, V
 * @param loadVolts across the collector or drain load, V; 0 without one
 * @param deviceVolts VCE or VDS, V
 * @param swingVolts greatest peak of the output before the device saturates or is cut off, V; negative where it is saturated
 * @param supplyAmps drawn from the supply by all devices and the divider, A
 */
public record OperatingPoint(
        double amps,
        double baseVolts,
        double leadVolts,
        double loadVolts,
        double deviceVolts,
        double swingVolts,
        double supplyAmps) {
    /** VBE at {@link #REFERENCE_AMPS} and {@link #REFERENCE_KELVIN}, V: common practice, no source. */
    public static final double REFERENCE_VBE_VOLTS = 0.65;

    /** The collector current at which that holds, A. */
    public static final double REFERENCE_AMPS = 1e-3;

    /** The temperature at which that holds, K: 25 °C. */
    public static final double REFERENCE_KELVIN = 298.15;

    /** Change of VBE with temperature, V/K: common practice, no source. */
    public static final double VBE_VOLTS_PER_KELVIN = -2e-3;

    /** VCE below which a bipolar transistor counts as saturated, V: common practice, no source. */
    public static final double SATURATION_VOLTS = 0.5;

    private static final double LEAST_AMPS = 1e-15;
    private static final double GREATEST_AMPS = 100.0;
    /** A current to nine digits: far finer than any resistor. */
    private static final double RELATIVE_ACCURACY = 1e-12;

    private static final double ABSOLUTE_ACCURACY = 1e-10;
    private static final int MOST_EVALUATIONS = 300;

    /**
     * Base-emitter voltage, {@code VBE = VT ln(IC/IS)} with IS such that VBE is 0.65 V at 1 mA and 25 °C and falls by 2 mV/K
     * at that current.
     *
     * @param amps IC, A; &gt; 0
     * @param kelvin junction temperature, K; &gt; 0
     * @return V
     */
    public static double baseEmitterVolts(double amps, double kelvin) {
        return REFERENCE_VBE_VOLTS
                + VBE_VOLTS_PER_KELVIN * (kelvin - REFERENCE_KELVIN)
                + Thermal.voltageVolts(kelvin) * Math.log(amps / REFERENCE_AMPS);
    }

    /**
     * A bipolar stage: {@code V R2/(R1 + R2) = N IB (R1 || R2) + VBE(IC) + (IC + IB)(N RE + re)}, solved for IC with hFE(IC).
     *
     * @param network the resistors
     * @param count N, devices that share them
     * @param gain hFE against IC
     * @param bulkOhms bulk emitter resistance of each device, Ω
     * @param kelvin junction temperature, K
     * @param supplyVolts V
     */
    public static OperatingPoint bipolar(
            BiasNetwork network, int count, GainCurve gain, double bulkOhms, double kelvin, double supplyVolts) {
        double openVolts = network.openVolts(supplyVolts);
        double baseOhms = count * network.parallelOhms();
        double emitterOhms = count * network.directOhms() + bulkOhms;
        double amps = solve(
                lnAmps -> {
                    double ic = Math.exp(lnAmps);
                    double ib = ic / gain.at(ic);
                    return openVolts - ib * baseOhms - baseEmitterVolts(ic, kelvin) - (ic + ib) * emitterOhms;
                },
                GREATEST_AMPS);
        double baseAmps = amps / gain.at(amps);
        double leadVolts = count * (amps + baseAmps) * network.directOhms();
        double baseVolts = openVolts - count * baseAmps * network.parallelOhms();
        double dividerAmps = (supplyVolts - baseVolts) / network.upperOhms();
        return at(network, count, amps, baseVolts, leadVolts, SATURATION_VOLTS, supplyVolts, dividerAmps);
    }

    /**
     * A JFET stage with its gate at ground: {@code N ID RS = |VGS(off)| (1 − √(ID/IDSS))}, solved for ID.
     *
     * @param network the resistors
     * @param count N, devices that share them
     * @param saturationAmps IDSS, A
     * @param pinchOffVolts |VGS(off)|, V
     * @param supplyVolts V
     */
    public static OperatingPoint jfet(
            BiasNetwork network, int count, double saturationAmps, double pinchOffVolts, double supplyVolts) {
        double sourceOhms = count * network.directOhms();
        double amps = solve(
                lnAmps -> {
                    double id = Math.exp(lnAmps);
                    return pinchOffVolts * (1.0 - Math.sqrt(id / saturationAmps)) - id * sourceOhms;
                },
                saturationAmps);
        return at(network, count, amps, 0.0, amps * sourceOhms, pinchOffVolts, supplyVolts, 0.0);
    }

    private static double solve(UnivariateFunction balance, double greatestAmps) {
        return Math.exp(new BrentSolver(RELATIVE_ACCURACY, ABSOLUTE_ACCURACY)
                .solve(MOST_EVALUATIONS, balance, Math.log(LEAST_AMPS), Math.log(greatestAmps)));
    }

    private static OperatingPoint at(
            BiasNetwork network,
            int count,
            double amps,
            double baseVolts,
            double leadVolts,
            double saturationVolts,
            double supplyVolts,
            double dividerAmps) {
        double loadVolts = count * amps * network.loadOhms();
        double deviceVolts = supplyVolts - loadVolts - leadVolts;
        double untilCutOff = network.loadOhms() > 0.0 ? loadVolts : leadVolts;
        return new OperatingPoint(
                amps,
                baseVolts,
                leadVolts,
                loadVolts,
                deviceVolts,
                Math.min(untilCutOff, deviceVolts - saturationVolts),
                count * amps + dividerAmps);
    }
}
