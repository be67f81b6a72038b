package hissledger.choose;

import hissledger.circuit.Arrangement;
import hissledger.circuit.CommonLead;
import hissledger.circuit.Pad;
import hissledger.circuit.Passive;
import hissledger.circuit.PathElement;
import hissledger.circuit.SeriesElement;
import hissledger.circuit.ShuntElement;
import hissledger.circuit.StagePlan;
import hissledger.circuit.Surroundings;
import hissledger.circuit.Transformer;
import hissledger.device.DeviceKind;
import hissledger.physics.ExcessNoise;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalInt;

/**
 * A candidate with its bias network put in. The last single shunt resistor of the candidate's own path is taken for the bias
 * resistor and replaced; where there is none, one is added at the end. A bipolar stage needs a capacitor that keeps direct
 * current of the base out of the source: the last series capacitor with no direct path to ground behind it; where there is
 * none, one is added before the bias resistor.
 */
final class BiasedStage {
    /** Noise index of the resistors that carry direct current, dB re 1 µV/V: metal film, IEC 60195 by secondary texts. */
    static final double NOISE_INDEX_DECIBELS = -20.0;

    private static final double NOISE_INDEX = ExcessNoise.indexFromDecibels(NOISE_INDEX_DECIBELS);
    private static final String BIAS = "bias";
    private static final String COUPLING = "bias coupling";

    private final Scenario scenario;
    private final Candidate candidate;
    private final OptionalInt biasAt;
    private final OptionalInt couplingAt;
    private final boolean couplingShared;

    BiasedStage(Scenario scenario, Candidate candidate) {
        this.scenario = scenario;
        this.candidate = candidate;
        List<PathElement> own = candidate.path();
        int bias = -1;
        for (int k = 0; k < own.size(); k++) {
            if (own.get(k) instanceof ShuntElement shunt
                    && shunt.legs() == 1
                    && shunt.part() instanceof Passive.Resistor) {
                bias = k;
            }
        }
        biasAt = bias < 0 ? OptionalInt.empty() : OptionalInt.of(bias);
        int coupling = blocking(own, bias);
        boolean direct = coupling < 0 && leads(own, bias, 0);
        couplingAt = coupling < 0 ? OptionalInt.empty() : OptionalInt.of(coupling);
        couplingShared = coupling < 0 && !direct && blocking(scenario.path(), -1) >= 0;
    }

    /** The last series capacitor behind which nothing but the bias resistor leads direct current to ground; -1 for none. */
    private static int blocking(List<PathElement> path, int bias) {
        int found = -1;
        for (int k = 0; k < path.size(); k++) {
            if (path.get(k) instanceof SeriesElement series && series.part() instanceof Passive.Capacitor) {
                found = k;
            }
        }
        return found >= 0 && leads(path, bias, found + 1) ? -1 : found;
    }

    private static boolean leads(List<PathElement> path, int bias, int from) {
        for (int k = from; k < path.size(); k++) {
            PathElement element = path.get(k);
            boolean shunts = element instanceof ShuntElement shunt && !(shunt.part() instanceof Passive.Capacitor);
            if (k != bias && (shunts || element instanceof Transformer || element instanceof Pad)) {
                return true;
            }
        }
        return false;
    }

    boolean isBipolar() {
        return candidate.device().kind() == DeviceKind.BIPOLAR;
    }

    boolean isFollower() {
        return candidate.plan().arrangement() == Arrangement.FOLLOWER;
    }

    /** Whether a coupling capacitor of the candidate's own is to be chosen. */
    boolean choosesCoupling() {
        return isBipolar() && !couplingShared;
    }

    /** Whether a bypass capacitor is to be chosen. */
    boolean choosesBypass() {
        return !isFollower();
    }

    /** Where in the own path the bias resistor stood; empty where one is added at the end. */
    OptionalInt biasAt() {
        return biasAt;
    }

    /** Where in the own path the coupling capacitor stood; empty where none did. */
    OptionalInt couplingAt() {
        return choosesCoupling() ? couplingAt : OptionalInt.empty();
    }

    /** The resistance of the bias resistor that the candidate states, Ω; 0 where there is none. */
    double statedBiasOhms() {
        if (biasAt.isEmpty()) {
            return 0.0;
        }
        ShuntElement shunt = (ShuntElement) candidate.path().get(biasAt.getAsInt());
        return ((Passive.Resistor) shunt.part()).ohms();
    }

    /** Part of the common lead that stays unbypassed, Ω. */
    double unbypassedOhms() {
        return isFollower() ? 0.0 : candidate.plan().around().commonLead().unbypassedOhms();
    }

