package hissledger.files;

import hissledger.device.Basis;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.device.NoisePoint;
import hissledger.device.Polarity;
import hissledger.device.StatedAt;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

/** The keys of a device file. */
final class DeviceShapes {
    private DeviceShapes() {}

    static final Key<String> SCHEMA = Key.optional("$schema", Values.text(), "for editors; not read");
    static final Key<String> ID = Key.required("id", Values.text(), "the file name without its ending");
    static final Key<String> KIND = Key.required("kind", Values.text(), "bipolar, jfet or amplifier");
    static final Key<String> DESCRIPTION = Key.required("description", Values.text(), "the device in one line");
    static final Key<String> EVIDENCE = Key.optional(
            "evidence",
            Values.word(List.of("A", "B", "C"), word -> word),
            "how well its noise is published: A, B or C");
    static final Key<String> NOTE = Key.optional("note", Values.text(), "findings and limits");
    static final Key<Basis> BASIS = Key.required(
            "basis",
            Values.word(List.of(Basis.values()), Basis::label),
            "where the value comes from: maker, measured, derived, practice, memory or invented");
    static final Key<String> REFERENCE = Key.optional(
            "reference",
            Values.text(),
            "title, publisher, document, or the derivation; required for maker, measured, derived");
    static final Key<String> CONDITIONS = Key.optional("conditions", Values.text(), "under which it holds");

    /* current gain */
    private static final Value<Double> GAIN = Values.number(Range.POSITIVE);
    static final Key<Double> GAIN_CURRENT =
            Key.required("current", Values.quantity(Dimension.CURRENT, Range.POSITIVE), "collector current, > 0 A");
    static final Key<Double> GAIN_MIN = Key.optional("min", GAIN, "least current gain, > 0");
    static final Key<Double> GAIN_TYPICAL = Key.optional("typical", GAIN, "typical current gain, > 0");
    static final Key<Double> GAIN_MAX = Key.optional("max", GAIN, "greatest current gain, > 0");
    static final Key<List<Located<Fields>>> POINTS = Key.required(
            "points",
            Values.list(
                    Values.object(Shape.of("a gain point", GAIN_CURRENT, GAIN_MIN, GAIN_TYPICAL, GAIN_MAX, CONDITIONS)),
                    1),
            "current gain at rising collector currents");
    static final Key<Fields> CURRENT_GAIN = Key.required(
            "currentGain",
            Values.object(Shape.of("a current gain", POINTS, BASIS, REFERENCE, CONDITIONS)),
            "current gain hFE against collector current");

    /** The keys of one parameter: its values and companions, each with its dimension. */
    static final class ParameterKeys {
        private final Key<Double> min;
        private final Key<Double> typical;
        private final Key<Double> max;
        private final Map<StatedAt, Key<Double>> companions;
        private final Key<Fields> key;

        private ParameterKeys(
                DeviceParameter parameter,
                Value<Double> value,
                boolean required,
                Map<StatedAt, Key<Double>> companions) {
            boolean induced = parameter == DeviceParameter.INDUCED_GATE_NOISE;
            min = Key.optional("min", value, "least value");
            typical = induced
                    ? Key.required("delta", value, "delta of the induced gate noise, >= 0")
                    : Key.optional("typical", value, "typical value");
            max = Key.optional("max", value, "greatest value");
            this.companions = companions;
            List<Key<?>> keys = new ArrayList<>();
            if (induced) {
                keys.add(typical);
            } else {
                keys.addAll(List.of(min, typical, max));
            }
            keys.addAll(companions.values());
            keys.addAll(List.of(BASIS, REFERENCE, CONDITIONS));
            key = new Key<>(
                    parameter.key(),
                    required,
                    Values.object(new Shape("a " + parameter.words(), keys)),
                    parameter.words());
        }

        Key<Double> min() {
            return min;
        }

        Key<Double> typical() {
            return typical;
        }

        Key<Double> max() {
            return max;
        }

        Map<StatedAt, Key<Double>> companions() {
            return companions;
        }

        Key<Fields> key() {
            return key;
        }
    }

    static final Map<DeviceParameter, ParameterKeys> PARAMETERS = parameters();

    private static Map<DeviceParameter, ParameterKeys> parameters() {
        Map<DeviceParameter, ParameterKeys> all = new EnumMap<>(DeviceParameter.class);
        for (DeviceParameter parameter : DeviceParameter.values()) {
            all.put(
                    parameter,
                    new ParameterKeys(parameter, value(parameter), needed(parameter), companions(parameter)));
        }
        return all;
    }

    /** Parameters without which no noise can be computed and for which there is no default. */
    private static boolean needed(DeviceParameter parameter) {
        return switch (parameter) {
            case BASE_RESISTANCE, DRAIN_SATURATION_CURRENT, GATE_LEAKAGE, VOLTAGE_NOISE, CURRENT_NOISE -> true;
            default -> false;
        };
    }

