package hissledger.choose;

import hissledger.circuit.FrontEnd;
import hissledger.device.BipolarModel;
import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.device.GainCurve;
import hissledger.device.GainSheet;
import hissledger.device.Parameter;
import hissledger.device.SquareLaw;
import hissledger.ledger.BandWalk;
import hissledger.physics.Band;
import hissledger.physics.Constants;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.OptionalInt;

/**
 * Resistors and capacitors of preferred values that give a single stage its quiescent current.
 *
 * <p>All networks on a grid of preferred values whose worst case keeps the wanted headroom are tried. Of those whose EIN lies
 * within 0.1 dB of the least, the one with the steadiest current is taken, then the one with the fewest different values. The
 * grid takes at most {@value #MOST_LEADS} emitter resistors and {@value #MOST_LOWER} lower divider resistors, evenly from the
 * series; the upper one and the load follow from these. The worst cases are the two ends: every tolerance that raises the
 * current together, and every one that lowers it.
 */
public final class BiasDesign {
    /** Networks whose EIN is this near the least are equally quiet, dB. */
    public static final double NEAR_BEST_DECIBELS = 0.1;

    /** Least temperature of the operating range, K: 0 °C. */
    public static final double COLD_KELVIN = Constants.ZERO_CELSIUS_KELVIN;

    /** Greatest temperature of the operating range, K: 50 °C. */
    public static final double HOT_KELVIN = Constants.ZERO_CELSIUS_KELVIN + 50.0;

    /** Least voltage across the emitter resistor, V: below it the current follows VBE too closely (common practice). */
    private static final double LEAST_LEAD_VOLTS = 0.2;

    /** Greatest part of the supply across the emitter resistor; a follower takes more (common practice). */
    private static final double GREATEST_LEAD_PART = 0.4;

    private static final double GREATEST_FOLLOWER_PART = 0.7;
    private static final int MOST_LEADS = 12;
    private static final int MOST_LOWER = 30;
    private static final int MOST_LOADS = 3;
    /** The typical current may miss the wanted one by this part, or by the tolerance of the resistors if that is more. */
    private static final double NEAR_CURRENT = 0.05;
    /** Currents that spread by amounts closer than this are equally steady. */
    private static final double SAME_SPREAD = 0.005;
    /** Direct voltage that gate leakage may make across a gate resistor at 50 °C, V (common practice). */
    private static final double LEAKAGE_VOLTS = 0.05;

    private static final double GREATEST_GATE_OHMS = 1e9;
    private static final double GREATEST_SUPPLY_VOLTS = 1000.0;
    private static final double SUPPLY_STEP_VOLTS = 0.1;
    private static final double SUPPLY_GROWTH = 1.05;
    /** A capacitor that lets everything pass, F. */
    private static final double SHORT_FARADS = 1e6;

    private static final double LEAST_FARADS = 1e-10;
    private static final double GREATEST_FARADS = 1.0;
    private static final double HALF_POWER_DECIBELS = Decibels.ofPowerRatio(2.0);

    private final Scenario scenario;
    private final BiasRequest request;
    private final BiasedStage stage;
    private final Candidate candidate;
    private final double wantedAmps;
    private final CurrentRange range;
    private final int count;
    private final List<Corner> corners;

    /** A device at one end of production. */
    private interface Corner {
        OperatingPoint solve(BiasNetwork network, double kelvin, double supplyVolts);
    }

    /**
     * A quiescent point with the conditions it holds under.
     *
     * @param words the conditions
     * @param point the point
     */
    public record Case(String words, OperatingPoint point) {}

    /**
     * A capacitor with what asked for it.
     *
     * @param farads its value, F
     * @param name what it is
     * @param reason which demand asked for more
     */
    public record Capacitor(String name, double farads, String reason) {}

