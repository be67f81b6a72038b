package hissledger.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowable;
import static org.assertj.core.api.Assertions.within;

import hissledger.choose.Comparison;
import hissledger.choose.Crossover;
import hissledger.choose.Evaluation;
import hissledger.choose.ResistanceSweep;
import hissledger.ledger.Figure;
import hissledger.ledger.NoiseSpectrum;
import hissledger.physics.Decibels;
import java.util.ArrayList;
import java.util.Collections;
import java.util.List;
import java.util.Optional;
import org.jfree.chart.plot.XYPlot;
import org.junit.jupiter.api.Test;

class ComparisonChartTest {
    /** From volts to nanovolts and back, or through a logarithm: a few roundings. */
    private static final double ROUNDINGS = 1e-12;

    /** Six points a decade: between two of them a straight line on log axes is this near to the curve, dB. */
    private static final double STRAIGHT_LINE_DECIBELS = 0.2;

    private static final double NANO = 1e9;
    private static final int NO_SWEEP = 0;

    @Test
    void drawsEveryCandidateAndTheFloorAgainstFrequency() {
        Comparison comparison = Comparisons.usual();
        Plate plate = ComparisonChart.densityPlate(comparison);
        assertThat(plate.traces()).hasSize(comparison.ranked().size() + 1);
        for (int k = 0; k < comparison.ranked().size(); k++) {
            Evaluation evaluation = comparison.ranked().get(k);
            NoiseSpectrum spectrum = evaluation.ledger().spectrum();
            Trace trace = plate.traces().get(k);
            assertThat(trace.name()).isEqualTo(evaluation.name());
            assertThat(trace.role()).isEqualTo(Trace.Role.CANDIDATE);
            assertThat(trace.x()).isEqualTo(spectrum.hertz());
            double volts = spectrum.einVoltsPerRootHertz().get(100);
            assertThat(trace.y().get(100) / (volts * NANO)).isCloseTo(1.0, within(ROUNDINGS));
        }
        Trace floor = only(plate, Trace.Role.FLOOR);
        double source = comparison
                .winner()
                .ledger()
                .spectrum()
                .sourceVoltsPerRootHertz()
                .get(0);
        assertThat(floor.y().get(0) / (source * NANO)).isCloseTo(1.0, within(ROUNDINGS));
        assertThat(floor.x()).hasSameSizeAs(plate.traces().get(0).x());
    }

    @Test
    void leavesTheFloorOutWhereTheSourceMakesNoNoise() {
        Comparison comparison =
                Comparisons.of(Comparisons.SILENT_CAPSULE, Figure.EIN_FLAT, Comparisons.usualCandidates());
        assertThat(ComparisonChart.densityPlate(comparison).traces())
                .hasSize(comparison.ranked().size())
                .allMatch(trace -> trace.role() == Trace.Role.CANDIDATE);
    }

    @Test
    void axesReachBeyondAllLines() {
        for (Comparison comparison : List.of(
                Comparisons.usual(),
                Comparisons.crowded(10),
                Comparisons.of(Comparisons.SILENT_CAPSULE, Figure.EIN_PLAYBACK_A, Comparisons.usualCandidates()))) {
            for (Plate plate :
                    List.of(ComparisonChart.densityPlate(comparison), Comparisons.resistancePlate(comparison))) {
                XYPlot plot = PlateDrawing.chart(plate, 1.0).getXYPlot();
                assertThat(plot.getSeriesCount()).isEqualTo(plate.traces().size());
                for (Trace trace : plate.traces()) {
                    assertThat(plot.getDomainAxis()
                                    .getRange()
                                    .contains(trace.x().get(0)))
                            .isTrue();
                    assertThat(plot.getDomainAxis()
                                    .getRange()
                                    .contains(trace.x().get(trace.x().size() - 1)))
                            .isTrue();
                    assertThat(plot.getRangeAxis().getLowerBound()).isLessThan(Collections.min(trace.y()));
                    assertThat(plot.getRangeAxis().getUpperBound()).isGreaterThan(Collections.max(trace.y()));
                }
            }
        }
    }

