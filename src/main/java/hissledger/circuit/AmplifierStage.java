package hissledger.circuit;

import hissledger.device.AmplifierModel;
import hissledger.device.NoiseKind;
import hissledger.device.NoiseSource;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Spectrum;
import java.util.OptionalDouble;

/**
 * A behavioural amplifier: its two generators at its terminals, its noiseless input resistance and capacitance after them.
 *
 * @param model the amplifier
 */
public record AmplifierStage(AmplifierModel model) implements Stage {
    private static final NoiseSource VOLTAGE = NoiseSource.of(NoiseKind.AMPLIFIER_VOLTAGE);
    private static final NoiseSource CURRENT = NoiseSource.of(NoiseKind.AMPLIFIER_CURRENT);

    @Override
    public void walk(ChainPass pass) {
        pass.seriesVoltage(
                VOLTAGE,
                Spectrum.whiteWithCorner(
                        model.voltsPerRootHertz() * model.voltsPerRootHertz(), model.voltageCornerHertz()));
        pass.shuntCurrent(
                CURRENT,
                Spectrum.whiteWithCorner(
                        model.ampsPerRootHertz() * model.ampsPerRootHertz(), model.currentCornerHertz()));
        pass.noiselessShunt(1.0 / model.inputOhms(), model.inputFarads());
    }

    @Override
    public OptionalDouble deviceAmps() {
        return OptionalDouble.empty();
    }

    @Override
    public double totalAmps() {
        return 0.0;
    }

    @Override
    public Harmonics.Limit onePercent() {
        return Harmonics.Limit.none();
    }
}
