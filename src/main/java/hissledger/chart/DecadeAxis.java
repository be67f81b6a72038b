package hissledger.chart;

import hissledger.files.Quantities;
import java.awt.Graphics2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayList;
import java.util.List;
import org.jfree.chart.axis.AxisState;
import org.jfree.chart.axis.LogAxis;
import org.jfree.chart.axis.NumberTick;
import org.jfree.chart.axis.TickType;
import org.jfree.chart.ui.RectangleEdge;
import org.jfree.chart.ui.TextAnchor;

/**
 * A logarithmic axis ruled like log paper: a line at 1 to 9 of every decade, labels in engineering notation at each decade, at
 * 1-2-5 where the span is short, at every line within one decade.
 */
final class DecadeAxis extends LogAxis {
    private static final long serialVersionUID = 1L;
    /** Up to this many decades 2 and 5 are labelled too. */
    private static final double SHORT_SPAN_DECADES = 3.2;

    private static final int LABEL_DIGITS = 3;
    private static final double ROUNDING = 1e-9;

    /** What one unit of the axis is in units of its data: 1e9 where volts are labelled in nanovolts. */
    private final double labelsPerUnit;

    /**
     * An axis.
     *
     * @param title its name and unit
     * @param labelsPerUnit the factor from a value to its label; labels take a prefix (k, M) where the factor is 1
     */
    DecadeAxis(String title, double labelsPerUnit) {
        super(title);
        this.labelsPerUnit = labelsPerUnit;
    }

    @Override
    public List<?> refreshTicks(Graphics2D graphics, AxisState state, Rectangle2D area, RectangleEdge edge) {
        boolean horizontal = RectangleEdge.isTopOrBottom(edge);
        TextAnchor anchor = horizontal ? TextAnchor.TOP_CENTER : TextAnchor.CENTER_RIGHT;
        double low = getRange().getLowerBound() * (1.0 - ROUNDING);
        double high = getRange().getUpperBound() * (1.0 + ROUNDING);
        boolean shortSpan = Math.log10(high / low) <= SHORT_SPAN_DECADES;
        boolean oneDecade = Math.log10(high / low) <= 1.0;
        List<NumberTick> ticks = new ArrayList<>();
        for (int decade = (int) Math.floor(Math.log10(low)); decade <= Math.ceil(Math.log10(high)); decade++) {
            for (int digit = 1; digit <= 9; digit++) {
                double value = Double.parseDouble(digit + "e" + decade);
                if (value < low || value > high) {
                    continue;
                }
                boolean labelled = digit == 1 || oneDecade || (shortSpan && (digit == 2 || digit == 5));
                ticks.add(new NumberTick(
                        digit == 1 ? TickType.MAJOR : TickType.MINOR,
                        value,
                        labelled ? label(value) : "",
                        anchor,
                        TextAnchor.CENTER,
                        0.0));
            }
        }
        return ticks;
    }

    private String label(double value) {
        return labelsPerUnit == 1.0
                ? Quantities.prefixed(value, LABEL_DIGITS)
                : Quantities.brief(value * labelsPerUnit, "", LABEL_DIGITS);
    }
}
