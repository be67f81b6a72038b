package hissledger.choose;

import hissledger.circuit.AmplifierStage;
import hissledger.circuit.FrontEnd;
import hissledger.circuit.PathElement;
import hissledger.circuit.Source;
import hissledger.circuit.Stage;
import hissledger.circuit.StagePlan;
import hissledger.device.AmplifierModel;
import hissledger.device.BiasedBipolar;
import hissledger.device.BiasedJfet;
import hissledger.device.BipolarModel;
import hissledger.device.Device;
import hissledger.device.JfetModel;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;

/**
 * A candidate placed in its scenario with its device resolved: a front end whose quiescent current alone is open. A
 * behavioural amplifier has none; it is the same at every current.
 *
 * @param candidate the candidate
 * @param source the transducer
 * @param path all passive elements before the stage
 * @param stage the stage at a given current of each device, A
 * @param range the currents that a search may try
 * @param defaultsUsed what had to be assumed for the device, one sentence each
 * @param kelvin temperature of the stage, K
 */
public record Design(
        Candidate candidate,
        Source source,
        List<PathElement> path,
        DoubleFunction<Stage> stage,
        CurrentRange range,
        List<String> defaultsUsed,
        double kelvin) {
    /** Least current that a search tries where nothing else bounds it, A. */
    public static final double LEAST_AMPS = 1e-6;

    /** Greatest current that a search tries where nothing else bounds it, A. */
    public static final double GREATEST_AMPS = 0.1;

    /** A gain curve is continued beyond its points by this factor of current, and no further. */
    public static final double CONTINUED_FACTOR = 10.0;

    public Design {
        path = List.copyOf(path);
        defaultsUsed = List.copyOf(defaultsUsed);
    }

    /**
     * Resolves a candidate of a scenario.
     *
     * @throws hissledger.device.IncompleteDeviceException where its device lacks a parameter that has no default
     */
    public static Design of(Scenario scenario, Candidate candidate) {
        List<PathElement> path = new ArrayList<>(scenario.path());
        path.addAll(candidate.path());
        return resolved(candidate, scenario.source(), path, scenario.temperatureKelvin());
    }

    private static Design resolved(Candidate candidate, Source source, List<PathElement> path, double kelvin) {
        Device device = candidate.device();
        CurrentRange free =
                new CurrentRange(LEAST_AMPS, "least current tried", GREATEST_AMPS, "greatest current tried");
        if (device.ratedAmps().isPresent()) {
            free = free.atMost(device.ratedAmps().getAsDouble(), "current rating of " + device.id());
        }
        DoubleFunction<Stage> stage;
        List<String> defaults;
        switch (device.kind()) {
            case BIPOLAR -> {
                Device.Resolved<BipolarModel> resolved = device.bipolar();
                stage = amps -> candidate.plan().with(new BiasedBipolar(resolved.model(), amps, kelvin));
                defaults = resolved.defaultsUsed();
                free = withinGainPoints(device, free);
            }
            case JFET -> {
                Device.Resolved<JfetModel> resolved = device.jfet();
                stage = amps -> candidate.plan().with(new BiasedJfet(resolved.model(), amps, kelvin));
                defaults = resolved.defaultsUsed();
                free = free.atMost(resolved.model().law().saturationAmps(), "typical IDSS of " + device.id());
            }
            case AMPLIFIER -> {
                Device.Resolved<AmplifierModel> resolved = device.amplifier();
                stage = amps -> new AmplifierStage(resolved.model());
                defaults = resolved.defaultsUsed();
            }
            default -> throw new IllegalStateException("unknown kind of device: " + device.kind());
        }
        return new Design(candidate, source, path, stage, asked(candidate, free), defaults, kelvin);
    }

    /** The gain curve is continued for one decade beyond its points; a search does not leave that. */
    private static CurrentRange withinGainPoints(Device device, CurrentRange range) {
        return device.currentGain()
                .filter(gain -> gain.points().size() > 1)
                .map(gain -> {
                    double first = gain.points().get(0).currentAmps();
                    double last = gain.points().get(gain.points().size() - 1).currentAmps();
                    String why = "one decade beyond the published current gain of " + device.id();
                    return range.atLeast(first / CONTINUED_FACTOR, why).atMost(last * CONTINUED_FACTOR, why);
                })
                .orElse(range);
    }

    private static CurrentRange asked(Candidate candidate, CurrentRange free) {
        if (!(candidate.current() instanceof CurrentChoice.Optimum)) {
            return free;
        }
        CurrentChoice.Optimum optimum = (CurrentChoice.Optimum) candidate.current();
        CurrentRange range = free;
        OptionalDouble from = optimum.fromAmps();
        OptionalDouble to = optimum.toAmps();
        String why = "range given in the scenario";
        if (from.isPresent()) {
            range = range.atLeast(from.getAsDouble(), why);
        }
        return to.isPresent() ? range.atMost(to.getAsDouble(), why) : range;
    }

    /** The front end at a quiescent current of each device, A. */
    public FrontEnd at(double amps) {
        return new FrontEnd(source, path, stage.apply(amps));
    }

    /** This design behind another source. */
    public Design withSource(Source other) {
        return new Design(candidate, other, path, stage, range, defaultsUsed, kelvin);
    }

    /** This design with an open value chosen. */
    public Design with(OpenValue open, double value) {
        if (open instanceof OpenValue.Count) {
            StagePlan plan = candidate.plan();
            return withPlan(new StagePlan(plan.arrangement(), (int) Math.rint(value), plan.around(), plan.pair()));
        }
        List<PathElement> changed = new ArrayList<>(path);
        for (int k = 0; k < changed.size(); k++) {
            PathElement element = changed.get(k);
            if (open instanceof OpenValue.Ratio ratio && element.name().equals(ratio.element())) {
                changed.set(k, ratio.set(element, value));
            } else if (open instanceof OpenValue.Resistance ohms
                    && element.name().equals(ohms.element())) {
                changed.set(k, ohms.set(element, value));
            }
        }
        return new Design(candidate, source, changed, stage, range, defaultsUsed, kelvin);
    }

    /** This design with another device of the same kind. */
    public Design withDevice(Device device) {
        Candidate changed = new Candidate(
                candidate.name(), device, candidate.plan(), candidate.current(), candidate.path(), candidate.open());
        return resolved(changed, source, path, kelvin);
    }

    /** This design with another stage plan around the same device. */
    public Design withPlan(StagePlan plan) {
        Candidate changed = new Candidate(
                candidate.name(), candidate.device(), plan, candidate.current(), candidate.path(), candidate.open());
        return resolved(changed, source, path, kelvin);
    }

    /** This design with one element of its path replaced. */
    public Design withElement(int index, PathElement element) {
        List<PathElement> changed = new ArrayList<>(path);
        changed.set(index, element);
        return new Design(candidate, source, changed, stage, range, defaultsUsed, kelvin);
    }

    /** This design with currents of each device limited to at most {@code amps}, A. */
    public Design atMost(double amps, String reason) {
        return new Design(candidate, source, path, stage, range.atMost(amps, reason), defaultsUsed, kelvin);
    }

    /** How many devices carry the current, both sides of a pair counted. */
    public int deviceCount() {
        StagePlan plan = candidate.plan();
        return plan.arrangement().isPair() ? 2 * plan.inParallel() : plan.inParallel();
    }
}
