package hissledger.chart;

import org.jfree.chart.LegendItem;
import org.jfree.chart.renderer.xy.XYLineAndShapeRenderer;

/** Lines with a marker at every so many points, staggered from series to series, so that markers stay apart. */
final class SparseMarkers extends XYLineAndShapeRenderer {
    private static final long serialVersionUID = 1L;
    private static final int MARKERS = 7;

    private final int points;
    private final int bare;
    private boolean drawingLegend;

    /**
     * A renderer.
     *
     * @param points points of each series
     * @param bare the series without markers; negative for none
     */
    SparseMarkers(int points, int bare) {
        super(true, true);
        this.points = points;
        this.bare = bare;
    }

    @Override
    public LegendItem getLegendItem(int dataset, int series) {
        drawingLegend = true;
        try {
            return super.getLegendItem(dataset, series);
        } finally {
            drawingLegend = false;
        }
    }

    @Override
    public boolean getItemShapeVisible(int series, int item) {
        if (series == bare) {
            return false;
        }
        if (drawingLegend) {
            return true;
        }
        int step = Math.max(1, points / MARKERS);
        int offset = step / 2 + series * step / 5;
        return item % step == offset % step;
    }
}
