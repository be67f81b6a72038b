package hissledger.chart;

import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Line2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import org.jfree.chart.ChartRenderingInfo;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.text.TextUtils;
import org.jfree.chart.ui.Layer;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/**
 * Lays a plate out in an area and draws it. From the top: title, conditions, a double rule, the title of the vertical axis, the
 * names of marked places, the ruled field, the title of the horizontal axis. To the right of the field every line has its name
 * at its end, moved apart where they would meet, with a piece of the line so that it is found without colour too.
 */
final class PlateDrawing {
    /* sizes in pixels of the usual picture */
    private static final double MARGIN = 30.0;
    private static final double TITLE = 30.0;
    private static final double TEXT = 19.0;
    private static final double VALUE = 16.5;
    private static final double RULE_GAP = 5.0;
    private static final double SPACE = 12.0;
    private static final double LEADER = 46.0;
    private static final double SAMPLE = 60.0;
    private static final double LABEL_GAP = 18.0;
    private static final double PLACE_TICK = 10.0;
    private static final double RING = 9.0;
    private static final double HAIR = 1.1;

    private static final int TITLE_LINES = 2;
    private static final int CONDITION_LINES = 3;
    /** The names beside the field take at most this part of the width. */
    private static final double WIDEST_NAMES = 0.22;

    /** How the names are set, the roomiest first: lines for the name, lines for its detail, size of the letters. */
    private static final List<Setting> SETTINGS = List.of(
            new Setting(3, 3, 1.0),
            new Setting(2, 2, 1.0),
            new Setting(2, 2, 0.85),
            new Setting(1, 1, 0.85),
            new Setting(1, 0, 0.85));

    private record Setting(int nameLines, int detailLines, double size) {}

    /** The name of one trace. */
    private record Name(Trace trace, Lettering name, Lettering detail) {
        double height() {
            return name.height() + detail.height();
        }

        double width() {
            return Math.max(name.width(), detail.width());
        }
    }

    private final Plate plate;
    private final Graphics2D graphics;
    private final Rectangle2D area;
    private final double scale;
    private final double left;
    private final double right;

    private PlateDrawing(Plate plate, Graphics2D graphics, Rectangle2D area, double scale) {
        this.plate = plate;
        this.graphics = graphics;
        this.area = area;
        this.scale = scale;
        this.left = area.getMinX() + MARGIN * scale;
        this.right = area.getMaxX() - MARGIN * scale;
    }

    /** The picture of a plate. */
    static Picture picture(Plate plate) {
        return new Picture((graphics, area, scale) -> new PlateDrawing(plate, graphics, area, scale).draw());
    }

    private void draw() {
        double headingBottom = heading();
        double top = axisTitle(plate.up().title(), left, headingBottom);
        double placesTop = top;
        if (!plate.places().isEmpty()) {
            top += lineHeight() + PLACE_TICK * scale;
        }
        Lettering across = text(plate.across().title(), right - left, 1);
        double bottom = area.getMaxY() - MARGIN * scale * 0.6 - across.height();
        double namesBottom = area.getMaxY() - MARGIN * scale * 0.6;
        List<Name> names = names(namesBottom - headingBottom);
        double namesWidth = names.stream().mapToDouble(Name::width).max().orElse(0.0);
        double fieldRight = right - namesWidth - (LEADER + SAMPLE + LABEL_GAP) * scale;
        // half a tick label stands out beyond each end of an axis: the chart library must not cut it off
        double overhang = lineHeight() / 2.0;

        JFreeChart chart = chart(plate, scale);
        chart.getXYPlot().setInsets(new RectangleInsets(overhang, 0.0, 0.0, LEADER * scale));
        ChartRenderingInfo info = new ChartRenderingInfo();
        chart.draw(
                graphics,
                new Rectangle2D.Double(
                        left, top - overhang, fieldRight + LEADER * scale - left, bottom - top + overhang),
                null,
                info);
        Rectangle2D field = info.getPlotInfo().getDataArea();
        XYPlot plot = chart.getXYPlot();

        graphics.setPaint(Look.INK);
        across.draw(graphics, field.getMaxX() - across.width(), bottom);
        drawPlaces(plot, field, placesTop);
        drawMapLabels(plot, field);
        drawNames(names, plot, field, headingBottom, namesBottom);
    }

