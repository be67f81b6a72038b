package hissledger.circuit;

import hissledger.device.Transistor;
import hissledger.physics.Require;
import hissledger.twoport.ChainPass;
import hissledger.twoport.SmallSignal;
import java.util.OptionalDouble;

/**
 * Emitter or source follower: rbb' in series, the device turned, bulk emitter resistance in series with its output, the
 * load (or tail) resistor in shunt, the next stage.
 *
 * @param device one device at its quiescent point
 * @param inParallel how many
 * @param around the parts around it; its load is the resistor from emitter or source to the supply
 */
public record FollowerStage(Transistor device, int inParallel, Surroundings around) implements Stage {
    public FollowerStage {
        Require.atLeast("inParallel", inParallel, 1);
        if (!around.commonLead().isGrounded()) {
            throw new IllegalArgumentException(
                    "a follower has no common lead; its emitter or source resistor is the load");
        }
    }

    @Override
    public void walk(ChainPass pass) {
        SingleStage.walkInputResistance(pass, device, inParallel);
        SmallSignal small = device.smallSignal().parallel(inParallel);
        pass.device(small);
        pass.follower();
        device.enterGenerators(pass, inParallel);
        pass.leaveDevice();
        SingleStage.walkOutputResistance(pass, device, inParallel);
        around.walkLoad(pass, device.temperatureKelvin());
        around.walkNextStage(pass);
    }

    @Override
    public OptionalDouble deviceAmps() {
        return OptionalDouble.of(device.currentAmps());
    }

    @Override
    public double totalAmps() {
        return inParallel * device.currentAmps();
    }

    @Override
    public Harmonics.Limit onePercent() {
        if (around.load().isEmpty()) {
            return Harmonics.Limit.none();
        }
        double gm = device.smallSignal().transconductanceSiemens() * inParallel;
        return Harmonics.secondOfSingle(device, gm * around.load().get().ohms());
    }
}