    /**
     * The candidate with its network.
     *
     * @param network the resistors
     * @param point their quiescent point
     * @param supplyVolts V
     * @param bypassFarads across the emitter or source resistor, F
     * @param couplingFarads of the own coupling capacitor, F
     */
    Candidate with(
            BiasNetwork network, OperatingPoint point, double supplyVolts, double bypassFarads, double couplingFarads) {
        List<PathElement> path = new ArrayList<>(candidate.path());
        ShuntElement bias = bias(network, point, supplyVolts);
        if (couplingAt().isPresent()) {
            SeriesElement stated = (SeriesElement) path.get(couplingAt().getAsInt());
            Passive.Capacitor part = (Passive.Capacitor) stated.part();
            path.set(
                    couplingAt().getAsInt(),
                    new SeriesElement(
                            stated.name(),
                            new Passive.Capacitor(couplingFarads, part.lossTangent(), part.seriesOhms()),
                            stated.legs(),
                            stated.temperatureKelvin()));
        }
        int at = biasAt.orElse(path.size());
        if (biasAt.isPresent()) {
            path.set(at, bias);
        } else {
            path.add(bias);
        }
        if (choosesCoupling() && couplingAt.isEmpty()) {
            path.add(
                    at,
                    new SeriesElement(COUPLING, Passive.Capacitor.of(couplingFarads), 1, scenario.temperatureKelvin()));
        }
        return candidate(path, around(network, point, bypassFarads), point.amps());
    }

    /** The candidate with noiseless bias: no bias resistor, emitter or source at ground, no excess noise of the load. */
    Candidate ideal(BiasNetwork network, OperatingPoint point, double couplingFarads) {
        List<PathElement> path =
                new ArrayList<>(with(network, point, 0.0, 0.0, couplingFarads).path());
        path.removeIf(element -> element.name().equals(biasName()) && element instanceof ShuntElement);
        Surroundings stated = candidate.plan().around();
        double loadOhms = isFollower() ? network.leadOhms() : network.loadOhms();
        Surroundings around = new Surroundings(
                isFollower() ? CommonLead.grounded() : CommonLead.of(network.unbypassedOhms()),
                Optional.of(Passive.Resistor.of(loadOhms)),
                stated.nextStage(),
                stated.cascode());
        return candidate(path, around, point.amps());
    }

    private Candidate candidate(List<PathElement> path, Surroundings around, double amps) {
        StagePlan plan = candidate.plan();
        return new Candidate(
                candidate.name(),
                candidate.device(),
                new StagePlan(plan.arrangement(), plan.inParallel(), around, plan.pair()),
                new CurrentChoice.Given(amps),
                path);
    }

    private String biasName() {
        return biasAt.isPresent() ? candidate.path().get(biasAt.getAsInt()).name() : BIAS;
    }

    /** Two resistors with excess currents {@code NI V/R} each as one: the voltage that gives it the same excess current. */
    private ShuntElement bias(BiasNetwork network, OperatingPoint point, double supplyVolts) {
        double parallel = network.parallelOhms();
        if (!network.hasDivider()) {
            return new ShuntElement(biasName(), Passive.Resistor.of(parallel), 1, scenario.temperatureKelvin());
        }
        double baseVolts = point.baseVolts();
        double upperAmps = (supplyVolts - baseVolts) / network.upperOhms();
        double lowerAmps = baseVolts / network.lowerOhms();
        return new ShuntElement(
                biasName(),
                new Passive.Resistor(parallel, NOISE_INDEX, parallel * Math.hypot(upperAmps, lowerAmps)),
                1,
                scenario.temperatureKelvin());
    }

    private Surroundings around(BiasNetwork network, OperatingPoint point, double bypassFarads) {
        Surroundings stated = candidate.plan().around();
        if (isFollower()) {
            return new Surroundings(
                    CommonLead.grounded(),
                    Optional.of(new Passive.Resistor(network.leadOhms(), NOISE_INDEX, point.leadVolts())),
                    stated.nextStage(),
                    stated.cascode());
        }
        CommonLead lead = stated.commonLead();
        return new Surroundings(
                new CommonLead(
                        lead.unbypassedOhms(),
                        network.leadOhms(),
                        bypassFarads,
                        bypassFarads > 0.0 ? lead.bypassSeriesOhms() : 0.0),
                Optional.of(new Passive.Resistor(network.loadOhms(), NOISE_INDEX, point.loadVolts())),
                stated.nextStage(),
                stated.cascode());
    }
}
