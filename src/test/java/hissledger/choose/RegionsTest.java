package hissledger.choose;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;
import static org.assertj.core.api.Assertions.catchThrowable;
import static org.assertj.core.api.Assertions.within;

import hissledger.circuit.Arrangement;
import hissledger.circuit.CommonLead;
import hissledger.circuit.Passive;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.Signal;
import hissledger.circuit.StagePlan;
import hissledger.circuit.Surroundings;
import hissledger.device.Basis;
import hissledger.device.Device;
import hissledger.device.DeviceKind;
import hissledger.device.DeviceParameter;
import hissledger.device.GainPoint;
import hissledger.device.GainSheet;
import hissledger.device.Parameter;
import hissledger.device.Polarity;
import hissledger.files.Catalogue;
import hissledger.files.InputException;
import hissledger.files.ScenarioReader;
import hissledger.ledger.BandWalk;
import hissledger.ledger.Ledger;
import hissledger.physics.Band;
import hissledger.physics.Constants;
import hissledger.physics.Decibels;
import hissledger.physics.Thermal;
import hissledger.physics.Weighting;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.CancellationException;
import org.junit.jupiter.api.Test;

class RegionsTest {
    private static final double KELVIN = 300.0;
    private static final double SPOT_HERTZ = 1000.0;
    private static final int FEW_POINTS = 12;

    /** Two walks of the same front end on other sets of frequencies: roundings alone. */
    private static final double ROUNDINGS = 1e-9;

    private static final double COLLECTOR_AMPS = 5e-3;
    private static final double GAIN = 1e4;
    private static final double BASE_OHMS = 1.0;
    private static final double DRAIN_AMPS = 1e-3;
    private static final double PINCH_OFF_VOLTS = 4.5;

    private static final Surroundings LOADED =
            new Surroundings(CommonLead.grounded(), Optional.of(Passive.Resistor.of(1e12)), Optional.empty(), false);

    private static Scenario vocal() throws InputException {
        return ScenarioReader.read(Path.of("scenarios/vocal-dynamic.json"), Catalogue.load(List.of()));
    }

    private static Candidate bipolar() {
        GainSheet gain = new GainSheet(
                List.of(new GainPoint(1e-3, OptionalDouble.empty(), OptionalDouble.of(GAIN), OptionalDouble.empty())),
                Basis.INVENTED,
                "",
                "");
        Device device = new Device(
                "ideal-bipolar",
                DeviceKind.BIPOLAR,
                Polarity.NPN,
                "",
                "",
                "",
                Optional.of(gain),
                Map.of(DeviceParameter.BASE_RESISTANCE, Parameter.typical(BASE_OHMS, Basis.INVENTED)),
                List.of());
        return new Candidate(
                "bipolar",
                device,
                new StagePlan(Arrangement.COMMON_EMITTER, 1, LOADED),
                new CurrentChoice.Given(COLLECTOR_AMPS),
                List.of());
    }

    private static Candidate jfet() {
        Device device = new Device(
                "ideal-jfet",
                DeviceKind.JFET,
                Polarity.N_CHANNEL,
                "",
                "",
                "",
                Optional.empty(),
                Map.of(
                        DeviceParameter.DRAIN_SATURATION_CURRENT, Parameter.typical(DRAIN_AMPS, Basis.INVENTED),
                        DeviceParameter.PINCH_OFF_VOLTAGE, Parameter.typical(PINCH_OFF_VOLTS, Basis.INVENTED),
                        DeviceParameter.GATE_LEAKAGE, Parameter.typical(0.0, Basis.INVENTED)),
                List.of());
        return new Candidate(
                "jfet",
                device,
                new StagePlan(Arrangement.COMMON_SOURCE, 1, LOADED),
                new CurrentChoice.Given(DRAIN_AMPS),
                List.of());
    }

    private static Scenario ideal(Candidate... candidates) {
        return new Scenario(
                "two ideal devices",
                "",
                KELVIN,
                Band.AUDIO,
                List.of(SPOT_HERTZ),
                new Target(Map.of()),
                new ResistorSource(1000.0, KELVIN, Signal.none()),
                List.of(),
                List.of(candidates));
    }

