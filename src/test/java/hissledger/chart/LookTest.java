package hissledger.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.Color;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.Area;
import java.util.Arrays;
import java.util.HashSet;
import java.util.List;
import java.util.Set;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class LookTest {
    private static final int COLOURS = 8;
    private static final int TOLD_APART_TWICE = 10;
    private static final int TOLD_APART = 110;

    /** Steps of CIE lightness that are told apart side by side in grey. */
    private static final double LIGHTNESS_STEP = 5.0;

    /** Contrast that graphical objects need against their ground (W3C, Web Content Accessibility Guidelines 2.1, 1.4.11). */
    private static final double LEAST_CONTRAST = 3.0;

    @Test
    void colourIsNotNeededToTellLinesApart() {
        Set<String> dashes = new HashSet<>();
        Set<String> markers = new HashSet<>();
        Set<String> pairs = new HashSet<>();
        for (int number = 0; number < TOLD_APART; number++) {
            String dash = Arrays.toString(
                    Look.stroke(Trace.Role.CANDIDATE, number, 1.0).getDashArray());
            String marker = outline(Look.marker(number, 1.0));
            pairs.add(dash + marker);
            if (number < TOLD_APART_TWICE) {
                dashes.add(dash);
                markers.add(marker);
            }
        }
        assertThat(pairs).hasSize(TOLD_APART);
        assertThat(dashes).hasSize(TOLD_APART_TWICE);
        assertThat(markers).hasSize(TOLD_APART_TWICE);
        for (Trace.Role reference : List.of(Trace.Role.FLOOR, Trace.Role.LIMIT)) {
            List<Stroke> candidates = IntStream.range(0, TOLD_APART_TWICE)
                    .<Stroke>mapToObj(number -> Look.stroke(Trace.Role.CANDIDATE, number, 1.0))
                    .toList();
            assertThat(candidates).doesNotContain(Look.stroke(reference, 0, 1.0));
        }
    }

    @Test
    void coloursStepInLightnessAndStandOutFromThePaper() {
        double[] lightness = IntStream.range(0, COLOURS)
                .mapToObj(number -> Look.colour(Trace.Role.CANDIDATE, number))
                .peek(colour -> assertThat(1.05 / (luminance(colour) + 0.05)).isGreaterThan(LEAST_CONTRAST))
                .mapToDouble(colour -> 116.0 * Math.cbrt(luminance(colour)) - 16.0)
                .sorted()
                .toArray();
        for (int k = 1; k < COLOURS; k++) {
            // the two lightest are as far apart as the contrast to the paper lets them
            double step = k == COLOURS - 1 ? LIGHTNESS_STEP / 2.0 : LIGHTNESS_STEP;
            assertThat(lightness[k] - lightness[k - 1]).isGreaterThan(step);
        }
    }

    @Test
    void theTypefaceComesWithTheProgram() {
        assertThat(Look.regular(20.0).getFamily()).isEqualTo("Roboto");
        assertThat(Look.bold("Ω µ √ ² − …", 20.0).getFontName()).isEqualTo("Roboto Bold");
        assertThat(Look.regular("磁", 20.0).getFamily()).isNotEqualTo("Roboto");
    }

    /** Relative luminance of a colour of IEC 61966-2-1 (sRGB). */
    private static double luminance(Color colour) {
        return 0.2126 * linear(colour.getRed())
                + 0.7152 * linear(colour.getGreen())
                + 0.0722 * linear(colour.getBlue());
    }

    private static double linear(int channel) {
        double value = channel / 255.0;
        return value <= 0.04045 ? value / 12.92 : Math.pow((value + 0.055) / 1.055, 2.4);
    }

    /** Which cells of a fine grid lie inside a shape. */
    private static String outline(Shape shape) {
        Area area = new Area(shape);
        StringBuilder cells = new StringBuilder();
        for (double y = -10.0; y <= 10.0; y += 1.0) {
            for (double x = -10.0; x <= 10.0; x += 1.0) {
                cells.append(area.contains(x, y) ? '#' : '.');
            }
        }
        return cells.toString();
    }
}