    /**
     * A finished design.
     *
     * @param scenario the scenario
     * @param stated the candidate as the scenario states it
     * @param chosen the candidate with its network
     * @param request what was asked for
     * @param wantedAmps the wanted current of each device, A
     * @param network the resistors
     * @param cases quiescent points, typical first, the two worst last
     * @param capacitors those chosen
     * @param evaluation its account
     * @param idealVolts EIN with noiseless bias, V rms
     * @param tried how many networks kept the headroom
     * @param nearBest how many of them were within 0.1 dB of the quietest
     * @param biasAt place of the replaced bias resistor in the own path; empty where one was added
     * @param couplingAt place of the replaced coupling capacitor; empty where none was
     */
    public record Outcome(
            Scenario scenario,
            Candidate stated,
            Candidate chosen,
            BiasRequest request,
            double wantedAmps,
            BiasNetwork network,
            List<Case> cases,
            List<Capacitor> capacitors,
            Evaluation evaluation,
            double idealVolts,
            int tried,
            int nearBest,
            OptionalInt biasAt,
            OptionalInt couplingAt) {
        public Outcome {
            cases = List.copyOf(cases);
            capacitors = List.copyOf(capacitors);
        }

        /** EIN over the flat band, V rms. */
        public double einVolts() {
            return evaluation.ledger().totals().ein(Weighting.FLAT);
        }

        /** What the bias network costs, dB of EIN. */
        public double costDecibels() {
            return Decibels.ofAmplitudeRatio(einVolts() / idealVolts);
        }

        /** The typical quiescent point at the scenario's temperature. */
        public OperatingPoint typical() {
            return cases.get(0).point();
        }

        /** The least current of each device, A. */
        public double leastAmps() {
            return cases.get(cases.size() - 2).point().amps();
        }

        /** The greatest current of each device, A. */
        public double greatestAmps() {
            return cases.get(cases.size() - 1).point().amps();
        }

        /** The least headroom of all cases, V peak. */
        public double leastSwingVolts() {
            return cases.stream()
                    .mapToDouble(each -> each.point().swingVolts())
                    .min()
                    .orElseThrow();
        }
    }

    private record Option(BiasNetwork network, OperatingPoint typical, double spread) {}

    private record Ranked(Option option, double einVoltsSquared) {}

    private BiasDesign(
            Scenario scenario, Candidate candidate, double wantedAmps, CurrentRange range, BiasRequest request) {
        this.range = range;
        this.scenario = scenario;
        this.candidate = candidate;
        this.wantedAmps = wantedAmps;
        this.request = request;
        this.stage = new BiasedStage(scenario, candidate);
        this.count = candidate.plan().inParallel();
        this.corners = stage.isBipolar() ? bipolarCorners() : jfetCorners();
    }

    /**
     * Designs the bias network of a candidate.
     *
     * @throws IllegalArgumentException with a sentence where the candidate or the supply does not allow one
     */
    public static Outcome of(Scenario scenario, Candidate candidate, BiasRequest request) {
        if (candidate.device().kind() == DeviceKind.AMPLIFIER) {
            throw new IllegalArgumentException(
                    candidate.device().id() + " is an amplifier, which has no current to set");
        }
        if (candidate.plan().arrangement().isPair()) {
            throw new IllegalArgumentException(
                    "a " + candidate.plan().arrangement().label()
                            + " is not designed yet; only common-emitter, common-source and follower stages are");
        }
        Design design = Design.of(scenario, candidate);
        double amps = candidate.current() instanceof CurrentChoice.Given given
                ? given.amps()
                : Evaluation.of(scenario, candidate, Weighting.FLAT).amps();
        if (candidate.device().kind() == DeviceKind.JFET) {
            double least = saturation(candidate.device()).least();
            if (amps > least) {
                throw new IllegalArgumentException(String.format(
                        Locale.ROOT,
                        "a current of %.3g mA is above the least IDSS of %s, %.3g mA, and not every one would carry it;"
                                + " state less current, more devices in parallel or another device",
                        1e3 * amps,
                        design.candidate().device().id(),
                        1e3 * least));
            }
        }
        return new BiasDesign(scenario, candidate, amps, design.range(), request).outcome();
    }

    private static Parameter saturation(Device device) {
        return device.parameter(DeviceParameter.DRAIN_SATURATION_CURRENT).orElseThrow();
    }

