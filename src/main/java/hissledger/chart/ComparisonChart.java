package hissledger.chart;

import hissledger.choose.Comparison;
import hissledger.choose.Crossover;
import hissledger.choose.Evaluation;
import hissledger.choose.ResistanceSweep;
import hissledger.choose.Scenario;
import hissledger.circuit.CapacitorSource;
import hissledger.circuit.CoilSource;
import hissledger.circuit.ResistorSource;
import hissledger.circuit.Source;
import hissledger.files.Phrases;
import hissledger.ledger.Figure;
import hissledger.ledger.NoiseSpectrum;
import hissledger.physics.Decibels;
import hissledger.physics.Weighting;
import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.geom.Line2D;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import org.jfree.chart.JFreeChart;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.plot.ValueMarker;
import org.jfree.chart.plot.XYPlot;
import org.jfree.chart.text.TextUtils;
import org.jfree.chart.title.LegendTitle;
import org.jfree.chart.title.TextTitle;
import org.jfree.chart.ui.HorizontalAlignment;
import org.jfree.chart.ui.RectangleAnchor;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.RectangleInsets;
import org.jfree.chart.ui.TextAnchor;
import org.jfree.data.xy.XYSeries;
import org.jfree.data.xy.XYSeriesCollection;

/** The charts of a comparison. */
public final class ComparisonChart {
    private static final double NANO = 1e9;
    private static final float TITLE = 34f;
    private static final float SUBTITLE = 21f;
    private static final float AXIS = 24f;
    private static final float TICK = 22f;
    private static final float LEGEND = 22f;
    private static final float NOTE = 21f;
    /** Room above and below the curves on a logarithmic axis. */
    private static final double HEAD_ROOM = 1.25;

    private static final double LEVEL_ROOM_DECIBELS = 2.0;

    /** How far around the source and the crossings a chart over resistance looks, as a ratio. */
    private static final double AROUND = 30.0;

    private ComparisonChart() {}

    /** EIN density of all candidates against frequency, with the source's own noise as the floor. */
    public static Picture density(Comparison comparison) {
        XYSeriesCollection lines = new XYSeriesCollection();
        double least = Double.POSITIVE_INFINITY;
        double greatest = 0.0;
        for (Evaluation evaluation : comparison.ranked()) {
            NoiseSpectrum spectrum = evaluation.ledger().spectrum();
            lines.addSeries(line(label(evaluation), spectrum.hertz(), spectrum.einVoltsPerRootHertz()));
            for (double ein : spectrum.einVoltsPerRootHertz()) {
                least = Math.min(least, ein);
                greatest = Math.max(greatest, ein);
            }
        }
        NoiseSpectrum first = comparison.winner().ledger().spectrum();
        boolean floor = first.sourceVoltsPerRootHertz().stream().allMatch(density -> density > 0.0);
        if (floor) {
            lines.addSeries(line("floor: the source alone", first.hertz(), first.sourceVoltsPerRootHertz()));
            for (double source : first.sourceVoltsPerRootHertz()) {
                least = Math.min(least, source);
            }
        }
        Scenario scenario = comparison.scenario();
        DecadeAxis frequency = new DecadeAxis("frequency, Hz", 1.0);
        frequency.setRange(scenario.band().fromHertz(), scenario.band().toHertz());
        DecadeAxis density = new DecadeAxis("equivalent input noise density, nV/√Hz", NANO);
        density.setRange(least / HEAD_ROOM, greatest * HEAD_ROOM);
        XYPlot plot = plot(lines, frequency, density, first.hertz().size(), floor ? lines.getSeriesCount() - 1 : -1);
        return picture(
                scenario,
                plot,
                List.of(
                        "Source: " + Phrases.source(scenario.source()) + ". Path and stage at "
                                + Phrases.temperature(scenario.temperatureKelvin()) + ".",
                        "Density " + Phrases.band(scenario.band())
                                + ", unweighted, at the source's EMF, source noise included."));
    }

