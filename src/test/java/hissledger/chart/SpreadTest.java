package hissledger.chart;

import static hissledger.Trials.forAll;
import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.Arrays;
import org.junit.jupiter.api.Test;

class SpreadTest {
    /** Sums of a few dozen numbers below 1000. */
    private static final double ROUNDINGS = 1e-9;

    private static final double ROOM = 1000.0;

    @Test
    void leavesLabelsAloneThatDoNotMeet() {
        assertThat(Spread.middles(new double[] {100.0, 200.0, 300.0}, new double[] {20.0, 20.0, 20.0}, 0.0, ROOM))
                .containsExactly(new double[] {100.0, 200.0, 300.0}, within(ROUNDINGS));
    }

    @Test
    void movesTwoThatMeetApartByHalfEach() {
        assertThat(Spread.middles(new double[] {100.0, 104.0}, new double[] {20.0, 20.0}, 0.0, ROOM))
                .containsExactly(new double[] {92.0, 112.0}, within(ROUNDINGS));
    }

    @Test
    void keepsOrderDistanceAndRoom() {
        forAll(500, random -> {
            int n = 1 + random.nextInt(20);
            double[] wanted = random.doubles(n, 0.0, ROOM).sorted().toArray();
            double[] extents = random.doubles(n, 1.0, ROOM / 20.0).toArray();
            double[] middles = Spread.middles(wanted, extents, 0.0, ROOM);
            assertThat(middles[0] - extents[0] / 2.0).isGreaterThan(-ROUNDINGS);
            assertThat(middles[n - 1] + extents[n - 1] / 2.0).isLessThan(ROOM + ROUNDINGS);
            for (int k = 1; k < n; k++) {
                assertThat(middles[k] - middles[k - 1])
                        .as(Arrays.toString(wanted))
                        .isGreaterThan((extents[k] + extents[k - 1]) / 2.0 - ROUNDINGS);
            }
        });
    }
}
