package hissledger.circuit;

import hissledger.device.Transistor;
import hissledger.physics.Require;
import hissledger.twoport.ChainPass;
import java.util.OptionalDouble;

/**
 * A pair driven between its two inputs by a floating source: the differential pair, and the pair with a gain resistor between
 * its emitters or sources. Solved as one half, turned by the pair rule; then the next stage, one amplifier across both
 * outputs. The feedback resistors end at the amplifier's own outputs, a low impedance: feedback changes the gain, not the
 * equivalent input noise, so the next stage is referred with the loop open.
 *
 * @param device one device at its quiescent point
 * @param inParallel devices in parallel in each half
 * @param around the parts around each half
 * @param gainOhms resistor between the two emitters or sources, Ω; 0 where they meet in a virtual ground
 * @param feedbackOhms resistor from each emitter or source to its own output, Ω; infinite for none
 */
public record BalancedPair(Transistor device, int inParallel, Surroundings around, double gainOhms, double feedbackOhms)
        implements Stage {
    public BalancedPair {
        Require.atLeast("inParallel", inParallel, 1);
        Require.notNegative("gainOhms", gainOhms, "Ω");
        if (!(feedbackOhms > 0.0)) {
            throw new IllegalArgumentException("feedbackOhms must be > 0 Ω, was " + feedbackOhms);
        }
    }

    private Half half() {
        return new Half(device, inParallel, around, 0.5 * gainOhms, feedbackOhms);
    }

    @Override
    public void walk(ChainPass pass) {
        pass.enterHalf();
        half().walk(pass);
        pass.leaveHalf();
        around.walkNextStage(pass);
    }

    /**
     * A gain-resistor pair with feedback does not load its source: the loop lifts the input impedance of the closed
     * amplifier far above that of the open stage.
     */
    @Override
    public boolean loadsSource() {
        return Double.isInfinite(feedbackOhms);
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
