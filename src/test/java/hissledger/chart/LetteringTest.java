package hissledger.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Font;
import org.junit.jupiter.api.Test;

class LetteringTest {
    private static final Font FONT = Look.regular(20.0);
    private static final double WIDTH = 200.0;

    @Test
    void breaksAtBlanks() {
        Lettering lettering = Lettering.broken("referred to the EMF of the source", FONT, WIDTH, 5);
        assertThat(String.join(" ", lettering.lines())).isEqualTo("referred to the EMF of the source");
        assertThat(lettering.lines()).hasSize(2);
        assertThat(lettering.width()).isLessThanOrEqualTo(WIDTH);
    }

    @Test
    void breaksInsideAWordThatIsTooWide() {
        Lettering lettering = Lettering.broken("x".repeat(50), FONT, WIDTH, 5);
        assertThat(String.join("", lettering.lines())).isEqualTo("x".repeat(50));
        assertThat(lettering.width()).isLessThanOrEqualTo(WIDTH);
    }

    @Test
    void saysWhereSomethingIsLeftOut() {
        Lettering lettering = Lettering.broken("one two three four five six seven eight nine ten", FONT, WIDTH, 1);
        assertThat(lettering.lines()).hasSize(1);
        assertThat(lettering.lines().get(0)).startsWith("one two").endsWith("…");
        assertThat(lettering.width()).isLessThanOrEqualTo(WIDTH);
    }

    @Test
    void writesControlCharactersAsBlanks() {
        assertThat(Lettering.broken("a\n\tb\u0007", FONT, WIDTH, 3).lines()).containsExactly("a b");
        assertThat(Lettering.broken("", FONT, WIDTH, 3).height()).isZero();
    }

    @Test
    void neverCutsACharacterInTwo() {
        Lettering lettering = Lettering.broken("𝄞".repeat(40), Look.regular("𝄞", 20.0), WIDTH, 2);
        assertThat(lettering.lines())
                .allSatisfy(line ->
                        assertThat(line.replace("…", "").codePoints()).allMatch(point -> point == "𝄞".codePointAt(0)));
    }
}