    private List<Corner> bipolarCorners() {
        BipolarModel model = candidate.device().bipolar().model();
        GainSheet sheet = candidate.device().currentGain().orElseThrow();
        List<Corner> list = new ArrayList<>();
        for (GainCurve gain : List.of(sheet.least(), model.currentGain(), sheet.greatest())) {
            list.add((network, kelvin, supply) ->
                    OperatingPoint.bipolar(network, count, gain, model.emitterResistanceOhms(), kelvin, supply));
        }
        return list;
    }

    /** IDSS and VGS(off) vary together; where VGS(off) has no bounds of its own it goes with √IDSS. */
    private List<Corner> jfetCorners() {
        SquareLaw law = candidate.device().jfet().model().law();
        Parameter saturation = saturation(candidate.device());
        double[] amps = {saturation.least(), law.saturationAmps(), saturation.greatest()};
        double[] volts = new double[amps.length];
        boolean bounded = candidate
                .device()
                .parameter(DeviceParameter.PINCH_OFF_VOLTAGE)
                .filter(stated -> stated.least() < stated.greatest())
                .isPresent();
        for (int k = 0; k < volts.length; k++) {
            volts[k] = law.pinchOffVolts() * Math.sqrt(amps[k] / law.saturationAmps());
        }
        if (bounded) {
            Parameter stated = candidate
                    .device()
                    .parameter(DeviceParameter.PINCH_OFF_VOLTAGE)
                    .orElseThrow();
            volts[0] = stated.least();
            volts[2] = stated.greatest();
        }
        List<Corner> list = new ArrayList<>();
        for (int k = 0; k < amps.length; k++) {
            double idss = amps[k];
            double pinchOff = volts[k];
            list.add((network, kelvin, supply) -> OperatingPoint.jfet(network, count, idss, pinchOff, supply));
        }
        return list;
    }

    private Outcome outcome() {
        List<Option> options = options(request.supplyVolts());
        if (options.isEmpty()) {
            throw new IllegalArgumentException(tooLow());
        }
        List<Ranked> ranked = ranked(options);
        double least =
                ranked.stream().mapToDouble(Ranked::einVoltsSquared).min().orElseThrow();
        double limit = least * Decibels.toPowerRatio(NEAR_BEST_DECIBELS);
        List<Ranked> near =
                ranked.stream().filter(each -> each.einVoltsSquared() <= limit).toList();
        Option best = near.stream()
                .map(Ranked::option)
                .min(Comparator.comparingLong((Option each) -> Math.round(each.spread() / SAME_SPREAD))
                        .thenComparingInt(each -> each.network().differentValues())
                        .thenComparingDouble(each -> -each.typical().swingVolts())
                        .thenComparingDouble(each -> each.network().lowerOhms())
                        .thenComparingDouble(each -> each.network().leadOhms())
                        .thenComparingDouble(each -> each.network().loadOhms()))
                .orElseThrow();
        List<Capacitor> capacitors = new ArrayList<>();
        double bypass = SHORT_FARADS;
        double coupling = SHORT_FARADS;
        int chosen = (stage.choosesBypass() ? 1 : 0) + (stage.choosesCoupling() ? 1 : 0);
        if (stage.choosesBypass()) {
            Capacitor found = capacitor("bypass", best, chosen, true);
            bypass = found.farads();
            capacitors.add(found);
        }
        if (stage.choosesCoupling()) {
            Capacitor found = capacitor("coupling", best, chosen, false);
            coupling = found.farads();
            capacitors.add(found);
        }
        Candidate finished = stage.with(best.network(), best.typical(), request.supplyVolts(), bypass, coupling);
        Evaluation evaluation = Evaluation.of(scenario, finished, Weighting.FLAT);
        FrontEnd ideal = frontEnd(stage.ideal(best.network(), best.typical(), coupling));
        BandWalk walk = BandWalk.over(ideal, scenario.band());
        walk.walk(ideal);
        return new Outcome(
                scenario,
                candidate,
                finished,
                request,
                wantedAmps,
                best.network(),
                cases(best.network()),
                capacitors,
                evaluation,
                Math.sqrt(walk.einVoltsSquared(Weighting.FLAT)),
                options.size(),
                near.size(),
                stage.biasAt(),
                stage.couplingAt());
    }

