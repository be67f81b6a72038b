package hissledger.choose;

import hissledger.circuit.CoilSource;
import hissledger.circuit.FrontEnd;
import hissledger.circuit.Pad;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.Transformer;
import hissledger.device.BipolarModel;
import hissledger.device.DeviceKind;
import hissledger.ledger.BandWalk;
import hissledger.physics.Band;
import hissledger.physics.Decibels;
import hissledger.physics.Thermal;
import hissledger.physics.Weighting;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.stream.IntStream;

/**
 * The joint choice of current, devices in parallel, transformer ratio and resistors.
 *
 * <p>Counts are tried one by one. For each, the continuous values are scanned on a logarithmic grid over their whole ranges; the
 * best points of the grid are then closed in on by a compass search whose steps halve. Wherever a value is tried, the current is
 * at its own best ({@link BestCurrent}, exact), within what the limits leave. The search is deterministic, and global as far as
 * the grid resolves the minima.
 */
public final class OpenSearch {
    private static final int GRID = 16;
    private static final int STARTS = 3;
    /** Compass steps end here in ln of a value: results are printed to three digits. */
    private static final double LEAST_STEP = 1e-4;

    private static final double EDGE_STEP = 1e-3;
    private static final int CURRENTS_PER_DECADE = 8;

    /** A limit is not relaxed by more than this many factors of two. */
    private static final double MOST_OCTAVES = 64.0;

    private static final double OCTAVE_STEP = 0.005;
    /** Digits of a relaxed limit. */
    private static final int DIGITS = 3;

    private final Design start;
    private final Limits limits;
    private final Band band;
    private final Weighting weighting;
    private final List<OpenValue> continuous;
    private final Optional<OpenValue.Count> count;

    private OpenSearch(Scenario scenario, Candidate candidate, Weighting weighting) {
        this.start = Design.of(scenario, candidate);
        this.limits = scenario.limits();
        this.band = scenario.band();
        this.weighting = weighting;
        this.continuous = candidate.open().stream()
                .filter(open -> !(open instanceof OpenValue.Count))
                .toList();
        this.count = candidate.open().stream()
                .filter(OpenValue.Count.class::isInstance)
                .map(OpenValue.Count.class::cast)
                .findFirst();
    }

    /** The same search under other limits. */
    private OpenSearch(OpenSearch other, Limits limits) {
        this.start = other.start;
        this.limits = limits;
        this.band = other.band;
        this.weighting = other.weighting;
        this.continuous = other.continuous;
        this.count = other.count;
    }

    /**
     * One complete choice.
     *
     * @param design the candidate with its open values chosen
     * @param values the chosen values
     * @param amps current of each device, A
     * @param einVolts EIN over the band under the weighting, V rms
     */
    public record Choice(Design design, Map<OpenValue, Double> values, double amps, double einVolts) {
        public Choice {
            values = new LinkedHashMap<>(values);
        }
    }

    /**
     * The range of a value within which the EIN stays within 0.1 dB of the best, the others at their best.
     *
     * @param from lower end
     * @param to upper end
     * @param heldBelow whether the lower end is that of its range
     * @param heldAbove whether the upper end is that of its range
     */
    public record Zone(double from, double to, boolean heldBelow, boolean heldAbove) {}

    /**
     * The outcome.
     *
     * @param best the best choice
     * @param currentSearch how flat the current is there; empty where it was given
     * @param zones the flat zone of each open value but the count
     * @param byCount the best choice of every count, in rising order; one entry where the count is not open
     */
    public record Outcome(
            Choice best,
            Optional<BestCurrent.Optimum> currentSearch,
            Map<OpenValue, Zone> zones,
            List<Choice> byCount) {
        public Outcome {
            zones = new LinkedHashMap<>(zones);
            byCount = List.copyOf(byCount);
        }
    }

    /**
     * Searches a candidate's open values.
     *
     * @throws ImpossibleLimitsException where the limits leave no design at all; it says what would help
     */
    public static Outcome of(Scenario scenario, Candidate candidate, Weighting weighting) {
        return new OpenSearch(scenario, candidate, weighting).search();
    }

