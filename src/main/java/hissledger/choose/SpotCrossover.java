package hissledger.choose;

import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.physics.Weighting;
import hissledger.twoport.Frequencies;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.apache.commons.math3.analysis.UnivariateFunction;
import org.apache.commons.math3.analysis.solvers.BrentSolver;

/**
 * The source resistances at which the best bipolar and the best JFET candidate are equally quiet, at one frequency or over the
 * band.
 *
 * @param hertz the frequency, Hz; empty for the whole band
 * @param bipolarQuieterAtLeastResistance whether the best bipolar is the quieter one at the least resistance looked at
 * @param crossings every crossing in the range looked at, rising; empty where one kind is quieter throughout
 */
public record SpotCrossover(OptionalDouble hertz, boolean bipolarQuieterAtLeastResistance, List<Crossing> crossings) {
    /** By this factor a device value grows for a sensitivity. */
    public static final double GROWTH = 1.1;

    private static final int MOST_EVALUATIONS = 100;
    /** Changes of a crossing are printed to a tenth of a per cent. */
    private static final double LOG_TOLERANCE = 1e-7;
    /** Two EIN² as near as this are equal: their rounding. */
    private static final double EQUAL = 1e-12;
    /** A changed crossing is sought within these factors, the nearest first. */
    private static final double[] AROUND = {1.03, 1.1, 1.3, 2.0, 5.0, 20.0, 100.0};

    /** A device value that moves a crossing. */
    public enum Cause {
        /** rbb' of the bipolar device. */
        BASE_RESISTANCE("rbb'", "baseResistance"),
        /** hFE of the bipolar device, at every current. */
        CURRENT_GAIN("hFE", "currentGain"),
        /** Gate leakage of the JFET. */
        GATE_LEAKAGE("gate leakage", "gateLeakage");

        private final String words;
        private final String key;

        Cause(String words, String key) {
            this.words = words;
            this.key = key;
        }

        /** The value in words. */
        public String words() {
            return words;
        }

        /** The key in results. */
        public String key() {
            return key;
        }
    }

    /**
     * What a value of a device does to a crossing when it grows by a tenth.
     *
     * @param cause the value
     * @param ohms where the two candidates then change places, Ω; empty where they no longer do within a factor of 100
     */
    public record Shift(Cause cause, OptionalDouble ohms) {}

    /**
     * One crossing.
     *
     * @param ohms source resistance, Ω
     * @param bipolar the bipolar candidate that is best there
     * @param jfet the JFET candidate that is best there
     * @param shifts what moves it
     */
    public record Crossing(double ohms, String bipolar, String jfet, List<Shift> shifts) {
        public Crossing {
            shifts = List.copyOf(shifts);
        }
    }

    public SpotCrossover {
        crossings = List.copyOf(crossings);
    }

    /** EIN² of a design behind a resistance, at one frequency or over the band. */
    @FunctionalInterface
    private interface Power {
        double of(Design design, double ohms);
    }

    /** The crossovers at every spot of a scenario and over its band; none without candidates of both kinds. */
    static List<SpotCrossover> of(
            Scenario scenario, List<Design> designs, Weighting weighting, List<Regions.Column> columns, int threads) {
        List<Integer> bipolars = ofKind(designs, DeviceKind.BIPOLAR);
        List<Integer> jfets = ofKind(designs, DeviceKind.JFET);
        if (bipolars.isEmpty() || jfets.isEmpty()) {
            return List.of();
        }
        int spots = scenario.spotsHertz().size();
        return Workers.map(spots + 1, threads, spot -> {
            OptionalDouble hertz =
                    spot < spots ? OptionalDouble.of(scenario.spotsHertz().get(spot)) : OptionalDouble.empty();
            Power power = (design, ohms) -> {
                Settled settled = Settled.at(design, ohms, scenario.band());
                return hertz.isPresent()
                        ? settled.densities(Frequencies.of(hertz.getAsDouble()))[0]
                        : settled.bandVoltsSquared(weighting);
            };
            double[] balance = new double[columns.size()];
            for (int k = 0; k < balance.length; k++) {
                Regions.Column column = columns.get(k);
                List<Double> volts = hertz.isPresent()
                        ? column.spotVoltsPerRootHertz().stream()
                                .map(row -> row.get(spot))
                                .toList()
                        : column.bandVolts();
                balance[k] = Math.log(least(bipolars, volts) / least(jfets, volts));
            }
            List<Crossing> crossings = new ArrayList<>();
            for (int k = 1; k < balance.length; k++) {
                boolean changes = balance[k - 1] < 0.0 != balance[k] < 0.0;
                if (changes) {
                    crossings.add(between(
                            pick(designs, bipolars),
                            pick(designs, jfets),
                            power,
                            columns.get(k - 1).ohms(),
                            columns.get(k).ohms()));
                }
            }
            return new SpotCrossover(hertz, balance[0] < 0.0, crossings);
        });
    }

