package hissledger.circuit;

import static hissledger.Trials.logUniform;

import hissledger.device.AmplifierModel;
import hissledger.device.BaseFlicker;
import hissledger.device.BiasedBipolar;
import hissledger.device.BiasedJfet;
import hissledger.device.BipolarModel;
import hissledger.device.ChannelFlicker;
import hissledger.device.GainCurve;
import hissledger.device.GateLeakage;
import hissledger.device.InducedGateNoise;
import hissledger.device.JfetModel;
import hissledger.device.SquareLaw;
import hissledger.device.Transistor;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.random.RandomGenerator;

/** Front ends drawn at random over the values that occur at the input of an audio or instrumentation amplifier. */
final class RandomFrontEnds {
    private static final int MOST_PATH_ELEMENTS = 6;
    private static final int MOST_IN_PARALLEL = 4;

    private RandomFrontEnds() {}

    static FrontEnd frontEnd(RandomGenerator random) {
        return new FrontEnd(source(random), path(random), stage(random));
    }

    /** A front end under a cascode, in common emitter or common source. */
    static FrontEnd cascoded(RandomGenerator random) {
        Surroundings around = surroundings(random, commonLead(random), true, true);
        return new FrontEnd(
                source(random),
                path(random),
                new SingleStage(transistor(random), random.nextInt(1, MOST_IN_PARALLEL + 1), around));
    }

    static Source source(RandomGenerator random) {
        double kelvin = random.nextDouble(250.0, 330.0);
        return switch (random.nextInt(3)) {
            case 0 -> new ResistorSource(logUniform(random, 1.0, 1e6), kelvin, Signal.none());
            case 1 ->
                new CoilSource(
                        logUniform(random, 0.1, 1e4),
                        logUniform(random, 1e-6, 2.0),
                        random.nextBoolean() ? logUniform(random, 1e3, 1e6) : Double.POSITIVE_INFINITY,
                        random.nextBoolean() ? logUniform(random, 1e-11, 1e-8) : 0.0,
                        kelvin,
                        Signal.none());
            default ->
                new CapacitorSource(
                        logUniform(random, 5e-12, 1e-8),
                        random.nextBoolean() ? logUniform(random, 1e-5, 0.1) : 0.0,
                        random.nextBoolean() ? logUniform(random, 1e7, 1e11) : Double.POSITIVE_INFINITY,
                        kelvin,
                        Signal.none());
        };
    }

    /** A front end with a pair between the ends of a floating path. */
    static FrontEnd balanced(RandomGenerator random) {
        boolean gain = random.nextBoolean();
        return new FrontEnd(
                source(random),
                path(random),
                new BalancedPair(
                        transistor(random),
                        random.nextInt(1, MOST_IN_PARALLEL + 1),
                        surroundings(random, halfLead(random), true, random.nextInt(4) == 0),
                        gain ? logUniform(random, 1.0, 1e4) : 0.0,
                        gain && random.nextBoolean() ? logUniform(random, 100.0, 1e5) : Double.POSITIVE_INFINITY));
    }

    /** A pair driven at one input, of devices without common-mode admittance: no feedback, no output conductance. */
    static FrontEnd singleEnded(RandomGenerator random) {
        return new FrontEnd(
                source(random),
                path(random),
                new SingleEndedPair(
                        withoutFeedback(transistor(random)),
                        random.nextInt(1, MOST_IN_PARALLEL + 1),
                        surroundings(random, halfLead(random), true, random.nextInt(4) == 0),
                        random.nextInt(5) == 0 ? 0.0 : logUniform(random, 1.0, 1e6)));
    }

    /** A behavioural amplifier behind a path. */
    static FrontEnd amplified(RandomGenerator random) {
        return new FrontEnd(
                source(random),
                path(random),
                new AmplifierStage(new AmplifierModel(
                        logUniform(random, 5e-10, 5e-8),
                        logUniform(random, 0.1, 1e4),
                        logUniform(random, 1e-15, 1e-11),
                        logUniform(random, 0.1, 1e4),
                        random.nextBoolean() ? logUniform(random, 1e3, 1e12) : Double.POSITIVE_INFINITY,
                        random.nextBoolean() ? logUniform(random, 1e-12, 1e-9) : 0.0)));
    }

    private static CommonLead halfLead(RandomGenerator random) {
        return new CommonLead(random.nextBoolean() ? logUniform(random, 1.0, 1e3) : 0.0, 0.0, 0.0, 0.0);
    }

