package hissledger.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hissledger.choose.Candidate;
import hissledger.choose.CurrentChoice;
import hissledger.choose.Design;
import hissledger.choose.Scenario;
import hissledger.circuit.Arrangement;
import hissledger.circuit.CapacitorSource;
import hissledger.circuit.CoilSource;
import hissledger.circuit.CommonLead;
import hissledger.circuit.NextStage;
import hissledger.circuit.Passive;
import hissledger.circuit.PathElement;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.SeriesElement;
import hissledger.circuit.ShuntElement;
import hissledger.circuit.Signal;
import hissledger.circuit.TableSource;
import hissledger.circuit.Transformer;
import hissledger.ledger.Figure;
import hissledger.physics.Band;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.OptionalDouble;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

class ScenarioMeaningTest {
    /** One rounding of 10^(dB/20) and one of its product. */
    private static final double TWO_ROUNDINGS = 4 * Math.ulp(1.0);

    private static final String SOURCE = "{ \"kind\": \"resistor\", \"resistance\": \"150 ohm\" }";
    private static final String PATH = "\"path\": []";

    @TempDir
    private Path folder = Path.of("");

    private Scenario read(String text) throws Exception {
        return ScenarioReader.read(Texts.file(folder, "t.json", text), Texts.catalogue());
    }

    private Scenario with(String part, String other) throws Exception {
        return read(Texts.exchanged(Texts.SCENARIO, part, other));
    }

    private List<PathElement> path(String elements) throws Exception {
        return with(PATH, "\"path\": [" + elements + "]").path();
    }

    private Candidate candidate(String part, String other) throws Exception {
        return with(part, other).candidates().get(0);
    }

    @Test
    void takesTheDefaultsOfTheContract() throws Exception {
        Scenario scenario = read(Texts.SCENARIO);
        assertThat(scenario.temperatureKelvin()).isEqualTo(300.0);
        assertThat(scenario.band()).isEqualTo(Band.AUDIO);
        assertThat(scenario.spotsHertz()).containsExactly(100.0, 1000.0, 10_000.0);
        assertThat(scenario.source()).isEqualTo(new ResistorSource(150.0, 300.0, Signal.none()));
        assertThat(scenario.path()).isEmpty();
        assertThat(scenario.note()).isEmpty();
        assertThat(scenario.target().limits()).isEmpty();
        Candidate candidate = scenario.candidates().get(0);
        assertThat(candidate.plan().inParallel()).isEqualTo(1);
        assertThat(candidate.plan().around().commonLead().isGrounded()).isTrue();
        assertThat(candidate.plan().around().nextStage()).isEmpty();
        assertThat(candidate.plan().around().cascode()).isFalse();
        assertThat(candidate.current()).isEqualTo(new CurrentChoice.Given(1e-3));
    }

    @Test
    void readsWhatStandsAtTheTop() throws Exception {
        Scenario scenario = with(
                "\"title\": \"T\",",
                "\"$schema\": \"scenario.schema.json\", \"title\": \"T\", \"note\": \"N\", \"temperature\": \"27 degC\", "
                        + "\"band\": { \"from\": \"300 Hz\", \"to\": \"3.4 kHz\" }, \"spots\": [\"1 kHz\"], "
                        + "\"target\": { \"einFlat\": \"0 dBu\", \"einA\": \"2 uV\", \"ein468\": \"0 dBV\", \"noiseFigure\": \"3 dB\" },");
        assertThat(scenario.note()).isEqualTo("N");
        assertThat(scenario.temperatureKelvin()).isEqualTo(300.15);
        assertThat(scenario.band()).isEqualTo(new Band(300.0, 3400.0));
        assertThat(scenario.spotsHertz()).containsExactly(1000.0);
        assertThat(scenario.target().limits())
                .containsOnlyKeys(Figure.EIN_FLAT, Figure.EIN_A, Figure.EIN_468, Figure.NOISE_FIGURE)
                .containsEntry(Figure.EIN_FLAT, Math.sqrt(0.6))
                .containsEntry(Figure.EIN_A, 2e-6)
                .containsEntry(Figure.EIN_468, 1.0)
                .containsEntry(Figure.NOISE_FIGURE, 3.0);
        assertThat(scenario.source().temperatureKelvin()).isEqualTo(300.15);
    }