    /**
     * EIN of all candidates against source resistance, each at its own best current where that is open.
     *
     * @param comparison the comparison
     * @param sweeps one a candidate
     * @param floorVolts noise of the source alone at the resistances of the sweeps, V rms
     */
    public static Picture resistance(Comparison comparison, List<ResistanceSweep> sweeps, List<Double> floorVolts) {
        Figure figure = comparison.figure();
        List<Double> ohms = sweeps.get(0).resistanceOhms();
        double[] span = span(comparison, ohms);
        XYSeriesCollection lines = new XYSeriesCollection();
        Extent extent = new Extent();
        for (ResistanceSweep sweep : sweeps) {
            lines.addSeries(levels(sweepLabel(sweep.evaluation()), ohms, sweep.einVolts(), span, extent));
        }
        lines.addSeries(levels("floor: the source alone", ohms, floorVolts, span, extent));
        DecadeAxis resistance = new DecadeAxis("source resistance, Ω", 1.0);
        resistance.setRange(span[0], span[1]);
        NumberAxis level = new NumberAxis("equivalent input noise over the band, " + weighting(figure) + ", dBu");
        level.setAutoRangeIncludesZero(false);
        level.setRange(extent.least - LEVEL_ROOM_DECIBELS, extent.greatest + LEVEL_ROOM_DECIBELS);
        XYPlot plot = plot(lines, resistance, level, ohms.size(), lines.getSeriesCount() - 1);
        Scenario scenario = comparison.scenario();
        limit(comparison)
                .ifPresent(volts -> plot.addRangeMarker(mark(
                        Decibels.dbu(volts),
                        "limit " + String.format(Locale.ROOT, "%.1f", Decibels.dbu(volts)) + " dBu",
                        RectangleAnchor.TOP_LEFT,
                        TextAnchor.BOTTOM_LEFT)));
        OptionalDouble own = ownResistance(scenario.source());
        if (own.isPresent()) {
            plot.addDomainMarker(mark(
                    own.getAsDouble(),
                    "this source, " + Phrases.brief(own.getAsDouble(), "Ω"),
                    RectangleAnchor.BOTTOM_RIGHT,
                    TextAnchor.BOTTOM_LEFT));
        }
        comparison
                .crossover()
                .map(Crossover::resistanceOhms)
                .orElse(List.of())
                .forEach(cross -> plot.addDomainMarker(mark(
                        cross,
                        "bipolar and JFET change places, " + Phrases.value(cross, "Ω"),
                        cross < own.orElse(0.0) ? RectangleAnchor.TOP_LEFT : RectangleAnchor.TOP_RIGHT,
                        cross < own.orElse(0.0) ? TextAnchor.TOP_RIGHT : TextAnchor.TOP_LEFT)));
        String source = scenario.source() instanceof CapacitorSource
                ? "Source: a plain resistor at "
                        + Phrases.temperature(scenario.source().temperatureKelvin())
                : "Source: " + Phrases.source(scenario.source()) + ", its resistance varied";
        return picture(
                scenario,
                plot,
                List.of(
                        source + ". Path and stage at " + Phrases.temperature(scenario.temperatureKelvin()) + ".",
                        "Band " + Phrases.band(scenario.band()) + ", " + weighting(figure)
                                + ", at the source's EMF, source noise included; open currents at their best for each resistance."));
    }

    /** Least and greatest level drawn. */
    private static final class Extent {
        private double least = Double.POSITIVE_INFINITY;
        private double greatest = Double.NEGATIVE_INFINITY;
    }

    private static XYSeries levels(String label, List<Double> ohms, List<Double> volts, double[] span, Extent extent) {
        XYSeries series = new XYSeries(label, false);
        for (int k = 0; k < ohms.size(); k++) {
            double level = Decibels.dbu(volts.get(k));
            series.add((double) ohms.get(k), level);
            if (ohms.get(k) >= span[0] && ohms.get(k) <= span[1]) {
                extent.least = Math.min(extent.least, level);
                extent.greatest = Math.max(extent.greatest, level);
            }
        }
        return series;
    }

