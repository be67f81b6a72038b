package hissledger.chart;

import java.util.List;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;

/** Lines with a marker at every so many points, staggered from line to line so that markers stay apart. */
final class SparseMarkers extends XYLineAndShapeRenderer {
    private static final long serialVersionUID = 1L;
    private static final int MARKERS = 7;
    /** Multiples of the golden section never come close to each other. */
    private static final double GOLDEN_SECTION = 0.6180339887498949;
    /** No marker is nearer to an end than this part of a step. */
    private static final double MARGIN = 0.15;

    private final List<Trace> traces;

    SparseMarkers(List<Trace> traces) {
        super(true, true);
        this.traces = List.copyOf(traces);
    }

    @Override
    public boolean getItemShapeVisible(int series, int item) {
        Trace trace = traces.get(series);
        if (trace.role() == Trace.Role.POINTS) {
            return true;
        }
        if (trace.role() != Trace.Role.CANDIDATE) {
            return false;
        }
        boolean atAnEnd = item == 0 || item == trace.x().size() - 1;
        if (atAnEnd) {
            return false;
        }
        int step = Math.max(1, trace.x().size() / MARKERS);
        double turn = trace.number() * GOLDEN_SECTION;
        double part = MARGIN + (1.0 - 2.0 * MARGIN) * (turn - Math.floor(turn));
        return item % step == (int) (part * step);
    }

    @Override
    public boolean getItemLineVisible(int series, int item) {
        Trace.Role role = traces.get(series).role();
        return role != Trace.Role.POINTS && role != Trace.Role.REGION;
    }

    @Override
    public boolean equals(Object other) {
        return this == other;
    }

    @Override
    public int hashCode() {
        return System.identityHashCode(this);
    }
}