    @Test
    void readsACoil() throws Exception {
        String coil =
                "{ \"kind\": \"coil\", \"resistance\": \"1 kohm\", \"inductance\": \"0.5 H\", \"parallelResistance\": \"100k\", "
                        + "\"parallelCapacitance\": \"150 pF\", \"temperature\": \"20 degC\", \"referenceLevel\": \"-50 dBu\" }";
        CoilSource source = (CoilSource) with(SOURCE, coil).source();
        assertThat(source.resistanceOhms()).isEqualTo(1000.0);
        assertThat(source.inductanceHenries()).isEqualTo(0.5);
        assertThat(source.parallelOhms()).isEqualTo(1e5);
        assertThat(source.parallelFarads()).isEqualTo(150e-12);
        assertThat(source.temperatureKelvin()).isEqualTo(293.15);
        double volts = Math.sqrt(0.6) * Math.pow(10.0, -2.5);
        assertThat(source.signal().referenceVolts().orElseThrow()).isCloseTo(volts, within(volts * TWO_ROUNDINGS));
        assertThat(source.signal().voltsPerUnit()).isEmpty();
    }

    @Test
    void readsACapsuleWithItsLevelInDecibels() throws Exception {
        String capsule = "{ \"kind\": \"capacitor\", \"capacitance\": \"60 pF\", \"lossTangent\": 0.0005, "
                + "\"sensitivity\": \"9 mV/Pa\", \"referenceLevel\": \"94 dB SPL\" }";
        CapacitorSource source = (CapacitorSource) with(SOURCE, capsule).source();
        assertThat(source.capacitanceFarads()).isEqualTo(60e-12);
        assertThat(source.lossTangent()).isEqualTo(0.0005);
        assertThat(source.parallelOhms()).isInfinite();
        assertThat(source.signal().voltsPerUnit()).isEqualTo(OptionalDouble.of(9e-3));
        assertThat(source.signal().isAcoustic()).isTrue();
        double volts = 9e-3 * 20e-6 * Math.pow(10.0, 4.7);
        assertThat(source.signal().referenceVolts().orElseThrow()).isCloseTo(volts, within(volts * TWO_ROUNDINGS));
    }

    @Test
    void readsSensitivitiesOfEveryKind() throws Exception {
        for (String[] each : new String[][] {
            {"1.8 mV/Pa", "Pa"},
            {"1.8 mV/(m/s)", "m/s"},
            {"1.8 mV/(m/s2)", "m/s²"},
            {"1.8 mV/(m/s²)", "m/s²"},
            {"1.8 mV/N", "N"}
        }) {
            Signal signal = with("\"150 ohm\" }", "\"150 ohm\", \"sensitivity\": \"" + each[0] + "\" }")
                    .source()
                    .signal();
            assertThat(signal.voltsPerUnit()).isEqualTo(OptionalDouble.of(1.8e-3));
            assertThat(signal.unit()).isEqualTo(each[1]);
        }
    }

    @Test
    void readsATableBesideTheScenario() throws Exception {
        Texts.file(folder, "z.csv", "frequency_Hz,magnitude_ohm,phase_deg\n10,100,0\n100000,100,60\n");
        TableSource source = (TableSource)
                with(SOURCE, "{ \"kind\": \"table\", \"file\": \"z.csv\" }").source();
        assertThat(source.hertz()).containsExactly(10.0, 100_000.0);
        assertThat(source.resistanceOhms().get(1)).isCloseTo(50.0, within(50.0 * TWO_ROUNDINGS));
        assertThat(source.reactanceOhms().get(1)).isCloseTo(100.0 * Math.sqrt(0.75), within(100.0 * TWO_ROUNDINGS));
    }