    private Outcome search() {
        List<Choice> byCount = counts().parallel()
                .mapToObj(this::ofCount)
                .flatMap(Optional::stream)
                .toList();
        if (byCount.isEmpty()) {
            throw refusal();
        }
        Choice best = byCount.stream()
                .min(Comparator.comparingDouble(Choice::einVolts))
                .orElseThrow();
        Map<OpenValue, Zone> zones = new LinkedHashMap<>();
        continuous.forEach(open -> zones.put(open, zone(best, open)));
        Optional<BestCurrent.Optimum> current = start.candidate().current() instanceof CurrentChoice.Optimum
                ? Optional.of(BestCurrent.of(limited(best.design()).orElseThrow(), band, weighting))
                : Optional.empty();
        return new Outcome(best, current, zones, byCount);
    }

    private ImpossibleLimitsException refusal() {
        Map<Limits.Kind, Optional<Double>> relief = new EnumMap<>(Limits.Kind.class);
        for (Limits.Kind kind : Limits.Kind.values()) {
            limits.of(kind).ifPresent(stated -> relief.put(kind, relaxed(kind, stated)));
        }
        return new ImpossibleLimitsException(relief);
    }

    /** The strictest value of one limit that leaves a choice while the others stay, to three digits; empty where none does. */
    private Optional<Double> relaxed(Limits.Kind kind, double stated) {
        if (!new OpenSearch(this, limits.with(kind, OptionalDouble.empty())).isPossible()) {
            return Optional.empty();
        }
        double bad = 0.0;
        double good = 1.0;
        while (!isPossibleAt(kind, relaxedBy(good, kind, stated))) {
            bad = good;
            good *= 2.0;
            if (good > MOST_OCTAVES) {
                return Optional.empty();
            }
        }
        while (good - bad > OCTAVE_STEP) {
            double middle = 0.5 * (good + bad);
            if (isPossibleAt(kind, relaxedBy(middle, kind, stated))) {
                good = middle;
            } else {
                bad = middle;
            }
        }
        RoundingMode outward = kind.isLeast() ? RoundingMode.FLOOR : RoundingMode.CEILING;
        return Optional.of(BigDecimal.valueOf(relaxedBy(good, kind, stated))
                .round(new MathContext(DIGITS, outward))
                .doubleValue());
    }

    private static double relaxedBy(double octaves, Limits.Kind kind, double stated) {
        return stated * Math.pow(2.0, kind.isLeast() ? -octaves : octaves);
    }

    private boolean isPossibleAt(Limits.Kind kind, double value) {
        return new OpenSearch(this, limits.with(kind, OptionalDouble.of(value))).isPossible();
    }

    /** Whether any choice that the search tries respects the limits. */
    private boolean isPossible() {
        return counts().parallel().anyMatch(devices -> {
            Design counted = count.isPresent() ? start.with(count.get(), devices) : start;
            return grid().stream().anyMatch(point -> {
                Design design = counted;
                for (int d = 0; d < point.length; d++) {
                    design = design.with(continuous.get(d), Math.exp(clamp(continuous.get(d), point[d])));
                }
                return design.candidate().current() instanceof CurrentChoice.Optimum
                        ? limited(design).isPresent()
                        : allowedAsGiven(design);
            });
        });
    }

    private IntStream counts() {
        int stated = start.candidate().plan().inParallel();
        return IntStream.rangeClosed(
                count.map(OpenValue.Count::least).orElse(stated),
                count.map(OpenValue.Count::greatest).orElse(stated));
    }

    private static double givenAmps(Design design) {
        return design.candidate().current() instanceof CurrentChoice.Given given ? given.amps() : 0.0;
    }

    private boolean allowedAsGiven(Design design) {
        double amps = givenAmps(design);
        return amps * design.deviceCount() <= limits.mostAmps() && allowed(design.at(amps));
    }

    private Optional<Choice> ofCount(int devices) {
        Design counted = count.isPresent() ? start.with(count.get(), devices) : start;
        Map<OpenValue, Double> fixed = new LinkedHashMap<>();
        count.ifPresent(open -> fixed.put(open, (double) devices));
        if (continuous.isEmpty()) {
            return choice(counted, fixed, new double[0]);
        }
        List<double[]> grid = grid();
        List<Choice> scanned = new ArrayList<>();
        for (double[] point : grid) {
            choice(counted, fixed, point).ifPresent(scanned::add);
        }
        scanned.sort(Comparator.comparingDouble(Choice::einVolts));
        return scanned.stream()
                .limit(STARTS)
                .map(choice -> compass(counted, fixed, choice))
                .min(Comparator.comparingDouble(Choice::einVolts));
    }