    private static Value<Double> value(DeviceParameter parameter) {
        Range notNegative = Range.NOT_NEGATIVE;
        return switch (parameter) {
            case BASE_RESISTANCE, EMITTER_RESISTANCE -> Values.quantity(Dimension.RESISTANCE, notNegative);
            case INPUT_RESISTANCE -> Values.quantity(Dimension.RESISTANCE, Range.POSITIVE);
            case EARLY_VOLTAGE, PINCH_OFF_VOLTAGE, COLLECTOR_EMITTER_VOLTAGE, GATE_VOLTAGE, DRAIN_SOURCE_VOLTAGE ->
                Values.quantity(Dimension.VOLTAGE, Range.POSITIVE);
            case TRANSITION_FREQUENCY -> Values.quantity(Dimension.FREQUENCY, Range.POSITIVE);
            case BASE_FLICKER_CORNER, VOLTAGE_NOISE_CORNER, CURRENT_NOISE_CORNER ->
                Values.quantity(Dimension.FREQUENCY, notNegative);
            case COLLECTOR_BASE_CAPACITANCE,
                    EMITTER_BASE_CAPACITANCE,
                    GATE_SOURCE_CAPACITANCE,
                    GATE_DRAIN_CAPACITANCE,
                    INPUT_CAPACITANCE -> Values.quantity(Dimension.CAPACITANCE, notNegative);
            case DRAIN_SATURATION_CURRENT, CURRENT -> Values.quantity(Dimension.CURRENT, Range.POSITIVE);
            case GATE_LEAKAGE -> Values.quantity(Dimension.CURRENT, notNegative);
            case TRANSCONDUCTANCE -> Values.quantity(Dimension.CONDUCTANCE, Range.POSITIVE);
            case OUTPUT_CONDUCTANCE_FACTOR -> Values.quantity(Dimension.INVERSE_VOLTAGE, notNegative);
            case FLICKER_DENSITY, VOLTAGE_NOISE -> Values.quantity(Dimension.VOLTAGE_DENSITY, notNegative);
            case CURRENT_NOISE -> Values.quantity(Dimension.CURRENT_DENSITY, notNegative);
            case POWER -> Values.quantity(Dimension.POWER, Range.POSITIVE);
            case CHANNEL_NOISE_FACTOR -> Values.number(Range.POSITIVE);
            case INDUCED_GATE_NOISE -> Values.number(notNegative);
        };
    }

    private static Map<StatedAt, Key<Double>> companions(DeviceParameter parameter) {
        List<StatedAt> wanted = switch (parameter) {
            case BASE_FLICKER_CORNER -> List.of(StatedAt.CURRENT, StatedAt.EXPONENT);
            case TRANSCONDUCTANCE -> List.of(StatedAt.CURRENT);
            case GATE_LEAKAGE -> List.of(StatedAt.TEMPERATURE, StatedAt.DOUBLING_STEP);
            case FLICKER_DENSITY -> List.of(StatedAt.FREQUENCY, StatedAt.EXPONENT);
            case INDUCED_GATE_NOISE -> List.of(StatedAt.CORRELATION);
            default -> List.of();
        };
        Map<StatedAt, Key<Double>> companions = new LinkedHashMap<>();
        wanted.forEach(at -> companions.put(at, companion(at)));
        return companions;
    }

    private static Key<Double> companion(StatedAt at) {
        return switch (at) {
            case CURRENT ->
                Key.optional(
                        at.key(),
                        Values.quantity(Dimension.CURRENT, Range.POSITIVE),
                        "collector or drain current it holds at, > 0 A");
            case TEMPERATURE ->
                Key.optional(
                        at.key(),
                        Values.quantity(Dimension.TEMPERATURE, Range.between(1.0, 1000.0)),
                        "temperature it holds at, 1 K to 1000 K");
            case DOUBLING_STEP ->
                Key.optional(
                        at.key(),
                        Values.quantity(Dimension.TEMPERATURE_STEP, Range.POSITIVE),
                        "rise that doubles it, > 0 K");
            case FREQUENCY ->
                Key.optional(
                        at.key(),
                        Values.quantity(Dimension.FREQUENCY, Range.POSITIVE),
                        "frequency it holds at, > 0 Hz");
            case EXPONENT -> Key.optional(at.key(), Values.number(Range.POSITIVE), "exponent of its law, > 0");
            case CORRELATION ->
                Key.optional(
                        at.key(),
                        Values.number(Range.between(-1.0, 1.0)),
                        "correlation with the channel noise, -1 to 1");
        };
    }

