package hissledger.choose;

import hissledger.circuit.Source;
import hissledger.ledger.BandWalk;
import hissledger.physics.Band;
import hissledger.physics.Weighting;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.IntStream;

/**
 * EIN of a candidate against source resistance, at its own best current wherever its current is left open.
 *
 * @param evaluation the candidate
 * @param resistanceOhms source resistances, Ω, rising
 * @param einVolts EIN at them, V rms at the EMF
 */
public record ResistanceSweep(Evaluation evaluation, List<Double> resistanceOhms, List<Double> einVolts) {
    /** Least source resistance looked at, Ω. */
    public static final double LEAST_OHMS = 1.0;

    /** Greatest source resistance looked at, Ω. */
    public static final double GREATEST_OHMS = 10e6;

    public ResistanceSweep {
        resistanceOhms = List.copyOf(resistanceOhms);
        einVolts = List.copyOf(einVolts);
    }

    /** Sweeps a candidate over given source resistances, Ω, on all cores. */
    public static ResistanceSweep of(
            Scenario scenario, Evaluation evaluation, List<Double> resistanceOhms, Weighting weighting) {
        List<Double> ein = resistanceOhms.parallelStream()
                .map(ohms -> einVolts(scenario, evaluation, ohms, weighting))
                .toList();
        return new ResistanceSweep(evaluation, resistanceOhms, ein);
    }

    /** Source resistances equally spaced on a logarithmic axis from least to greatest, Ω. */
    public static List<Double> grid(int pointsPerDecade) {
        Band span = new Band(LEAST_OHMS, GREATEST_OHMS);
        int decades = (int) Math.round(Math.log10(GREATEST_OHMS / LEAST_OHMS));
        double[] ohms = span.logarithmicHertz(decades * pointsPerDecade + 1);
        return IntStream.range(0, ohms.length).mapToObj(k -> ohms[k]).toList();
    }

    /** EIN of a candidate at one source resistance, V rms. */
    public static double einVolts(Scenario scenario, Evaluation evaluation, double ohms, Weighting weighting) {
        Source source = scenario.source().withResistance(ohms);
        Design design = evaluation.design().withSource(source);
        double amps = evaluation.optimum().isPresent()
                ? BestCurrent.of(design, scenario.band(), weighting).amps()
                : evaluation.amps();
        BandWalk walk = BandWalk.over(design.at(amps), scenario.band());
        walk.walk(design.at(amps));
        return Math.sqrt(walk.einVoltsSquared(weighting));
    }

    /** The source noise alone at the same resistances, V rms: the floor. */
    public static List<Double> floorVolts(
            Scenario scenario, Evaluation evaluation, List<Double> resistanceOhms, Weighting weighting) {
        List<Double> floor = new ArrayList<>();
        for (double ohms : resistanceOhms) {
            Design design = evaluation.design().withSource(scenario.source().withResistance(ohms));
            BandWalk walk = BandWalk.over(design.at(evaluation.amps()), scenario.band());
            walk.walk(design.at(evaluation.amps()));
            floor.add(Math.sqrt(walk.powerVoltsSquared(0, weighting)));
        }
        return floor;
    }
}
