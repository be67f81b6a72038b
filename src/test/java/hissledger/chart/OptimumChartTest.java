package hissledger.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import hissledger.choose.Candidate;
import hissledger.choose.CurrentSweep;
import hissledger.choose.OpenSearch;
import hissledger.choose.Scenario;
import hissledger.files.Catalogue;
import hissledger.files.InputException;
import hissledger.files.ScenarioReader;
import hissledger.ledger.Figure;
import hissledger.physics.Weighting;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;

class OptimumChartTest {
    @Test
    void everyCandidateHasItsLineItsBandAndWhereItIsFlat() throws InputException {
        Scenario scenario = ScenarioReader.read(Path.of("scenarios/vocal-dynamic.json"), Catalogue.load(List.of()));
        List<CurrentSweep> sweeps = new ArrayList<>();
        for (Candidate candidate : scenario.candidates()) {
            OpenSearch.Outcome outcome = OpenSearch.of(scenario, candidate, Weighting.FLAT);
            sweeps.add(CurrentSweep.of(outcome.best(), outcome.currentSearch(), scenario.band(), Weighting.FLAT));
        }
        Plate plate = OptimumChart.plate(scenario, Figure.EIN_FLAT, sweeps);
        assertThat(plate.traces().stream().filter(trace -> trace.role() == Trace.Role.CANDIDATE))
                .hasSize(5);
        // three of the five leave their current open
        assertThat(plate.traces().stream().filter(trace -> trace.role() == Trace.Role.ZONE))
                .hasSize(3);
        assertThat(plate.shades()).hasSize(5);
        for (CurrentSweep sweep : sweeps) {
            double chosen = sweep.choice().einVolts();
            assertThat(sweep.typicalVolts()).hasSameSizeAs(sweep.amps());
            if (sweep.flat().isPresent()) {
                double searched = 1.0 - 1e-6;
                assertThat(sweep.typicalVolts()).allMatch(volts -> volts >= chosen * searched);
            }
        }
        assertThat(plate.across().title()).isEqualTo("current of each device, A");
        assertThat(OptimumChart.current(scenario, Figure.EIN_FLAT, sweeps).png(800, 500).length)
                .isGreaterThan(10_000);
    }

    @Test
    void thereMustBeSomethingToDraw() throws InputException {
        Scenario scenario = ScenarioReader.read(Path.of("scenarios/geophone.json"), Catalogue.load(List.of()));
        assertThatIllegalArgumentException()
                .isThrownBy(() -> OptimumChart.plate(scenario, Figure.EIN_FLAT, List.of()))
                .withMessage("no candidate has a current to draw");
    }
}
