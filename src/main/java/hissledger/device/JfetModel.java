package hissledger.device;

import hissledger.physics.Require;
import hissledger.physics.Thermal;
import hissledger.twoport.SmallSignal;
import java.util.Optional;

/**
 * The numbers of one JFET, resolved for a calculation.
 *
 * @param law drain saturation current, pinch-off voltage and transconductance
 * @param channelNoiseFactor γ of the channel noise 4kTγgm, dimensionless; &gt; 0
 * @param outputConductanceFactor λ of {@code g22 = λ ID}, 1/V; ≥ 0
 * @param leakage gate leakage and its growth with temperature
 * @param gateSourceFarads Cgs, F; ≥ 0
 * @param gateDrainFarads Cgd, F; ≥ 0
 * @param flicker flicker noise of the channel, gate-referred; empty for none
 * @param induced induced gate noise; empty for none
 */
public record JfetModel(
        SquareLaw law,
        double channelNoiseFactor,
        double outputConductanceFactor,
        GateLeakage leakage,
        double gateSourceFarads,
        double gateDrainFarads,
        Optional<ChannelFlicker> flicker,
        Optional<InducedGateNoise> induced) {
    /** γ of a long channel in saturation (A. van der Ziel, Proc. IRE 50 (1962) 1808). */
    public static final double LONG_CHANNEL_NOISE_FACTOR = 2.0 / 3.0;

    public JfetModel {
        Require.positive("channelNoiseFactor", channelNoiseFactor, "");
        Require.notNegative("outputConductanceFactor", outputConductanceFactor, "1/V");
        Require.notNegative("gateSourceFarads", gateSourceFarads, "F");
        Require.notNegative("gateDrainFarads", gateDrainFarads, "F");
    }

    /** A long-channel JFET with the square law alone: no leakage, capacitances, flicker or induced gate noise. */
    public static JfetModel ideal(double saturationAmps, double pinchOffVolts) {
        return new JfetModel(
                SquareLaw.of(saturationAmps, pinchOffVolts),
                LONG_CHANNEL_NOISE_FACTOR,
                0.0,
                GateLeakage.none(),
                0.0,
                0.0,
                Optional.empty(),
                Optional.empty());
    }

    /** This JFET with another gate leakage. */
    public JfetModel withLeakage(GateLeakage other) {
        return new JfetModel(
                law,
                channelNoiseFactor,
                outputConductanceFactor,
                other,
                gateSourceFarads,
                gateDrainFarads,
                flicker,
                induced);
    }

    /** This JFET with other capacitances, F. */
    public JfetModel withCapacitances(double gateSource, double gateDrain) {
        return new JfetModel(
                law, channelNoiseFactor, outputConductanceFactor, leakage, gateSource, gateDrain, flicker, induced);
    }

    /** This JFET with another channel flicker noise. */
    public JfetModel withFlicker(ChannelFlicker other) {
        return new JfetModel(
                law,
                channelNoiseFactor,
                outputConductanceFactor,
                leakage,
                gateSourceFarads,
                gateDrainFarads,
                Optional.of(other),
                induced);
    }

    /** This JFET with induced gate noise. */
    public JfetModel withInduced(InducedGateNoise other) {
        return new JfetModel(
                law,
                channelNoiseFactor,
                outputConductanceFactor,
                leakage,
                gateSourceFarads,
                gateDrainFarads,
                flicker,
                Optional.of(other));
    }

    /**
     * Admittances at a quiescent point: {@code y11 = jω(Cgs + Cgd)}, {@code y12 = −jωCgd}, {@code y21 = gm − jωCgd},
     * {@code y22 = λ ID + jωCgd}.
     *
     * @param drainAmps ID, A; &gt; 0
     * @param temperatureKelvin channel temperature, K; &gt; 0
     */
    public SmallSignal smallSignal(double drainAmps, double temperatureKelvin) {
        return SmallSignal.of(
                0.0,
                law.transconductanceSiemens(drainAmps, Thermal.voltageVolts(temperatureKelvin)),
                outputConductanceFactor * drainAmps,
                gateSourceFarads,
                gateDrainFarads);
    }
}
