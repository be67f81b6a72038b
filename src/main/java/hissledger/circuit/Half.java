package hissledger.circuit;

import hissledger.device.NoiseKind;
import hissledger.device.NoiseSource;
import hissledger.device.Transistor;
import hissledger.physics.Thermal;
import hissledger.twoport.ChainPass;
import hissledger.twoport.SmallSignal;
import hissledger.twoport.Spectrum;

/**
 * One half of a pair: rbb', the device with its common lead to the joint (a virtual ground), its load. The lead is the
 * unbypassed resistor, the bulk emitter resistance and, in a pair with a gain resistor, half of that in parallel with the
 * feedback resistor.
 *
 * @param device one device at its quiescent point
 * @param inParallel devices in parallel in this half
 * @param around the parts around it
 * @param halfGainOhms half the gain resistor, Ω; 0 where there is none
 * @param feedbackOhms feedback resistor of this half to its amplifier's output, Ω; infinite for none
 */
record Half(Transistor device, int inParallel, Surroundings around, double halfGainOhms, double feedbackOhms) {
    private static final NoiseSource EMITTER_RESISTANCE = NoiseSource.of(NoiseKind.EMITTER_RESISTANCE);
    private static final NoiseSource COMMON_LEAD = NoiseSource.of(NoiseKind.COMMON_LEAD);
    private static final NoiseSource GAIN_RESISTOR = NoiseSource.of(NoiseKind.GAIN_RESISTOR);
    private static final NoiseSource FEEDBACK_RESISTOR = NoiseSource.of(NoiseKind.FEEDBACK_RESISTOR);

    /** Resistance of the gain network in the lead, {@code Rg/2 || Rf}, Ω. */
    private double networkOhms() {
        return halfGainOhms == 0.0 ? 0.0 : 1.0 / (1.0 / halfGainOhms + 1.0 / feedbackOhms);
    }

    /** Resistance from emitter or source to the joint without the devices' own, Ω. */
    double leadOhms() {
        return around.commonLead().unbypassedOhms() + networkOhms();
    }

    void walk(ChainPass pass) {
        walkDevice(pass);
        around.walkLoad(pass, device.temperatureKelvin());
    }

    /** The half without its load. */
    void walkDevice(ChainPass pass) {
        double kelvin = device.temperatureKelvin();
        SingleStage.walkInputResistance(pass, device, inParallel);
        double bulkOhms = device.leadResistanceOhms() / inParallel;
        SmallSignal small = device.smallSignal().parallel(inParallel);
        pass.device(around.cascode() ? small.cascoded() : small);
        pass.commonLead(CommonLead.of(leadOhms()).impedance(bulkOhms));
        device.enterGenerators(pass, inParallel);
        thermal(pass, EMITTER_RESISTANCE, bulkOhms, kelvin);
        thermal(pass, COMMON_LEAD, around.commonLead().unbypassedOhms(), kelvin);
        if (halfGainOhms > 0.0) {
            // 4kT/R of each arm through the parallel combination: 4kT Rp²/R as a voltage in the lead
            double network = networkOhms();
            thermal(pass, GAIN_RESISTOR, network * network / halfGainOhms, kelvin);
            thermal(pass, FEEDBACK_RESISTOR, network * network / feedbackOhms, kelvin);
        }
        pass.leaveDevice();
    }

    private static void thermal(ChainPass pass, NoiseSource source, double ohms, double kelvin) {
        if (ohms > 0.0) {
            pass.commonLeadVoltage(source, Spectrum.white(Thermal.voltsSquaredPerHertz(ohms, kelvin)));
        }
    }

    /** {@code gm RE} of this half. */
    double degeneration() {
        double gm = device.smallSignal().transconductanceSiemens() * inParallel;
        return gm * (leadOhms() + device.leadResistanceOhms() / inParallel);
    }
}
