package hissledger.files;

import hissledger.device.Basis;
import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.device.GainPoint;
import hissledger.device.GainSheet;
import hissledger.device.NoisePoint;
import hissledger.device.Parameter;
import hissledger.device.Polarity;
import hissledger.device.StatedAt;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.EnumMap;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/** Reads a device file. All faults of a file are reported at once. */
public final class DeviceReader {
    private static final String ENDING = ".json";

    private final Faults faults;

    private DeviceReader(String file) {
        faults = new Faults(file);
    }

    /** Reads a device file. */
    public static Device read(Path file) throws InputException {
        return read(file.toString(), JsonIn.bytes(file));
    }

    /** Reads a device file that is at hand already. */
    static Device read(String file, byte[] content) throws InputException {
        return new DeviceReader(file).device(JsonIn.tree(file, content));
    }

    private Device device(Node tree) throws InputException {
        Map<String, Shape> shapes = new LinkedHashMap<>();
        DeviceShapes.KINDS.forEach((kind, ofKind) -> shapes.put(kind.label(), ofKind.shape()));
        Optional<Fields> read = Values.kind(shapes).read(tree, faults);
        if (read.isEmpty()) {
            faults.throwIfAny();
        }
        Fields fields = read.orElseThrow();
        DeviceKind kind = kind(fields);
        DeviceShapes.OfKind keys = keys(kind);
        fields.located(DeviceShapes.ID).ifPresent(this::checkId);
        Optional<Fields> parameters = fields.get(keys.parameters());
        Map<DeviceParameter, Parameter> values = new EnumMap<>(DeviceParameter.class);
        for (DeviceParameter parameter : DeviceParameter.values()) {
            Optional<Fields> object = parameter.isRating() ? fields.get(keys.ratings()) : parameters;
            object.ifPresent(each -> parameter(each, parameter).ifPresent(value -> values.put(parameter, value)));
        }
        Optional<GainSheet> gain =
                parameters.flatMap(each -> each.get(DeviceShapes.CURRENT_GAIN)).flatMap(this::gain);
        List<NoisePoint> points = new ArrayList<>();
        for (Located<Fields> point : fields.get(DeviceShapes.NOISE_POINTS).orElse(List.of())) {
            noisePoint(point.value()).ifPresent(points::add);
        }
        checkJfet(kind, parameters);
        faults.throwIfAny();
        return new Device(
                fields.need(DeviceShapes.ID),
                kind,
                fields.get(keys.polarity(), Polarity.NONE),
                fields.need(DeviceShapes.DESCRIPTION),
                fields.get(DeviceShapes.EVIDENCE, ""),
                fields.get(DeviceShapes.NOTE, ""),
                gain,
                values,
                points);
    }

    private static DeviceKind kind(Fields fields) {
        String word = fields.need(DeviceShapes.KIND);
        for (DeviceKind kind : DeviceKind.values()) {
            if (kind.label().equals(word)) {
                return kind;
            }
        }
        throw new IllegalStateException("no kind " + word);
    }

    private static DeviceShapes.OfKind keys(DeviceKind kind) {
        DeviceShapes.OfKind keys = DeviceShapes.KINDS.get(kind);
        if (keys == null) {
            throw new IllegalStateException("no keys for " + kind);
        }
        return keys;
    }

    private void checkId(Located<String> id) {
        String file = faults.file().substring(faults.file().lastIndexOf('/') + 1);
        file = file.substring(file.lastIndexOf('\\') + 1);
        String expected = file.endsWith(ENDING) ? file.substring(0, file.length() - ENDING.length()) : file;
        if (!id.value().equals(expected)) {
            faults.at(
                    id.node(),
                    "must equal the file name without its ending, \"" + expected + "\", was "
                            + id.node().quoted() + "; rename the one or the other");
        }
    }

    /** A JFET needs a slope: its pinch-off voltage or a transconductance. */
    private void checkJfet(DeviceKind kind, Optional<Fields> parameters) {
        if (kind != DeviceKind.JFET || parameters.isEmpty()) {
            return;
        }
        boolean pinchOff = parameters
                .get()
                .node()
                .member(DeviceParameter.PINCH_OFF_VOLTAGE.key())
                .isPresent();
        boolean slope = parameters
                .get()
                .node()
                .member(DeviceParameter.TRANSCONDUCTANCE.key())
                .isPresent();
        if (!pinchOff && !slope) {
            faults.at(parameters.get().node(), "has neither pinchOffVoltage nor transconductance; state at least one");
        }
    }

    private Optional<Parameter> parameter(Fields object, DeviceParameter which) {
        DeviceShapes.ParameterKeys keys = DeviceShapes.PARAMETERS.get(which);
        if (keys == null) {
            return Optional.empty();
        }
        Optional<Fields> read = object.get(keys.key());
        if (read.isEmpty()) {
            return Optional.empty();
        }
        Fields fields = read.get();
        OptionalDouble min = optional(fields.get(keys.min()));
        OptionalDouble typical = optional(fields.get(keys.typical()));
        OptionalDouble max = optional(fields.get(keys.max()));
        boolean ordered = ordered(fields, List.of(keys.min(), keys.typical(), keys.max()));
        Optional<Basis> basis = fields.get(DeviceShapes.BASIS);
        checkReference(fields, basis);
        if (!ordered || basis.isEmpty()) {
            return Optional.empty();
        }
        Map<StatedAt, Double> at = new EnumMap<>(StatedAt.class);
        keys.companions().forEach((companion, key) -> fields.get(key).ifPresent(value -> at.put(companion, value)));
        return Optional.of(new Parameter(
                min,
                typical,
                max,
                basis.get(),
                fields.get(DeviceShapes.REFERENCE, ""),
                fields.get(DeviceShapes.CONDITIONS, ""),
                at));
    }

