package hissledger.chart;

import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;

/** Shades what lies below the floor: no amplifier gets there. */
final class FloorShade extends AbstractXYAnnotation {
    private static final long serialVersionUID = 1L;

    private final Trace floor;

    FloorShade(Trace floor) {
        this.floor = floor;
    }

    @Override
    public void draw(
            Graphics2D graphics,
            XYPlot plot,
            Rectangle2D area,
            ValueAxis across,
            ValueAxis up,
            int rendererIndex,
            PlotRenderingInfo info) {
        Path2D path = new Path2D.Double();
        int last = floor.x().size() - 1;
        path.moveTo(across.valueToJava2D(floor.x().get(0), area, plot.getDomainAxisEdge()), area.getMaxY());
        for (int k = 0; k <= last; k++) {
            path.lineTo(
                    across.valueToJava2D(floor.x().get(k), area, plot.getDomainAxisEdge()),
                    up.valueToJava2D(floor.y().get(k), area, plot.getRangeAxisEdge()));
        }
        path.lineTo(across.valueToJava2D(floor.x().get(last), area, plot.getDomainAxisEdge()), area.getMaxY());
        path.closePath();
        graphics.setPaint(Look.FLOOR_SHADE);
        graphics.fill(path);
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