    private FrontEnd frontEnd(Candidate with) {
        return Design.of(scenario, with).at(((CurrentChoice.Given) with.current()).amps());
    }

    private List<Ranked> ranked(List<Option> options) {
        List<Ranked> ranked = new ArrayList<>();
        Band band = scenario.band();
        BandWalk walk = BandWalk.over(shorted(options.get(0)), band);
        for (Option option : options) {
            walk.walk(shorted(option));
            ranked.add(new Ranked(option, walk.einVoltsSquared(Weighting.FLAT)));
        }
        return ranked;
    }

    private FrontEnd shorted(Option option) {
        return frontEnd(
                stage.with(option.network(), option.typical(), request.supplyVolts(), SHORT_FARADS, SHORT_FARADS));
    }

    private List<Option> options(double supply) {
        return stage.isBipolar() ? bipolarOptions(supply) : jfetOptions(supply);
    }

    private List<Option> bipolarOptions(double supply) {
        ESeries series = request.series();
        double total = count * wantedAmps;
        double part = stage.isFollower() ? GREATEST_FOLLOWER_PART : GREATEST_LEAD_PART;
        List<Option> options = new ArrayList<>();
        if (supply * part <= LEAST_LEAD_VOLTS) {
            return options;
        }
        double kelvin = scenario.temperatureKelvin();
        BipolarModel model = candidate.device().bipolar().model();
        double baseAmps = wantedAmps / model.currentGain().at(wantedAmps);
        for (double lead : thinned(series.between(LEAST_LEAD_VOLTS / total, supply * part / total), MOST_LEADS)) {
            double baseVolts =
                    (wantedAmps + baseAmps) * (count * (lead + stage.unbypassedOhms()) + model.emitterResistanceOhms())
                            + OperatingPoint.baseEmitterVolts(wantedAmps, kelvin);
            if (baseVolts >= supply) {
                continue;
            }
            // the divider takes no more than the devices, nor so little that the base current rules it
            double least = baseVolts / total;
            double greatest = baseVolts / (count * baseAmps);
            for (double lower : thinned(series.between(least, greatest), MOST_LOWER)) {
                double upper = (supply - baseVolts) / (baseVolts / lower + count * baseAmps);
                for (double standard : List.of(series.notAbove(upper), series.notBelow(upper))) {
                    addLoads(options, new BiasNetwork(standard, lower, stage.unbypassedOhms(), lead, 0.0), supply);
                }
            }
        }
        return options;
    }

    private List<Option> jfetOptions(double supply) {
        ESeries series = request.series();
        SquareLaw law = candidate.device().jfet().model().law();
        double volts = law.gateSourceVolts(wantedAmps);
        double ohms = volts / (count * wantedAmps) - stage.unbypassedOhms();
        if (!(ohms > 0.0)) {
            throw new IllegalArgumentException("the unbypassed source resistance alone holds the current below what is"
                    + " wanted, or the current equals IDSS and leaves nothing for a source resistor; want less");
        }
        double gate = gateOhms();
        List<Option> options = new ArrayList<>();
        double nearest = series.nearest(ohms);
        addLoads(
                options, new BiasNetwork(Double.POSITIVE_INFINITY, gate, stage.unbypassedOhms(), nearest, 0.0), supply);
        return options;
    }

    private double gateOhms() {
        if (stage.statedBiasOhms() > 0.0) {
            return request.series().nearest(stage.statedBiasOhms());
        }
        double leakage = count * candidate.device().jfet().model().leakage().at(HOT_KELVIN);
        return request.series().notAbove(Math.min(GREATEST_GATE_OHMS, LEAKAGE_VOLTS / leakage));
    }