    /**
     * With white en and in the crossover is R = √(enJ² − enB²)/inB. What that leaves out: the collector shot noise meets R too,
     * which adds 2 re/R of the base shot noise (0.08 %, half of it in R), rbb' stands in series with R (0.01 %), and 1/hFE.
     */
    @Test
    void theCrossoverOfTwoIdealDevicesIsTheClosedForm() {
        double q = Constants.ELEMENTARY_CHARGE_COULOMBS;
        double re = Thermal.voltageVolts(KELVIN) / COLLECTOR_AMPS;
        double fourKt = 4.0 * Constants.BOLTZMANN_JOULES_PER_KELVIN * KELVIN;
        double bipolarVolts = fourKt * BASE_OHMS + 2.0 * q * COLLECTOR_AMPS * re * re;
        double jfetVolts = fourKt * (2.0 / 3.0) / (2.0 / PINCH_OFF_VOLTS * DRAIN_AMPS);
        double bipolarAmps = Math.sqrt(2.0 * q * COLLECTOR_AMPS / GAIN);
        double textbook = Math.sqrt(jfetVolts - bipolarVolts) / bipolarAmps;
        // exactly: 4kT rbb + 2qIC (re + r/β)² + (2qIC/β) r² = enJ², r = R + rbb, a quadratic in r
        double a = 2.0 * q * COLLECTOR_AMPS * (1.0 / (GAIN * GAIN) + 1.0 / GAIN);
        double b = 2.0 * q * COLLECTOR_AMPS * 2.0 * re / GAIN;
        double c = bipolarVolts - jfetVolts;
        double exact = (-b + Math.sqrt(b * b - 4.0 * a * c)) / (2.0 * a) - BASE_OHMS;

        Regions regions = Regions.of(ideal(bipolar(), jfet()), 1.0, 10e6, FEW_POINTS, 1);
        assertThat(regions.crossovers()).hasSize(2);
        double leftOut = 1e-3;
        double searched = 1e-6;
        for (SpotCrossover crossover : regions.crossovers()) {
            assertThat(crossover.bipolarQuieterAtLeastResistance()).isTrue();
            assertThat(crossover.crossings()).hasSize(1);
            double ohms = crossover.crossings().get(0).ohms();
            assertThat(ohms / exact).isCloseTo(1.0, within(searched));
            assertThat(ohms / textbook).isCloseTo(1.0, within(leftOut));
        }
        assertThat(regions.crossovers().get(0).hertz()).hasValue(SPOT_HERTZ);
        assertThat(regions.crossovers().get(1).hertz()).isEmpty();
    }

    /** R grows as √hFE where base shot noise decides; rbb' of 1 Ω against 5 nV/√Hz, and a gate without leakage, move nothing. */
    @Test
    void theSensitivitiesFollowTheClosedForm() {
        Regions regions = Regions.of(ideal(bipolar(), jfet()), 1.0, 10e6, FEW_POINTS, 1);
        SpotCrossover.Crossing crossing =
                regions.crossovers().get(0).crossings().get(0);
        double leftOut = 1e-3;
        for (SpotCrossover.Shift shift : crossing.shifts()) {
            double ratio = shift.ohms().orElseThrow() / crossing.ohms();
            double expected = shift.cause() == SpotCrossover.Cause.CURRENT_GAIN ? Math.sqrt(SpotCrossover.GROWTH) : 1.0;
            assertThat(ratio).as(shift.cause().words()).isCloseTo(expected, within(leftOut));
        }
        assertThat(crossing.shifts())
                .extracting(SpotCrossover.Shift::cause)
                .containsExactly(SpotCrossover.Cause.values());
    }

    @Test
    void theBandCrossoverIsThatOfAComparison() throws InputException {
        Scenario scenario = vocal();
        Regions regions = Regions.of(scenario, 10.0, 10e3, FEW_POINTS, 2);
        double compared = Comparison.of(scenario, regions.figure())
                .crossover()
                .orElseThrow()
                .resistanceOhms()
                .get(0);
        double sought = regions.crossovers()
                .get(regions.crossovers().size() - 1)
                .crossings()
                .get(0)
                .ohms();
        double asSearchedThere = 1e-4;
        assertThat(sought / compared).isCloseTo(1.0, within(asSearchedThere));
    }

