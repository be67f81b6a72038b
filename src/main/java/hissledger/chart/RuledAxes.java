package hissledger.chart;

import java.awt.Graphics2D;
import java.awt.font.FontRenderContext;
import java.awt.geom.Rectangle2D;
import java.util.List;
import java.util.function.DoubleFunction;
import java.util.function.Predicate;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.axis.ValueAxis;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/** Axes of the chart library that are ruled and labelled by {@link Ruling}: its own labels are outlines at odd values. */
final class RuledAxes {
    /** Lettering is measured as it is drawn: smooth, and at fractions of a pixel. */
    static final FontRenderContext LETTERING = new FontRenderContext(null, true, true);

    /** Between two labels along an axis, in heights of the letters. */
    private static final double GAP = 0.7;

    private RuledAxes() {}

    /** The axis of a scale. */
    static ValueAxis of(Scale scale) {
        ValueAxis axis = switch (scale.kind()) {
            case LOGARITHMIC_PREFIXED -> new RuledLogAxis(true);
            case LOGARITHMIC_PLAIN -> new RuledLogAxis(false);
            case LEVEL -> new RuledLevelAxis();
        };
        axis.setRange(scale.from(), scale.to());
        return axis;
    }

    private static final class RuledLogAxis extends LogAxis {
        private static final long serialVersionUID = 1L;
        private final boolean prefixed;

        RuledLogAxis(boolean prefixed) {
            super("");
            this.prefixed = prefixed;
        }

        @Override
        public List<?> refreshTicks(Graphics2D graphics, AxisState state, Rectangle2D area, RectangleEdge edge) {
            DoubleFunction<String> label = prefixed ? EngineeringLabels::prefixed : EngineeringLabels::plain;
            return ticks(
                    Ruling.logarithmic(
                            getRange().getLowerBound(),
                            getRange().getUpperBound(),
                            label,
                            fits(this, label, area, edge)),
                    edge);
        }
    }

    private static final class RuledLevelAxis extends NumberAxis {
        private static final long serialVersionUID = 1L;

        @Override
        public List<?> refreshTicks(Graphics2D graphics, AxisState state, Rectangle2D area, RectangleEdge edge) {
            DoubleFunction<String> label = EngineeringLabels::plain;
            return ticks(
                    Ruling.levels(
                            getRange().getLowerBound(),
                            getRange().getUpperBound(),
                            label,
                            fits(this, label, area, edge)),
                    edge);
        }
    }

    private static Predicate<List<Double>> fits(
            ValueAxis axis, DoubleFunction<String> label, Rectangle2D area, RectangleEdge edge) {
        double height = axis.getTickLabelFont().getSize2D();
        boolean horizontal = RectangleEdge.isTopOrBottom(edge);
        return Ruling.sideBySide(
                value -> axis.valueToJava2D(value, area, edge),
                value -> horizontal
                        ? axis.getTickLabelFont()
                                .getStringBounds(label.apply(value), LETTERING)
                                .getWidth()
                        : height,
                GAP * height);
    }

    private static List<NumberTick> ticks(List<Ruling> rulings, RectangleEdge edge) {
        TextAnchor anchor = RectangleEdge.isTopOrBottom(edge) ? TextAnchor.TOP_CENTER : TextAnchor.CENTER_RIGHT;
        return rulings.stream()
                .map(ruling -> new NumberTick(
                        ruling.strong() ? TickType.MAJOR : TickType.MINOR,
                        ruling.value(),
                        ruling.label(),
                        anchor,
                        TextAnchor.CENTER,
                        0.0))
                .toList();
    }
}
