package hissledger.circuit;

import hissledger.device.NoiseKind;
import hissledger.device.NoiseSource;
import hissledger.twoport.ChainPass;
import java.util.Optional;

/**
 * What every transistor arrangement shares: the parts around the device.
 *
 * @param commonLead between emitter or source and ground; grounded in a follower
 * @param load collector or drain load, or in a follower the resistor from emitter or source to the supply; empty for none
 * @param nextStage the amplifier after it; empty for none
 * @param cascode whether a cascode keeps the output terminal still
 */
public record Surroundings(
        CommonLead commonLead, Optional<Passive.Resistor> load, Optional<NextStage> nextStage, boolean cascode) {
    private static final NoiseSource LOAD = NoiseSource.of(NoiseKind.LOAD);
    private static final NoiseSource LOAD_EXCESS = NoiseSource.of(NoiseKind.LOAD_EXCESS);

    /** The device alone: grounded lead, no load, nothing after it. */
    public static Surroundings none() {
        return new Surroundings(CommonLead.grounded(), Optional.empty(), Optional.empty(), false);
    }

    /** Enters the load in shunt, with its excess noise where it has any. */
    void walkLoad(ChainPass pass, double temperatureKelvin) {
        if (load.isPresent()) {
            Passive.Resistor resistor = load.get();
            if (resistor.hasExcessNoise()) {
                pass.shuntCurrent(LOAD_EXCESS, resistor.excessCurrent());
            }
            pass.shunt(resistor.impedance(), LOAD, temperatureKelvin);
        }
    }

    /** Enters the next stage. */
    void walkNextStage(ChainPass pass) {
        nextStage.ifPresent(stage -> stage.walk(pass));
    }
}
