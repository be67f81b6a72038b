package hissledger.chart;

import java.util.List;

/**
 * One line of a chart.
 *
 * @param role what it stands for
 * @param number which candidate of its scenario it is, from 0; chooses dashes, marker and colour
 * @param name its name
 * @param detail what stands under the name; may be empty
 * @param x places along the axis, rising
 * @param y values at them, in the unit of the axis
 */
record Trace(Role role, int number, String name, String detail, List<Double> x, List<Double> y) {
    /** What a line stands for. */
    enum Role {
        /** A candidate. */
        CANDIDATE,
        /** The source's own noise. */
        FLOOR,
        /** A limit of the target. */
        LIMIT,
        /** Points without a line between them. */
        POINTS,
        /** The part of a candidate's line that costs next to nothing: drawn broad, without a name. */
        ZONE,
        /** The name of a hatched region: no line. */
        REGION
    }

    Trace {
        x = List.copyOf(x);
        y = List.copyOf(y);
        if (x.isEmpty() || x.size() != y.size()) {
            throw new IllegalArgumentException("a trace needs points, and as many y as x");
        }
    }

    double lastY() {
        return y.get(y.size() - 1);
    }
}
