package hissledger.choose;

import hissledger.ledger.Accounting;
import hissledger.ledger.Figure;
import hissledger.ledger.Ledger;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * A candidate computed: its current settled and its account drawn up.
 *
 * @param design the candidate in its scenario
 * @param amps quiescent current of each device, A; 0 for a behavioural amplifier, which has none
 * @param optimum the search that settled the current; empty where it was given
 * @param ledger its account
 */
public record Evaluation(Design design, double amps, Optional<BestCurrent.Optimum> optimum, Ledger ledger) {
    /** Computes a candidate of a scenario, its entries summed under a weighting. */
    public static Evaluation of(Scenario scenario, Candidate candidate, Weighting weighting) {
        Design design = Design.of(scenario, candidate);
        if (candidate.current() instanceof CurrentChoice.Optimum) {
            CurrentChoice.Optimum asked = (CurrentChoice.Optimum) candidate.current();
            BestCurrent.Optimum best =
                    BestCurrent.of(design, scenario.band(), asked.figure().weighting());
            return at(scenario, design, best.amps(), Optional.of(best), weighting);
        }
        if (candidate.current() instanceof CurrentChoice.Given) {
            return at(
                    scenario, design, ((CurrentChoice.Given) candidate.current()).amps(), Optional.empty(), weighting);
        }
        return at(scenario, design, 0.0, Optional.empty(), weighting);
    }

    private static Evaluation at(
            Scenario scenario, Design design, double amps, Optional<BestCurrent.Optimum> optimum, Weighting weighting) {
        Ledger ledger = Accounting.of(design.at(amps), scenario.band(), scenario.spotsHertz(), weighting);
        return new Evaluation(design, amps, optimum, ledger);
    }

    /** The candidate. */
    public Candidate candidate() {
        return design.candidate();
    }

    /** The candidate's name. */
    public String name() {
        return design.candidate().name();
    }

    /** The limits of a scenario that it breaks. */
    public List<Limits.Kind> broken(Limits limits) {
        return limits.brokenBy(ledger.frontEnd(), amps * design.deviceCount());
    }

    /** Margin to the target, dB: the least over all limited figures, positive where it is met; empty without a target. */
    public OptionalDouble marginDecibels(Target target) {
        double least = Double.POSITIVE_INFINITY;
        for (Map.Entry<Figure, Double> limit : target.inOrder().entrySet()) {
            OptionalDouble value = ledger.figure(limit.getKey());
            if (value.isEmpty()) {
                continue;
            }
            double margin = limit.getKey().isEin()
                    ? Decibels.ofAmplitudeRatio(limit.getValue() / value.getAsDouble())
                    : limit.getValue() - value.getAsDouble();
            least = Math.min(least, margin);
        }
        return Double.isInfinite(least) ? OptionalDouble.empty() : OptionalDouble.of(least);
    }
}
