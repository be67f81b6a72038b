package hissledger.chart;

import static hissledger.Trials.forAll;
import static org.assertj.core.api.Assertions.assertThat;

import hissledger.Trials;
import java.util.List;
import org.junit.jupiter.api.Test;

class RulingTest {
    private static final int FEWEST_LABELS = 4;

    @Test
    void labelsDecadesOfResistance() {
        assertThat(labels(Ruling.logarithmic(1.0, 10e6, EngineeringLabels::prefixed, RulingTest::roomy)))
                .containsExactly("1", "10", "100", "1 k", "10 k", "100 k", "1 M", "10 M");
    }

    @Test
    void labelsTheAudioBandAtOneTwoFive() {
        assertThat(labels(Ruling.logarithmic(20.0, 20e3, EngineeringLabels::prefixed, RulingTest::roomy)))
                .containsExactly("20", "50", "100", "200", "500", "1 k", "2 k", "5 k", "10 k", "20 k");
    }

    @Test
    void labelsDensities() {
        assertThat(labels(Ruling.logarithmic(0.5, 10.0, EngineeringLabels::plain, RulingTest::roomy)))
                .containsExactly("0.5", "1", "2", "5", "10");
    }

    @Test
    void rulesEveryDecadeLikeLogPaper() {
        List<Ruling> rulings = Ruling.logarithmic(1.0, 1000.0, EngineeringLabels::plain, RulingTest::roomy);
        assertThat(rulings.stream().map(Ruling::value).sorted())
                .containsExactly(
                        1.0, 2.0, 3.0, 4.0, 5.0, 6.0, 7.0, 8.0, 9.0, 10.0, 20.0, 30.0, 40.0, 50.0, 60.0, 70.0, 80.0,
                        90.0, 100.0, 200.0, 300.0, 400.0, 500.0, 600.0, 700.0, 800.0, 900.0, 1000.0);
        assertThat(rulings.stream().filter(Ruling::strong).map(Ruling::value))
                .containsExactlyInAnyOrder(1.0, 10.0, 100.0, 1000.0);
    }

    @Test
    void labelsLevelsWithATrueMinusSign() {
        assertThat(labels(Ruling.levels(-130.0, -110.0, EngineeringLabels::plain, RulingTest::roomy)))
                .containsExactly(
                        "−130", "−128", "−126", "−124", "−122", "−120", "−118", "−116", "−114", "−112", "−110");
        assertThat(labels(Ruling.levels(-155.0, -50.0, EngineeringLabels::plain, RulingTest::roomy)))
                .containsExactly("−150", "−140", "−130", "−120", "−110", "−100", "−90", "−80", "−70", "−60", "−50");
    }

    @Test
    void labelsSparselyWhereThereIsLittleRoom() {
        assertThat(labels(Ruling.logarithmic(20.0, 20e3, EngineeringLabels::prefixed, values -> values.size() <= 5)))
                .containsExactly("100", "1 k", "10 k");
        assertThat(labels(Ruling.levels(-155.0, -50.0, EngineeringLabels::plain, values -> values.size() <= 3)))
                .containsExactly("−150", "−100", "−50");
    }

    @Test
    void anySpanHasLabelsThatDifferAndLieOnTheAxis() {
        forAll(500, random -> {
            double from = Trials.logUniform(random, 1e-3, 1e6);
            double to = from * Trials.logUniform(random, 2.0, 1e9);
            List<Ruling> rulings = Ruling.logarithmic(from, to, EngineeringLabels::plain, RulingTest::roomy);
            List<String> labels = labels(rulings);
            assertThat(labels).hasSizeGreaterThanOrEqualTo(FEWEST_LABELS).doesNotHaveDuplicates();
            assertThat(rulings).allMatch(ruling -> ruling.value() > from * 0.999 && ruling.value() < to * 1.001);
            assertThat(rulings.stream().map(Ruling::value)).doesNotHaveDuplicates();
        });
    }

    /** There is room for any labels. */
    static boolean roomy(List<Double> values) {
        return true;
    }

    private static List<String> labels(List<Ruling> rulings) {
        return rulings.stream()
                .map(Ruling::label)
                .filter(label -> !label.isEmpty())
                .toList();
    }
}