    /** Whether there is at least one of min, typical and max, and they do not fall. */
    private boolean ordered(Fields fields, List<Key<Double>> keys) {
        boolean stated = false;
        boolean good = true;
        double below = Double.NEGATIVE_INFINITY;
        String belowName = "";
        for (Key<Double> key : keys) {
            stated |= fields.node().member(key.name()).isPresent();
            Optional<Located<Double>> value = fields.located(key);
            if (value.isEmpty()) {
                continue;
            }
            if (value.get().value() < below) {
                faults.at(
                        value.get().node(),
                        "must not be below " + belowName + ", was "
                                + value.get().node().quoted());
                good = false;
            }
            below = value.get().value();
            belowName = key.name();
        }
        boolean requiredMissing = keys.stream()
                .anyMatch(key ->
                        key.required() && fields.node().member(key.name()).isEmpty());
        if (!stated && !requiredMissing) {
            faults.at(fields.node(), "has no value; state at least one of min, typical and max");
        }
        return good && !belowName.isEmpty();
    }

    private void checkReference(Fields fields, Optional<Basis> basis) {
        if (basis.isPresent()
                && basis.get().needsReference()
                && fields.node().member("reference").isEmpty()) {
            faults.at(
                    fields.node(),
                    "has the basis " + basis.get().label()
                            + " but no reference; name title, publisher and document, or the derivation");
        }
    }

    private Optional<GainSheet> gain(Fields fields) {
        Optional<Basis> basis = fields.get(DeviceShapes.BASIS);
        checkReference(fields, basis);
        List<GainPoint> points = new ArrayList<>();
        boolean good = basis.isPresent();
        double below = 0.0;
        for (Located<Fields> located : fields.get(DeviceShapes.POINTS).orElse(List.of())) {
            Fields point = located.value();
            Optional<Located<Double>> amps = point.located(DeviceShapes.GAIN_CURRENT);
            good &= ordered(point, List.of(DeviceShapes.GAIN_MIN, DeviceShapes.GAIN_TYPICAL, DeviceShapes.GAIN_MAX));
            if (amps.isEmpty()) {
                good = false;
                continue;
            }
            if (amps.get().value() <= below) {
                faults.at(
                        amps.get().node(),
                        "must be above the current of the point before it, was "
                                + amps.get().node().quoted() + "; put the points in rising order, each current once");
                good = false;
            }
            below = amps.get().value();
            if (good) {
                points.add(new GainPoint(
                        below,
                        optional(point.get(DeviceShapes.GAIN_MIN)),
                        optional(point.get(DeviceShapes.GAIN_TYPICAL)),
                        optional(point.get(DeviceShapes.GAIN_MAX))));
            }
        }
        return good && !points.isEmpty()
                ? Optional.of(new GainSheet(
                        points,
                        basis.get(),
                        fields.get(DeviceShapes.REFERENCE, ""),
                        fields.get(DeviceShapes.CONDITIONS, "")))
                : Optional.empty();
    }

    private Optional<NoisePoint> noisePoint(Fields fields) {
        Optional<NoisePoint.Quantity> quantity = fields.get(DeviceShapes.QUANTITY);
        Optional<Basis> basis = fields.get(DeviceShapes.BASIS);
        checkReference(fields, basis);
        if (quantity.isEmpty()
                || basis.isEmpty()
                || fields.get(DeviceShapes.POINT_FREQUENCY).isEmpty()) {
            return Optional.empty();
        }
        Value<Double> form = DeviceShapes.pointValue(quantity.get());
        Optional<Double> typical = fields.get(DeviceShapes.POINT_TYPICAL).flatMap(node -> form.read(node, faults));
        Optional<Double> max = fields.get(DeviceShapes.POINT_MAX).flatMap(node -> form.read(node, faults));
        if (fields.get(DeviceShapes.POINT_TYPICAL).isEmpty()
                && fields.get(DeviceShapes.POINT_MAX).isEmpty()) {
            faults.at(fields.node(), "has no value; state typical or max");
        }
        if (quantity.get() == NoisePoint.Quantity.NOISE_FIGURE
                && fields.get(DeviceShapes.POINT_SOURCE).isEmpty()) {
            faults.at(fields.node(), "is a noise figure without a source; add sourceResistance");
        }
        return Optional.of(new NoisePoint(
                quantity.get(),
                optional(fields.get(DeviceShapes.POINT_CURRENT)),
                fields.need(DeviceShapes.POINT_FREQUENCY),
                optional(fields.get(DeviceShapes.POINT_SOURCE)),
                optional(typical),
                optional(max),
                basis.get(),
                fields.get(DeviceShapes.REFERENCE, ""),
                fields.get(DeviceShapes.CONDITIONS, "")));
    }

    private static OptionalDouble optional(Optional<Double> value) {
        return value.isPresent() ? OptionalDouble.of(value.get()) : OptionalDouble.empty();
    }
}
