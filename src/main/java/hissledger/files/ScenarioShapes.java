package hissledger.files;

import hissledger.circuit.Arrangement;
import hissledger.ledger.Figure;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The keys of a scenario file. */
final class ScenarioShapes {
    private ScenarioShapes() {}

    private static final Range HERTZ = Range.between(1e-3, 1e9);
    private static final Range KELVIN = Range.between(1.0, 1000.0);
    private static final int MOST_IN_PARALLEL = 1000;

    /* parts that stand in several objects */
    static final Key<String> KIND = Key.required("kind", Values.text(), "which kind of object this is");
    static final Key<String> NAME = Key.optional("name", Values.text(), "the name of its entry");
    static final Key<Double> TEMPERATURE =
            Key.optional("temperature", Values.quantity(Dimension.TEMPERATURE, KELVIN), "temperature, 1 K to 1000 K");
    static final Key<Integer> LEGS = Key.optional(
            "legs", Values.whole(1, 2), "2 where it stands once in each leg of a balanced line; 1 unless stated");
    static final Key<Double> LOSS_TANGENT =
            Key.optional("lossTangent", Values.number(Range.NOT_NEGATIVE), "loss tangent, >= 0");
    static final Key<Double> ESR = Key.optional(
            "esr", quantity(Dimension.RESISTANCE, Range.NOT_NEGATIVE), "equivalent series resistance, >= 0 ohm");
    static final Key<Double> NOISE_INDEX = Key.optional(
            "noiseIndex",
            quantity(Dimension.DECIBELS, Range.ANY),
            "noise index, dB re 1 uV/V in a decade; needs dcVoltage");
    static final Key<Double> DC_VOLTAGE = Key.optional(
            "dcVoltage", quantity(Dimension.VOLTAGE, Range.ANY), "direct voltage across it, V; needs noiseIndex");

    private static Value<Double> quantity(Dimension dimension, Range range) {
        return Values.quantity(dimension, range);
    }

    private static Value<Double> ohms() {
        return quantity(Dimension.RESISTANCE, Range.POSITIVE);
    }

    /** The source. */
    static final class SourceKeys {
        private SourceKeys() {}

        static final Key<Double> RESISTANCE = Key.required(
                "resistance", quantity(Dimension.RESISTANCE, Range.NOT_NEGATIVE), "DC resistance, >= 0 ohm");
        static final Key<Double> INDUCTANCE =
                Key.required("inductance", quantity(Dimension.INDUCTANCE, Range.NOT_NEGATIVE), "inductance, >= 0 H");
        static final Key<Double> CAPACITANCE =
                Key.required("capacitance", quantity(Dimension.CAPACITANCE, Range.POSITIVE), "capacitance, > 0 F");
        static final Key<Double> PARALLEL_RESISTANCE =
                Key.optional("parallelResistance", ohms(), "resistance across it, > 0 ohm");
        static final Key<Double> PARALLEL_CAPACITANCE = Key.optional(
                "parallelCapacitance",
                quantity(Dimension.CAPACITANCE, Range.NOT_NEGATIVE),
                "capacitance across it, >= 0 F");
        static final Key<String> FILE = Key.required(
                "file",
                Values.text(),
                "CSV beside the scenario: frequency_Hz,real_ohm,imag_ohm or frequency_Hz,magnitude_ohm,phase_deg");
        static final Key<Quantities.Parsed> SENSITIVITY = Key.optional(
                "sensitivity",
                Values.written(Dimension.SENSITIVITY, Range.POSITIVE),
                "EMF per unit of stimulus, > 0 V/Pa");
        static final Key<String> MEDIUM = Key.optional(
                "medium",
                Values.word(List.of("air", "water"), word -> word),
                "what the sound pressure of a sensitivity in V/Pa is in; air unless stated: levels in dB SPL are for air");
        static final Key<Quantities.Parsed> REFERENCE_LEVEL = Key.optional(
                "referenceLevel",
                Values.written(Dimension.REFERENCE_LEVEL, Range.POSITIVE),
                "EMF at the reference level, > 0 V; or the stimulus in the unit of the sensitivity, or in dB SPL");

        static final Map<String, Shape> SHAPES = shapes();

        private static Map<String, Shape> shapes() {
            Map<String, Shape> shapes = new LinkedHashMap<>();
            shapes.put("resistor", source("a resistor source", RESISTANCE));
            shapes.put(
                    "coil", source("a coil source", RESISTANCE, INDUCTANCE, PARALLEL_RESISTANCE, PARALLEL_CAPACITANCE));
            shapes.put("capacitor", source("a capacitor source", CAPACITANCE, LOSS_TANGENT, PARALLEL_RESISTANCE));
            shapes.put("table", source("a table source", FILE));
            return shapes;
        }

