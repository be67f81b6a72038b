package hissledger.chart;

import java.util.List;

/**
 * The area between two lines.
 *
 * @param number which candidate it belongs to; chooses the colour
 * @param x places along the axis, rising
 * @param one values of one line at the first of them, in the unit of the axis
 * @param other values of the other line
 */
record Shade(int number, List<Double> x, List<Double> one, List<Double> other) {
    Shade {
        x = List.copyOf(x);
        one = List.copyOf(one);
        other = List.copyOf(other);
    }
}
