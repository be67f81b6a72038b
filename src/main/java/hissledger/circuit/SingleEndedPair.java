package hissledger.circuit;

import hissledger.device.NoiseKind;
import hissledger.device.NoiseSource;
import hissledger.device.Transistor;
import hissledger.physics.Require;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Impedance;
import java.util.OptionalDouble;

/**
 * A pair driven at one input, with a resistor at the other: a long-tailed pair with an ideal tail. The twin generators of both
 * halves add {@code 2 |e + ½(Z1+Z2) i|² + 2 |½(Z1−Z2) κ i|²}, {@code κ = y21/(y11+y21)}: the ideal tail shares a current drawn
 * by one input between both (see {@link ChainPass#enterPair}). The thermal noise of Z2 stands in series with the input. Load
 * and next stage are seen between the two outputs.
 *
 * <p>The common-mode admittance of the two inputs (through the feedback capacitances and the output conductance, the tail
 * being ideal) is left out; it is small against 1/Z1 and 1/Z2 in the audio band below about 100 kΩ.
 *
 * @param device one device at its quiescent point
 * @param inParallel devices in parallel in each half
 * @param around the parts around each half
 * @param otherOhms resistor Z2 from the other input to ground, Ω; ≥ 0
 */
public record SingleEndedPair(Transistor device, int inParallel, Surroundings around, double otherOhms)
        implements Stage {
    private static final NoiseSource OTHER_SIDE = NoiseSource.of(NoiseKind.OTHER_SIDE);

    public SingleEndedPair {
        Require.atLeast("inParallel", inParallel, 1);
        Require.notNegative("otherOhms", otherOhms, "Ω");
    }

    private Half half() {
        return new Half(device, inParallel, around, 0.0, Double.POSITIVE_INFINITY);
    }

    @Override
    public void walk(ChainPass pass) {
        pass.enterPair(Impedance.resistance(otherOhms), OTHER_SIDE, device.temperatureKelvin());
        half().walk(pass);
        pass.enterSharedCurrent();
        half().walkDevice(pass);
        pass.joinHalves();
        around.walkNextStage(pass);
    }

    @Override
    public OptionalDouble deviceAmps() {
        return OptionalDouble.of(device.currentAmps());
    }

    @Override
    public double totalAmps() {
        return 2.0 * inParallel * device.currentAmps();
    }

    @Override
    public Harmonics.Limit onePercent() {
        return Harmonics.thirdOfPair(device, half().degeneration());
    }
}