    @Test
    void statesTheConditionsOfADensity() {
        Plate plate = ComparisonChart.densityPlate(Comparisons.usual());
        assertThat(plate.title()).startsWith("Microphone before a long cable");
        assertThat(plate.conditions())
                .containsExactly(
                        "Source: resistor 150 Ω, at 20 °C. Path and stage at 27 °C.",
                        "EIN density over 20 Hz to 20 kHz, unweighted, referred to the source's EMF, source noise included.");
        assertThat(plate.up().title()).isEqualTo("equivalent input noise density, nV/√Hz");
        assertThat(plate.across().title()).isEqualTo("frequency, Hz");
    }

    @Test
    void saysOfEachCandidateDeviceCountAndCurrent() {
        Plate plate = ComparisonChart.densityPlate(Comparisons.usual());
        assertThat(detail(plate, "NPN")).matches("npn-1, [0-9.]+ mA");
        assertThat(detail(plate, "JFETs")).isEqualTo("njf-1 x2, 5 mA each");
        assertThat(detail(plate, "JFET pair")).isEqualTo("njf-2 x2, 2.5 mA each");
        assertThat(detail(plate, "chip")).isEqualTo("amp-1");
        assertThat(detail(Comparisons.resistancePlate(Comparisons.usual()), "NPN"))
                .isEqualTo("npn-1, best current");
    }

    @Test
    void statesTheConditionsOfASweep() {
        Comparison comparison = Comparisons.of(Comparisons.MICROPHONE, Figure.EIN_A, Comparisons.usualCandidates());
        Plate plate = Comparisons.resistancePlate(comparison);
        assertThat(plate.conditions().subList(0, 2))
                .containsExactly(
                        "Source: resistor 150 Ω, at 20 °C, its resistance varied. Path and stage at 27 °C.",
                        "EIN over 20 Hz to 20 kHz, A-weighted, referred to the source's EMF, source noise included."
                                + " Best currents are found anew at each resistance.");
        assertThat(plate.up().title()).isEqualTo("equivalent input noise, A-weighted, dBu");
        Comparison capsule = Comparisons.of(Comparisons.SILENT_CAPSULE, Figure.EIN_A, Comparisons.usualCandidates());
        assertThat(Comparisons.resistancePlate(capsule).conditions().get(0))
                .isEqualTo("Source: a plain resistor at 20 °C in place of the capacitor 50 pF, at 20 °C."
                        + " Path and stage at 27 °C.");
    }

    /** Source 150 Ω, crossover a little above: thirty times around them, whole decades. */
    @Test
    void looksAroundTheSourceAndTheCrossover() {
        Comparison comparison = Comparisons.usual();
        double crossover = comparison.crossover().orElseThrow().resistanceOhms().get(0);
        assertThat(crossover).isBetween(150.0, 333.0);
        Plate plate = Comparisons.resistancePlate(comparison);
        assertThat(plate.across().title()).isEqualTo("source resistance, Ω");
        assertThat(plate.across().from()).isEqualTo(1.0);
        assertThat(plate.across().to()).isCloseTo(10e3, within(1e-6));
        assertThat(plate.traces()).allSatisfy(trace -> {
            assertThat(trace.x().get(0)).isEqualTo(1.0);
            assertThat(trace.x().get(trace.x().size() - 1)).isCloseTo(10e3, within(1e-6));
        });
    }

    @Test
    void looksAtTheWholeSweepWhereNothingIsToBeMarked() {
        Comparison comparison = Comparisons.of(
                Comparisons.SILENT_CAPSULE,
                Figure.EIN_FLAT,
                Comparisons.usualCandidates().subList(0, 1));
        Plate plate = Comparisons.resistancePlate(comparison);
        assertThat(plate.places()).isEmpty();
        assertThat(plate.across())
                .isEqualTo(new Scale("source resistance, Ω", Scale.Kind.LOGARITHMIC_PREFIXED, 1.0, 10e6));
        assertThat(plate.traces().get(0).x()).hasSize(43);
    }