    /** Title and conditions over a double rule; where it ends. */
    private double heading() {
        double width = right - left;
        double top = area.getMinY() + MARGIN * scale * 0.7;
        Lettering title = Lettering.broken(plate.title(), Look.bold(plate.title(), TITLE * scale), width, TITLE_LINES);
        graphics.setPaint(Look.INK);
        title.draw(graphics, left, top);
        top += title.height();
        graphics.setPaint(Look.PALE_INK);
        for (String condition : plate.conditions()) {
            Lettering lines = text(condition, width, CONDITION_LINES);
            lines.draw(graphics, left, top);
            top += lines.height();
        }
        top += RULE_GAP * scale;
        graphics.setPaint(Look.RULE);
        graphics.setStroke(Look.plain(2.0 * HAIR, scale));
        graphics.draw(new Line2D.Double(left, top, right, top));
        top += RULE_GAP * scale;
        graphics.setStroke(Look.plain(HAIR, scale));
        graphics.draw(new Line2D.Double(left, top, right, top));
        return top + SPACE * scale;
    }

    private double axisTitle(String title, double x, double top) {
        Lettering line = text(title, right - left, 1);
        graphics.setPaint(Look.INK);
        line.draw(graphics, x, top);
        return top + line.height() + SPACE * scale;
    }

    private Lettering text(String text, double width, int mostLines) {
        return Lettering.broken(text, Look.regular(text, TEXT * scale), width, mostLines);
    }

    private double lineHeight() {
        return new Lettering(List.of(""), Look.regular(TEXT * scale)).lineHeight();
    }

    /** The names of all traces in the roomiest setting that fits; of very many, the foremost. */
    private List<Name> names(double height) {
        double width = WIDEST_NAMES * area.getWidth();
        List<Name> names = List.of();
        for (Setting setting : SETTINGS) {
            names = plate.traces().stream()
                    .filter(trace -> trace.role() != Trace.Role.ZONE)
                    .map(trace -> name(trace, setting, width))
                    .toList();
            if (stackHeight(names) <= height) {
                return names;
            }
        }
        List<Name> kept = new ArrayList<>();
        List<Name> candidatesLast = names.stream()
                .sorted(Comparator.comparing(name -> name.trace().role() == Trace.Role.CANDIDATE))
                .toList();
        for (Name name : candidatesLast) {
            kept.add(name);
            if (stackHeight(kept) > height) {
                kept.remove(kept.size() - 1);
                break;
            }
        }
        return kept;
    }

    private double stackHeight(List<Name> names) {
        return names.stream().mapToDouble(this::room).sum();
    }

    private double room(Name name) {
        return name.height() + 0.3 * lineHeight();
    }

    private Name name(Trace trace, Setting setting, double width) {
        double size = TEXT * setting.size() * scale;
        return new Name(
                trace,
                Lettering.broken(trace.name(), Look.bold(trace.name(), size), width, setting.nameLines()),
                Lettering.broken(trace.detail(), Look.regular(trace.detail(), size), width, setting.detailLines()));
    }

    private void drawNames(List<Name> names, XYPlot plot, Rectangle2D field, double top, double bottom) {
        ValueAxis up = plot.getRangeAxis();
        List<Name> downwards = names.stream()
                .sorted(Comparator.comparingDouble(name -> -name.trace().lastY()))
                .toList();
        double[] ends = downwards.stream()
                .mapToDouble(name -> up.valueToJava2D(name.trace().lastY(), field, RectangleEdge.LEFT))
                .toArray();
        double[] rooms = downwards.stream().mapToDouble(this::room).toArray();
        boolean besideField = stackHeight(names) <= field.getHeight();
        double[] middles = Spread.middles(
                ends, rooms, besideField ? field.getMinY() : top, besideField ? field.getMaxY() : bottom);
        double start = field.getMaxX();
        double sample = start + LEADER * scale;
        double textStart = sample + (SAMPLE + LABEL_GAP) * scale;
        for (int k = 0; k < middles.length; k++) {
            Name name = downwards.get(k);
            Trace trace = name.trace();
            Color colour = Look.colour(trace.role(), trace.number());
            double middle = middles[k];
            double nameTop = middle - name.height() / 2.0;
            double sampleY = nameTop + name.name().lineHeight() / 2.0;
            if (trace.role() == Trace.Role.REGION) {
                drawSwatch(sample, nameTop, name.name().lineHeight(), trace.number());
                drawName(name, textStart, nameTop);
                continue;
            }
            graphics.setPaint(colour);
            graphics.setStroke(Look.plain(HAIR, scale));
            graphics.draw(new Line2D.Double(start + 3.0 * scale, ends[k], sample - 3.0 * scale, sampleY));
            if (trace.role() != Trace.Role.POINTS) {
                graphics.setStroke(Look.stroke(trace.role(), trace.number(), scale));
                graphics.draw(new Line2D.Double(sample, sampleY, sample + SAMPLE * scale, sampleY));
            }
            if (trace.role() == Trace.Role.CANDIDATE || trace.role() == Trace.Role.POINTS) {
                Graphics2D moved = (Graphics2D) graphics.create();
                moved.translate(sample + SAMPLE * scale, sampleY);
                moved.fill(Look.marker(trace.number(), scale));
                moved.dispose();
            }
            drawName(name, textStart, nameTop);
        }
    }

