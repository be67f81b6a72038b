package hissledger.choose;

import hissledger.ledger.Figure;
import hissledger.physics.Band;
import hissledger.physics.Decibels;
import hissledger.physics.Require;
import hissledger.physics.Weighting;
import hissledger.twoport.Frequencies;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.OptionalDouble;
import java.util.stream.DoubleStream;

/**
 * Which candidate is quietest over source resistance and frequency, and by how much. The resistance of the source is varied,
 * everything else of the scenario stays. Each candidate runs at the current it states or, where that is left open, at its best
 * current over the band for each resistance, by the figure that it names.
 *
 * @param scenario the question
 * @param figure the figure of the scenario's band columns: the first that its target limits, else the flat EIN
 * @param hertz the frequencies of the grid, Hz, rising over the band
 * @param columns the grid, one column a resistance, rising
 * @param steps columns at round resistances, for tables
 * @param crossovers where the best bipolar and the best JFET candidate change places: at each spot frequency, then over the
 *     band; empty where the scenario lacks one of the two kinds
 */
public record Regions(
        Scenario scenario,
        Figure figure,
        List<Double> hertz,
        List<Column> columns,
        List<Column> steps,
        List<SpotCrossover> crossovers) {
    /** Resistances, and frequencies, of the usual grid. */
    public static final int USUAL_POINTS = 200;

    private static final double[] DIGITS = {1.0, 2.0, 5.0};
    private static final double ROUNDING = 1e-9;
    private static final int FEWEST_STEPS = 3;
    private static final int STEPS_OF_A_NARROW_RANGE = 5;

    /**
     * All candidates at one source resistance, in the order of the scenario.
     *
     * @param ohms source resistance, Ω
     * @param amps current of each device of each candidate, A
     * @param gridVoltsPerRootHertz EIN density of each candidate at each frequency of the grid
     * @param spotVoltsPerRootHertz EIN density of each candidate at each spot frequency of the scenario
     * @param bandVolts EIN of each candidate over the band under the weighting of the figure, V rms
     */
    public record Column(
            double ohms,
            List<Double> amps,
            List<List<Double>> gridVoltsPerRootHertz,
            List<List<Double>> spotVoltsPerRootHertz,
            List<Double> bandVolts) {
        public Column {
            amps = List.copyOf(amps);
            gridVoltsPerRootHertz = List.copyOf(gridVoltsPerRootHertz);
            spotVoltsPerRootHertz = List.copyOf(spotVoltsPerRootHertz);
            bandVolts = List.copyOf(bandVolts);
        }

        /** Who leads at a frequency of the grid. */
        public Lead atGrid(int frequency) {
            return Lead.among(nth(gridVoltsPerRootHertz, frequency));
        }

        /** Who leads at a spot frequency of the scenario. */
        public Lead atSpot(int spot) {
            return Lead.among(nth(spotVoltsPerRootHertz, spot));
        }

        /** Who leads over the band. */
        public Lead overBand() {
            return Lead.among(bandVolts);
        }

        private static List<Double> nth(List<List<Double>> rows, int number) {
            return rows.stream().map(row -> row.get(number)).toList();
        }
    }

    /**
     * Who leads.
     *
     * @param winner the number of the quietest candidate; of equal ones the first
     * @param next the number of the next
     * @param marginDecibels by how much the winner is quieter than the next, dB; ≥ 0
     */
    public record Lead(int winner, int next, double marginDecibels) {
        private static Lead among(List<Double> ein) {
            int winner = ein.get(1) < ein.get(0) ? 1 : 0;
            int next = 1 - winner;
            for (int c = 2; c < ein.size(); c++) {
                if (ein.get(c) < ein.get(winner)) {
                    next = winner;
                    winner = c;
                } else if (ein.get(c) < ein.get(next)) {
                    next = c;
                }
            }
            return new Lead(winner, next, Decibels.ofAmplitudeRatio(ein.get(next) / ein.get(winner)));
        }
    }

    public Regions {
        hertz = List.copyOf(hertz);
        columns = List.copyOf(columns);
        steps = List.copyOf(steps);
        crossovers = List.copyOf(crossovers);
    }

    /** The regions on the usual grid, on all cores. */
    public static Regions of(Scenario scenario, double fromOhms, double toOhms) {
        return of(scenario, fromOhms, toOhms, USUAL_POINTS, Runtime.getRuntime().availableProcessors());
    }

    /**
     * The regions on a grid of {@code points} resistances and as many frequencies. The result does not depend on the threads.
     *
     * @param scenario the question; at least two candidates
     * @param fromOhms least source resistance, Ω; &gt; 0
     * @param toOhms greatest source resistance, Ω; above the least
     * @param points resistances, and frequencies; at least 2
     * @param threads at least 1
     * @throws java.util.concurrent.CancellationException if the calling thread is interrupted
     */
    public static Regions of(Scenario scenario, double fromOhms, double toOhms, int points, int threads) {
        if (scenario.candidates().size() < 2) {
            throw new IllegalArgumentException("regions need at least two candidates to choose between");
        }
        List<Double> ohms = logarithmic(fromOhms, toOhms, points);
        List<Double> rounds = steps(fromOhms, toOhms);
        double[] hertz = scenario.band().logarithmicHertz(points);
        Figure figure = Comparison.decidingFigure(scenario);
        List<Design> designs = scenario.candidates().stream()
                .map(candidate -> Design.of(scenario, candidate))
                .toList();
        Frequencies frequencies = Frequencies.of(DoubleStream.concat(
                        Arrays.stream(hertz), scenario.spotsHertz().stream().mapToDouble(Double::doubleValue))
                .toArray());
        List<Column> all = Workers.map(ohms.size() + rounds.size(), threads, k -> {
            double at = k < ohms.size() ? ohms.get(k) : rounds.get(k - ohms.size());
            return column(designs, at, scenario.band(), frequencies, points, figure.weighting());
        });
        List<Column> columns = all.subList(0, ohms.size());
        return new Regions(
                scenario,
                figure,
                Arrays.stream(hertz).boxed().toList(),
                columns,
                all.subList(ohms.size(), all.size()),
                SpotCrossover.of(scenario, designs, figure.weighting(), columns, threads));
    }

    /** Resistances equally spaced on a logarithmic axis, Ω. */
    static List<Double> logarithmic(double fromOhms, double toOhms, int points) {
        Require.positive("fromOhms", fromOhms, "Ω");
        Require.positive("toOhms", toOhms, "Ω");
        if (!(toOhms > fromOhms)) {
            throw new IllegalArgumentException(
                    "toOhms must be above fromOhms, was " + toOhms + " Ω against " + fromOhms + " Ω");
        }
        double[] ohms = new Band(fromOhms, toOhms).logarithmicHertz(points);
        return Arrays.stream(ohms).boxed().toList();
    }

    /** The resistances 1, 2 and 5 of every decade in a range, or some of the range where it holds next to none, Ω. */
    static List<Double> steps(double fromOhms, double toOhms) {
        List<Double> steps = new ArrayList<>();
        for (int decade = (int) Math.floor(Math.log10(fromOhms)); decade <= Math.log10(toOhms); decade++) {
            for (double digit : DIGITS) {
                double ohms = digit * Math.pow(10.0, decade);
                if (ohms >= fromOhms * (1.0 - ROUNDING) && ohms <= toOhms * (1.0 + ROUNDING)) {
                    steps.add(ohms);
                }
            }
        }
        return steps.size() < FEWEST_STEPS ? logarithmic(fromOhms, toOhms, STEPS_OF_A_NARROW_RANGE) : steps;
    }

    private static Column column(
            List<Design> designs, double ohms, Band band, Frequencies frequencies, int grid, Weighting weighting) {
        List<Double> amps = new ArrayList<>();
        List<List<Double>> onGrid = new ArrayList<>();
        List<List<Double>> atSpots = new ArrayList<>();
        List<Double> bandVolts = new ArrayList<>();
        for (Design design : designs) {
            Settled settled = Settled.at(design, ohms, band);
            List<Double> densities = Arrays.stream(settled.densities(frequencies))
                    .map(Math::sqrt)
                    .boxed()
                    .toList();
            amps.add(settled.amps());
            onGrid.add(List.copyOf(densities.subList(0, grid)));
            atSpots.add(List.copyOf(densities.subList(grid, densities.size())));
            bandVolts.add(Math.sqrt(settled.bandVoltsSquared(weighting)));
        }
        return new Column(ohms, amps, onGrid, atSpots, bandVolts);
    }

    /** The name of a candidate by its number. */
    public String name(int candidate) {
        return scenario.candidates().get(candidate).name();
    }

    /** Source resistances of the grid, Ω, rising. */
    public List<Double> resistanceOhms() {
        return columns.stream().map(Column::ohms).toList();
    }

    /** By how many dB the quietest candidate leads the next, over resistance and frequency. */
    public Surface margin() {
        return Surface.of(
                resistanceOhms(), hertz, (k, j) -> columns.get(k).atGrid(j).marginDecibels());
    }

    /** By how many dB a candidate is quieter than the quietest other, over resistance and frequency; negative where it loses. */
    public Surface advantage(int candidate) {
        return Surface.of(resistanceOhms(), hertz, (k, j) -> {
            List<List<Double>> densities = columns.get(k).gridVoltsPerRootHertz();
            double best = Double.POSITIVE_INFINITY;
            for (int c = 0; c < densities.size(); c++) {
                best = c == candidate ? best : Math.min(best, densities.get(c).get(j));
            }
            return Decibels.ofAmplitudeRatio(best / densities.get(candidate).get(j));
        });
    }

    /** The numbers of the candidates that are quietest somewhere on the grid, rising. */
    public List<Integer> winners() {
        boolean[] wins = new boolean[scenario.candidates().size()];
        for (Column column : columns) {
            for (int j = 0; j < hertz.size(); j++) {
                wins[column.atGrid(j).winner()] = true;
            }
        }
        List<Integer> winners = new ArrayList<>();
        for (int c = 0; c < wins.length; c++) {
            if (wins[c]) {
                winners.add(c);
            }
        }
        return winners;
    }

    /** The scenario's own source resistance, Ω; empty where its source is no resistor and no coil. */
    public OptionalDouble ownOhms() {
        return NoiseFigureMap.ownOhms(scenario.source());
    }
}