    @Test
    void marksTheSourceAndTheCrossover() {
        Comparison comparison = Comparisons.usual();
        Plate plate = Comparisons.resistancePlate(comparison);
        double ohms = comparison.crossover().orElseThrow().resistanceOhms().get(0);
        assertThat(plate.places()).hasSize(2);
        assertThat(plate.places().get(0).label()).isEqualTo("source 150 Ω");
        assertThat(plate.places().get(0).x()).isEqualTo(150.0);
        Place crossover = plate.places().get(1);
        assertThat(crossover.label()).matches("crossover [0-9.]+ k?Ω");
        assertThat(crossover.x()).isEqualTo(ohms);
        double level = Decibels.dbu(ResistanceSweep.einVolts(
                comparison.scenario(),
                comparison.crossover().orElseThrow().jfet(),
                ohms,
                comparison.figure().weighting()));
        assertThat(crossover.y().orElseThrow()).isCloseTo(level, within(STRAIGHT_LINE_DECIBELS));
        assertThat(plate.conditions().get(2))
                .matches("\"NPN\" \\(bipolar\\) and \"JFETs\" \\(JFET\\) change places at [0-9.]+ k?Ω\\.");
    }

    @Test
    void saysSoWhereThereIsNoCrossover() {
        Comparison comparison = Comparisons.usual();
        Crossover never = new Crossover(
                comparison.crossover().orElseThrow().bipolar(),
                comparison.crossover().orElseThrow().jfet(),
                List.of(),
                false);
        Plate plate = Comparisons.resistancePlate(
                new Comparison(comparison.scenario(), comparison.figure(), comparison.ranked(), Optional.of(never)));
        assertThat(plate.conditions().get(2))
                .isEqualTo("\"NPN\" (bipolar) and \"JFETs\" (JFET) do not change places from 1 Ω to 10 MΩ:"
                        + " the JFET is quieter throughout.");
        assertThat(plate.places()).hasSize(1);
    }

    @Test
    void drawsTheLimitOfTheFigureAlone() {
        Comparison flat = Comparisons.usual();
        Trace limit = only(Comparisons.resistancePlate(flat), Trace.Role.LIMIT);
        assertThat(limit.detail()).isEqualTo("−128 dBu");
        assertThat(limit.y()).allSatisfy(level -> assertThat(level).isCloseTo(Comparisons.LIMIT_DBU, within(1e-9)));
        for (Figure unlimited : List.of(Figure.EIN_A, Figure.NOISE_FIGURE)) {
            Comparison other = Comparisons.of(Comparisons.MICROPHONE, unlimited, Comparisons.usualCandidates());
            assertThat(Comparisons.resistancePlate(other).traces())
                    .noneMatch(trace -> trace.role() == Trace.Role.LIMIT);
        }
    }

    @Test
    void aCandidateLooksTheSameHoweverItIsRanked() {
        Comparison quiet = Comparisons.usual();
        List<Evaluation> turned = new ArrayList<>(quiet.ranked());
        Collections.reverse(turned);
        Comparison other = new Comparison(quiet.scenario(), quiet.figure(), turned, quiet.crossover());
        for (Trace trace : ComparisonChart.densityPlate(quiet).traces()) {
            Trace same = ComparisonChart.densityPlate(other).traces().stream()
                    .filter(candidate -> candidate.name().equals(trace.name()))
                    .findFirst()
                    .orElseThrow();
            assertThat(same.number()).isEqualTo(trace.number());
        }
    }

    @Test
    void refusesAFloorThatDoesNotMatchAndNoSweeps() {
        Comparison comparison = Comparisons.usual();
        assertThat(catchThrowable(
                        () -> ComparisonChart.resistance(comparison, Comparisons.sweeps(comparison), List.of(1e-7))))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("floorVolts must be one to each of 43 resistances, was 1");
        assertThat(catchThrowable(() -> ComparisonChart.resistance(
                        comparison, Comparisons.sweeps(comparison).subList(0, NO_SWEEP), List.of())))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("sweeps must not be empty");
    }

    private static Trace only(Plate plate, Trace.Role role) {
        List<Trace> found =
                plate.traces().stream().filter(trace -> trace.role() == role).toList();
        assertThat(found).hasSize(1);
        return found.get(0);
    }

    private static String detail(Plate plate, String name) {
        return plate.traces().stream()
                .filter(trace -> trace.name().equals(name))
                .findFirst()
                .orElseThrow()
                .detail();
    }
}