    @Test
    void readsEveryPartOfAPath() throws Exception {
        List<PathElement> path = path("""
                { "kind": "series-resistor", "value": "10 ohm", "legs": 2, "name": "stopper" },
                { "kind": "shunt-resistor", "value": "4k7", "noiseIndex": "-20 dB", "dcVoltage": "48 V", "temperature": "320 K" },
                { "kind": "series-capacitor", "value": "47 uF", "lossTangent": 0.1 },
                { "kind": "shunt-capacitor", "value": "470 pF", "esr": "1 ohm" },
                { "kind": "series-inductor", "value": "1 mH" },
                { "kind": "shunt-inductor", "value": "10 H" }
                """);
        assertThat(path.get(0)).isEqualTo(new SeriesElement("stopper", Passive.Resistor.of(10.0), 2, 300.0));
        ShuntElement feed = (ShuntElement) path.get(1);
        Passive.Resistor resistor = (Passive.Resistor) feed.part();
        assertThat(feed.name()).isEqualTo("shunt resistor 4.7 kΩ");
        assertThat(feed.temperatureKelvin()).isEqualTo(320.0);
        assertThat(resistor.ohms()).isEqualTo(4700.0);
        assertThat(resistor.noiseIndex()).isCloseTo(1e-7, within(1e-7 * TWO_ROUNDINGS));
        assertThat(resistor.directVolts()).isEqualTo(48.0);
        assertThat(path.get(2))
                .isEqualTo(
                        new SeriesElement("series capacitor 47 µF", new Passive.Capacitor(47e-6, 0.1, 0.0), 1, 300.0));
        assertThat(path.get(3))
                .isEqualTo(
                        new ShuntElement("shunt capacitor 470 pF", new Passive.Capacitor(470e-12, 0.0, 1.0), 1, 300.0));
        assertThat(path.get(4))
                .isEqualTo(new SeriesElement("series inductor 1 mH", new Passive.Inductor(1e-3), 1, 300.0));
        assertThat(path.get(5))
                .isEqualTo(new ShuntElement("shunt inductor 10 H", new Passive.Inductor(10.0), 1, 300.0));
    }

    @Test
    void readsATransformer() throws Exception {
        List<PathElement> path = path("{ \"kind\": \"transformer\", \"ratio\": 10, \"primaryResistance\": \"4 ohm\", "
                + "\"secondaryResistance\": \"400 ohm\", \"leakageInductance\": \"1 mH\", \"name\": \"step-up\" }");
        assertThat(path)
                .containsExactly(new Transformer(
                        "step-up",
                        10.0,
                        4.0,
                        400.0,
                        Double.POSITIVE_INFINITY,
                        1e-3,
                        Double.POSITIVE_INFINITY,
                        0.0,
                        300.0));
    }

    @Test
    void givesEqualNamesANumber() throws Exception {
        String element = "{ \"kind\": \"series-resistor\", \"value\": \"10 ohm\" }";
        assertThat(path(element + ", " + element + ", " + element))
                .extracting(PathElement::name)
                .containsExactly("series resistor 10 Ω", "series resistor 10 Ω (2)", "series resistor 10 Ω (3)");
    }

    @Test
    void readsTheSurroundingsOfADevice() throws Exception {
        Candidate candidate = candidate(
                "\"load\": { \"resistor\": \"1 kohm\" }",
                "\"inParallel\": 4, \"cascode\": true, "
                        + "\"commonLead\": { \"unbypassed\": \"1 ohm\", \"resistor\": \"150 ohm\", \"bypass\": \"2200 uF\", \"bypassEsr\": \"20 mohm\" }, "
                        + "\"load\": { \"resistor\": \"2k7\", \"noiseIndex\": \"0 dB\", \"dcVoltage\": \"5 V\" }, "
                        + "\"nextStage\": { \"voltageNoise\": \"5 nV/rtHz\", \"voltageNoiseCorner\": \"10 Hz\", "
                        + "\"currentNoise\": \"0.5 pA/rtHz\", \"currentNoiseCorner\": \"100 Hz\" }");
        assertThat(candidate.plan().arrangement()).isEqualTo(Arrangement.COMMON_EMITTER);
        assertThat(candidate.plan().inParallel()).isEqualTo(4);
        assertThat(candidate.plan().around().cascode()).isTrue();
        assertThat(candidate.plan().around().commonLead()).isEqualTo(new CommonLead(1.0, 150.0, 2200e-6, 0.02));
        assertThat(candidate.plan().around().load()).contains(new Passive.Resistor(2700.0, 1e-6, 5.0));
        assertThat(candidate.plan().around().nextStage()).contains(new NextStage(5e-9, 10.0, 0.5e-12, 100.0));
    }