    private void drawName(Name name, double x, double top) {
        graphics.setPaint(Look.INK);
        name.name().draw(graphics, x, top);
        graphics.setPaint(Look.PALE_INK);
        name.detail().draw(graphics, x, top + name.name().height());
    }

    /** A piece of the hatching of a region beside its name. */
    private void drawSwatch(double x, double top, double height, int number) {
        Rectangle2D swatch = new Rectangle2D.Double(x, top, SAMPLE * scale, height);
        MapShade.hatch(graphics, swatch, number, scale);
        graphics.setPaint(Look.INK);
        graphics.setStroke(Look.plain(HAIR, scale));
        graphics.draw(swatch);
    }

    /** Names in regions and values on lines, clear of the rings of places. */
    private void drawMapLabels(XYPlot plot, Rectangle2D field) {
        List<Rectangle2D> taken = new ArrayList<>();
        double ring = RING * scale;
        for (Place place : plate.places()) {
            place.y()
                    .ifPresent(y -> taken.add(new Rectangle2D.Double(
                            plot.getDomainAxis().valueToJava2D(place.x(), field, RectangleEdge.BOTTOM) - ring,
                            plot.getRangeAxis().valueToJava2D(y, field, RectangleEdge.LEFT) - ring,
                            2.0 * ring,
                            2.0 * ring)));
        }
        MapLabels labels = new MapLabels(graphics, plot, field, scale, taken);
        plate.regions().forEach(region -> labels.name(region, TEXT * scale));
        plate.isolines().forEach(isoline -> labels.value(isoline, VALUE * scale));
    }

    /** The names of places above the field, moved apart, each with a stroke to its line. */
    private void drawPlaces(XYPlot plot, Rectangle2D field, double top) {
        List<Place> places = plate.places().stream()
                .sorted(Comparator.comparingDouble(Place::x))
                .toList();
        ValueAxis across = plot.getDomainAxis();
        double[] wanted = places.stream()
                .mapToDouble(place -> across.valueToJava2D(place.x(), field, RectangleEdge.BOTTOM))
                .toArray();
        List<Lettering> labels = places.stream()
                .map(place -> text(place.label(), field.getWidth(), 1))
                .toList();
        double[] rooms = labels.stream()
                .mapToDouble(label -> label.width() + TEXT * scale)
                .toArray();
        double[] middles = Spread.middles(wanted, rooms, field.getMinX(), field.getMaxX() + LEADER * scale);
        double labelBottom = top + lineHeight();
        for (int k = 0; k < middles.length; k++) {
            Lettering label = labels.get(k);
            graphics.setPaint(Look.RULE);
            label.draw(graphics, middles[k] - label.width() / 2.0, top);
            graphics.setStroke(Look.plain(HAIR, scale));
            graphics.draw(new Line2D.Double(middles[k], labelBottom, wanted[k], field.getMinY()));
            if (places.get(k).y().isPresent()) {
                double y =
                        plot.getRangeAxis().valueToJava2D(places.get(k).y().getAsDouble(), field, RectangleEdge.LEFT);
                double ring = RING * scale;
                graphics.setStroke(Look.plain(2.0 * HAIR, scale));
                graphics.draw(new Ellipse2D.Double(wanted[k] - ring, y - ring, 2.0 * ring, 2.0 * ring));
            }
        }
    }

