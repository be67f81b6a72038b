package hissledger.chart;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import hissledger.choose.Surface;
import java.util.List;
import java.util.stream.IntStream;
import org.junit.jupiter.api.Test;

class ContoursTest {
    private static final int POINTS = 101;
    private static final double REACH = 2.0;
    private static final double STEP = 2.0 * REACH / (POINTS - 1);
    private static final double RADIUS = 1.5;

    /** A chord of one cell stays within step²/(8 r) of its circle, crossings by straight lines within as much again. */
    private static final double CHORD = STEP * STEP / (4.0 * RADIUS);

    private static final double ROUNDINGS = 1e-12;

    private static List<Double> places(int points, double reach) {
        return IntStream.range(0, points)
                .mapToObj(k -> Math.exp(reach * (2.0 * k / (points - 1) - 1.0)))
                .toList();
    }

    private static Surface cone() {
        List<Double> places = places(POINTS, REACH);
        return Surface.of(places, places, (k, j) -> Math.hypot(Math.log(places.get(k)), Math.log(places.get(j))));
    }

    @Test
    void theContourOfAConeIsACircle() {
        List<Contours.Line> lines = Contours.lines(cone(), RADIUS);
        assertThat(lines).hasSize(1);
        Contours.Line circle = lines.get(0);
        int last = circle.x().size() - 1;
        assertThat(last).isGreaterThan(POINTS);
        assertThat(circle.x().get(last)).isEqualTo(circle.x().get(0));
        assertThat(circle.y().get(last)).isEqualTo(circle.y().get(0));
        double length = 0.0;
        for (int k = 0; k <= last; k++) {
            double x = Math.log(circle.x().get(k));
            double y = Math.log(circle.y().get(k));
            assertThat(Math.hypot(x, y)).isCloseTo(RADIUS, within(CHORD));
            if (k > 0) {
                length += Math.hypot(
                        x - Math.log(circle.x().get(k - 1)),
                        y - Math.log(circle.y().get(k - 1)));
            }
        }
        assertThat(length).isCloseTo(2.0 * Math.PI * RADIUS, within(2.0 * Math.PI * CHORD));
    }

    @Test
    void aLineThatLeavesTheFieldEndsAtItsEdges() {
        List<Double> places = places(POINTS, REACH);
        Surface plane = Surface.of(places, places, (k, j) -> Math.log(places.get(k)) + 2.0 * Math.log(places.get(j)));
        List<Contours.Line> lines = Contours.lines(plane, 0.3);
        assertThat(lines).hasSize(1);
        Contours.Line line = lines.get(0);
        for (int k = 0; k < line.x().size(); k++) {
            assertThat(Math.log(line.x().get(k)) + 2.0 * Math.log(line.y().get(k)))
                    .isCloseTo(0.3, within(ROUNDINGS));
        }
        double first = Math.log(line.x().get(0));
        double last = Math.log(line.x().get(line.x().size() - 1));
        assertThat(Math.abs(first - last)).isCloseTo(2.0 * REACH, within(ROUNDINGS));
    }

    @Test
    void theAreasOutsideACircleLeaveItsDisc() {
        double area = 0.0;
        for (Contours.Line polygon : Contours.areas(cone(), RADIUS)) {
            int n = polygon.x().size();
            for (int k = 0; k < n; k++) {
                int next = (k + 1) % n;
                area += 0.5
                        * (Math.log(polygon.x().get(k)) * Math.log(polygon.y().get(next))
                                - Math.log(polygon.x().get(next))
                                        * Math.log(polygon.y().get(k)));
            }
        }
        double square = 4.0 * REACH * REACH;
        assertThat(area).isCloseTo(square - Math.PI * RADIUS * RADIUS, within(2.0 * Math.PI * RADIUS * CHORD));
    }

    /** Two corners above, crosswise: their mean joins them or parts them. */
    @Test
    void theMeanDecidesASaddle() {
        List<Double> places = List.of(1.0, 10.0);
        Surface saddle = Surface.of(places, places, (k, j) -> k.equals(j) ? 1.0 : -1.0);
        for (double level : new double[] {-0.2, 0.2}) {
            List<Contours.Line> lines = Contours.lines(saddle, level);
            assertThat(lines).hasSize(2);
            for (Contours.Line line : lines) {
                assertThat(line.x()).hasSize(2);
                double x = Math.log10(line.x().get(0)) + Math.log10(line.x().get(1));
                double y = Math.log10(line.y().get(0)) + Math.log10(line.y().get(1));
                // the line cuts off a corner: of those below the level where the mean is above it, else of those above
                boolean sameSide = x > 1.0 == y > 1.0;
                assertThat(sameSide).isEqualTo(level > 0.0);
            }
        }
    }

    @Test
    void aLevelThatIsNotReachedHasNoLine() {
        assertThat(Contours.lines(cone(), -1.0)).isEmpty();
        assertThat(Contours.areas(cone(), 10.0)).isEmpty();
        assertThat(Contours.areas(cone(), -1.0)).hasSize(POINTS - 1);
    }
}