    /* published noise */
    static final Key<NoisePoint.Quantity> QUANTITY = Key.required(
            "quantity",
            Values.word(List.of(NoisePoint.Quantity.values()), NoisePoint.Quantity::key),
            "voltageNoise, currentNoise, noiseFigure or optimumResistance");
    static final Key<Double> POINT_CURRENT = Key.optional(
            "current", Values.quantity(Dimension.CURRENT, Range.POSITIVE), "collector or drain current, > 0 A");
    static final Key<Double> POINT_FREQUENCY =
            Key.required("frequency", Values.quantity(Dimension.FREQUENCY, Range.POSITIVE), "frequency, > 0 Hz");
    static final Key<Double> POINT_SOURCE = Key.optional(
            "sourceResistance",
            Values.quantity(Dimension.RESISTANCE, Range.NOT_NEGATIVE),
            "source of a noise figure, >= 0 ohm");
    private static final Value<Node> POINT_VALUE = Values.undecided(
            pointValue(NoisePoint.Quantity.VOLTAGE_NOISE),
            pointValue(NoisePoint.Quantity.CURRENT_NOISE),
            pointValue(NoisePoint.Quantity.NOISE_FIGURE),
            pointValue(NoisePoint.Quantity.OPTIMUM_RESISTANCE));
    static final Key<Node> POINT_TYPICAL =
            Key.optional("typical", POINT_VALUE, "typical value, in the unit of the quantity");
    static final Key<Node> POINT_MAX = Key.optional("max", POINT_VALUE, "greatest value, in the unit of the quantity");
    static final Key<List<Located<Fields>>> NOISE_POINTS = Key.optional(
            "noisePoints",
            Values.list(
                    Values.object(Shape.of(
                            "a noise point",
                            QUANTITY,
                            POINT_CURRENT,
                            POINT_FREQUENCY,
                            POINT_SOURCE,
                            POINT_TYPICAL,
                            POINT_MAX,
                            BASIS,
                            REFERENCE,
                            CONDITIONS)),
                    0),
            "published noise figures and densities of this device");

    /** How the value of a noise point is written. */
    static Value<Double> pointValue(NoisePoint.Quantity quantity) {
        return switch (quantity) {
            case VOLTAGE_NOISE -> Values.quantity(Dimension.VOLTAGE_DENSITY, Range.POSITIVE);
            case CURRENT_NOISE -> Values.quantity(Dimension.CURRENT_DENSITY, Range.POSITIVE);
            case NOISE_FIGURE -> Values.quantity(Dimension.DECIBELS, Range.NOT_NEGATIVE);
            case OPTIMUM_RESISTANCE -> Values.quantity(Dimension.RESISTANCE, Range.POSITIVE);
        };
    }

    /**
     * The keys of one kind of device that depend on the kind.
     *
     * @param parameters the object of parameters
     * @param ratings the object of ratings
     * @param polarity the polarity; of no use for an amplifier
     * @param shape the whole file
     */
    record OfKind(Key<Fields> parameters, Key<Fields> ratings, Key<Polarity> polarity, Shape shape) {}

    static final Map<DeviceKind, OfKind> KINDS = kinds();

    private static Map<DeviceKind, OfKind> kinds() {
        Map<DeviceKind, OfKind> kinds = new EnumMap<>(DeviceKind.class);
        for (DeviceKind kind : DeviceKind.values()) {
            kinds.put(kind, ofKind(kind));
        }
        return kinds;
    }

    private static OfKind ofKind(DeviceKind kind) {
        List<Key<?>> parameters = new ArrayList<>();
        List<Key<?>> ratings = new ArrayList<>();
        if (kind == DeviceKind.BIPOLAR) {
            parameters.add(CURRENT_GAIN);
        }
        for (DeviceParameter parameter : DeviceParameter.values()) {
            ParameterKeys keys = PARAMETERS.get(parameter);
            if (keys != null && parameter.fits(kind)) {
                (parameter.isRating() ? ratings : parameters).add(keys.key());
            }
        }
        Key<Fields> parameterKey = Key.required(
                "parameters",
                Values.object(new Shape("the parameters of a device of kind " + kind.label(), parameters)),
                "its values");
        Key<Fields> ratingKey = Key.optional(
                "ratings",
                Values.object(new Shape("the ratings of a device of kind " + kind.label(), ratings)),
                "its limits");
        List<Polarity> polarities = List.of(Polarity.values()).stream()
                .filter(polarity -> polarity.kind() == kind && polarity != Polarity.NONE)
                .toList();
        Key<Polarity> polarityKey =
                Key.required("polarity", Values.word(polarities, Polarity::label), "npn, pnp, n-channel or p-channel");
        Shape shape = Shape.of("a device of kind " + kind.label(), SCHEMA, ID, KIND);
        Shape withPolarity = kind == DeviceKind.AMPLIFIER ? shape : shape.with(polarityKey);
        return new OfKind(
                parameterKey,
                ratingKey,
                polarityKey,
                withPolarity.with(DESCRIPTION, EVIDENCE, NOTE, parameterKey, ratingKey, NOISE_POINTS));
    }
}