    @Test
    void readsEveryWayToStateACurrent() throws Exception {
        assertThat(candidate("\"1 mA\"", "\"optimum\"").current()).isEqualTo(CurrentChoice.Optimum.usual());
        assertThat(candidate(
                                "\"1 mA\"",
                                "{ \"optimum\": { \"from\": \"10 uA\", \"to\": \"20 mA\", \"for\": \"einA\" } }")
                        .current())
                .isEqualTo(new CurrentChoice.Optimum(OptionalDouble.of(10e-6), OptionalDouble.of(20e-3), Figure.EIN_A));
        assertThat(candidate("\"1 mA\"", "{ \"optimum\": { } }").current()).isEqualTo(CurrentChoice.Optimum.usual());
    }

    @Test
    void readsEveryArrangementSoThatItCanBeComputed() throws Exception {
        for (Arrangement arrangement : Arrangement.values()) {
            String device = arrangement == Arrangement.COMMON_SOURCE
                    ? "trial-njf"
                    : arrangement == Arrangement.AMPLIFIER ? "trial-amplifier" : "trial-npn";
            String more = switch (arrangement) {
                case GAIN_RESISTOR_PAIR -> ", \"gainResistor\": \"10 ohm\", \"feedbackResistor\": \"5 kohm\"";
                case SINGLE_ENDED_PAIR -> ", \"otherSide\": { \"resistor\": \"150 ohm\" }";
                default -> "";
            };
            String around = arrangement == Arrangement.AMPLIFIER
                    ? ""
                    : ", \"current\": \"1 mA\", \"load\": { \"resistor\": \"1 kohm\" }" + more;
            String text = Texts.SCENARIO.substring(0, Texts.SCENARIO.indexOf("{ \"name\""))
                    + "{ \"name\": \"a\", \"device\": \"" + device + "\", \"arrangement\": \"" + arrangement.label()
                    + "\"" + around + " } ] }";
            Scenario scenario = read(text);
            Candidate candidate = scenario.candidates().get(0);
            assertThat(candidate.plan().arrangement()).isEqualTo(arrangement);
            assertThat(Design.of(scenario, candidate).at(1e-3)).isNotNull();
        }
    }

    @Test
    void doesNotDependOnTheLocale() throws Exception {
        Locale before = Locale.getDefault();
        Locale.setDefault(Locale.GERMANY);
        try {
            assertThat(path("{ \"kind\": \"series-resistor\", \"value\": \"4.7 kohm\" }"))
                    .containsExactly(
                            new SeriesElement("series resistor 4.7 kΩ", Passive.Resistor.of(4700.0), 1, 300.0));
        } finally {
            Locale.setDefault(before);
        }
    }

    static Stream<Path> shippedScenarios() throws IOException {
        try (Stream<Path> files = Files.list(Path.of("scenarios"))) {
            return files.filter(file -> file.toString().endsWith(".json")).sorted().toList().stream();
        }
    }

    @ParameterizedTest
    @MethodSource("shippedScenarios")
    void readsTheShippedScenarios(Path file) throws Exception {
        Scenario scenario = ScenarioReader.read(file, Catalogue.load(List.of()));
        assertThat(scenario.candidates()).isNotEmpty();
    }
}