        private static Shape source(String words, Key<?>... own) {
            return Shape.of(words, KIND).with(own).with(TEMPERATURE, SENSITIVITY, MEDIUM, REFERENCE_LEVEL);
        }
    }

    /** Path elements. */
    static final class PathKeys {
        private PathKeys() {}

        static final Key<Double> OHMS = Key.required("value", ohms(), "resistance, > 0 ohm");
        static final Key<Double> FARADS =
                Key.required("value", quantity(Dimension.CAPACITANCE, Range.POSITIVE), "capacitance, > 0 F");
        static final Key<Double> HENRIES =
                Key.required("value", quantity(Dimension.INDUCTANCE, Range.POSITIVE), "inductance, > 0 H");
        static final Key<Double> SUPPLY_NOISE = Key.optional(
                "supplyNoise",
                quantity(Dimension.VOLTAGE_DENSITY, Range.NOT_NEGATIVE),
                "noise density of the supply at its far end, >= 0 V/rtHz");
        static final Key<Double> MISMATCH = Key.optional(
                "mismatch",
                quantity(Dimension.PERCENT, Range.between(0.0, 1.0)),
                "relative difference of the two legs, 0 to 100 %; needs supplyNoise and legs 2");
        static final Key<Double> LENGTH =
                Key.required("length", quantity(Dimension.LENGTH, Range.POSITIVE), "length of the cable, > 0 m");
        static final Key<Double> CAPACITANCE_PER_LENGTH = Key.required(
                "capacitancePerLength",
                quantity(Dimension.CAPACITANCE_PER_LENGTH, Range.POSITIVE),
                "capacitance between its conductors, > 0 F/m");
        static final Key<Double> RATIO =
                Key.required("ratio", Values.number(Range.POSITIVE), "secondary over primary turns, > 0");
        static final Key<Double> PRIMARY_RESISTANCE = Key.required(
                "primaryResistance",
                quantity(Dimension.RESISTANCE, Range.NOT_NEGATIVE),
                "resistance of the primary, >= 0 ohm");
        static final Key<Double> SECONDARY_RESISTANCE = Key.required(
                "secondaryResistance",
                quantity(Dimension.RESISTANCE, Range.NOT_NEGATIVE),
                "resistance of the secondary, >= 0 ohm");
        static final Key<Double> PRIMARY_INDUCTANCE = Key.optional(
                "primaryInductance",
                quantity(Dimension.INDUCTANCE, Range.POSITIVE),
                "inductance of the primary, > 0 H");
        static final Key<Double> LEAKAGE_INDUCTANCE = Key.optional(
                "leakageInductance",
                quantity(Dimension.INDUCTANCE, Range.NOT_NEGATIVE),
                "leakage inductance referred to the secondary, >= 0 H");
        static final Key<Double> CORE_LOSS_RESISTANCE =
                Key.optional("coreLossResistance", ohms(), "core loss as a resistance across the primary, > 0 ohm");
        static final Key<Double> WINDING_CAPACITANCE = Key.optional(
                "windingCapacitance",
                quantity(Dimension.CAPACITANCE, Range.NOT_NEGATIVE),
                "capacitance across the secondary, >= 0 F");
        static final Key<Double> SERIES_ARM = Key.required("series", ohms(), "series arm, > 0 ohm");
        static final Key<Double> SHUNT_ARM = Key.required("shunt", ohms(), "shunt arm across the line, > 0 ohm");

        static final Map<String, Shape> SHAPES = shapes();

        private static Map<String, Shape> shapes() {
            Map<String, Shape> shapes = new LinkedHashMap<>();
            shapes.put("series-resistor", part("a series resistor", OHMS, LEGS, NOISE_INDEX, DC_VOLTAGE));
            shapes.put(
                    "shunt-resistor",
                    part("a shunt resistor", OHMS, LEGS, NOISE_INDEX, DC_VOLTAGE, SUPPLY_NOISE, MISMATCH));
            shapes.put("series-capacitor", part("a series capacitor", FARADS, LEGS, LOSS_TANGENT, ESR));
            shapes.put("shunt-capacitor", part("a shunt capacitor", FARADS, LEGS, LOSS_TANGENT, ESR));
            shapes.put("series-inductor", part("a series inductor", HENRIES, LEGS));
            shapes.put("shunt-inductor", part("a shunt inductor", HENRIES, LEGS));
            shapes.put("cable", part("a cable", LENGTH, CAPACITANCE_PER_LENGTH));
            shapes.put(
                    "transformer",
                    part(
                            "a transformer",
                            RATIO,
                            PRIMARY_RESISTANCE,
                            SECONDARY_RESISTANCE,
                            PRIMARY_INDUCTANCE,
                            LEAKAGE_INDUCTANCE,
                            CORE_LOSS_RESISTANCE,
                            WINDING_CAPACITANCE));
            shapes.put("pad", part("a pad", SERIES_ARM, SHUNT_ARM, LEGS));
            return shapes;
        }

