package hissledger.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import org.junit.jupiter.api.Test;

class TextTableTest {
    @Test
    void numbersStandOnTheirDecimalPoints() {
        TextTable table =
                new TextTable().column(TextTable.Align.LEFT, "what").column(TextTable.Align.POINT, "value", "V");
        table.row("a", "1.25 mV");
        table.row("long name", "-110 µV");
        table.row("none", "-");
        assertThat(table.render().lines())
                .containsExactly(
                        "what       value",
                        "           V",
                        "---------------------",
                        "a             1.25 mV",
                        "long name  -110 µV",
                        "none          -");
    }

    @Test
    void aRowNeedsACellForEachColumn() {
        TextTable table = new TextTable().column(TextTable.Align.LEFT, "one");
        assertThatIllegalArgumentException()
                .isThrownBy(() -> table.row("a", "b"))
                .withMessage("a row of 2 cells in a table of 1");
    }

    @Test
    void sentencesAreBrokenBetweenWords() {
        String word = "abcdefghi ";
        assertThat(Words.wrapped(word.repeat(25).strip())).allMatch(line -> line.length() <= 110);
        assertThat(String.join(" ", Words.wrapped("one two"))).isEqualTo("one two");
    }
}