    /** Logarithms of the continuous values at every point of the grid. */
    private List<double[]> grid() {
        List<double[]> points = new ArrayList<>();
        points.add(new double[continuous.size()]);
        for (int d = 0; d < continuous.size(); d++) {
            double from = Math.log(continuous.get(d).from());
            double to = Math.log(continuous.get(d).to());
            List<double[]> wider = new ArrayList<>();
            for (double[] point : points) {
                for (int k = 0; k < GRID; k++) {
                    double[] next = point.clone();
                    next[d] = from + (to - from) * k / (GRID - 1);
                    wider.add(next);
                }
            }
            points = wider;
        }
        return points;
    }

    private Choice compass(Design counted, Map<OpenValue, Double> fixed, Choice from) {
        Choice best = from;
        double[] at = continuous.stream()
                .mapToDouble(open -> Math.log(from.values().getOrDefault(open, open.from())))
                .toArray();
        double[] step = continuous.stream()
                .mapToDouble(open -> Math.log(open.to() / open.from()) / (GRID - 1))
                .toArray();
        while (IntStream.range(0, step.length).anyMatch(d -> step[d] > LEAST_STEP)) {
            boolean moved = false;
            for (int d = 0; d < step.length; d++) {
                for (int direction : new int[] {-1, 1}) {
                    double[] tried = at.clone();
                    tried[d] = clamp(continuous.get(d), at[d] + direction * step[d]);
                    Optional<Choice> choice = choice(counted, fixed, tried);
                    if (choice.isPresent() && choice.get().einVolts() < best.einVolts()) {
                        best = choice.get();
                        at = tried;
                        moved = true;
                    }
                }
            }
            if (!moved) {
                for (int d = 0; d < step.length; d++) {
                    step[d] *= 0.5;
                }
            }
        }
        return best;
    }

    private static double clamp(OpenValue open, double logarithm) {
        return Math.max(Math.log(open.from()), Math.min(Math.log(open.to()), logarithm));
    }

    private Optional<Choice> choice(Design counted, Map<OpenValue, Double> fixed, double[] logarithms) {
        Design design = counted;
        Map<OpenValue, Double> values = new LinkedHashMap<>(fixed);
        for (int d = 0; d < logarithms.length; d++) {
            OpenValue open = continuous.get(d);
            double value = Math.max(open.from(), Math.min(open.to(), Math.exp(logarithms[d])));
            design = design.with(open, value);
            values.put(open, value);
        }
        return settled(design, values);
    }

    /** A design at its best current, or at the given one where that respects the limits. */
    private Optional<Choice> settled(Design design, Map<OpenValue, Double> values) {
        double amps = givenAmps(design);
        if (design.candidate().current() instanceof CurrentChoice.Optimum) {
            Optional<Design> limited = limited(design);
            if (limited.isEmpty()) {
                return Optional.empty();
            }
            amps = BestCurrent.of(limited.get(), band, weighting).amps();
        } else if (!allowedAsGiven(design)) {
            return Optional.empty();
        }
        FrontEnd frontEnd = design.at(amps);
        BandWalk walk = BandWalk.over(frontEnd, band);
        walk.walk(frontEnd);
        return Optional.of(new Choice(design, values, amps, Math.sqrt(walk.einVoltsSquared(weighting))));
    }

    /**
     * A design whose range of currents respects the limits: the longest stretch of allowed currents, found on a grid and its
     * ends halved; empty where no current is allowed.
     */
    private Optional<Design> limited(Design design) {
        double most = limits.mostAmps() / design.deviceCount();
        if (most < design.range().fromAmps()) {
            return Optional.empty();
        }
        Design capped = design.atMost(most, "current or power limit of the scenario");
        if (limits.headroomVolts().isEmpty() && limits.inputFarads().isEmpty()) {
            return Optional.of(capped);
        }
        double from = Math.log(capped.range().fromAmps());
        double to = Math.log(capped.range().toAmps());
        int points = 2 + (int) Math.ceil((to - from) / Math.log(10.0) * CURRENTS_PER_DECADE);
        int bestFirst = -1;
        int bestLast = -2;
        int first = -1;
        for (int k = 0; k <= points; k++) {
            boolean good = k < points && allowed(capped.at(Math.exp(from + (to - from) * k / (points - 1))));
            if (good && first < 0) {
                first = k;
            } else if (!good && first >= 0) {
                if (k - 1 - first > bestLast - bestFirst) {
                    bestFirst = first;
                    bestLast = k - 1;
                }
                first = -1;
            }
        }
        if (bestFirst < 0) {
            return Optional.empty();
        }
        double step = (to - from) / (points - 1);
        CurrentRange range = capped.range();
        double low = bestFirst == 0
                ? range.fromAmps()
                : range.clamp(Math.exp(boundary(capped, from + bestFirst * step, -step)));
        double high = bestLast == points - 1
                ? range.toAmps()
                : range.clamp(Math.exp(boundary(capped, from + bestLast * step, step)));
        String reason = "headroom or input capacitance limit of the scenario";
        Design cut = capped.atMost(high, reason);
        return Optional.of(new Design(
                cut.candidate(),
                cut.source(),
                cut.path(),
                cut.stage(),
                cut.range().atLeast(low, reason),
                cut.defaultsUsed(),
                cut.kelvin()));
    }

