package hissledger.files;

import hissledger.choose.BiasDesign;
import hissledger.choose.Candidate;
import hissledger.circuit.CommonLead;
import hissledger.circuit.Passive;
import hissledger.circuit.PathElement;
import hissledger.circuit.SeriesElement;
import hissledger.circuit.ShuntElement;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalInt;

/** Writes a scenario in which one candidate has its bias network; all else is as in the file it came from. */
public final class BiasFile {
    /** Far finer than any resistor, so that the account of the file is the account of the design. */
    private static final int DIGITS = 9;

    private static final double INDEX_REFERENCE = 1e-6;

    private BiasFile() {}

    /** Refuses a target that exists, before anything is computed. */
    public static void check(Path target) throws InputException {
        if (Files.exists(target)) {
            throw InputException.of(target.toString(), "exists already and is left as it is; choose another name");
        }
    }

    /**
     * Writes the scenario.
     *
     * @param from the file of the scenario
     * @param target the file to write; must not exist
     * @param outcome the design
     */
    public static void write(Path from, Path target, BiasDesign.Outcome outcome) throws InputException {
        check(target);
        Map<String, Object> tree = object(JsonIn.tree(from.toString(), JsonIn.bytes(from)));
        tree.remove("$schema");
        if (tree.get("source") instanceof Map<?, ?> source && source.get("file") instanceof String file) {
            Map<String, Object> moved = new LinkedHashMap<>();
            source.forEach((key, value) -> moved.put(String.valueOf(key), value));
            Path folder = from.toAbsolutePath().normalize().resolveSibling(file);
            Path home = target.toAbsolutePath().normalize().getParent();
            moved.put(
                    "file",
                    home == null ? folder.toString() : home.relativize(folder).toString());
            tree.put("source", moved);
        }
        List<Object> candidates = new ArrayList<>();
        if (tree.get("candidates") instanceof List<?> list) {
            for (Object each : list) {
                if (each instanceof Map<?, ?> candidate
                        && outcome.stated().name().equals(candidate.get("name"))) {
                    candidates.add(candidate(candidate, outcome));
                }
            }
        }
        tree.put("candidates", candidates);
        SafeWrite.text(target, JsonOut.text(tree));
    }

    private static Map<String, Object> candidate(Map<?, ?> stated, BiasDesign.Outcome outcome) {
        Map<String, Object> tree = new LinkedHashMap<>();
        stated.forEach((key, value) -> tree.put(String.valueOf(key), value));
        tree.remove("open");
        Candidate chosen = outcome.chosen();
        tree.put("current", text(outcome.typical().amps(), "A"));
        tree.put("path", path(tree.getOrDefault("path", List.of()), outcome));
        CommonLead lead = chosen.plan().around().commonLead();
        if (!lead.isGrounded()) {
            Map<String, Object> common = new LinkedHashMap<>();
            if (lead.unbypassedOhms() > 0.0) {
                common.put("unbypassed", text(lead.unbypassedOhms(), "ohm"));
            }
            common.put("resistor", text(lead.resistorOhms(), "ohm"));
            common.put("bypass", text(lead.bypassFarads(), "F"));
            if (lead.bypassSeriesOhms() > 0.0) {
                common.put("bypassEsr", text(lead.bypassSeriesOhms(), "ohm"));
            }
            tree.put("commonLead", common);
        }
        Map<String, Object> load = new LinkedHashMap<>();
        resistor(load, "resistor", chosen.plan().around().load().orElseThrow());
        tree.put("load", load);
        return tree;
    }

    /** The own path: elements as stated, but for the bias resistor and its coupling capacitor. */
    private static List<Object> path(Object stated, BiasDesign.Outcome outcome) {
        List<Object> old = new ArrayList<>();
        if (stated instanceof List<?> list) {
            old.addAll(list);
        }
        List<Object> path = new ArrayList<>();
        int next = 0;
        for (PathElement element : outcome.chosen().path()) {
            boolean kept = outcome.stated().path().contains(element);
            boolean replaced = !kept && (at(outcome.biasAt(), next) || at(outcome.couplingAt(), next));
            Map<String, Object> tree = new LinkedHashMap<>();
            if ((kept || replaced) && old.get(next) instanceof Map<?, ?> before) {
                before.forEach((key, value) -> tree.put(String.valueOf(key), value));
            }
            boolean inserted = !kept && element instanceof SeriesElement && !at(outcome.couplingAt(), next);
            if (inserted) {
                tree.clear();
            }
            if (!kept) {
                value(tree, element);
            }
            path.add(tree);
            next += (kept || replaced) && !inserted ? 1 : 0;
        }
        return path;
    }

    private static boolean at(OptionalInt place, int index) {
        return place.isPresent() && place.getAsInt() == index;
    }

    private static void value(Map<String, Object> tree, PathElement element) {
        if (element instanceof ShuntElement shunt && shunt.part() instanceof Passive.Resistor part) {
            tree.put("kind", "shunt-resistor");
            tree.put("name", shunt.name());
            resistor(tree, "value", part);
        } else if (element instanceof SeriesElement series && series.part() instanceof Passive.Capacitor part) {
            tree.put("kind", "series-capacitor");
            tree.put("name", series.name());
            tree.put("value", text(part.farads(), "F"));
        } else {
            throw new IllegalStateException("no part of a bias network: " + element);
        }
    }

    private static void resistor(Map<String, Object> tree, String key, Passive.Resistor part) {
        tree.put(key, text(part.ohms(), "ohm"));
        if (part.hasExcessNoise()) {
            double decibels = 20.0 * Math.log10(part.noiseIndex() / INDEX_REFERENCE);
            tree.put("noiseIndex", Quantities.brief(decibels, "dB", DIGITS));
            tree.put("dcVoltage", text(part.directVolts(), "V"));
        } else {
            tree.remove("noiseIndex");
            tree.remove("dcVoltage");
        }
    }

    private static String text(double value, String unit) {
        return Quantities.brief(value, unit, DIGITS);
    }

    private static Map<String, Object> object(Node node) {
        Map<String, Object> tree = new LinkedHashMap<>();
        for (Node.Member member : node.members()) {
            tree.put(member.name(), plain(member.value()));
        }
        return tree;
    }

    private static Object plain(Node node) {
        return switch (node.kind()) {
            case OBJECT -> object(node);
            case LIST -> node.items().stream().map(BiasFile::plain).toList();
            case NUMBER -> number(node.text());
            case FLAG -> Boolean.valueOf(node.text());
            case TEXT, NOTHING -> node.text();
        };
    }

    private static Object number(String text) {
        double value = Double.parseDouble(text);
        boolean whole = value == Math.rint(value) && Math.abs(value) <= Integer.MAX_VALUE;
        if (whole) {
            return (int) value;
        }
        return value;
    }
}