    private static Transistor withoutFeedback(Transistor device) {
        if (device instanceof BiasedBipolar bipolar) {
            BipolarModel model = bipolar.model();
            return new BiasedBipolar(
                    new BipolarModel(
                            model.currentGain(),
                            model.baseResistanceOhms(),
                            model.emitterResistanceOhms(),
                            Double.POSITIVE_INFINITY,
                            model.transitionHertz(),
                            0.0,
                            model.emitterBaseFarads(),
                            model.flicker()),
                    bipolar.currentAmps(),
                    bipolar.temperatureKelvin());
        }
        BiasedJfet jfet = (BiasedJfet) device;
        JfetModel model = jfet.model();
        return new BiasedJfet(
                new JfetModel(
                        model.law(),
                        model.channelNoiseFactor(),
                        0.0,
                        model.leakage(),
                        model.gateSourceFarads(),
                        0.0,
                        model.flicker(),
                        model.induced()),
                jfet.currentAmps(),
                jfet.temperatureKelvin());
    }

    private static Transformer transformer(RandomGenerator random, String name, double kelvin) {
        return new Transformer(
                name,
                logUniform(random, 0.1, 30.0),
                random.nextInt(5) == 0 ? 0.0 : logUniform(random, 0.1, 100.0),
                random.nextInt(5) == 0 ? 0.0 : logUniform(random, 1.0, 5e3),
                random.nextBoolean() ? logUniform(random, 1e-3, 100.0) : Double.POSITIVE_INFINITY,
                random.nextBoolean() ? logUniform(random, 1e-6, 1.0) : 0.0,
                random.nextBoolean() ? logUniform(random, 1e3, 1e6) : Double.POSITIVE_INFINITY,
                random.nextBoolean() ? logUniform(random, 1e-12, 1e-9) : 0.0,
                kelvin);
    }

    static List<PathElement> path(RandomGenerator random) {
        List<PathElement> path = new ArrayList<>();
        int elements = random.nextInt(MOST_PATH_ELEMENTS + 1);
        for (int e = 0; e < elements; e++) {
            int kind = random.nextInt(8);
            if (kind == 0) {
                path.add(transformer(random, "element " + e, random.nextDouble(250.0, 330.0)));
                continue;
            }
            if (kind == 1) {
                path.add(new Pad(
                        "element " + e,
                        logUniform(random, 1.0, 1e4),
                        logUniform(random, 10.0, 1e5),
                        random.nextInt(1, 3),
                        random.nextDouble(250.0, 330.0)));
                continue;
            }
            boolean series = random.nextBoolean();
            Passive part = part(random, series);
            int legs = random.nextInt(1, 3);
            double kelvin = random.nextDouble(250.0, 330.0);
            String name = "element " + e;
            boolean supplied = !series && legs == 1 && part instanceof Passive.Resistor && random.nextBoolean();
            Optional<Supply> supply = supplied
                    ? Optional.of(new Supply(logUniform(random, 1e-9, 1e-5), random.nextDouble()))
                    : Optional.empty();
            path.add(
                    series
                            ? new SeriesElement(name, part, legs, kelvin)
                            : new ShuntElement(name, part, legs, kelvin, supply));
        }
        return path;
    }

    private static Passive part(RandomGenerator random, boolean series) {
        return switch (random.nextInt(3)) {
            case 0 -> resistor(random, series ? 1.0 : 100.0, series ? 1e5 : 1e9);
            case 1 ->
                new Passive.Capacitor(
                        series ? logUniform(random, 1e-9, 1e-4) : logUniform(random, 1e-12, 1e-8),
                        random.nextBoolean() ? logUniform(random, 1e-5, 0.1) : 0.0,
                        random.nextBoolean() ? logUniform(random, 0.01, 10.0) : 0.0);
            default -> new Passive.Inductor(series ? logUniform(random, 1e-8, 1e-2) : logUniform(random, 1e-2, 1e2));
        };
    }

    private static Passive.Resistor resistor(RandomGenerator random, double from, double to) {
        double ohms = logUniform(random, from, to);
        return random.nextBoolean()
                ? new Passive.Resistor(ohms, logUniform(random, 1e-9, 1e-5), random.nextDouble(-50.0, 50.0))
                : Passive.Resistor.of(ohms);
    }

    static Stage stage(RandomGenerator random) {
        Transistor device = transistor(random);
        int inParallel = random.nextInt(1, MOST_IN_PARALLEL + 1);
        if (random.nextInt(3) == 0) {
            return new FollowerStage(
                    device, inParallel, surroundings(random, CommonLead.grounded(), random.nextInt(4) > 0, false));
        }
        boolean loaded = random.nextInt(5) > 0 || device.smallSignal().outputSiemens() == 0.0;
        return new SingleStage(device, inParallel, surroundings(random, commonLead(random), loaded, false));
    }

