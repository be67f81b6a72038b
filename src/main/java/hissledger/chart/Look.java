package hissledger.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.FontFormatException;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.geom.AffineTransform;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.io.InputStream;

/**
 * The one look of all charts: dark on white, made for print. Series differ by dash and marker before they differ by colour, and
 * the colours step in lightness so that they differ in grey.
 */
final class Look {
    private static final String REGULAR = "/com/formdev/flatlaf/fonts/roboto/Roboto-Regular.ttf";
    private static final String BOLD = "/com/formdev/flatlaf/fonts/roboto/Roboto-Bold.ttf";

    /** The reference line: the source's own noise. */
    static final Color FLOOR = new Color(0x55, 0x55, 0x55);

    /** Limits and crossings. */
    static final Color MARK = new Color(0x8C, 0x1C, 0x13);

    static final Color INK = new Color(0x1E, 0x1E, 0x24);
    static final Color GRID = new Color(0xC9, 0xCE, 0xD6);
    static final Color FINE_GRID = new Color(0xE7, 0xEA, 0xEF);

    /* dark to light; each hue is told from its neighbours by those who do not see red or green */
    private static final Color[] COLOURS = {
        new Color(0x14, 0x2B, 0x5E),
        new Color(0xB0, 0x3A, 0x0E),
        new Color(0x1B, 0x7F, 0x79),
        new Color(0x7A, 0x3B, 0x9A),
        new Color(0xC9, 0x8A, 0x00),
        new Color(0x3E, 0x8E, 0xC7),
        new Color(0x66, 0x70, 0x2B),
        new Color(0xB5, 0x6A, 0x93)
    };

    private static final float[][] DASHES = {
        {},
        {14f, 6f},
        {3f, 5f},
        {18f, 5f, 3f, 5f},
        {8f, 4f},
        {22f, 4f, 6f, 4f},
        {2f, 3f, 9f, 3f},
        {12f, 3f, 3f, 3f, 3f, 3f}
    };

    private static final float LINE = 3.2f;
    private static final double MARKER = 7.0;

    private Look() {}

    /** The font of everything, from the program itself, so that a chart looks the same on every machine. */
    static Font font(float size, boolean bold) {
        try (InputStream stream = Look.class.getResourceAsStream(bold ? BOLD : REGULAR)) {
            if (stream != null) {
                return Font.createFont(Font.TRUETYPE_FONT, stream).deriveFont(size);
            }
        } catch (IOException | FontFormatException unreadable) {
            // the font of the system is legible too
        }
        return new Font(Font.SANS_SERIF, bold ? Font.BOLD : Font.PLAIN, 1).deriveFont(size);
    }

    static Color colour(int series) {
        return COLOURS[series % COLOURS.length];
    }

    static Stroke stroke(int series) {
        float[] dash = DASHES[series % DASHES.length];
        return dash.length == 0
                ? new BasicStroke(LINE, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND)
                : new BasicStroke(LINE, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1f, dash, 0f);
    }

    /** A thin line of long dashes: the floor. */
    static Stroke floorStroke() {
        return new BasicStroke(2.2f, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1f, new float[] {2f, 4f}, 0f);
    }

    /** Markers: circle, square, triangle, diamond, and the same smaller and turned. */
    static Shape marker(int series) {
        double r = MARKER;
        return switch (series % 8) {
            case 0 -> new Ellipse2D.Double(-r, -r, 2 * r, 2 * r);
            case 1 -> new Rectangle2D.Double(-r, -r, 2 * r, 2 * r);
            case 2 -> polygon(0, -1.2 * r, 1.1 * r, 0.9 * r, -1.1 * r, 0.9 * r);
            case 3 -> polygon(0, -1.35 * r, 1.35 * r, 0, 0, 1.35 * r, -1.35 * r, 0);
            case 4 -> polygon(0, 1.2 * r, 1.1 * r, -0.9 * r, -1.1 * r, -0.9 * r);
            case 5 -> new Rectangle2D.Double(-1.4 * r, -0.5 * r, 2.8 * r, r);
            case 6 -> polygon(-1.2 * r, 0, 0.9 * r, 1.1 * r, 0.9 * r, -1.1 * r);
            default ->
                AffineTransform.getScaleInstance(0.6, 1.4)
                        .createTransformedShape(new Ellipse2D.Double(-r, -r, 2 * r, 2 * r));
        };
    }

    private static Shape polygon(double... xy) {
        Path2D path = new Path2D.Double();
        path.moveTo(xy[0], xy[1]);
        for (int k = 2; k < xy.length; k += 2) {
            path.lineTo(xy[k], xy[k + 1]);
        }
        path.closePath();
        return path;
    }
}
