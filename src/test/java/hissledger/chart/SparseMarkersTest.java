package hissledger.chart;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class SparseMarkersTest {
    private static final int POINTS = 240;

    @Test
    void marksEveryLineAFewTimesAndElsewhereThanItsNeighbours() {
        List<Trace> traces = IntStream.range(0, 8)
                .mapToObj(number -> trace(Trace.Role.CANDIDATE, number, POINTS))
                .toList();
        SparseMarkers renderer = new SparseMarkers(traces);
        List<Integer> all = new ArrayList<>();
        for (int series = 0; series < traces.size(); series++) {
            List<Integer> marked = marked(renderer, series, POINTS);
            assertThat(marked).hasSizeBetween(6, 8).doesNotContain(0, POINTS - 1);
            all.addAll(marked);
        }
        assertThat(new HashSet<>(all)).hasSameSizeAs(all);
    }

    @Test
    void marksAFewPointsOfAShortLineAndNoReference() {
        SparseMarkers renderer = new SparseMarkers(List.of(
                trace(Trace.Role.CANDIDATE, 0, 43), trace(Trace.Role.FLOOR, 0, 43), trace(Trace.Role.CANDIDATE, 3, 4)));
        assertThat(marked(renderer, 0, 43)).hasSizeBetween(5, 8);
        assertThat(marked(renderer, 1, 43)).isEmpty();
        assertThat(marked(renderer, 2, 4)).containsExactly(1, 2);
    }

    private static List<Integer> marked(SparseMarkers renderer, int series, int points) {
        return IntStream.range(0, points)
                .filter(item -> renderer.getItemShapeVisible(series, item))
                .boxed()
                .toList();
    }

    private static Trace trace(Trace.Role role, int number, int points) {
        List<Double> values =
                IntStream.rangeClosed(1, points).mapToObj(k -> (double) k).toList();
        return new Trace(role, number, "name", "", values, values);
    }
}
