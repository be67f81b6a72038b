package hissledger.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;

/** Shades what lies between two lines: what production makes of a value. */
final class BandShade extends AbstractXYAnnotation {
    private static final long serialVersionUID = 1L;
    /** Pale enough that three bands over one another still show a line. */
    private static final int ALPHA = 0x26;

    private final Shade shade;

    BandShade(Shade shade) {
        this.shade = shade;
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
        int there = shade.one().size();
        for (int k = 0; k < there; k++) {
            double x = across.valueToJava2D(shade.x().get(k), area, plot.getDomainAxisEdge());
            double y = up.valueToJava2D(shade.one().get(k), area, plot.getRangeAxisEdge());
            if (k == 0) {
                path.moveTo(x, y);
            } else {
                path.lineTo(x, y);
            }
        }
        for (int k = shade.other().size() - 1; k >= 0; k--) {
            path.lineTo(
                    across.valueToJava2D(shade.x().get(k), area, plot.getDomainAxisEdge()),
                    up.valueToJava2D(shade.other().get(k), area, plot.getRangeAxisEdge()));
        }
        path.closePath();
        Color line = Look.colour(Trace.Role.CANDIDATE, shade.number());
        graphics.setPaint(new Color(line.getRed(), line.getGreen(), line.getBlue(), ALPHA));
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
