package hissledger.report;

import hissledger.choose.BestCurrent;
import hissledger.choose.Candidate;
import hissledger.choose.ImpossibleLimitsException;
import hissledger.choose.OpenSearch;
import hissledger.choose.Scenario;
import hissledger.choose.Sensitivity;
import hissledger.files.Phrases;
import hissledger.ledger.Figure;
import hissledger.physics.Decibels;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;

/** The outcome of a search over open values as text. */
public final class OptimumText {
    private static final int MOST_SENSITIVITIES = 12;

    private OptimumText() {}

    /**
     * One candidate searched.
     *
     * @param candidate the candidate as the scenario states it
     * @param outcome what the search found
     * @param closedFormAmps VT √hFE/(Rs + rbb'), A, where it applies
     * @param sensitivities what moves the result, the strongest first
     */
    public record Searched(
            Candidate candidate,
            OpenSearch.Outcome outcome,
            OptionalDouble closedFormAmps,
            List<Sensitivity> sensitivities) {
        public Searched {
            sensitivities = List.copyOf(sensitivities);
        }
    }

    /** The whole text, lines ended by line feeds; candidates quietest first. */
    public static String of(Scenario scenario, Figure figure, List<Searched> searched) {
        StringBuilder text = new StringBuilder();
        text.append(scenario.title()).append('\n');
        Words.conditions(scenario).forEach(line -> text.append(line).append('\n'));
        text.append("Minimised: ").append(Words.ein(figure.weighting())).append(".\n");
        Words.limits(scenario.limits()).ifPresent(line -> text.append(line).append('\n'));
        text.append('\n').append(table(searched).render()).append('\n');
        for (Searched each : searched) {
            describe(text, each);
        }
        return text.toString();
    }

    /** Why the limits leave a candidate no choice, and what would help. */
    public static String refusal(ImpossibleLimitsException refused) {
        List<String> help = new ArrayList<>();
        List<String> all = new ArrayList<>();
        refused.relief().forEach((kind, value) -> {
            all.add(kind.path());
            value.ifPresent(enough -> help.add(kind.path() + " " + Phrases.value(enough, kind.unit())
                    + (kind.isLeast() ? " or less" : " or more")));
        });
        String wanted = help.isEmpty()
                ? "relaxing one alone does not help: relax several of " + String.join(", ", all)
                : "enough would be " + String.join(", or ", help);
        return "no choice of its open values and current respects " + (all.size() == 1 ? "" : "all of ")
                + String.join(", ", all) + "; " + wanted;
    }

    private static TextTable table(List<Searched> searched) {
        TextTable table = new TextTable()
                .column(TextTable.Align.LEFT, "candidate")
                .column(TextTable.Align.LEFT, "device")
                .column(TextTable.Align.POINT, "current", "of each")
                .column(TextTable.Align.POINT, "total", "current")
                .column(TextTable.Align.POINT, "EIN", "rms")
                .column(TextTable.Align.POINT, "EIN", "dBu")
                .column(TextTable.Align.LEFT, "chosen");
        for (Searched each : searched) {
            OpenSearch.Choice best = each.outcome().best();
            int count = best.design().deviceCount();
            String id = each.candidate().device().id();
            List<String> chosen = new ArrayList<>();
            best.values().forEach((open, value) -> chosen.add(open.name() + " " + Phrases.chosen(open, value)));
            table.row(
                    each.candidate().name(),
                    count == 1 ? id : id + " x" + count,
                    best.amps() > 0.0 ? Words.value(best.amps(), "A") : "-",
                    best.amps() > 0.0 ? Words.value(best.amps() * count, "A") : "-",
                    Words.value(best.einVolts(), "V"),
                    Words.dbu(best.einVolts()),
                    chosen.isEmpty() ? "-" : String.join("; ", chosen));
        }
        return table;
    }

    private static void describe(StringBuilder text, Searched each) {
        OpenSearch.Outcome outcome = each.outcome();
        text.append("[").append(each.candidate().name()).append("]\n");
        outcome.currentSearch().ifPresent(current -> line(text, current(current, each.closedFormAmps())));
        outcome.zones()
                .forEach((open, zone) -> line(
                        text,
                        open.name() + ": within 0.1 dB from " + Phrases.chosen(open, zone.from())
                                + (zone.heldBelow() ? " (end of its range)" : "") + " to "
                                + Phrases.chosen(open, zone.to())
                                + (zone.heldAbove() ? " (end of its range)" : "")
                                + ", the current at its best for each."));
        if (outcome.byCount().size() > 1) {
            List<String> counts = new ArrayList<>();
            for (OpenSearch.Choice choice : outcome.byCount()) {
                counts.add(choice.design().candidate().plan().inParallel() + ": " + Words.dbu(choice.einVolts()));
            }
            line(text, "EIN in dBu by devices in parallel: " + String.join(", ", counts) + ".");
            outcome.byCount().stream()
                    .filter(choice -> !choice.equals(outcome.best()))
                    .min(Comparator.comparingDouble(OpenSearch.Choice::einVolts))
                    .ifPresent(second -> line(
                            text,
                            "Runner-up: " + second.design().candidate().plan().inParallel() + " in parallel, "
                                    + worse(Decibels.ofAmplitudeRatio(
                                            second.einVolts() / outcome.best().einVolts()))
                                    + "."));
        }
        if (!each.sensitivities().isEmpty()) {
            line(text, "What moves it (change of EIN in dB):");
            TextTable table = new TextTable()
                    .column(TextTable.Align.LEFT, "  value")
                    .column(TextTable.Align.POINT, "for +1 %")
                    .column(TextTable.Align.POINT, "at its least")
                    .column(TextTable.Align.POINT, "at its greatest");
            each.sensitivities().stream()
                    .limit(MOST_SENSITIVITIES)
                    .forEach(sensitivity -> table.row(
                            "  " + sensitivity.name(),
                            String.format(Locale.ROOT, "%+.4f", sensitivity.perPercentDecibels()),
                            decibels(sensitivity.atLeastDecibels()),
                            decibels(sensitivity.atGreatestDecibels())));
            text.append(table.render());
        }
        text.append('\n');
    }

    private static String decibels(OptionalDouble change) {
        return change.isPresent() ? String.format(Locale.ROOT, "%+.2f", change.getAsDouble()) : "-";
    }

    private static String current(BestCurrent.Optimum current, OptionalDouble closedForm) {
        StringBuilder sentence = new StringBuilder("Current: best " + Words.value(current.amps(), "A")
                + " each; within 0.1 dB from " + Words.value(current.flatFromAmps(), "A") + " to "
                + Words.value(current.flatToAmps(), "A"));
        current.bound().ifPresent(bound -> sentence.append("; held back by: ").append(bound));
        if (closedForm.isPresent()) {
            sentence.append("; the closed form VT sqrt(hFE)/(Rs + rbb') gives ")
                    .append(Words.value(closedForm.getAsDouble(), "A"));
        }
        return sentence.append('.').toString();
    }

    private static String worse(double decibels) {
        return Words.isLevel(decibels) ? "level within 0.01 dB" : Words.decibels(decibels) + " dB worse";
    }

    private static void line(StringBuilder text, String sentence) {
        Words.wrapped(sentence).forEach(line -> text.append(line).append('\n'));
    }
}