        private static Shape part(String words, Key<?>... own) {
            return Shape.of(words, KIND).with(own).with(NAME, TEMPERATURE);
        }
    }

    /** Candidates. */
    static final class CandidateKeys {
        private CandidateKeys() {}

        static final Key<String> NAME = Key.required("name", Values.text(), "its name, unique in the scenario");
        static final Key<String> DEVICE = Key.required("device", Values.text(), "id of a device, see devices list");
        static final Key<Arrangement> ARRANGEMENT = Key.required(
                "arrangement",
                Values.word(List.of(Arrangement.values()), Arrangement::label),
                "the circuit form: common-emitter, common-source, follower, differential-pair, single-ended-pair, "
                        + "gain-resistor-pair or amplifier");
        static final Key<Double> FROM =
                Key.optional("from", quantity(Dimension.CURRENT, Range.POSITIVE), "lower end of the search, > 0 A");
        static final Key<Double> TO =
                Key.optional("to", quantity(Dimension.CURRENT, Range.POSITIVE), "upper end of the search, > 0 A");
        static final Key<Figure> FOR = Key.optional(
                "for",
                Values.word(List.of(Figure.values()), Figure::key),
                "the figure to minimise; unless stated the first that the target limits, else einFlat");
        static final Key<Fields> OPTIMUM = Key.required(
                "optimum", Values.object(Shape.of("a search for the best current", FROM, TO, FOR)), "where to search");
        static final Shape OPEN_CURRENT = Shape.of("an open current", OPTIMUM);
        static final Value<Double> GIVEN_CURRENT = quantity(Dimension.CURRENT, Range.POSITIVE);
        static final Key<Node> CURRENT = Key.optional(
                "current",
                Values.undecided(
                        GIVEN_CURRENT, Values.word(List.of("optimum"), word -> word), Values.object(OPEN_CURRENT)),
                "quiescent current of each device, > 0 A; or \"optimum\"; or { \"optimum\": { from, to, for } }");
        static final Key<Integer> IN_PARALLEL = Key.optional(
                "inParallel",
                Values.whole(1, MOST_IN_PARALLEL),
                "devices in parallel, per side for a pair, 1 to " + MOST_IN_PARALLEL);
        static final Key<List<Located<Fields>>> PATH = Key.optional(
                "path",
                Values.list(Values.kind(PathKeys.SHAPES), 0),
                "elements of its own, after those that all share");

        static final Key<Double> UNBYPASSED = Key.optional(
                "unbypassed",
                quantity(Dimension.RESISTANCE, Range.NOT_NEGATIVE),
                "resistance without bypass, >= 0 ohm");
        static final Key<Double> LEAD_RESISTOR = Key.optional(
                "resistor",
                quantity(Dimension.RESISTANCE, Range.NOT_NEGATIVE),
                "resistor that may be bypassed, >= 0 ohm");
        static final Key<Double> BYPASS =
                Key.optional("bypass", quantity(Dimension.CAPACITANCE, Range.POSITIVE), "bypass capacitor, > 0 F");
        static final Key<Double> BYPASS_ESR = Key.optional(
                "bypassEsr",
                quantity(Dimension.RESISTANCE, Range.NOT_NEGATIVE),
                "series resistance of the bypass, >= 0 ohm");
        static final Key<Fields> COMMON_LEAD = Key.optional(
                "commonLead",
                Values.object(Shape.of("a common lead", UNBYPASSED, LEAD_RESISTOR, BYPASS, BYPASS_ESR)),
                "what stands between emitter or source and ground");

        static final Key<Double> LOAD_RESISTOR = Key.required("resistor", ohms(), "load resistor, > 0 ohm");
        static final Key<Fields> LOAD = Key.optional(
                "load",
                Values.object(Shape.of("a load", LOAD_RESISTOR, NOISE_INDEX, DC_VOLTAGE)),
                "collector or drain load; of a follower the resistor from emitter or source to the supply");