    private static Surroundings surroundings(RandomGenerator random, CommonLead lead, boolean loaded, boolean cascode) {
        Optional<Passive.Resistor> load = loaded ? Optional.of(resistor(random, 100.0, 1e5)) : Optional.empty();
        Optional<NextStage> next = random.nextInt(4) > 0
                ? Optional.of(new NextStage(
                        logUniform(random, 1e-9, 1e-7),
                        random.nextBoolean() ? logUniform(random, 1.0, 1e4) : 0.0,
                        logUniform(random, 1e-15, 1e-11),
                        random.nextBoolean() ? logUniform(random, 1.0, 1e4) : 0.0))
                : Optional.empty();
        return new Surroundings(lead, load, next, cascode);
    }

    static CommonLead commonLead(RandomGenerator random) {
        return switch (random.nextInt(5)) {
            case 0 -> CommonLead.grounded();
            case 1 -> CommonLead.of(logUniform(random, 1.0, 1e5));
            case 2 -> new CommonLead(logUniform(random, 1.0, 1e3), 0.0, 0.0, 0.0);
            case 3 ->
                new CommonLead(
                        0.0,
                        logUniform(random, 10.0, 1e5),
                        logUniform(random, 1e-8, 1e-2),
                        random.nextBoolean() ? logUniform(random, 1e-3, 1.0) : 0.0);
            default ->
                new CommonLead(
                        logUniform(random, 1.0, 1e3),
                        logUniform(random, 10.0, 1e5),
                        logUniform(random, 1e-8, 1e-2),
                        logUniform(random, 1e-3, 1.0));
        };
    }

    static Transistor transistor(RandomGenerator random) {
        return random.nextBoolean() ? bipolar(random) : jfet(random);
    }

    static BiasedBipolar bipolar(RandomGenerator random) {
        double gain = logUniform(random, 30.0, 1000.0);
        GainCurve curve = random.nextBoolean()
                ? GainCurve.flat(gain)
                : GainCurve.through(new double[] {1e-5, 1e-3, 1e-1}, new double[] {0.6 * gain, gain, 0.8 * gain});
        BipolarModel model = new BipolarModel(
                curve,
                random.nextInt(5) > 0 ? logUniform(random, 1.0, 500.0) : 0.0,
                random.nextBoolean() ? logUniform(random, 0.05, 3.0) : 0.0,
                random.nextInt(4) > 0 ? logUniform(random, 10.0, 300.0) : Double.POSITIVE_INFINITY,
                random.nextInt(4) > 0 ? logUniform(random, 1e7, 1e9) : Double.POSITIVE_INFINITY,
                random.nextInt(4) > 0 ? logUniform(random, 1e-12, 4e-11) : 0.0,
                random.nextInt(4) > 0 ? logUniform(random, 1e-12, 2e-10) : 0.0,
                random.nextBoolean()
                        ? Optional.of(new BaseFlicker(
                                logUniform(random, 1.0, 1e4),
                                logUniform(random, 1e-5, 1e-2),
                                random.nextBoolean() ? 1.0 : random.nextDouble(0.8, 2.0)))
                        : Optional.empty());
        return new BiasedBipolar(model, logUniform(random, 1e-6, 3e-2), random.nextDouble(250.0, 350.0));
    }

    static BiasedJfet jfet(RandomGenerator random) {
        double saturation = logUniform(random, 1e-4, 5e-2);
        double pinchOff = logUniform(random, 0.2, 6.0);
        double at = saturation * random.nextDouble(0.1, 1.0);
        SquareLaw law = random.nextBoolean()
                ? SquareLaw.of(saturation, pinchOff)
                : new SquareLaw(
                        saturation,
                        pinchOff,
                        OptionalDouble.of(random.nextDouble(0.7, 1.3) * 2.0 / pinchOff * Math.sqrt(saturation * at)),
                        at);
        JfetModel model = new JfetModel(
                law,
                random.nextDouble(0.5, 1.5),
                random.nextInt(4) > 0 ? logUniform(random, 1e-3, 0.1) : 0.0,
                new GateLeakage(logUniform(random, 1e-14, 1e-9), 298.15, random.nextDouble(8.0, 13.0)),
                random.nextInt(5) > 0 ? logUniform(random, 1e-12, 2e-10) : 0.0,
                random.nextInt(5) > 0 ? logUniform(random, 5e-13, 5e-11) : 0.0,
                random.nextBoolean()
                        ? Optional.of(new ChannelFlicker(
                                logUniform(random, 1e-10, 1e-7),
                                logUniform(random, 1.0, 1e4),
                                random.nextBoolean() ? 1.0 : random.nextDouble(0.7, 1.4)))
                        : Optional.empty(),
                random.nextBoolean()
                        ? Optional.of(new InducedGateNoise(random.nextDouble(0.5, 2.0), random.nextDouble(-1.0, 1.0)))
                        : Optional.empty());
        return new BiasedJfet(model, saturation * random.nextDouble(0.001, 1.0), random.nextDouble(250.0, 350.0));
    }
}
