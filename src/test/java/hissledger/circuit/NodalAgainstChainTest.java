package hissledger.circuit;

import static hissledger.Trials.forAll;
import static hissledger.Trials.logUniform;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hissledger.twoport.ChainPass;
import hissledger.twoport.Frequencies;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.random.RandomGenerator;
import org.apache.commons.math3.complex.Complex;
import org.assertj.core.data.Percentage;
import org.junit.jupiter.api.Test;

/** The chain engine against nodal analysis of the drawn circuit: (c), two independent routes. */
class NodalAgainstChainTest {
    /**
     * Both routes work in double precision, 1.1e-16. The chain accumulates some hundred roundings, 1e-14; a sum near a
     * resonance or near a null of the generator's transfer cancels up to five digits of them. What is left, 1e-9, is four
     * orders of magnitude below any fault of the algebra, which shows in per cent.
     */
    private static final double BOTH_ROUTES_ROUNDING = 1e-9;

    private static final int FRONT_ENDS = 400;
    private static final int CASCODED = 100;
    private static final int PAIRS = 200;
    private static final int AMPLIFIED = 100;
    private static final double LOWEST_HERTZ = 1.0;
    private static final double HIGHEST_HERTZ = 1e6;

    @Test
    void everyEntryOfARandomFrontEndIsThatOfItsDrawnCircuit() {
        forAll(FRONT_ENDS, random -> assertAgreement(RandomFrontEnds.frontEnd(random), random));
    }

    @Test
    void aCascodeIsAHeldOutputTerminalWithTheFeedbackCapacitanceToGround() {
        forAll(CASCODED, random -> assertAgreement(RandomFrontEnds.cascoded(random), random));
    }

    @Test
    void aBalancedPairIsItsTwoHalvesDrawnInFull() {
        forAll(PAIRS, random -> assertAgreement(RandomFrontEnds.balanced(random), random));
    }

    /**
     * Exact where the halves have no feedback and no output conductance, whose common-mode admittance the engine leaves out.
     */
    @Test
    void aPairDrivenAtOneInputIsItsTwoHalvesDrawnInFull() {
        forAll(PAIRS, random -> assertAgreement(RandomFrontEnds.singleEnded(random), random));
    }

    @Test
    void aBehaviouralAmplifierIsItsGeneratorsAndItsInput() {
        forAll(AMPLIFIED, random -> assertAgreement(RandomFrontEnds.amplified(random), random));
    }

    @Test
    void theTrialsMeetEveryKindOfSourceStageAndPart() {
        // a test of the tests: a generator that never drew a follower would prove nothing of followers
        Map<Class<?>, Integer> met = new LinkedHashMap<>();
        forAll(FRONT_ENDS, random -> {
            FrontEnd frontEnd = RandomFrontEnds.frontEnd(random);
            met.merge(frontEnd.source().getClass(), 1, Integer::sum);
            met.merge(frontEnd.stage().getClass(), 1, Integer::sum);
            frontEnd.path().forEach(element -> met.merge(element.getClass(), 1, Integer::sum));
        });
        List<Class<?>> wanted = List.of(
                ResistorSource.class,
                CoilSource.class,
                CapacitorSource.class,
                SingleStage.class,
                FollowerStage.class,
                SeriesElement.class,
                ShuntElement.class,
                Transformer.class,
                Pad.class);
        assertThat(met.keySet()).containsAll(wanted);
        assertThat(met.values()).allMatch(count -> count > FRONT_ENDS / 10);
    }

    private static void assertAgreement(FrontEnd frontEnd, RandomGenerator random) {
        double[] hertz = {
            LOWEST_HERTZ,
            logUniform(random, LOWEST_HERTZ, HIGHEST_HERTZ),
            logUniform(random, LOWEST_HERTZ, HIGHEST_HERTZ),
            logUniform(random, LOWEST_HERTZ, HIGHEST_HERTZ),
            HIGHEST_HERTZ
        };
        ChainPass pass = new ChainPass(Frequencies.of(hertz));
        frontEnd.walk(pass);
        DrawnFrontEnd drawn = DrawnFrontEnd.of(frontEnd);
        for (int k = 0; k < hertz.length; k++) {
            NodalSolver.Answer nodal = drawn.solve(hertz[k]);
            assertThat(withoutSilent(chainEntries(pass, k)).keySet())
                    .as("names of the generators at %s Hz", hertz[k])
                    .containsExactlyInAnyOrderElementsOf(
                            withoutSilent(nodal.referred()).keySet());
            for (Map.Entry<String, Double> entry :
                    withoutSilent(chainEntries(pass, k)).entrySet()) {
                assertThat(entry.getValue())
                        .as("%s at %s Hz of %s", entry.getKey(), hertz[k], frontEnd)
                        .isCloseTo(nodal.referred().getOrDefault(entry.getKey(), 0.0), PERCENT);
            }
            Complex chainGain = new Complex(pass.rowVoltageRe()[k], pass.rowVoltageIm()[k]).reciprocal();
            assertThat(chainGain.subtract(nodal.gain()).abs())
                    .as("gain at %s Hz of %s", hertz[k], frontEnd)
                    .isCloseTo(0.0, within(BOTH_ROUTES_ROUNDING * nodal.gain().abs()));
        }
    }

    private static final Percentage PERCENT = Percentage.withPercentage(100.0 * BOTH_ROUTES_ROUNDING);

    private static Map<String, Double> chainEntries(ChainPass pass, int k) {
        Map<String, Double> entries = new LinkedHashMap<>();
        for (int g = 0; g < pass.generatorCount(); g++) {
            entries.merge(pass.generators().get(g).name(), pass.power(g)[k], Double::sum);
        }
        return entries;
    }

    /** Parts without losses have an entry of exactly nothing in one route and none in the other. */
    private static Map<String, Double> withoutSilent(Map<String, Double> entries) {
        Map<String, Double> loud = new LinkedHashMap<>(entries);
        loud.values().removeIf(power -> power == 0.0);
        return loud;
    }
}
