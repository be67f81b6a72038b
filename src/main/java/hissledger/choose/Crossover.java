package hissledger.choose;

import hissledger.physics.Weighting;
import java.util.ArrayList;
import java.util.List;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The source resistances at which a bipolar and a JFET candidate are equally quiet, each at its own best current wherever
 * its current is left open, everything else of the scenario unchanged.
 *
 * @param bipolar the bipolar candidate
 * @param jfet the JFET candidate
 * @param resistanceOhms every crossing from 1 Ω to 10 MΩ, Ω, rising; empty where one of them is quieter throughout
 * @param bipolarQuieterAtLeastResistance whether the bipolar candidate is the quieter one at 1 Ω
 */
public record Crossover(
        Evaluation bipolar, Evaluation jfet, List<Double> resistanceOhms, boolean bipolarQuieterAtLeastResistance) {
    private static final int POINTS_PER_DECADE = 3;
    private static final int MOST_EVALUATIONS = 100;
    /** Crossings are printed to three digits. */
    private static final double LOG_TOLERANCE = 1e-5;

    public Crossover {
        resistanceOhms = List.copyOf(resistanceOhms);
    }

    /** Finds the crossings of two candidates under a weighting. */
    public static Crossover between(Scenario scenario, Evaluation bipolar, Evaluation jfet, Weighting weighting) {
        List<Double> grid = ResistanceSweep.grid(POINTS_PER_DECADE);
        List<Double> b = ResistanceSweep.of(scenario, bipolar, grid, weighting).einVolts();
        List<Double> j = ResistanceSweep.of(scenario, jfet, grid, weighting).einVolts();
        List<Double> crossings = new ArrayList<>();
        for (int k = 1; k < grid.size(); k++) {
            double before = Math.log(b.get(k - 1) / j.get(k - 1));
            double after = Math.log(b.get(k) / j.get(k));
            if (after == 0.0) {
                crossings.add(grid.get(k));
            }
            if (before * after >= 0.0) {
                continue;
            }
            double logOhms = new BrentSolver(LOG_TOLERANCE)
                    .solve(
                            MOST_EVALUATIONS,
                            x -> Math.log(ResistanceSweep.einVolts(scenario, bipolar, Math.exp(x), weighting)
                                    / ResistanceSweep.einVolts(scenario, jfet, Math.exp(x), weighting)),
                            Math.log(grid.get(k - 1)),
                            Math.log(grid.get(k)));
            crossings.add(Math.exp(logOhms));
        }
        return new Crossover(bipolar, jfet, crossings, b.get(0) < j.get(0));
    }
}
