package hissledger.choose;

import hissledger.circuit.PathElement;
import hissledger.circuit.Source;
import hissledger.physics.Band;
import hissledger.physics.Require;
import java.util.List;

/**
 * One design question.
 *
 * @param title its title
 * @param note free text; may be empty
 * @param temperatureKelvin temperature of path and stage, K; &gt; 0
 * @param band the band over which noise is integrated
 * @param spotsHertz the frequencies at which densities are printed, Hz
 * @param target limits to be met
 * @param source the transducer
 * @param path passive elements from the source toward the stage, shared by all candidates
 * @param candidates at least one
 * @param limits what a search must respect
 */
public record Scenario(
        String title,
        String note,
        double temperatureKelvin,
        Band band,
        List<Double> spotsHertz,
        Target target,
        Source source,
        List<PathElement> path,
        List<Candidate> candidates,
        Limits limits) {
    /** Temperature where a scenario states none, K. */
    public static final double USUAL_KELVIN = 300.0;

    public Scenario {
        Require.positive("temperatureKelvin", temperatureKelvin, "K");
        spotsHertz = List.copyOf(spotsHertz);
        path = List.copyOf(path);
        candidates = List.copyOf(candidates);
        if (candidates.isEmpty()) {
            throw new IllegalArgumentException("a scenario needs at least one candidate");
        }
    }

    /** A scenario without limits to a search. */
    public Scenario(
            String title,
            String note,
            double temperatureKelvin,
            Band band,
            List<Double> spotsHertz,
            Target target,
            Source source,
            List<PathElement> path,
            List<Candidate> candidates) {
        this(title, note, temperatureKelvin, band, spotsHertz, target, source, path, candidates, Limits.none());
    }

    /** This scenario with another source. */
    public Scenario withSource(Source other) {
        return new Scenario(title, note, temperatureKelvin, band, spotsHertz, target, other, path, candidates, limits);
    }

    /** This scenario with some of its candidates. */
    public Scenario withCandidates(List<Candidate> chosen) {
        return new Scenario(title, note, temperatureKelvin, band, spotsHertz, target, source, path, chosen, limits);
    }

    /** This scenario with another path. */
    public Scenario withPath(List<PathElement> other) {
        return new Scenario(
                title, note, temperatureKelvin, band, spotsHertz, target, source, other, candidates, limits);
    }
}
