package hissledger.ledger;

import hissledger.circuit.FrontEnd;
import hissledger.circuit.Harmonics;
import hissledger.circuit.Signal;
import hissledger.physics.Constants;
import hissledger.physics.Decibels;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The signal at which the stage's own lowest harmonic reaches 1 %, from the device law and its degeneration, voltage-driven,
 * at low frequency.
 *
 * @param harmonic 2, or 3 for a balanced pair
 * @param cutOff whether a device is cut off there, before the harmonic reaches 1 %
 * @param stageVolts level between the stage's input terminals, V rms
 * @param emfVolts the EMF that gives it at 1 kHz, V rms
 * @param soundPressureDecibels sound pressure level of that EMF, dB SPL; empty without a sensitivity in V/Pa
 * @param dynamicRangeDecibels that EMF over the flat EIN, dB
 */
public record Headroom(
        int harmonic,
        boolean cutOff,
        double stageVolts,
        double emfVolts,
        OptionalDouble soundPressureDecibels,
        double dynamicRangeDecibels) {
    /** The headroom of a front end with a given flat EIN, V rms; empty where the device law does not tell. */
    static Optional<Headroom> of(FrontEnd frontEnd, double einVolts) {
        Harmonics.Limit limit = frontEnd.stage().onePercent();
        OptionalDouble level = emfVolts(frontEnd);
        if (limit.inputVolts().isEmpty() || level.isEmpty()) {
            return Optional.empty();
        }
        double stageVolts = limit.inputVolts().getAsDouble();
        double emf = level.getAsDouble();
        Signal signal = frontEnd.source().signal();
        OptionalDouble sound = signal.isAcoustic()
                ? OptionalDouble.of(Decibels.ofAmplitudeRatio(
                        emf / signal.voltsPerUnit().getAsDouble() / Constants.REFERENCE_SOUND_PRESSURE_PASCALS))
                : OptionalDouble.empty();
        return Optional.of(new Headroom(
                limit.harmonic(), limit.cutOff(), stageVolts, emf, sound, Decibels.ofAmplitudeRatio(emf / einVolts)));
    }

    /** The EMF at 1 kHz that makes 1 % of the stage's lowest harmonic, V rms; empty where the device law does not tell. */
    public static OptionalDouble emfVolts(FrontEnd frontEnd) {
        OptionalDouble stage = frontEnd.stage().onePercent().inputVolts();
        return stage.isPresent() ? OptionalDouble.of(stage.getAsDouble() / transfer(frontEnd)) : stage;
    }

    /** |Vstage/EMF| at 1 kHz: A of the stage over the a of the whole chain, or of the path where the stage does not load. */
    private static double transfer(FrontEnd frontEnd) {
        ChainPass whole = new ChainPass(Frequencies.of(Accounting.REFERENCE_HERTZ));
        whole.beginBehind(frontEnd.source().impedance());
        frontEnd.walkLoading(whole);
        double a = Math.hypot(whole.rowVoltageRe()[0], whole.rowVoltageIm()[0]);
        if (!frontEnd.stage().loadsSource()) {
            return 1.0 / a;
        }
        ChainPass stage = new ChainPass(Frequencies.of(Accounting.REFERENCE_HERTZ));
        stage.beginWith(1.0, 0.0, 0.0);
        frontEnd.stage().walk(stage);
        return Math.hypot(stage.rowVoltageRe()[0], stage.rowVoltageIm()[0]) / a;
    }
}