    private static List<Integer> ofKind(List<Design> designs, DeviceKind kind) {
        List<Integer> numbers = new ArrayList<>();
        for (int c = 0; c < designs.size(); c++) {
            if (designs.get(c).candidate().device().kind() == kind) {
                numbers.add(c);
            }
        }
        return numbers;
    }

    private static List<Design> pick(List<Design> designs, List<Integer> numbers) {
        return numbers.stream().map(designs::get).toList();
    }

    private static double least(List<Integer> numbers, List<Double> volts) {
        return numbers.stream().mapToDouble(volts::get).min().orElseThrow();
    }

    private static Crossing between(
            List<Design> bipolars, List<Design> jfets, Power power, double belowOhms, double aboveOhms) {
        double ohms = root(
                x -> Math.log(best(bipolars, power, Math.exp(x)) / best(jfets, power, Math.exp(x))),
                Math.log(belowOhms),
                Math.log(aboveOhms));
        Design bipolar = quietest(bipolars, power, ohms);
        Design jfet = quietest(jfets, power, ohms);
        List<Shift> shifts = new ArrayList<>();
        for (Cause cause : Cause.values()) {
            boolean ofJfet = cause == Cause.GATE_LEAKAGE;
            grown((ofJfet ? jfet : bipolar).candidate().device(), cause)
                    .ifPresent(device -> shifts.add(new Shift(
                            cause,
                            moved(
                                    ofJfet ? bipolar : bipolar.withDevice(device),
                                    ofJfet ? jfet.withDevice(device) : jfet,
                                    power,
                                    ohms))));
        }
        return new Crossing(ohms, bipolar.candidate().name(), jfet.candidate().name(), shifts);
    }

    private static double best(List<Design> designs, Power power, double ohms) {
        return designs.stream()
                .mapToDouble(design -> power.of(design, ohms))
                .min()
                .orElseThrow();
    }

    private static Design quietest(List<Design> designs, Power power, double ohms) {
        Design quietest = designs.get(0);
        for (Design design : designs) {
            if (power.of(design, ohms) < power.of(quietest, ohms)) {
                quietest = design;
            }
        }
        return quietest;
    }

    /** The device with one of its values grown; empty where it does not state the value. */
    private static Optional<Device> grown(Device device, Cause cause) {
        return switch (cause) {
            case BASE_RESISTANCE -> grown(device, DeviceParameter.BASE_RESISTANCE);
            case CURRENT_GAIN -> device.currentGain().map(sheet -> device.with(sheet.typical(), GROWTH));
            case GATE_LEAKAGE -> grown(device, DeviceParameter.GATE_LEAKAGE);
        };
    }

    private static Optional<Device> grown(Device device, DeviceParameter key) {
        return device.parameter(key).map(parameter -> device.with(key, GROWTH * parameter.representative()));
    }

    /** Where two designs change places next to a resistance at which they nearly do, Ω. */
    private static OptionalDouble moved(Design bipolar, Design jfet, Power power, double ohms) {
        UnivariateFunction balance = x -> Math.log(power.of(bipolar, Math.exp(x)) / power.of(jfet, Math.exp(x)));
        double here = Math.log(ohms);
        double atHere = balance.value(here);
        if (Math.abs(atHere) < EQUAL) {
            return OptionalDouble.of(ohms);
        }
        double nearerBelow = here;
        double nearerAbove = here;
        for (double factor : AROUND) {
            double below = here - Math.log(factor);
            double above = here + Math.log(factor);
            if (balance.value(below) * atHere <= 0.0) {
                return OptionalDouble.of(root(balance, below, nearerBelow));
            }
            if (balance.value(above) * atHere <= 0.0) {
                return OptionalDouble.of(root(balance, nearerAbove, above));
            }
            nearerBelow = below;
            nearerAbove = above;
        }
        return OptionalDouble.empty();
    }

    private static double root(UnivariateFunction balance, double from, double to) {
        return Math.exp(new BrentSolver(LOG_TOLERANCE).solve(MOST_EVALUATIONS, balance, from, to));
    }
}
