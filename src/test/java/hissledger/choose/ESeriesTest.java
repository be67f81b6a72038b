package hissledger.choose;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

class ESeriesTest {
    private static final int SERIES = 0;
    private static final int DIGITS = 3;
    /** The tables print the worst error of the nearest value in percent to one or two decimals. */
    private static final double PRINTED_ERROR = 0.06;

    private static List<Integer> published(ESeries series) throws IOException {
        List<Integer> digits = new ArrayList<>();
        try (InputStream table = ESeriesTest.class.getResourceAsStream("e-series.csv")) {
            assertThat(table).isNotNull();
            String text = new String(table.readAllBytes(), StandardCharsets.UTF_8);
            for (String line : text.lines().toList()) {
                List<String> cells = List.of(line.split(",", -1));
                if (cells.get(SERIES).equals(series.toString())) {
                    digits.add(Integer.parseInt(cells.get(DIGITS)));
                }
            }
        }
        return digits;
    }

    @ParameterizedTest
    @EnumSource(ESeries.class)
    void holdsThePublishedDigits(ESeries series) throws IOException {
        List<Integer> published = published(series);
        assertThat(published).hasSize(Integer.parseInt(series.toString().substring(1)));
        assertThat(series.digits()).isEqualTo(published);
    }

    @ParameterizedTest
    @CsvSource({"E6, 22.5", "E12, 11.8", "E24, 7.4", "E48, 2.63", "E96, 1.49"})
    void noValueIsFartherFromTheNearestThanPublished(ESeries series, double percent) {
        double worst = 0.0;
        List<Double> values = series.between(1.0, 10.0);
        for (int k = 1; k < values.size(); k++) {
            double middle = Math.sqrt(values.get(k - 1) * values.get(k));
            worst = Math.max(worst, 100.0 * (middle / values.get(k - 1) - 1.0));
        }
        assertThat(worst).isCloseTo(percent, within(PRINTED_ERROR));
    }

    @Test
    void findsNeighboursAcrossDecades() {
        assertThat(ESeries.E24.notAbove(999.0)).isEqualTo(910.0);
        assertThat(ESeries.E24.notBelow(911.0)).isEqualTo(1000.0);
        assertThat(ESeries.E24.nearest(4699.0)).isEqualTo(4700.0);
        assertThat(ESeries.E96.nearest(1e6)).isEqualTo(1e6);
        assertThat(ESeries.E6.nearest(2.1e-6)).isEqualTo(2.2e-6);
        assertThat(ESeries.E12.between(8.2, 12.0)).containsExactly(8.2, 10.0, 12.0);
    }
}