    /** Every lead of a grid against accounts drawn up one by one. */
    @Test
    void theMarginIsThatOfTheAccounts() throws InputException {
        Scenario scenario = vocal();
        Regions regions = Regions.of(scenario, 1.0, 1e6, FEW_POINTS, 2);
        for (int k : new int[] {0, 3, 7, FEW_POINTS - 1}) {
            Regions.Column column = regions.columns().get(k);
            Scenario moved = scenario.withSource(scenario.source().withResistance(column.ohms()));
            Scenario spots = new Scenario(
                    moved.title(),
                    "",
                    moved.temperatureKelvin(),
                    moved.band(),
                    regions.hertz(),
                    moved.target(),
                    moved.source(),
                    moved.path(),
                    moved.candidates());
            List<Ledger> ledgers = Comparison.evaluate(spots, Weighting.FLAT).stream()
                    .map(Evaluation::ledger)
                    .toList();
            for (int j = 0; j < FEW_POINTS; j++) {
                int spot = j;
                List<Double> ein = ledgers.stream()
                        .map(ledger -> ledger.spots().get(spot).einVoltsPerRootHertz())
                        .toList();
                List<Double> sorted = ein.stream().sorted().toList();
                Regions.Lead lead = column.atGrid(j);
                assertThat(ein.get(lead.winner())).isCloseTo(sorted.get(0), within(ROUNDINGS * sorted.get(0)));
                assertThat(lead.marginDecibels())
                        .isCloseTo(Decibels.ofAmplitudeRatio(sorted.get(1) / sorted.get(0)), within(ROUNDINGS));
                assertThat(regions.margin().at(k, j)).isEqualTo(lead.marginDecibels());
                assertThat(regions.advantage(lead.winner()).at(k, j))
                        .isCloseTo(lead.marginDecibels(), within(ROUNDINGS));
                assertThat(regions.advantage(lead.next()).at(k, j))
                        .isCloseTo(-lead.marginDecibels(), within(ROUNDINGS));
            }
        }
    }

    @Test
    void threadsDoNotChangeTheResult() throws InputException {
        Scenario scenario = vocal();
        assertThat(Regions.of(scenario, 1.0, 10e6, FEW_POINTS, 2))
                .isEqualTo(Regions.of(scenario, 1.0, 10e6, FEW_POINTS, 1));
        Candidate candidate = scenario.candidates().get(0);
        NoiseFigureMap one = NoiseFigureMap.of(scenario, candidate, 1.0, 10e6, FEW_POINTS, FEW_POINTS, 1);
        NoiseFigureMap two = NoiseFigureMap.of(scenario, candidate, 1.0, 10e6, FEW_POINTS, FEW_POINTS, 2);
        assertThat(two.ridge()).isEqualTo(one.ridge());
        assertThat(values(two.noiseFigure())).isEqualTo(values(one.noiseFigure()));
    }

    private static List<Double> values(Surface surface) {
        List<Double> values = new ArrayList<>();
        for (int k = 0; k < surface.across().size(); k++) {
            for (int j = 0; j < surface.up().size(); j++) {
                values.add(surface.at(k, j));
            }
        }
        return values;
    }

    @Test
    void interruptingTheCallerCancels() throws InputException {
        Scenario scenario = vocal();
        Thread.currentThread().interrupt();
        Throwable cancelled = catchThrowable(() -> Regions.of(scenario, 1.0, 10e6));
        assertThat(Thread.interrupted()).isTrue();
        assertThat(cancelled).isInstanceOf(CancellationException.class);
    }