    /** The last allowed ln I between an allowed one and its neighbour that is not. */
    private double boundary(Design design, double allowedLog, double step) {
        double good = allowedLog;
        double width = step;
        while (Math.abs(width) > EDGE_STEP) {
            width *= 0.5;
            if (allowed(design.at(Math.exp(good + width)))) {
                good += width;
            }
        }
        return good;
    }

    /** Whether headroom and input capacitance are kept; the current is limited by its range. */
    private boolean allowed(FrontEnd frontEnd) {
        return limits.brokenBy(frontEnd, 0.0).isEmpty();
    }

    /** How far one value may move from the best before the EIN has risen by 0.1 dB, the others and the current at their best. */
    private Zone zone(Choice best, OpenValue open) {
        double at = Math.log(best.values().getOrDefault(open, open.from()));
        double low = edge(best, open, at, Math.log(open.from()));
        double high = edge(best, open, at, Math.log(open.to()));
        boolean atFrom = low <= Math.log(open.from()) + EDGE_STEP;
        boolean atTo = high >= Math.log(open.to()) - EDGE_STEP;
        return new Zone(atFrom ? open.from() : Math.exp(low), atTo ? open.to() : Math.exp(high), atFrom, atTo);
    }

    private double edge(Choice best, OpenValue open, double at, double end) {
        if (within(best, open, end)) {
            return end;
        }
        double good = at;
        double bad = end;
        while (Math.abs(bad - good) > EDGE_STEP) {
            double middle = 0.5 * (good + bad);
            if (within(best, open, middle)) {
                good = middle;
            } else {
                bad = middle;
            }
        }
        return good;
    }

    private boolean within(Choice best, OpenValue open, double logarithm) {
        Optional<Choice> moved = settled(best.design().with(open, Math.exp(logarithm)), best.values());
        return moved.isPresent()
                && moved.get().einVolts() <= best.einVolts() * Decibels.toAmplitudeRatio(BestCurrent.FLAT_DECIBELS);
    }

    /**
     * The closed form of the best current of a bare bipolar transistor at a resistive source, {@code VT √hFE/(Rs + rbb')}, with the
     * pair's and parallel devices' rule: each of N in parallel takes 1/N of it with rbb'/N, each half of a pair sees Rs/2.
     *
     * <p>Source: T. C. Carusone, D. A. Johns, K. Martin, <cite>Analog Integrated Circuit Design</cite>, 2nd ed., section 9.4.2
     * (by course notes).
     *
     * @return A; empty where the device is no bipolar transistor, the source is no resistor or coil, or a transformer or pad
     *     stands between them
     */
    public static OptionalDouble closedFormAmps(Choice choice) {
        double ohms;
        if (choice.design().source() instanceof ResistorSource resistor) {
            ohms = resistor.resistanceOhms();
        } else if (choice.design().source() instanceof CoilSource coil) {
            ohms = coil.resistanceOhms();
        } else {
            return OptionalDouble.empty();
        }
        Candidate candidate = choice.design().candidate();
        boolean transformed = choice.design().path().stream()
                .anyMatch(element -> element instanceof Transformer || element instanceof Pad);
        if (candidate.device().kind() != DeviceKind.BIPOLAR || choice.amps() == 0.0 || transformed) {
            return OptionalDouble.empty();
        }
        BipolarModel model = candidate.device().bipolar().model();
        int devices = candidate.plan().inParallel();
        double seen = candidate.plan().arrangement().isPair() ? 0.5 * ohms : ohms;
        double total = Thermal.voltageVolts(choice.design().kelvin())
                * Math.sqrt(model.currentGain().at(choice.amps()))
                / (seen + model.baseResistanceOhms() / devices);
        return OptionalDouble.of(total / devices);
    }
}
