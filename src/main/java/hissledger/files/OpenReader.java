package hissledger.files;

import hissledger.choose.OpenValue;
import hissledger.files.ScenarioShapes.CandidateKeys;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** The open values of a candidate: what their keys say together, and the values themselves. */
final class OpenReader {
    private final Faults faults;

    OpenReader(Faults faults) {
        this.faults = faults;
    }

    /** Open values must name a part of the right kind, and their ranges must leave something to choose. */
    void check(Fields open, List<Located<Fields>> sharedPath, List<Located<Fields>> ownPath) {
        open.get(CandidateKeys.OPEN_COUNT)
                .ifPresent(range -> rising(range, CandidateKeys.LEAST_COUNT, CandidateKeys.GREATEST_COUNT));
        open.get(CandidateKeys.OPEN_RATIO).ifPresent(range -> {
            rising(range, CandidateKeys.LEAST_RATIO, CandidateKeys.GREATEST_RATIO);
            named(range, List.of(sharedPath, ownPath), List.of("transformer"));
        });
        open.get(CandidateKeys.OPEN_RESISTOR).ifPresent(range -> {
            rising(range, CandidateKeys.LEAST_OHMS, CandidateKeys.GREATEST_OHMS);
            named(range, List.of(sharedPath, ownPath), List.of("shunt-resistor", "series-resistor"));
        });
    }

    private <T extends Number> void rising(Fields range, Key<T> from, Key<T> to) {
        Optional<T> low = range.get(from);
        Optional<Located<T>> high = range.located(to);
        if (low.isPresent()
                && high.isPresent()
                && !(high.get().value().doubleValue() > low.get().doubleValue())) {
            faults.at(
                    high.get().node(),
                    "must be above from, or there is nothing to choose; was "
                            + high.get().node().quoted());
        }
    }

    private void named(Fields range, List<List<Located<Fields>>> paths, List<String> kinds) {
        Optional<Located<String>> of = range.located(CandidateKeys.OF);
        if (of.isEmpty()) {
            return;
        }
        List<String> names = new ArrayList<>();
        for (List<Located<Fields>> path : paths) {
            for (Located<Fields> element : path) {
                if (kinds.contains(element.value().get(ScenarioShapes.KIND, ""))) {
                    element.value().get(ScenarioShapes.NAME).ifPresent(names::add);
                }
            }
        }
        if (!names.contains(of.get().value())) {
            faults.at(
                    of.get().node(),
                    "names no " + String.join(" or ", kinds) + " of the path, "
                            + of.get().node().quoted()
                            + (names.isEmpty()
                                    ? "; give the part a name and use it here"
                                    : "; use one of " + String.join(", ", names)));
        }
    }

    /** The open values, once the whole file was found free of faults. */
    static List<OpenValue> values(Fields open) {
        List<OpenValue> values = new ArrayList<>();
        open.get(CandidateKeys.OPEN_COUNT)
                .ifPresent(range -> values.add(new OpenValue.Count(
                        range.need(CandidateKeys.LEAST_COUNT), range.need(CandidateKeys.GREATEST_COUNT))));
        open.get(CandidateKeys.OPEN_RATIO)
                .ifPresent(range -> values.add(new OpenValue.Ratio(
                        range.need(CandidateKeys.OF),
                        range.need(CandidateKeys.LEAST_RATIO),
                        range.need(CandidateKeys.GREATEST_RATIO))));
        open.get(CandidateKeys.OPEN_RESISTOR)
                .ifPresent(range -> values.add(new OpenValue.Resistance(
                        range.need(CandidateKeys.OF),
                        range.need(CandidateKeys.LEAST_OHMS),
                        range.need(CandidateKeys.GREATEST_OHMS))));
        return values;
    }
}