    /** The ruled field with its lines, as the chart library draws it: without any title or legend. */
    static JFreeChart chart(Plate plate, double scale) {
        TextUtils.setUseDrawRotatedStringWorkaround(false);
        XYSeriesCollection lines = new XYSeriesCollection();
        for (int k = 0; k < plate.traces().size(); k++) {
            Trace trace = plate.traces().get(k);
            XYSeries series = new XYSeries(k, false);
            for (int point = 0; point < trace.x().size(); point++) {
                series.add(trace.x().get(point), trace.y().get(point));
            }
            lines.addSeries(series);
        }
        SparseMarkers renderer = new SparseMarkers(plate.traces());
        renderer.setDrawSeriesLineAsPath(true);
        for (int k = 0; k < plate.traces().size(); k++) {
            Trace trace = plate.traces().get(k);
            renderer.setSeriesPaint(k, Look.colour(trace.role(), trace.number()));
            renderer.setSeriesStroke(k, Look.stroke(trace.role(), trace.number(), scale));
            renderer.setSeriesShape(k, Look.marker(trace.number(), scale));
        }
        if (!plate.regions().isEmpty() || !plate.isolines().isEmpty()) {
            renderer.addAnnotation(new MapShade(plate, scale), Layer.BACKGROUND);
        }
        plate.shades().forEach(shade -> renderer.addAnnotation(new BandShade(shade), Layer.BACKGROUND));
        floor(plate).ifPresent(trace -> renderer.addAnnotation(new FloorShade(trace), Layer.BACKGROUND));

        ValueAxis across = RuledAxes.of(plate.across());
        ValueAxis up = RuledAxes.of(plate.up());
        Font tickFont = Look.regular(TEXT * scale);
        for (ValueAxis axis : List.of(across, up)) {
            axis.setTickLabelFont(tickFont);
            axis.setTickLabelPaint(Look.INK);
            axis.setTickMarkPaint(Look.INK);
            axis.setTickMarkStroke(Look.plain(HAIR, scale));
            axis.setTickMarkOutsideLength((float) (5.0 * scale));
            axis.setAxisLineVisible(false);
            axis.setTickLabelInsets(new RectangleInsets(4.0 * scale, 5.0 * scale, 4.0 * scale, 5.0 * scale));
        }
        XYPlot plot = new XYPlot(lines, across, up, renderer);
        plot.setInsets(RectangleInsets.ZERO_INSETS);
        plot.setAxisOffset(RectangleInsets.ZERO_INSETS);
        plot.setBackgroundPaint(Color.WHITE);
        plot.setOutlinePaint(Look.INK);
        plot.setOutlineStroke(Look.plain(HAIR, scale));
        plot.setDomainMinorGridlinesVisible(true);
        plot.setRangeMinorGridlinesVisible(true);
        plot.setDomainGridlinePaint(Look.GRID);
        plot.setRangeGridlinePaint(Look.GRID);
        plot.setDomainMinorGridlinePaint(Look.FINE_GRID);
        plot.setRangeMinorGridlinePaint(Look.FINE_GRID);
        plot.setDomainGridlineStroke(Look.plain(1.3 * HAIR, scale));
        plot.setRangeGridlineStroke(Look.plain(1.3 * HAIR, scale));
        plot.setDomainMinorGridlineStroke(Look.plain(HAIR, scale));
        plot.setRangeMinorGridlineStroke(Look.plain(HAIR, scale));
        for (Place place : plate.places()) {
            plot.addDomainMarker(new ValueMarker(place.x(), Look.RULE, Look.placeStroke(scale)), Layer.BACKGROUND);
        }
        JFreeChart chart = new JFreeChart(null, tickFont, plot, false);
        // whoever draws the picture has made it white, and lettering stands where the chart library would begin
        chart.setBackgroundPaint(null);
        chart.setPadding(RectangleInsets.ZERO_INSETS);
        return chart;
    }

    private static Optional<Trace> floor(Plate plate) {
        return plate.traces().stream()
                .filter(trace -> trace.role() == Trace.Role.FLOOR)
                .findFirst();
    }
}
