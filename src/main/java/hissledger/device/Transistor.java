package hissledger.device;

import hissledger.twoport.ChainPass;
import hissledger.twoport.SmallSignal;

/** A transistor at one quiescent point: what the circuit around it needs to know. */
public sealed interface Transistor permits BiasedBipolar, BiasedJfet {
    /** Quiescent current of one device, A; collector or drain. */
    double currentAmps();

    /** The admittances of one device, common lead grounded, without its base and bulk emitter resistance. */
    SmallSignal smallSignal();

    /** Resistance in series with the input terminal of one device (rbb'), Ω. */
    double inputResistanceOhms();

    /** Resistance of one device in its common lead (bulk emitter resistance), Ω. */
    double leadResistanceOhms();

    /**
     * Enters the generators between the device's terminals, between taking the device up and leaving it.
     *
     * @param pass the walk, standing at the device
     * @param devices how many equal devices are in parallel; powers in current form count that often
     */
    void enterGenerators(ChainPass pass, int devices);

    /** Direct current drawn by the input terminal of one device, A: base current or gate leakage. */
    double inputCurrentAmps();

    /**
     * The voltage scale of the curvature of the device law: the input amplitude between base and emitter (gate and
     * source) is compared with it for distortion. V_T for a bipolar transistor, the overdrive |VGS − VGS(off)| for a JFET.
     */
    double lawVolts();

    /** Junction temperature, K. */
    double temperatureKelvin();
}