    /** Adds a network with the loads that keep the headroom in the worst case: the widest swing and larger ones. */
    private void addLoads(List<Option> options, BiasNetwork bare, double supply) {
        if (stage.isFollower()) {
            addIfKept(options, bare, supply);
            return;
        }
        double nearest = typical(withLoad(bare, 1.0), supply).amps();
        if (Math.abs(nearest / wantedAmps - 1.0) > nearCurrent()) {
            return;
        }
        double total = count * wantedAmps;
        List<Double> loads = request.series().between(request.headroomVolts() / total, supply / total);
        double widest = Double.NEGATIVE_INFINITY;
        int at = 0;
        for (int k = 0; k < loads.size(); k++) {
            double swing = worstSwing(withLoad(bare, loads.get(k)), supply);
            if (swing > widest) {
                widest = swing;
                at = k;
            }
        }
        List<Double> kept = new ArrayList<>();
        for (int k = at;
                k < loads.size() && worstSwing(withLoad(bare, loads.get(k)), supply) >= request.headroomVolts();
                k++) {
            kept.add(loads.get(k));
        }
        for (double load : thinned(kept, MOST_LOADS)) {
            addIfKept(options, withLoad(bare, load), supply);
        }
    }

    private double nearCurrent() {
        // one resistor alone sets the current of a JFET: half a step of the series is the best there is
        return stage.isBipolar() ? Math.max(NEAR_CURRENT, request.series().tolerance()) : Double.POSITIVE_INFINITY;
    }

    private static BiasNetwork withLoad(BiasNetwork bare, double load) {
        return new BiasNetwork(bare.upperOhms(), bare.lowerOhms(), bare.unbypassedOhms(), bare.leadOhms(), load);
    }

    private void addIfKept(List<Option> options, BiasNetwork network, double supply) {
        OperatingPoint typical = typical(network, supply);
        boolean near = Math.abs(typical.amps() / wantedAmps - 1.0) <= nearCurrent()
                && range.clamp(typical.amps()) == typical.amps();
        if (near && worstSwing(network, supply) >= request.headroomVolts()) {
            double spread =
                    (highest(network, supply).amps() - lowest(network, supply).amps()) / typical.amps();
            options.add(new Option(network, typical, spread));
        }
    }

    private OperatingPoint typical(BiasNetwork network, double supply) {
        return corners.get(1).solve(network, scenario.temperatureKelvin(), supply);
    }

    private OperatingPoint lowest(BiasNetwork network, double supply) {
        double up = 1.0 + request.tolerance();
        double down = 1.0 - request.tolerance();
        return corners.get(0).solve(network.off(up, down, up, down), COLD_KELVIN, supply);
    }

    private OperatingPoint highest(BiasNetwork network, double supply) {
        double up = 1.0 + request.tolerance();
        double down = 1.0 - request.tolerance();
        return corners.get(2).solve(network.off(down, up, down, up), HOT_KELVIN, supply);
    }

    private double worstSwing(BiasNetwork network, double supply) {
        return Math.min(
                lowest(network, supply).swingVolts(), highest(network, supply).swingVolts());
    }

    private List<Case> cases(BiasNetwork network) {
        double supply = request.supplyVolts();
        double kelvin = scenario.temperatureKelvin();
        String spread = stage.isBipolar() ? "hFE" : "IDSS and VGS(off)";
        List<Case> cases = new ArrayList<>();
        cases.add(new Case("typical", typical(network, supply)));
        cases.add(new Case(spread + " least", corners.get(0).solve(network, kelvin, supply)));
        cases.add(new Case(spread + " greatest", corners.get(2).solve(network, kelvin, supply)));
        if (stage.isBipolar()) {
            cases.add(new Case("typical at 0 °C", corners.get(1).solve(network, COLD_KELVIN, supply)));
            cases.add(new Case("typical at 50 °C", corners.get(1).solve(network, HOT_KELVIN, supply)));
        }
        cases.add(new Case("everything lowers the current", lowest(network, supply)));
        cases.add(new Case("everything raises the current", highest(network, supply)));
        return cases;
    }

