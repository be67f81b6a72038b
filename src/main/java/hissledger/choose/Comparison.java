package hissledger.choose;

import hissledger.device.DeviceKind;
import hissledger.ledger.Figure;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * All candidates of a scenario side by side.
 *
 * @param scenario the question
 * @param figure the figure they are ranked by
 * @param ranked the candidates, quietest first
 * @param crossover where the best bipolar and the best JFET candidate change places; empty where one of them is missing
 */
public record Comparison(Scenario scenario, Figure figure, List<Evaluation> ranked, Optional<Crossover> crossover) {
    public Comparison {
        ranked = List.copyOf(ranked);
    }

    /** The figure that a scenario is decided by: the first that its target limits, else the flat EIN. */
    public static Figure decidingFigure(Scenario scenario) {
        return decidingFigure(scenario.target());
    }

    /** The figure that a target decides by: the first that it limits, else the flat EIN. */
    public static Figure decidingFigure(Target target) {
        return target.inOrder().keySet().stream().findFirst().orElse(Figure.EIN_FLAT);
    }

    /** Computes every candidate and ranks them by a figure. */
    public static Comparison of(Scenario scenario, Figure figure) {
        List<Evaluation> ranked = evaluate(scenario, figure.weighting()).stream()
                .sorted(Comparator.comparingDouble(evaluation -> rank(evaluation, figure)))
                .toList();
        Optional<Evaluation> bipolar = best(ranked, DeviceKind.BIPOLAR);
        Optional<Evaluation> jfet = best(ranked, DeviceKind.JFET);
        Optional<Crossover> crossover = bipolar.isPresent() && jfet.isPresent()
                ? Optional.of(Crossover.between(scenario, bipolar.get(), jfet.get(), figure.weighting()))
                : Optional.empty();
        return new Comparison(scenario, figure, ranked, crossover);
    }

    /** Computes every candidate, in the order of the scenario, on all cores, entries summed under a weighting. */
    public static List<Evaluation> evaluate(Scenario scenario, Weighting weighting) {
        return scenario.candidates().parallelStream()
                .map(candidate -> Evaluation.of(scenario, candidate, weighting))
                .toList();
    }

    /** The quietest candidate. */
    public Evaluation winner() {
        return ranked.get(0);
    }

    /** The quietest candidate that keeps the limits of the scenario; empty where none does. */
    public Optional<Evaluation> bestWithinLimits() {
        return ranked.stream()
                .filter(evaluation -> evaluation.broken(scenario.limits()).isEmpty())
                .findFirst();
    }

    /** By how many dB the quietest candidate leads the next under the ranking figure; empty for a single candidate. */
    public OptionalDouble leadDecibels() {
        if (ranked.size() < 2) {
            return OptionalDouble.empty();
        }
        double first = rank(ranked.get(0), figure);
        double second = rank(ranked.get(1), figure);
        return OptionalDouble.of(figure.isEin() ? Decibels.ofAmplitudeRatio(second / first) : second - first);
    }

    private static double rank(Evaluation evaluation, Figure figure) {
        OptionalDouble value = evaluation.ledger().figure(figure);
        // a figure that is not defined for this source is not defined for any candidate: EIN ranks them the same way
        return value.orElseGet(() -> evaluation.ledger().totals().ein(figure.weighting()));
    }

    private static Optional<Evaluation> best(List<Evaluation> ranked, DeviceKind kind) {
        return ranked.stream()
                .filter(evaluation -> evaluation.candidate().device().kind() == kind)
                .findFirst();
    }
}
