package hissledger.circuit;

import hissledger.device.NoiseKind;
import hissledger.device.NoiseSource;
import hissledger.device.Transistor;
import hissledger.physics.Require;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Impedance;
import hissledger.twoport.SmallSignal;
import java.util.OptionalDouble;

/**
 * Common emitter or common source: rbb' in series, the device with its common lead, the load in shunt, the next stage.
 *
 * @param device one device at its quiescent point
 * @param inParallel how many; each with its own rbb' and bulk emitter resistance, all sharing path, lead and load
 * @param around the parts around it
 */
public record SingleStage(Transistor device, int inParallel, Surroundings around) implements Stage {
    private static final NoiseSource BASE_RESISTANCE = NoiseSource.of(NoiseKind.BASE_RESISTANCE);
    private static final NoiseSource EMITTER_RESISTANCE = NoiseSource.of(NoiseKind.EMITTER_RESISTANCE);
    private static final NoiseSource COMMON_LEAD = NoiseSource.of(NoiseKind.COMMON_LEAD);

    public SingleStage {
        Require.atLeast("inParallel", inParallel, 1);
    }

    @Override
    public void walk(ChainPass pass) {
        double kelvin = device.temperatureKelvin();
        walkInputResistance(pass, device, inParallel);
        CommonLead lead = around.commonLead();
        double bulkOhms = device.leadResistanceOhms() / inParallel;
        SmallSignal small = device.smallSignal().parallel(inParallel);
        pass.device(around.cascode() ? small.cascoded() : small);
        pass.commonLead(lead.impedance(bulkOhms));
        device.enterGenerators(pass, inParallel);
        if (bulkOhms > 0.0) {
            pass.commonLeadVoltage(EMITTER_RESISTANCE, CommonLead.of(bulkOhms).thermal(kelvin));
        }
        if (!lead.isGrounded()) {
            pass.commonLeadVoltage(COMMON_LEAD, lead.thermal(kelvin));
        }
        pass.leaveDevice();
        around.walkLoad(pass, kelvin);
        around.walkNextStage(pass);
    }

    /** rbb'/N in series, with its thermal noise. */
    static void walkInputResistance(ChainPass pass, Transistor device, int inParallel) {
        double ohms = device.inputResistanceOhms() / inParallel;
        if (ohms > 0.0) {
            pass.series(Impedance.resistance(ohms), BASE_RESISTANCE, device.temperatureKelvin());
        }
    }

    /** Bulk emitter resistance of followers, in series with their common output. */
    static void walkOutputResistance(ChainPass pass, Transistor device, int inParallel) {
        double ohms = device.leadResistanceOhms() / inParallel;
        if (ohms > 0.0) {
            pass.series(Impedance.resistance(ohms), EMITTER_RESISTANCE, device.temperatureKelvin());
        }
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
        double unbypassed = around.commonLead().bypassFarads() > 0.0
                ? around.commonLead().unbypassedOhms()
                : around.commonLead().directOhms();
        double gm = device.smallSignal().transconductanceSiemens() * inParallel;
        double resistance = unbypassed + device.leadResistanceOhms() / inParallel;
        return Harmonics.secondOfSingle(device, gm * resistance);
    }

    /** A stage without anything around the device. */
    public static SingleStage bare(Transistor device) {
        return new SingleStage(device, 1, Surroundings.none());
    }
}