    /** The resistances worth looking at: two decades below and above the source and the crossings, whole decades. */
    private static double[] span(Comparison comparison, List<Double> ohms) {
        double first = ohms.get(0);
        double last = ohms.get(ohms.size() - 1);
        List<Double> points = new ArrayList<>(
                comparison.crossover().map(Crossover::resistanceOhms).orElse(List.of()));
        ownResistance(comparison.scenario().source()).ifPresent(points::add);
        if (points.isEmpty()) {
            return new double[] {first, last};
        }
        double least = points.stream().mapToDouble(Double::doubleValue).min().orElse(first);
        double greatest = points.stream().mapToDouble(Double::doubleValue).max().orElse(last);
        return new double[] {
            Math.max(first, Math.pow(10.0, Math.floor(Math.log10(least / AROUND)))),
            Math.min(last, Math.pow(10.0, Math.ceil(Math.log10(greatest * AROUND))))
        };
    }

    private static String weighting(Figure figure) {
        return figure.weighting() == Weighting.FLAT
                ? "unweighted"
                : figure.weighting().label() + (figure.weighting() == Weighting.A ? "-weighted" : "");
    }

    private static Optional<Double> limit(Comparison comparison) {
        return comparison.figure().isEin()
                ? Optional.ofNullable(comparison.scenario().target().limits().get(comparison.figure()))
                : Optional.empty();
    }

    private static OptionalDouble ownResistance(Source source) {
        if (source instanceof ResistorSource resistor) {
            return inRange(resistor.resistanceOhms());
        }
        return source instanceof CoilSource coil ? inRange(coil.resistanceOhms()) : OptionalDouble.empty();
    }

    private static OptionalDouble inRange(double ohms) {
        return ohms >= ResistanceSweep.LEAST_OHMS && ohms <= ResistanceSweep.GREATEST_OHMS
                ? OptionalDouble.of(ohms)
                : OptionalDouble.empty();
    }

    private static String label(Evaluation evaluation) {
        String current = evaluation.ledger().frontEnd().stage().deviceAmps().isPresent()
                ? ", " + current(evaluation) + (count(evaluation) > 1 ? " each" : "")
                : "";
        return named(evaluation) + current;
    }

    private static String current(Evaluation evaluation) {
        return evaluation.optimum().isPresent()
                ? Phrases.value(evaluation.amps(), "A")
                : Phrases.brief(evaluation.amps(), "A");
    }

    private static String sweepLabel(Evaluation evaluation) {
        return evaluation.optimum().isPresent() ? named(evaluation) + ", best current" : label(evaluation);
    }

    private static String named(Evaluation evaluation) {
        String id = evaluation.candidate().device().id();
        return evaluation.name() + ": " + (count(evaluation) > 1 ? count(evaluation) + " x " + id : id);
    }

    private static int count(Evaluation evaluation) {
        return evaluation.candidate().plan().inParallel();
    }

    private static XYSeries line(String label, List<Double> x, List<Double> y) {
        XYSeries series = new XYSeries(label, false);
        for (int k = 0; k < x.size(); k++) {
            series.add((double) x.get(k), (double) y.get(k));
        }
        return series;
    }

    private static ValueMarker mark(double value, String label, RectangleAnchor anchor, TextAnchor text) {
        ValueMarker marker = new ValueMarker(value, Look.MARK, new BasicStroke(2.2f));
        marker.setLabel(label);
        marker.setLabelFont(Look.font(NOTE, false));
        marker.setLabelPaint(Look.MARK);
        marker.setLabelBackgroundColor(new Color(0, 0, 0, 0));
        marker.setLabelAnchor(anchor);
        marker.setLabelTextAnchor(text);
        marker.setLabelOffset(new RectangleInsets(6.0, 8.0, 6.0, 8.0));
        return marker;
    }

