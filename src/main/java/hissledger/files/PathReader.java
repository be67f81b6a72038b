package hissledger.files;

import hissledger.circuit.Pad;
import hissledger.circuit.Passive;
import hissledger.circuit.PathElement;
import hissledger.circuit.SeriesElement;
import hissledger.circuit.ShuntElement;
import hissledger.circuit.Supply;
import hissledger.circuit.Transformer;
import hissledger.files.ScenarioShapes.PathKeys;
import hissledger.physics.ExcessNoise;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.Set;

/** Path elements out of what was read of them. */
final class PathReader {
    private static final double NO_PART = Double.POSITIVE_INFINITY;
    private static final int DIGITS = 4;

    private PathReader() {}

    /** Names keys of a path element that do not go together. */
    static void check(List<Located<Fields>> path, Faults faults) {
        for (Located<Fields> element : path) {
            Fields fields = element.value();
            excess(fields, faults);
            both(fields, ScenarioShapes.LOSS_TANGENT, ScenarioShapes.ESR, faults);
            Optional<Located<Double>> mismatch = fields.located(PathKeys.MISMATCH);
            if (mismatch.isPresent()) {
                boolean legs = fields.get(ScenarioShapes.LEGS, 1) == 2;
                if (fields.get(PathKeys.SUPPLY_NOISE).isEmpty() || !legs) {
                    faults.at(
                            mismatch.get().node(),
                            "has a meaning only with supplyNoise and \"legs\": 2; add them or remove it");
                }
            } else if (fields.get(PathKeys.SUPPLY_NOISE).isPresent() && fields.get(ScenarioShapes.LEGS, 1) == 2) {
                faults.at(
                        fields.located(PathKeys.SUPPLY_NOISE).orElseThrow().node(),
                        "reaches a balanced line only through a mismatch of its legs; add \"mismatch\", like \"1 %\"");
            }
        }
    }

    /** Noise index and direct voltage belong together. */
    static void excess(Fields fields, Faults faults) {
        Optional<Located<Double>> index = fields.located(ScenarioShapes.NOISE_INDEX);
        Optional<Located<Double>> volts = fields.located(ScenarioShapes.DC_VOLTAGE);
        if (index.isPresent() != volts.isPresent()) {
            Node node =
                    index.isPresent() ? index.get().node() : volts.orElseThrow().node();
            faults.at(
                    node,
                    index.isPresent()
                            ? "makes excess noise only with the direct voltage across the resistor; add dcVoltage"
                            : "makes excess noise only with a noise index of the resistor; add noiseIndex");
        }
    }

    private static void both(Fields fields, Key<Double> one, Key<Double> other, Faults faults) {
        Optional<Located<Double>> second = fields.located(other);
        if (fields.get(one).isPresent() && second.isPresent()) {
            faults.at(
                    second.get().node(),
                    "says the losses of the capacitor a second time beside " + one.name() + "; keep one of the two");
        }
    }

    /** The elements; names that are not stated or not unique are made so, and entered in {@code taken}. */
    static List<PathElement> elements(List<Located<Fields>> path, double kelvin, Set<String> taken) {
        List<PathElement> elements = new ArrayList<>();
        for (Located<Fields> located : path) {
            elements.add(element(located.value(), kelvin, taken));
        }
        return elements;
    }

    private static PathElement element(Fields fields, double usualKelvin, Set<String> taken) {
        String kind = fields.need(ScenarioShapes.KIND);
        double kelvin = fields.get(ScenarioShapes.TEMPERATURE, usualKelvin);
        int legs = fields.get(ScenarioShapes.LEGS, 1);
        String name = unique(fields.get(ScenarioShapes.NAME).orElseGet(() -> usualName(kind, fields)), taken);
        return switch (kind) {
            case "series-resistor" -> new SeriesElement(name, resistor(fields), legs, kelvin);
            case "shunt-resistor" -> new ShuntElement(name, resistor(fields), legs, kelvin, supply(fields));
            case "series-capacitor" -> new SeriesElement(name, capacitor(fields), legs, kelvin);
            case "shunt-capacitor" -> new ShuntElement(name, capacitor(fields), legs, kelvin);
            case "series-inductor" -> new SeriesElement(name, inductor(fields), legs, kelvin);
            case "shunt-inductor" -> new ShuntElement(name, inductor(fields), legs, kelvin);
            case "cable" ->
                new ShuntElement(
                        name,
                        Passive.Capacitor.of(
                                fields.need(PathKeys.LENGTH) * fields.need(PathKeys.CAPACITANCE_PER_LENGTH)),
                        1,
                        kelvin);
            case "transformer" ->
                new Transformer(
                        name,
                        fields.need(PathKeys.RATIO),
                        fields.need(PathKeys.PRIMARY_RESISTANCE),
                        fields.need(PathKeys.SECONDARY_RESISTANCE),
                        fields.get(PathKeys.PRIMARY_INDUCTANCE, NO_PART),
                        fields.get(PathKeys.LEAKAGE_INDUCTANCE, 0.0),
                        fields.get(PathKeys.CORE_LOSS_RESISTANCE, NO_PART),
                        fields.get(PathKeys.WINDING_CAPACITANCE, 0.0),
                        kelvin);
            case "pad" ->
                new Pad(name, fields.need(PathKeys.SERIES_ARM), fields.need(PathKeys.SHUNT_ARM), legs, kelvin);
            default -> throw new IllegalStateException("no element for " + kind);
        };
    }

    private static Passive.Resistor resistor(Fields fields) {
        return resistor(fields, fields.need(PathKeys.OHMS));
    }

    /** A resistor with the excess noise that its object states. */
    static Passive.Resistor resistor(Fields fields, double ohms) {
        double index = fields.get(ScenarioShapes.NOISE_INDEX)
                .map(ExcessNoise::indexFromDecibels)
                .orElse(0.0);
        return new Passive.Resistor(ohms, index, fields.get(ScenarioShapes.DC_VOLTAGE, 0.0));
    }

    private static Passive.Capacitor capacitor(Fields fields) {
        return new Passive.Capacitor(
                fields.need(PathKeys.FARADS),
                fields.get(ScenarioShapes.LOSS_TANGENT, 0.0),
                fields.get(ScenarioShapes.ESR, 0.0));
    }

    private static Passive.Inductor inductor(Fields fields) {
        return new Passive.Inductor(fields.need(PathKeys.HENRIES));
    }

    private static Optional<Supply> supply(Fields fields) {
        return fields.get(PathKeys.SUPPLY_NOISE).map(noise -> new Supply(noise, fields.get(PathKeys.MISMATCH, 0.0)));
    }

    private static String usualName(String kind, Fields fields) {
        String words = kind.replace('-', ' ');
        if (fields.get(PathKeys.OHMS).isPresent()) {
            return words + " " + Quantities.brief(fields.need(PathKeys.OHMS), "Ω", DIGITS);
        }
        if (fields.get(PathKeys.FARADS).isPresent()) {
            return words + " " + Quantities.brief(fields.need(PathKeys.FARADS), "F", DIGITS);
        }
        if (fields.get(PathKeys.HENRIES).isPresent()) {
            return words + " " + Quantities.brief(fields.need(PathKeys.HENRIES), "H", DIGITS);
        }
        return words;
    }

    private static String unique(String name, Set<String> taken) {
        String candidate = name;
        for (int number = 2; !taken.add(candidate); number++) {
            candidate = name + " (" + number + ")";
        }
        return candidate;
    }
}
