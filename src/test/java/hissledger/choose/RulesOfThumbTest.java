package hissledger.choose;

import static org.assertj.core.api.Assertions.assertThat;

import hissledger.circuit.Arrangement;
import hissledger.circuit.CommonLead;
import hissledger.circuit.Passive;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.Signal;
import hissledger.circuit.StagePlan;
import hissledger.circuit.Surroundings;
import hissledger.device.Device;
import hissledger.files.Catalogue;
import hissledger.files.InputException;
import hissledger.ledger.Figure;
import hissledger.physics.Band;
import java.util.List;
import java.util.Optional;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Rules of the trade, common practice without source, held against the shipped devices. */
class RulesOfThumbTest {
    private static final double KELVIN = 300.0;
    private static final Surroundings LOADED =
            new Surroundings(CommonLead.grounded(), Optional.of(Passive.Resistor.of(2700.0)), Optional.empty(), false);

    private static Candidate candidate(String id, Arrangement arrangement) throws InputException {
        Device device = Catalogue.load(List.of()).find(id).orElseThrow();
        return new Candidate(
                id, device, new StagePlan(arrangement, 1, LOADED), CurrentChoice.Optimum.usual(), List.of());
    }

    private static Comparison compare(double sourceOhms, String bipolar, String jfet) throws InputException {
        Scenario scenario = new Scenario(
                "rule of thumb",
                "",
                KELVIN,
                Band.AUDIO,
                List.of(1000.0),
                Target.none(),
                new ResistorSource(sourceOhms, KELVIN, Signal.none()),
                List.of(),
                List.of(candidate(bipolar, Arrangement.COMMON_EMITTER), candidate(jfet, Arrangement.COMMON_SOURCE)));
        return Comparison.of(scenario, Figure.EIN_FLAT);
    }

    /**
     * "A FET input is quieter, since no current flows into its gate": common practice, no source. True at 1 MΩ, false at 150 Ω,
     * and there is one source resistance between them at which it begins to hold.
     */
    @ParameterizedTest
    @CsvSource({"ztx951, bf862", "ssm2212, bf862", "ztx951, j310", "2n4403, j310", "mat03, 2sk435"})
    void aFetIsQuieterAboveTheCrossoverOnly(String bipolar, String jfet) throws InputException {
        assertThat(compare(150.0, bipolar, jfet).winner().name()).isEqualTo(bipolar);
        Comparison high = compare(1e6, bipolar, jfet);
        assertThat(high.winner().name()).isEqualTo(jfet);
        Crossover crossover = high.crossover().orElseThrow();
        assertThat(crossover.bipolarQuieterAtLeastResistance()).isTrue();
        assertThat(crossover.resistanceOhms()).hasSize(1);
        double ohms = crossover.resistanceOhms().get(0);
        assertThat(ohms).isBetween(150.0, 1e6);
        assertThat(compare(0.9 * ohms, bipolar, jfet).winner().name()).isEqualTo(bipolar);
        assertThat(compare(1.1 * ohms, bipolar, jfet).winner().name()).isEqualTo(jfet);
    }
}