    private static XYPlot plot(XYSeriesCollection lines, ValueAxis x, ValueAxis y, int points, int floor) {
        SparseMarkers renderer = new SparseMarkers(points, floor);
        renderer.setDrawSeriesLineAsPath(true);
        renderer.setUseOutlinePaint(true);
        for (int series = 0; series < lines.getSeriesCount(); series++) {
            boolean reference = series == floor;
            renderer.setSeriesPaint(series, reference ? Look.FLOOR : Look.colour(series));
            renderer.setSeriesOutlinePaint(series, Color.WHITE);
            renderer.setSeriesStroke(series, reference ? Look.floorStroke() : Look.stroke(series));
            renderer.setSeriesShape(series, Look.marker(series));
        }
        renderer.setLegendLine(new Line2D.Double(-32.0, 0.0, 32.0, 0.0));
        XYPlot plot = new XYPlot(lines, x, y, renderer);
        for (ValueAxis axis : List.of(x, y)) {
            axis.setLabelFont(Look.font(AXIS, false));
            axis.setTickLabelFont(Look.font(TICK, false));
            axis.setLabelPaint(Look.INK);
            axis.setTickLabelPaint(Look.INK);
            axis.setAxisLinePaint(Look.INK);
        }
        plot.setBackgroundPaint(Color.WHITE);
        plot.setOutlinePaint(Look.INK);
        plot.setDomainGridlinePaint(Look.GRID);
        plot.setRangeGridlinePaint(Look.GRID);
        plot.setDomainGridlineStroke(new BasicStroke(1.2f));
        plot.setRangeGridlineStroke(new BasicStroke(1.2f));
        plot.setDomainMinorGridlinesVisible(true);
        plot.setRangeMinorGridlinesVisible(y instanceof DecadeAxis);
        plot.setDomainMinorGridlinePaint(Look.FINE_GRID);
        plot.setRangeMinorGridlinePaint(Look.FINE_GRID);
        plot.setDomainMinorGridlineStroke(new BasicStroke(1f));
        plot.setRangeMinorGridlineStroke(new BasicStroke(1f));
        plot.setInsets(new RectangleInsets(10.0, 12.0, 4.0, 46.0));
        return plot;
    }

    private static Picture picture(Scenario scenario, XYPlot plot, List<String> conditions) {
        TextUtils.setUseDrawRotatedStringWorkaround(false);
        JFreeChart chart = new JFreeChart(null, Look.font(TITLE, true), plot, false);
        chart.setBackgroundPaint(Color.WHITE);
        chart.setPadding(new RectangleInsets(18.0, 18.0, 14.0, 10.0));
        List<TextTitle> titles = new ArrayList<>();
        titles.add(new TextTitle(scenario.title(), Look.font(TITLE, true)));
        conditions.forEach(condition -> titles.add(new TextTitle(condition, Look.font(SUBTITLE, false))));
        for (TextTitle title : titles) {
            title.setHorizontalAlignment(HorizontalAlignment.LEFT);
            title.setTextAlignment(HorizontalAlignment.LEFT);
            title.setPaint(Look.INK);
            title.setPadding(new RectangleInsets(2.0, 14.0, 2.0, 10.0));
            title.setExpandToFitSpace(true);
            chart.addSubtitle(title);
        }
        LegendTitle legend = new LegendTitle(plot);
        legend.setItemFont(Look.font(LEGEND, false));
        legend.setItemPaint(Look.INK);
        legend.setPosition(RectangleEdge.BOTTOM);
        legend.setBackgroundPaint(Color.WHITE);
        legend.setItemLabelPadding(new RectangleInsets(4.0, 10.0, 4.0, 28.0));
        legend.setLegendItemGraphicPadding(new RectangleInsets(4.0, 12.0, 4.0, 2.0));
        chart.addSubtitle(legend);
        return new Picture(chart);
    }
}
