package hissledger.chart;

import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.Shape;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.util.List;
import org.jfree.chart.annotations.AbstractXYAnnotation;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.PlotRenderingInfo;
import org.jfree.chart.plot.XYPlot;

/** Regions with their hatching and borders, and lines of equal value over them. */
final class MapShade extends AbstractXYAnnotation {
    private static final long serialVersionUID = 1L;

    private static final int TINT_ALPHA = 0x24;
    private static final int HATCH_ALPHA = 0x78;
    private static final double HATCH_STEP = 15.0;
    private static final double HATCH_LINE = 1.1;
    private static final double DOT = 1.8;
    private static final double BORDER = 2.6;
    private static final double ISOLINE = 1.5;

    /** Angles of the hatching in degrees, one list a candidate; none is a plain tint. */
    private static final List<List<Double>> HATCHES = List.of(
            List.of(45.0),
            List.of(-45.0),
            List.of(),
            List.of(45.0, -45.0),
            List.of(0.0),
            List.of(90.0),
            List.of(0.0, 90.0),
            List.of(20.0),
            List.of(-70.0),
            List.of(0.0, 45.0));

    private final Plate plate;
    private final double scale;

    MapShade(Plate plate, double scale) {
        this.plate = plate;
        this.scale = scale;
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
        for (Region region : plate.regions()) {
            Path2D path = new Path2D.Double();
            for (Contours.Line polygon : Contours.areas(region.advantage(), 0.0)) {
                append(path, polygon, plot, area);
                path.closePath();
            }
            hatch(graphics, path, region.number(), scale);
        }
        graphics.setPaint(Look.INK);
        graphics.setStroke(Look.plain(BORDER, scale));
        for (Region region : plate.regions()) {
            drawLines(graphics, Contours.lines(region.advantage(), 0.0), plot, area);
        }
        graphics.setStroke(Look.plain(ISOLINE, scale));
        for (Isoline isoline : plate.isolines()) {
            drawLines(graphics, Contours.lines(isoline.surface(), isoline.level()), plot, area);
        }
    }

    private static void drawLines(Graphics2D graphics, List<Contours.Line> lines, XYPlot plot, Rectangle2D area) {
        for (Contours.Line line : lines) {
            Path2D path = new Path2D.Double();
            append(path, line, plot, area);
            graphics.draw(path);
        }
    }

    private static void append(Path2D path, Contours.Line line, XYPlot plot, Rectangle2D area) {
        for (int k = 0; k < line.x().size(); k++) {
            double x = plot.getDomainAxis().valueToJava2D(line.x().get(k), area, plot.getDomainAxisEdge());
            double y = plot.getRangeAxis().valueToJava2D(line.y().get(k), area, plot.getRangeAxisEdge());
            if (k == 0) {
                path.moveTo(x, y);
            } else {
                path.lineTo(x, y);
            }
        }
    }

    /** Fills a shape with the tint and the hatching of a candidate: told apart without colour by its lines. */
    static void hatch(Graphics2D graphics, Shape shape, int number, double scale) {
        Color colour = Look.colour(Trace.Role.CANDIDATE, number);
        graphics.setPaint(alpha(colour, TINT_ALPHA));
        graphics.fill(shape);
        Graphics2D inside = (Graphics2D) graphics.create();
        inside.clip(shape);
        inside.setPaint(alpha(colour, HATCH_ALPHA));
        inside.setStroke(Look.plain(HATCH_LINE, scale));
        Rectangle2D bounds = shape.getBounds2D();
        double reach = Math.hypot(bounds.getWidth(), bounds.getHeight());
        double step = HATCH_STEP * scale;
        for (double angle : HATCHES.get(number % HATCHES.size())) {
            double cos = Math.cos(Math.toRadians(angle));
            double sin = Math.sin(Math.toRadians(angle));
            // lines are counted from the corner of the page, so that pieces of one area meet
            double middle = -bounds.getCenterX() * sin + bounds.getCenterY() * cos;
            double along = bounds.getCenterX() * cos + bounds.getCenterY() * sin;
            long last = (long) Math.ceil((middle + reach / 2.0) / step);
            for (long line = (long) Math.floor((middle - reach / 2.0) / step); line <= last; line++) {
                double off = line * step;
                inside.draw(new Line2D.Double(
                        (along - reach) * cos - off * sin,
                        (along - reach) * sin + off * cos,
                        (along + reach) * cos - off * sin,
                        (along + reach) * sin + off * cos));
            }
        }
        if (HATCHES.get(number % HATCHES.size()).isEmpty()) {
            dots(inside, bounds, step);
        }
        inside.dispose();
    }

    private static void dots(Graphics2D graphics, Rectangle2D bounds, double step) {
        double radius = DOT * step / HATCH_STEP;
        for (long row = (long) (bounds.getMinY() / step); row <= (long) (bounds.getMaxY() / step) + 1; row++) {
            double shift = row % 2 == 0 ? 0.0 : step / 2.0;
            for (long dot = (long) (bounds.getMinX() / step) - 1; dot <= (long) (bounds.getMaxX() / step) + 1; dot++) {
                graphics.fill(new Ellipse2D.Double(
                        dot * step + shift - radius, row * step - radius, 2.0 * radius, 2.0 * radius));
            }
        }
    }

    private static Color alpha(Color colour, int alpha) {
        return new Color(colour.getRed(), colour.getGreen(), colour.getBlue(), alpha);
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
