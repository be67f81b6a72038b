package hissledger.files;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

class NearWordsTest {
    private static final List<String> KNOWN = List.of("resistance", "inductance", "temperature", "esr");

    @Test
    void findsTheWordThatWasMeant() {
        assertThat(Nearest.of("resistence", KNOWN)).containsExactly("resistance");
        assertThat(Nearest.of("Temprature", KNOWN)).containsExactly("temperature");
        assertThat(Nearest.of("ers", KNOWN)).containsExactly("esr");
    }

    @Test
    void suggestsNothingForAWordThatIsFarFromAll() {
        assertThat(Nearest.of("colour", KNOWN)).isEmpty();
        assertThat(Nearest.of("", KNOWN)).isEmpty();
        assertThat(Nearest.of("D", List.of("A", "B"))).isEmpty();
        assertThat(Nearest.of("x".repeat(1_000_000), KNOWN)).isEmpty();
    }

    @Test
    void suggestsAtMostThreeNearestFirst() {
        assertThat(Nearest.of("bc55", List.of("bc550", "bc551", "bc552", "bc553", "bc5500")))
                .containsExactly("bc550", "bc551", "bc552");
    }

    @Test
    void countsASwapOfNeighboursAsOne() {
        assertThat(Nearest.distance("gian", "gain")).isEqualTo(1);
        assertThat(Nearest.distance("", "abc")).isEqualTo(3);
        assertThat(Nearest.distance("kitten", "sitting")).isEqualTo(3);
    }
}