        static final Key<Double> VOLTAGE_NOISE = Key.required(
                "voltageNoise", quantity(Dimension.VOLTAGE_DENSITY, Range.NOT_NEGATIVE), "voltage noise, >= 0 V/rtHz");
        static final Key<Double> VOLTAGE_NOISE_CORNER = Key.optional(
                "voltageNoiseCorner", quantity(Dimension.FREQUENCY, Range.NOT_NEGATIVE), "its flicker corner, >= 0 Hz");
        static final Key<Double> CURRENT_NOISE = Key.optional(
                "currentNoise", quantity(Dimension.CURRENT_DENSITY, Range.NOT_NEGATIVE), "current noise, >= 0 A/rtHz");
        static final Key<Double> CURRENT_NOISE_CORNER = Key.optional(
                "currentNoiseCorner", quantity(Dimension.FREQUENCY, Range.NOT_NEGATIVE), "its flicker corner, >= 0 Hz");
        static final Key<Fields> NEXT_STAGE = Key.optional(
                "nextStage",
                Values.object(Shape.of(
                        "a next stage", VOLTAGE_NOISE, VOLTAGE_NOISE_CORNER, CURRENT_NOISE, CURRENT_NOISE_CORNER)),
                "the amplifier after the stage, across both outputs of a pair");

        static final Key<Boolean> CASCODE = Key.optional(
                "cascode", Values.flag(), "whether a cascode keeps the collector or drain still; false unless stated");
        static final Key<Double> GAIN_RESISTOR = Key.optional(
                "gainResistor", ohms(), "resistor between the emitters or sources of a gain-resistor pair, > 0 ohm");
        static final Key<Double> FEEDBACK_RESISTOR = Key.optional(
                "feedbackResistor", ohms(), "resistor from each emitter or source to its own output, > 0 ohm");
        static final Key<Double> OTHER_RESISTOR = Key.required(
                "resistor",
                quantity(Dimension.RESISTANCE, Range.NOT_NEGATIVE),
                "resistor at the other input, >= 0 ohm");
        static final Key<Fields> OTHER_SIDE = Key.optional(
                "otherSide",
                Values.object(Shape.of("the other side", OTHER_RESISTOR)),
                "the other input of a single-ended pair");

        /* values that a search may choose */
        static final Key<String> OF = Key.required("of", Values.text(), "the name of the path element");
        static final Key<Integer> LEAST_COUNT =
                Key.required("from", Values.whole(1, MOST_IN_PARALLEL), "least devices in parallel, >= 1");
        static final Key<Integer> GREATEST_COUNT =
                Key.required("to", Values.whole(1, MOST_IN_PARALLEL), "most devices in parallel");
        static final Key<Double> LEAST_RATIO =
                Key.required("from", Values.number(Range.POSITIVE), "least secondary over primary turns, > 0");
        static final Key<Double> GREATEST_RATIO =
                Key.required("to", Values.number(Range.POSITIVE), "greatest secondary over primary turns");
        static final Key<Double> LEAST_OHMS = Key.required("from", ohms(), "least resistance, > 0 ohm");
        static final Key<Double> GREATEST_OHMS = Key.required("to", ohms(), "greatest resistance");
        static final Key<Fields> OPEN_COUNT = Key.optional(
                "inParallel",
                Values.object(Shape.of("an open count", LEAST_COUNT, GREATEST_COUNT)),
                "range of the devices in parallel");
        static final Key<Fields> OPEN_RATIO = Key.optional(
                "ratio",
                Values.object(Shape.of("an open ratio", OF, LEAST_RATIO, GREATEST_RATIO)),
                "range of a transformer's ratio; its secondary resistance and leakage go with the square of the ratio");
        static final Key<Fields> OPEN_RESISTOR = Key.optional(
                "resistor",
                Values.object(Shape.of("an open resistor", OF, LEAST_OHMS, GREATEST_OHMS)),
                "range of a resistor of the path");
        static final Key<Fields> OPEN = Key.optional(
                "open",
                Values.object(Shape.of("open values", OPEN_COUNT, OPEN_RATIO, OPEN_RESISTOR)),
                "values that the verb optimum chooses; other verbs take them as they are stated");

        static final Shape SHAPE = Shape.of(
                "a candidate",
                NAME,
                DEVICE,
                ARRANGEMENT,
                CURRENT,
                IN_PARALLEL,
                PATH,
                COMMON_LEAD,
                LOAD,
                NEXT_STAGE,
                CASCODE,
                GAIN_RESISTOR,
                FEEDBACK_RESISTOR,
                OTHER_SIDE,
                OPEN);
    }

