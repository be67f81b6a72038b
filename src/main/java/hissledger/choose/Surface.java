package hissledger.choose;

import java.util.List;
import java.util.function.ToDoubleBiFunction;

/** A figure over two axes that are divided logarithmically. */
public final class Surface {
    private static final int FEWEST_POINTS = 2;

    private final List<Double> across;
    private final List<Double> up;
    private final double[] values;

    private Surface(List<Double> across, List<Double> up, double[] values) {
        this.across = List.copyOf(across);
        this.up = List.copyOf(up);
        this.values = values;
    }

    /**
     * The surface of a figure.
     *
     * @param across places along one axis, rising; &gt; 0; at least 2
     * @param up places along the other, likewise
     * @param value the figure at the place of a number across and a number up
     */
    public static Surface of(List<Double> across, List<Double> up, ToDoubleBiFunction<Integer, Integer> value) {
        requireRising("across", across);
        requireRising("up", up);
        double[] values = new double[across.size() * up.size()];
        for (int k = 0; k < across.size(); k++) {
            for (int j = 0; j < up.size(); j++) {
                values[k * up.size() + j] = value.applyAsDouble(k, j);
            }
        }
        return new Surface(across, up, values);
    }

    private static void requireRising(String name, List<Double> places) {
        if (places.size() < FEWEST_POINTS) {
            throw new IllegalArgumentException(name + " needs at least 2 places, had " + places.size());
        }
        double below = 0.0;
        for (double place : places) {
            if (!(place > below)) {
                throw new IllegalArgumentException(
                        name + " must rise from above 0, but " + place + " follows " + below);
            }
            below = place;
        }
    }

    /** Places along the axis across, rising. */
    public List<Double> across() {
        return across;
    }

    /** Places along the axis up, rising. */
    public List<Double> up() {
        return up;
    }

    /** The figure at place {@code k} across and place {@code j} up. */
    public double at(int k, int j) {
        return values[k * up.size() + j];
    }
}
