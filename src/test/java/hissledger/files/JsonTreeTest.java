package hissledger.files;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class JsonTreeTest {
    @Test
    void writesTheTreeInItsOrder() {
        Map<String, Object> tree = new LinkedHashMap<>();
        tree.put("title", "20 µV \"quoted\"");
        tree.put("count", 3);
        tree.put("value_V", 1.5e-9);
        tree.put("absent_dB", OptionalDouble.empty());
        tree.put("present_dB", OptionalDouble.of(-127.5));
        tree.put("flag", true);
        tree.put("list", List.of(1.0, 2.0));
        tree.put("empty", Map.of());
        assertThat(JsonOut.text(tree)).isEqualTo("""
                        {
                          "title" : "20 µV \\"quoted\\"",
                          "count" : 3,
                          "value_V" : 1.5E-9,
                          "absent_dB" : null,
                          "present_dB" : -127.5,
                          "flag" : true,
                          "list" : [ 1.0, 2.0 ],
                          "empty" : { }
                        }
                        """);
    }

    @ParameterizedTest
    @ValueSource(doubles = {Double.NaN, Double.POSITIVE_INFINITY, Double.NEGATIVE_INFINITY})
    void writesNoNumberThatIsNone(double value) {
        assertThatThrownBy(() -> JsonOut.text(Map.of("a", List.of(value))))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("JSON has no number for " + value);
        assertThatThrownBy(() -> JsonOut.text(Map.of("a", OptionalDouble.of(value))))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("JSON has no number for " + value);
    }

    @Test
    void writesNothingOfAKindThatJsonLacks() {
        assertThatThrownBy(() -> JsonOut.text(Map.of("a", new StringBuilder())))
                .isInstanceOf(IllegalArgumentException.class)
                .hasMessage("no JSON for a StringBuilder");
    }
}