    /** The sentence for a supply that leaves no network, with the least one that does. */
    private String tooLow() {
        double asked = request.supplyVolts();
        for (double supply = asked; supply < GREATEST_SUPPLY_VOLTS; supply = raised(supply)) {
            if (!options(supply).isEmpty()) {
                double least = supply;
                while (least - SUPPLY_STEP_VOLTS > asked
                        && !options(least - SUPPLY_STEP_VOLTS).isEmpty()) {
                    least -= SUPPLY_STEP_VOLTS;
                }
                return String.format(
                        Locale.ROOT,
                        "a supply of %.4g V is too low for %.4g mA with %.3g V of headroom in the worst case; "
                                + "at least %.1f V would do",
                        asked,
                        1e3 * count * wantedAmps,
                        request.headroomVolts(),
                        least);
            }
        }
        return String.format(
                Locale.ROOT,
                "no supply up to %.0f V gives %.4g mA with %.3g V of headroom in the worst case; want less headroom or"
                        + " tighter tolerances",
                GREATEST_SUPPLY_VOLTS,
                1e3 * count * wantedAmps,
                request.headroomVolts());
    }

    private static double raised(double supply) {
        return Math.ceil(supply * SUPPLY_GROWTH / SUPPLY_STEP_VOLTS + 1e-9) * SUPPLY_STEP_VOLTS;
    }

    /** The least capacitor of E6 that keeps its share of the response and of the noise, the other one a short circuit. */
    private Capacitor capacitor(String name, Option option, int chosen, boolean bypass) {
        double edge = request.edgeHertz().orElse(scenario.band().fromHertz());
        double fromHertz = scenario.band().fromHertz();
        double responseShort = response(option, SHORT_FARADS, bypass, edge);
        double noiseShort = noise(option, SHORT_FARADS, bypass, fromHertz);
        double forResponse = 0.0;
        double forNoise = 0.0;
        for (double farads : ESeries.E6.between(LEAST_FARADS, GREATEST_FARADS)) {
            boolean responds = Decibels.ofPowerRatio(responseShort / response(option, farads, bypass, edge))
                    <= HALF_POWER_DECIBELS / chosen;
            boolean quiet = Decibels.ofPowerRatio(noise(option, farads, bypass, fromHertz) / noiseShort)
                    <= request.penaltyDecibels() / chosen;
            forResponse = forResponse == 0.0 && responds ? farads : forResponse;
            forNoise = forNoise == 0.0 && quiet ? farads : forNoise;
            if (forResponse > 0.0 && forNoise > 0.0) {
                String reason = forNoise > forResponse ? "noise at the lower edge of the band" : "response";
                return new Capacitor(name, Math.max(forResponse, forNoise), reason);
            }
        }
        throw new IllegalArgumentException("no " + name + " capacitor up to 1 F keeps the response and the noise at the"
                + " band's lower edge; allow a greater --penalty or a higher --edge");
    }

    private FrontEnd withCapacitor(Option option, double farads, boolean bypass) {
        return frontEnd(stage.with(
                option.network(),
                option.typical(),
                request.supplyVolts(),
                bypass ? farads : SHORT_FARADS,
                bypass ? SHORT_FARADS : farads));
    }

    private double response(Option option, double farads, boolean bypass, double hertz) {
        ChainPass pass = new ChainPass(Frequencies.of(hertz));
        withCapacitor(option, farads, bypass).walk(pass);
        double re = pass.rowVoltageRe()[0];
        double im = pass.rowVoltageIm()[0];
        return 1.0 / (re * re + im * im);
    }

    private double noise(Option option, double farads, boolean bypass, double hertz) {
        ChainPass pass = new ChainPass(Frequencies.of(hertz));
        withCapacitor(option, farads, bypass).walk(pass);
        double[] total = new double[1];
        pass.total(total);
        return total[0];
    }

    /** At most so many of a list, evenly, both ends kept. */
    private static List<Double> thinned(List<Double> values, int most) {
        if (values.size() <= most) {
            return values;
        }
        List<Double> kept = new ArrayList<>();
        for (int k = 0; k < most; k++) {
            kept.add(values.get((int) Math.round((double) k * (values.size() - 1) / (most - 1))));
        }
        return kept;
    }
}
