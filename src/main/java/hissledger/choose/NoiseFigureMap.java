package hissledger.choose;

import hissledger.circuit.CoilSource;
import hissledger.circuit.FrontEnd;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.Source;
import hissledger.device.DeviceKind;
import hissledger.ledger.BandWalk;
import hissledger.physics.Band;
import hissledger.physics.Constants;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * The noise figure of one candidate over source resistance and current: unweighted, over the band, re T₀ = 290 K. The
 * resistance of the source is varied, everything else of the scenario stays.
 *
 * @param scenario the question
 * @param candidate the candidate
 * @param noiseFigure NF in dB over source resistance in Ω (across) and current of each device in A (up)
 * @param ridge the best current for each resistance of the map, A: least unweighted EIN, so least NF
 * @param ridgeDecibels NF at those currents, dB
 * @param working the scenario's own source and the candidate's own current; empty where the source is no resistor and no coil
 * @param steps rows at round resistances, for tables
 * @param stepAmps the currents of these rows, A
 */
public record NoiseFigureMap(
        Scenario scenario,
        Candidate candidate,
        Surface noiseFigure,
        List<Double> ridge,
        List<Double> ridgeDecibels,
        Optional<WorkingPoint> working,
        List<Step> steps,
        List<Double> stepAmps) {
    /** Resistances of the usual map. */
    public static final int USUAL_RESISTANCES = 160;

    /** Currents of the usual map. */
    public static final int USUAL_CURRENTS = 120;

    private static final double[] DIGITS = {1.0, 2.0, 5.0};
    private static final double ROUNDING = 1e-9;
    private static final double DECADE = 10.0;
    /** So many columns of currents stand side by side in a table. */
    private static final int MOST_STEP_CURRENTS = 9;
    /** A range of currents narrower than this factor is one current. */
    private static final double LEAST_SPAN = 1.01;

    /**
     * Where the scenario stands.
     *
     * @param ohms source resistance, Ω
     * @param amps current of each device, A
     * @param noiseFigureDecibels NF there, dB
     */
    public record WorkingPoint(double ohms, double amps, double noiseFigureDecibels) {}

    /**
     * One resistance of a table.
     *
     * @param ohms source resistance, Ω
     * @param bestAmps best current of each device, A
     * @param bestDecibels NF there, dB
     * @param decibels NF at each current of the table, dB
     */
    public record Step(double ohms, double bestAmps, double bestDecibels, List<Double> decibels) {
        public Step {
            decibels = List.copyOf(decibels);
        }
    }

    public NoiseFigureMap {
        ridge = List.copyOf(ridge);
        ridgeDecibels = List.copyOf(ridgeDecibels);
        steps = List.copyOf(steps);
        stepAmps = List.copyOf(stepAmps);
    }

    /** The usual map, on all cores. */
    public static NoiseFigureMap of(Scenario scenario, Candidate candidate, double fromOhms, double toOhms) {
        return of(
                scenario,
                candidate,
                fromOhms,
                toOhms,
                USUAL_RESISTANCES,
                USUAL_CURRENTS,
                Runtime.getRuntime().availableProcessors());
    }

    /**
     * A map of given size. The result does not depend on the threads.
     *
     * @throws IllegalArgumentException if the candidate has no current to vary
     * @throws java.util.concurrent.CancellationException if the calling thread is interrupted
     */
    public static NoiseFigureMap of(
            Scenario scenario,
            Candidate candidate,
            double fromOhms,
            double toOhms,
            int resistances,
            int currents,
            int threads) {
        Design design = Design.of(scenario, candidate);
        requireACurrent(design);
        List<Double> ohms = Regions.logarithmic(fromOhms, toOhms, resistances);
        List<Double> rounds = Regions.steps(fromOhms, toOhms);
        List<Double> amps = Arrays.stream(
                        new Band(design.range().fromAmps(), design.range().toAmps()).logarithmicHertz(currents))
                .boxed()
                .toList();
        List<Double> stepAmps = stepAmps(design.range());
        List<Step> all = Workers.map(ohms.size() + rounds.size(), threads, k -> {
            boolean onMap = k < ohms.size();
            double at = onMap ? ohms.get(k) : rounds.get(k - ohms.size());
            return step(design, at, scenario.band(), onMap ? amps : stepAmps);
        });
        List<Step> columns = all.subList(0, ohms.size());
        return new NoiseFigureMap(
                scenario,
                candidate,
                Surface.of(ohms, amps, (k, j) -> columns.get(k).decibels().get(j)),
                columns.stream().map(Step::bestAmps).toList(),
                columns.stream().map(Step::bestDecibels).toList(),
                working(design, scenario.band()),
                all.subList(ohms.size(), all.size()),
                stepAmps);
    }

    private static void requireACurrent(Design design) {
        String name = "candidate \"" + design.candidate().name() + "\"";
        if (design.candidate().device().kind() == DeviceKind.AMPLIFIER) {
            throw new IllegalArgumentException(
                    name + " is a behavioural amplifier: it has no current over which a noise figure could be drawn");
        }
        if (design.range().toAmps() < design.range().fromAmps() * LEAST_SPAN) {
            throw new IllegalArgumentException(
                    name + " leaves no range of currents over which a noise figure could be drawn");
        }
    }

    private static Step step(Design design, double ohms, Band band, List<Double> amps) {
        Design moved = design.withSource(design.source().withResistance(ohms));
        double best = BestCurrent.of(moved, band, Weighting.FLAT).amps();
        BandWalk walk = BandWalk.over(moved.at(best), band);
        List<Double> decibels = new ArrayList<>();
        for (double each : amps) {
            decibels.add(decibels(walk, moved.at(each)));
        }
        return new Step(ohms, best, decibels(walk, moved.at(best)), decibels);
    }

    /** Band NF, {@code 10 lg(1 + (total − source)/(source · T₀/Ts))}, dB. */
    private static double decibels(BandWalk walk, FrontEnd frontEnd) {
        walk.walk(frontEnd);
        double source = walk.powerVoltsSquared(0, Weighting.FLAT);
        double added = walk.einVoltsSquared(Weighting.FLAT) - source;
        double standard = source
                * Constants.STANDARD_NOISE_TEMPERATURE_KELVIN
                / frontEnd.source().temperatureKelvin();
        return Decibels.ofPowerRatio(1.0 + added / standard);
    }

    private static Optional<WorkingPoint> working(Design design, Band band) {
        OptionalDouble own = ownOhms(design.source());
        if (own.isEmpty() || !(own.getAsDouble() > 0.0)) {
            return Optional.empty();
        }
        Settled settled = Settled.at(design, own.getAsDouble(), band);
        BandWalk walk = BandWalk.over(settled.frontEnd(), band);
        return Optional.of(new WorkingPoint(own.getAsDouble(), settled.amps(), decibels(walk, settled.frontEnd())));
    }

    /** The resistance of a source that is a resistor or a coil, Ω. */
    static OptionalDouble ownOhms(Source source) {
        if (source instanceof ResistorSource resistor) {
            return OptionalDouble.of(resistor.resistanceOhms());
        }
        return source instanceof CoilSource coil ? OptionalDouble.of(coil.resistanceOhms()) : OptionalDouble.empty();
    }

    /** Round currents in a range: 1, 2 and 5 of a decade, or of many decades the decades alone, A. */
    private static List<Double> stepAmps(CurrentRange range) {
        List<Double> steps = new ArrayList<>();
        List<Double> decades = new ArrayList<>();
        for (int exponent = (int) Math.floor(Math.log10(range.fromAmps()));
                exponent <= Math.log10(range.toAmps());
                exponent++) {
            for (double digit : DIGITS) {
                double amps = digit * Math.pow(DECADE, exponent);
                if (amps >= range.fromAmps() * (1.0 - ROUNDING) && amps <= range.toAmps() * (1.0 + ROUNDING)) {
                    steps.add(Math.min(range.toAmps(), Math.max(range.fromAmps(), amps)));
                    if (digit == 1.0) {
                        decades.add(steps.get(steps.size() - 1));
                    }
                }
            }
        }
        if (steps.isEmpty()) {
            return List.of(range.fromAmps(), range.toAmps());
        }
        return steps.size() > MOST_STEP_CURRENTS ? decades : steps;
    }
}
