package hissledger.choose;

import static org.assertj.core.api.Assertions.assertThat;

import hissledger.files.Catalogue;
import hissledger.files.InputException;
import hissledger.files.ScenarioReader;
import java.nio.file.Path;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

class BiasDesignTest {
    private static final double HEADROOM_VOLTS = 0.5;

    private static BiasDesign.Outcome design(ESeries series, double tolerance, double penaltyDecibels, double edgeHertz)
            throws InputException {
        Scenario scenario = ScenarioReader.read(Path.of("scenarios/cartridge-mm.json"), Catalogue.load(List.of()));
        Candidate candidate = scenario.candidates().stream()
                .filter(each -> each.name().equals("bipolar at 1 mA"))
                .findFirst()
                .orElseThrow();
        return BiasDesign.of(
                scenario,
                candidate,
                new BiasRequest(
                        12.0, series, tolerance, HEADROOM_VOLTS, OptionalDouble.of(edgeHertz), penaltyDecibels));
    }

    @ParameterizedTest
    @EnumSource(names = {"E12", "E24", "E48", "E96"})
    void everyValueIsOfItsSeriesAndEveryCaseKeepsTheHeadroom(ESeries series) throws InputException {
        BiasDesign.Outcome outcome = design(series, series.tolerance(), 0.1, 20.0);
        BiasNetwork network = outcome.network();
        for (double ohms : List.of(network.upperOhms(), network.lowerOhms(), network.leadOhms(), network.loadOhms())) {
            assertThat(series.nearest(ohms)).isEqualTo(ohms);
        }
        outcome.capacitors()
                .forEach(each -> assertThat(ESeries.E6.nearest(each.farads())).isEqualTo(each.farads()));
        assertThat(outcome.leastSwingVolts()).isGreaterThanOrEqualTo(HEADROOM_VOLTS);
        outcome.cases()
                .forEach(
                        each -> assertThat(each.point().amps()).isBetween(outcome.leastAmps(), outcome.greatestAmps()));
    }

    @Test
    void narrowerTolerancesGiveASteadierCurrent() throws InputException {
        BiasDesign.Outcome wide = design(ESeries.E24, 0.05, 0.1, 20.0);
        BiasDesign.Outcome narrow = design(ESeries.E24, 0.01, 0.1, 20.0);
        assertThat(narrow.greatestAmps() - narrow.leastAmps()).isLessThan(wide.greatestAmps() - wide.leastAmps());
    }

    @Test
    void theGreaterDemandSetsACapacitor() throws InputException {
        BiasDesign.Capacitor forNoise = coupling(design(ESeries.E24, 0.05, 0.001, 20.0));
        BiasDesign.Capacitor forResponse = coupling(design(ESeries.E24, 0.05, 30.0, 1.0));
        assertThat(forNoise.reason()).startsWith("noise");
        assertThat(forResponse.reason()).isEqualTo("response");
    }

    private static BiasDesign.Capacitor coupling(BiasDesign.Outcome outcome) {
        return outcome.capacitors().stream()
                .filter(each -> each.name().equals("coupling"))
                .findFirst()
                .orElseThrow();
    }
}