    @Test
    void theRidgeIsTheBestCurrentAndTheValley() throws InputException {
        Scenario scenario = vocal();
        Candidate candidate = scenario.candidates().get(0);
        NoiseFigureMap map = NoiseFigureMap.of(scenario, candidate, 1.0, 10e6, FEW_POINTS, FEW_POINTS, 2);
        for (int k = 0; k < FEW_POINTS; k++) {
            double ohms = map.noiseFigure().across().get(k);
            Design design = Design.of(scenario.withSource(scenario.source().withResistance(ohms)), candidate);
            assertThat(map.ridge().get(k))
                    .isEqualTo(BestCurrent.of(design, scenario.band(), Weighting.FLAT)
                            .amps());
            for (int j = 0; j < FEW_POINTS; j++) {
                assertThat(map.noiseFigure().at(k, j))
                        .isGreaterThanOrEqualTo(map.ridgeDecibels().get(k) - ROUNDINGS);
            }
        }
    }

    @Test
    void theNoiseFigureIsThatOfTheAccount() throws InputException {
        Scenario scenario = vocal();
        Candidate candidate = scenario.candidates().get(0);
        NoiseFigureMap map = NoiseFigureMap.of(scenario, candidate, 1.0, 10e6, FEW_POINTS, FEW_POINTS, 1);
        NoiseFigureMap.WorkingPoint point = map.working().orElseThrow();
        Evaluation evaluation = Evaluation.of(scenario, candidate, Weighting.FLAT);
        assertThat(point.amps() / evaluation.amps()).isCloseTo(1.0, within(ROUNDINGS));
        assertThat(point.noiseFigureDecibels())
                .isCloseTo(evaluation.ledger().totals().noiseFigureDecibels().orElseThrow(), within(ROUNDINGS));
        OnePoint moved = new OnePoint(scenario, candidate, map);
        assertThat(moved.fromMap()).isCloseTo(moved.fromAccount(), within(ROUNDINGS));
    }

    /** One point of the map, away from the working point, against the integral of its front end. */
    private record OnePoint(Scenario scenario, Candidate candidate, NoiseFigureMap map) {
        private static final int ACROSS = 4;
        private static final int UP = 6;

        double fromMap() {
            return map.noiseFigure().at(ACROSS, UP);
        }

        double fromAccount() {
            Design design = Design.of(scenario, candidate)
                    .withSource(scenario.source()
                            .withResistance(map.noiseFigure().across().get(ACROSS)));
            var frontEnd = design.at(map.noiseFigure().up().get(UP));
            BandWalk walk = BandWalk.over(frontEnd, scenario.band());
            walk.walk(frontEnd);
            double source = walk.powerVoltsSquared(0, Weighting.FLAT);
            double standard = source
                    * Constants.STANDARD_NOISE_TEMPERATURE_KELVIN
                    / scenario.source().temperatureKelvin();
            return Decibels.ofPowerRatio(1.0 + (walk.einVoltsSquared(Weighting.FLAT) - source) / standard);
        }
    }

    @Test
    void stepsAreRoundResistances() {
        double rounding = 1e-9;
        assertThat(Regions.steps(1.0, 10e6)).hasSize(22);
        assertThat(Regions.steps(10.0, 100.0).get(1)).isCloseTo(20.0, within(rounding));
        assertThat(Regions.steps(120.0, 180.0)).hasSize(5).startsWith(120.0).endsWith(180.0);
    }

    @Test
    void refusesWhatHasNoAnswer() throws InputException {
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Regions.of(ideal(bipolar()), 1.0, 10.0, FEW_POINTS, 1))
                .withMessage("regions need at least two candidates to choose between");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> Regions.of(ideal(bipolar(), jfet()), 10.0, 1.0, FEW_POINTS, 1))
                .withMessage("toOhms must be above fromOhms, was 1.0 Ω against 10.0 Ω");
        assertThat(Regions.of(ideal(bipolar(), bipolar()), 1.0, 10.0, FEW_POINTS, 1)
                        .crossovers())
                .isEmpty();
        Scenario geophone = ScenarioReader.read(Path.of("scenarios/geophone.json"), Catalogue.load(List.of()));
        Candidate amplifier = geophone.candidates().stream()
                .filter(candidate -> candidate.device().kind() == DeviceKind.AMPLIFIER)
                .findFirst()
                .orElseThrow();
        assertThatIllegalArgumentException()
                .isThrownBy(() -> NoiseFigureMap.of(geophone, amplifier, 1.0, 10.0))
                .withMessageContaining("is a behavioural amplifier");
    }
}
