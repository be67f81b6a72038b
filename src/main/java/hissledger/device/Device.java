package hissledger.device;

import java.util.ArrayList;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * An active device as its sheet states it: every value with its bounds and where it comes from.
 *
 * <p>{@link #bipolar()}, {@link #jfet()} and {@link #amplifier()} resolve the typical numbers for a calculation. Values that
 * the sheet leaves out follow documented defaults, each listed in {@link Resolved#defaultsUsed()}: no bulk emitter
 * resistance, no Early effect, no diffusion capacitance, no junction capacitances, no flicker noise; γ = 2/3, λ = 0, no
 * capacitances, no flicker and no induced gate noise for a JFET; gate leakage doubling every 10 K. rbb', current gain, IDSS,
 * gate leakage and either VGS(off) or a transconductance have no default: without them the device is incomplete.
 *
 * @param id the file name without its ending
 * @param kind bipolar, jfet or amplifier
 * @param polarity npn, pnp, n-channel or p-channel
 * @param description one line
 * @param evidence A, B or C, how well the noise values are published; empty where it says nothing
 * @param note findings and limits; may be empty
 * @param currentGain of a bipolar transistor
 * @param parameters everything else, ratings included
 * @param noisePoints published noise figures and densities of this device
 */
public record Device(
        String id,
        DeviceKind kind,
        Polarity polarity,
        String description,
        String evidence,
        String note,
        Optional<GainSheet> currentGain,
        Map<DeviceParameter, Parameter> parameters,
        List<NoisePoint> noisePoints) {
    public Device {
        parameters = Map.copyOf(parameters);
        noisePoints = List.copyOf(noisePoints);
    }

    /**
     * A model with the defaults that had to be used for it.
     *
     * @param model the numbers
     * @param defaultsUsed one sentence each
     */
    public record Resolved<M>(M model, List<String> defaultsUsed) {
        public Resolved {
            defaultsUsed = List.copyOf(defaultsUsed);
        }
    }

    /** A parameter, if the sheet states it. */
    public Optional<Parameter> parameter(DeviceParameter parameter) {
        return Optional.ofNullable(parameters.get(parameter));
    }

    /** The parameters a device states, in the order of {@link DeviceParameter}. */
    public Map<DeviceParameter, Parameter> inOrder() {
        Map<DeviceParameter, Parameter> ordered = new EnumMap<>(DeviceParameter.class);
        ordered.putAll(parameters);
        return ordered;
    }

    /** The greatest current the device may carry, A: its rating; empty where none is stated. */
    public OptionalDouble ratedAmps() {
        return parameter(DeviceParameter.CURRENT).map(Parameter::max).orElse(OptionalDouble.empty());
    }

    /** This device with a gain curve, times a factor, for its only one. */
    public Device with(GainCurve curve, double factor) {
        GainSheet sheet = currentGain.orElseThrow();
        List<GainPoint> points = new ArrayList<>();
        for (GainPoint point : sheet.points()) {
            double gain = factor * curve.at(point.currentAmps());
            points.add(new GainPoint(
                    point.currentAmps(), OptionalDouble.empty(), OptionalDouble.of(gain), OptionalDouble.empty()));
        }
        GainSheet only = new GainSheet(points, sheet.basis(), sheet.reference(), sheet.conditions());
        return new Device(id, kind, polarity, description, evidence, note, Optional.of(only), parameters, noisePoints);
    }

    /** This device with one value of a stated parameter for its only one, SI. */
    public Device with(DeviceParameter key, double value) {
        Parameter stated = parameter(key).orElseThrow();
        Map<DeviceParameter, Parameter> changed = inOrder();
        changed.put(
                key,
                new Parameter(
                        OptionalDouble.empty(),
                        OptionalDouble.of(value),
                        OptionalDouble.empty(),
                        stated.basis(),
                        stated.reference(),
                        stated.conditions(),
                        stated.at()));
        return new Device(id, kind, polarity, description, evidence, note, currentGain, changed, noisePoints);
    }

    /** Whether the sheet states flicker noise, so that densities fall with frequency. */
    public boolean noiseFallsWithFrequency() {
        return parameters.containsKey(DeviceParameter.BASE_FLICKER_CORNER)
                || parameters.containsKey(DeviceParameter.FLICKER_DENSITY);
    }

    /** The values that a noise calculation uses and that rest on the given basis, in words. */
    public List<String> resting(Basis basis) {
        List<String> words = new ArrayList<>();
        if (currentGain.filter(gain -> gain.basis() == basis).isPresent()) {
            words.add("hFE");
        }
        inOrder().forEach((key, parameter) -> {
            if (!key.isRating() && parameter.basis() == basis) {
                words.add(key.words());
            }
        });
        return words;
    }

    /**
     * The typical numbers of a bipolar transistor.
     *
     * @throws IncompleteDeviceException where the sheet lacks one that has no default
     */
    public Resolved<BipolarModel> bipolar() {
        require(DeviceKind.BIPOLAR);
        Defaults defaults = new Defaults();
        GainSheet gain = currentGain.orElseThrow(() -> new IncompleteDeviceException(id, "currentGain"));
        if (!gain.rule().isEmpty()) {
            defaults.add("current gain hFE: typical value taken as " + gain.rule());
        }
        Optional<Parameter> corner = parameter(DeviceParameter.BASE_FLICKER_CORNER);
        Optional<BaseFlicker> flicker = Optional.empty();
        if (corner.isPresent()) {
            double hertz = defaults.value(DeviceParameter.BASE_FLICKER_CORNER, corner.get());
            flicker = Optional.of(new BaseFlicker(
                    hertz,
                    defaults.companion(
                            DeviceParameter.BASE_FLICKER_CORNER, corner.get(), StatedAt.CURRENT, 1e-3, "1 mA"),
                    corner.get().at().getOrDefault(StatedAt.EXPONENT, 1.0)));
        } else {
            defaults.add("flicker corner of the base current: not stated, no flicker noise counted");
        }
        BipolarModel model = new BipolarModel(
                gain.typical(),
                defaults.needed(DeviceParameter.BASE_RESISTANCE),
                defaults.orElse(DeviceParameter.EMITTER_RESISTANCE, 0.0, "0 Ω"),
                defaults.orElse(DeviceParameter.EARLY_VOLTAGE, Double.POSITIVE_INFINITY, "infinite"),
                defaults.orElse(DeviceParameter.TRANSITION_FREQUENCY, Double.POSITIVE_INFINITY, "infinite"),
                defaults.orElse(DeviceParameter.COLLECTOR_BASE_CAPACITANCE, 0.0, "0 pF"),
                defaults.orElse(DeviceParameter.EMITTER_BASE_CAPACITANCE, 0.0, "0 pF"),
                flicker);
        return new Resolved<>(model, defaults.list);
    }

    /**
     * The typical numbers of a JFET.
     *
     * @throws IncompleteDeviceException where the sheet lacks one that has no default
     */
    public Resolved<JfetModel> jfet() {
        require(DeviceKind.JFET);
        Defaults defaults = new Defaults();
        double saturation = defaults.needed(DeviceParameter.DRAIN_SATURATION_CURRENT);
        Optional<Parameter> published = parameter(DeviceParameter.TRANSCONDUCTANCE);
        OptionalDouble measured = OptionalDouble.empty();
        double measuredAt = saturation;
        if (published.isPresent()) {
            measured = OptionalDouble.of(defaults.value(DeviceParameter.TRANSCONDUCTANCE, published.get()));
            measuredAt = defaults.companion(
                    DeviceParameter.TRANSCONDUCTANCE, published.get(), StatedAt.CURRENT, saturation, "IDSS");
        }
        double pinchOff;
        if (parameter(DeviceParameter.PINCH_OFF_VOLTAGE).isPresent()) {
            pinchOff = defaults.needed(DeviceParameter.PINCH_OFF_VOLTAGE);
        } else if (measured.isPresent()) {
            // gm = (2/|VGS(off)|) √(IDSS ID), solved for VGS(off)
            pinchOff = 2.0 * Math.sqrt(saturation * measuredAt) / measured.getAsDouble();
            defaults.add("pinch-off voltage VGS(off): not stated, taken from IDSS and gm by the square law");
        } else {
            throw new IncompleteDeviceException(id, DeviceParameter.PINCH_OFF_VOLTAGE.key());
        }
        SquareLaw law = new SquareLaw(saturation, pinchOff, measured, measuredAt);

        Parameter leakage = parameter(DeviceParameter.GATE_LEAKAGE)
                .orElseThrow(() -> new IncompleteDeviceException(id, DeviceParameter.GATE_LEAKAGE.key()));
        GateLeakage gateLeakage = new GateLeakage(
                defaults.value(DeviceParameter.GATE_LEAKAGE, leakage),
                defaults.companion(DeviceParameter.GATE_LEAKAGE, leakage, StatedAt.TEMPERATURE, 298.15, "25 °C"),
                defaults.companion(
                        DeviceParameter.GATE_LEAKAGE,
                        leakage,
                        StatedAt.DOUBLING_STEP,
                        GateLeakage.USUAL_DOUBLING_KELVIN,
                        "10 K"));

        Optional<ChannelFlicker> flicker = Optional.empty();
        Optional<Parameter> density = parameter(DeviceParameter.FLICKER_DENSITY);
        if (density.isPresent()) {
            flicker = Optional.of(new ChannelFlicker(
                    defaults.value(DeviceParameter.FLICKER_DENSITY, density.get()),
                    defaults.companion(
                            DeviceParameter.FLICKER_DENSITY, density.get(), StatedAt.FREQUENCY, 1000.0, "1 kHz"),
                    density.get().at().getOrDefault(StatedAt.EXPONENT, 1.0)));
        } else {
            defaults.add("flicker voltage density: not stated, no flicker noise counted");
        }

        Optional<InducedGateNoise> induced = Optional.empty();
        Optional<Parameter> delta = parameter(DeviceParameter.INDUCED_GATE_NOISE);
        if (delta.isPresent()) {
            induced = Optional.of(new InducedGateNoise(
                    delta.get().representative(), delta.get().at().getOrDefault(StatedAt.CORRELATION, 0.0)));
        } else {
            defaults.add("induced gate noise: not stated, none counted");
        }
        JfetModel model = new JfetModel(
                law,
                defaults.orElse(DeviceParameter.CHANNEL_NOISE_FACTOR, JfetModel.LONG_CHANNEL_NOISE_FACTOR, "2/3"),
                defaults.orElse(DeviceParameter.OUTPUT_CONDUCTANCE_FACTOR, 0.0, "0 1/V"),
                gateLeakage,
                defaults.orElse(DeviceParameter.GATE_SOURCE_CAPACITANCE, 0.0, "0 pF"),
                defaults.orElse(DeviceParameter.GATE_DRAIN_CAPACITANCE, 0.0, "0 pF"),
                flicker,
                induced);
        return new Resolved<>(model, defaults.list);
    }

    /**
     * The typical numbers of a behavioural amplifier.
     *
     * @throws IncompleteDeviceException where the sheet lacks its voltage noise
     */
    public Resolved<AmplifierModel> amplifier() {
        require(DeviceKind.AMPLIFIER);
        Defaults defaults = new Defaults();
        AmplifierModel model = new AmplifierModel(
                defaults.needed(DeviceParameter.VOLTAGE_NOISE),
                defaults.orElse(DeviceParameter.VOLTAGE_NOISE_CORNER, 0.0, "0 Hz"),
                defaults.needed(DeviceParameter.CURRENT_NOISE),
                defaults.orElse(DeviceParameter.CURRENT_NOISE_CORNER, 0.0, "0 Hz"),
                defaults.orElse(DeviceParameter.INPUT_RESISTANCE, Double.POSITIVE_INFINITY, "infinite"),
                defaults.orElse(DeviceParameter.INPUT_CAPACITANCE, 0.0, "0 pF"));
        return new Resolved<>(model, defaults.list);
    }

    private void require(DeviceKind wanted) {
        if (kind != wanted) {
            throw new IllegalArgumentException(id + " is a device of kind " + kind.label() + ", not " + wanted.label());
        }
    }

    /** Collects what had to be assumed. */
    private final class Defaults {
        private final List<String> list = new ArrayList<>();

        void add(String sentence) {
            list.add(sentence);
        }

        double value(DeviceParameter key, Parameter parameter) {
            if (!parameter.rule().isEmpty()) {
                add(key.words() + ": typical value taken as " + parameter.rule());
            }
            return parameter.representative();
        }

        double needed(DeviceParameter key) {
            Parameter parameter = parameter(key).orElseThrow(() -> new IncompleteDeviceException(id, key.key()));
            return value(key, parameter);
        }

        double orElse(DeviceParameter key, double value, String words) {
            Optional<Parameter> parameter = parameter(key);
            if (parameter.isPresent()) {
                return value(key, parameter.get());
            }
            add(key.words() + ": not stated, taken as " + words);
            return value;
        }

        double companion(DeviceParameter key, Parameter parameter, StatedAt at, double value, String words) {
            Double stated = parameter.at().get(at);
            if (stated != null) {
                return stated;
            }
            add(key.words() + ": its " + at.key() + " not stated, taken as " + words);
            return value;
        }
    }
}
