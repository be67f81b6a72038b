package hissledger.choose;

import hissledger.circuit.FrontEnd;
import hissledger.device.Device;
import hissledger.device.GainSheet;
import hissledger.ledger.BandWalk;
import hissledger.physics.Band;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleUnaryOperator;

/**
 * How much the EIN moves with one value, everything else and the current unchanged.
 *
 * @param name the parameter or part
 * @param perPercentDecibels change of the EIN for a rise by 1 %, dB
 * @param atLeastDecibels change with the least value that the sheet states, dB; empty where it states none
 * @param atGreatestDecibels change with the greatest value that the sheet states, dB
 */
public record Sensitivity(
        String name, double perPercentDecibels, OptionalDouble atLeastDecibels, OptionalDouble atGreatestDecibels) {
    private static final double PERCENT = 1.01;
    /** Changes below this are rounding, dB. */
    private static final double NOTHING = 1e-7;

    /** The values that move the EIN of a design at a current, the strongest first. */
    public static List<Sensitivity> of(Scenario scenario, Design design, double amps, Weighting weighting) {
        Sweep sweep = new Sweep(scenario, design, amps, weighting);
        List<Sensitivity> found = new ArrayList<>();
        Device device = design.candidate().device();
        device.currentGain().ifPresent(gain -> found.add(gain(sweep, device, gain)));
        device.inOrder().forEach((key, parameter) -> {
            if (!key.isRating()) {
                found.add(sensitivity(
                        key.words(),
                        value -> sweep.with(device.with(key, value)),
                        parameter.representative(),
                        parameter.min(),
                        parameter.max()));
            }
        });
        for (Parts.Part part : Parts.of(design)) {
            found.add(sensitivity(
                    part.name(),
                    value -> sweep.change(part.with(value).at(amps)),
                    part.value(),
                    OptionalDouble.empty(),
                    OptionalDouble.empty()));
        }
        found.removeIf(each -> each.strongest() < NOTHING);
        found.sort(Comparator.comparingDouble(Sensitivity::strongest).reversed());
        return found;
    }

    /** The greatest of its changes, dB; what it is sorted by. */
    public double strongest() {
        return Math.max(
                Math.abs(perPercentDecibels),
                Math.max(Math.abs(atLeastDecibels.orElse(0.0)), Math.abs(atGreatestDecibels.orElse(0.0))));
    }

    private static Sensitivity sensitivity(
            String name, DoubleUnaryOperator change, double value, OptionalDouble least, OptionalDouble greatest) {
        return new Sensitivity(
                name,
                change.applyAsDouble(value * PERCENT),
                least.isPresent() ? OptionalDouble.of(change.applyAsDouble(least.getAsDouble())) : least,
                greatest.isPresent() ? OptionalDouble.of(change.applyAsDouble(greatest.getAsDouble())) : greatest);
    }

    private static Sensitivity gain(Sweep sweep, Device device, GainSheet sheet) {
        boolean least = sheet.points().stream().anyMatch(point -> point.min().isPresent());
        boolean greatest = sheet.points().stream().anyMatch(point -> point.max().isPresent());
        double atLeast = sweep.with(device.with(sheet.least(), 1.0));
        double atGreatest = sweep.with(device.with(sheet.greatest(), 1.0));
        return new Sensitivity(
                "current gain hFE",
                sweep.with(device.with(sheet.typical(), PERCENT)),
                least ? OptionalDouble.of(atLeast) : OptionalDouble.empty(),
                greatest ? OptionalDouble.of(atGreatest) : OptionalDouble.empty());
    }

    /** The EIN with one thing changed, as a change from what it was. */
    private static final class Sweep {
        private final Scenario scenario;
        private final Design design;
        private final double amps;
        private final Weighting weighting;
        private final double before;

        Sweep(Scenario scenario, Design design, double amps, Weighting weighting) {
            this.scenario = scenario;
            this.design = design;
            this.amps = amps;
            this.weighting = weighting;
            this.before = ein(design.at(amps), scenario.band());
        }

        double with(Device device) {
            Design other = design.withDevice(device);
            double saturation = other.range().toAmps();
            return change(other.at(Math.min(amps, saturation)));
        }

        double change(FrontEnd frontEnd) {
            return Decibels.ofAmplitudeRatio(ein(frontEnd, scenario.band()) / before);
        }

        private double ein(FrontEnd frontEnd, Band band) {
            BandWalk walk = BandWalk.over(frontEnd, band);
            walk.walk(frontEnd);
            return Math.sqrt(walk.einVoltsSquared(weighting));
        }
    }
}