    /** The scenario itself. */
    static final class ScenarioKeys {
        private ScenarioKeys() {}

        static final Key<String> SCHEMA = Key.optional("$schema", Values.text(), "for editors; not read");
        static final Key<String> TITLE = Key.required("title", Values.text(), "the title of every result");
        static final Key<String> NOTE = Key.optional("note", Values.text(), "free text");
        static final Key<Double> BAND_FROM =
                Key.required("from", quantity(Dimension.FREQUENCY, HERTZ), "lower edge, 1 mHz to 1 GHz");
        static final Key<Double> BAND_TO =
                Key.required("to", quantity(Dimension.FREQUENCY, HERTZ), "upper edge, above the lower");
        static final Key<Fields> BAND = Key.optional(
                "band",
                Values.object(Shape.of("a band", BAND_FROM, BAND_TO)),
                "band of the sums; 20 Hz to 20 kHz unless stated");
        static final Key<List<Located<Double>>> SPOTS = Key.optional(
                "spots",
                Values.list(quantity(Dimension.FREQUENCY, HERTZ), 1),
                "frequencies of the printed densities; 100 Hz, 1 kHz, 10 kHz unless stated");
        static final Key<Double> TOTAL_CURRENT = Key.optional(
                "totalCurrent", quantity(Dimension.CURRENT, Range.POSITIVE), "greatest current of all devices, > 0 A");
        static final Key<Double> SUPPLY = Key.optional(
                "supply", quantity(Dimension.VOLTAGE, Range.POSITIVE), "supply voltage, > 0 V; for the power");
        static final Key<Double> POWER = Key.optional(
                "power",
                quantity(Dimension.POWER, Range.POSITIVE),
                "greatest power of all devices at the supply, > 0 W");
        static final Key<Quantities.Parsed> HEADROOM = Key.optional(
                "headroom",
                Values.written(Dimension.LEVEL, Range.POSITIVE),
                "least EMF at 1 kHz before 1 % of the stage's lowest harmonic, V, dBu or dBV");
        static final Key<Double> INPUT_CAPACITANCE = Key.optional(
                "inputCapacitance",
                quantity(Dimension.CAPACITANCE, Range.POSITIVE),
                "greatest input capacitance of the stage at 1 kHz, > 0 F");
        static final Key<Fields> SEARCH_LIMITS = Key.optional(
                "limits",
                Values.object(
                        Shape.of("the limits of a search", TOTAL_CURRENT, SUPPLY, POWER, HEADROOM, INPUT_CAPACITANCE)),
                "what the verb optimum must respect");
        static final Map<Figure, Key<Quantities.Parsed>> LIMITS = limits();
        static final Key<Fields> TARGET = Key.optional(
                "target", Values.object(new Shape("a target", List.copyOf(LIMITS.values()))), "limits to be met");
        static final Key<Fields> SOURCE = Key.required("source", Values.kind(SourceKeys.SHAPES), "the transducer");
        static final Key<List<Located<Fields>>> PATH = Key.optional(
                "path",
                Values.list(Values.kind(PathKeys.SHAPES), 0),
                "passive elements from the source toward the stage, shared by all candidates");
        static final Key<List<Located<Fields>>> CANDIDATES = Key.required(
                "candidates",
                Values.list(Values.object(CandidateKeys.SHAPE), 1),
                "ways to build the stage, at least one");

        static final Shape SHAPE = Shape.of(
                "a scenario",
                SCHEMA,
                TITLE,
                NOTE,
                TEMPERATURE,
                BAND,
                SPOTS,
                TARGET,
                SEARCH_LIMITS,
                SOURCE,
                PATH,
                CANDIDATES);

        private static Map<Figure, Key<Quantities.Parsed>> limits() {
            Map<Figure, Key<Quantities.Parsed>> limits = new LinkedHashMap<>();
            for (Figure figure : Figure.values()) {
                limits.put(
                        figure,
                        figure.isEin()
                                ? Key.optional(
                                        figure.key(),
                                        Values.written(Dimension.LEVEL, Range.POSITIVE),
                                        "greatest " + figure.words() + ", dBu, dBV or V")
                                : Key.optional(
                                        figure.key(),
                                        Values.written(Dimension.DECIBELS, Range.ANY),
                                        "greatest " + figure.words() + ", dB"));
            }
            return limits;
        }
    }
}
