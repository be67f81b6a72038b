package hissledger.chart;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Font;
import java.awt.FontFormatException;
import java.awt.Shape;
import java.awt.geom.AffineTransform;
import java.awt.geom.Area;
import java.awt.geom.Ellipse2D;
import java.awt.geom.Path2D;
import java.awt.geom.Rectangle2D;
import java.io.IOException;
import java.io.InputStream;
import java.util.List;

/**
 * The one look of all pictures: ink on white, ruled like an account book. A line is told by its dashes and its marker before it
 * is told by its colour; the colours are equal steps of lightness, warm and cold in turn, so that they differ in grey and to
 * those who do not see red or green.
 */
final class Look {
    static final Color INK = new Color(0x1F, 0x1D, 0x1A);
    /** Words of the second rank. */
    static final Color PALE_INK = new Color(0x55, 0x50, 0x49);
    /** The double rule under the heading, and the lines of limits and places. */
    static final Color RULE = new Color(0x7A, 0x1F, 0x2B);

    static final Color GRID = new Color(0xB4, 0xAE, 0xA2);
    static final Color FINE_GRID = new Color(0xE2, 0xDE, 0xD5);
    /** Lies over the grid. */
    static final Color FLOOR_SHADE = new Color(0x6B, 0x5B, 0x3E, 0x1E);

    /** CIE lightness 14, 58, 32, 46, 26, 61, 39 and 52. */
    private static final List<Color> COLOURS = List.of(
            new Color(0x0E2050),
            new Color(0xCA781C),
            new Color(0x911D2C),
            new Color(0x007696),
            new Color(0x0A4820),
            new Color(0xC17CBB),
            new Color(0x6C4B9D),
            new Color(0x64863C));

    /** Line and gap in turn, in widths of the line; ten, while there are eleven markers: 110 different pairs. */
    private static final float[][] DASHES = {
        {},
        {6f, 2f},
        {2.2f, 1.6f},
        {8f, 1.8f, 1.2f, 1.8f},
        {1f, 1.3f},
        {11f, 2.4f},
        {5f, 1.5f, 1.2f, 1.5f, 1.2f, 1.5f},
        {4f, 4f},
        {8f, 1.6f, 2.6f, 1.6f},
        {2.6f, 1.4f, 1f, 1.4f}
    };

    private static final float[] FLOOR_DASH = {0.8f, 2.6f};
    private static final float[] LIMIT_DASH = {};
    private static final float[] PLACE_DASH = {3f, 3f};
    private static final int MARKERS = 11;

    private static final float LINE = 2.9f;
    private static final float ZONE_LINE = 8.0f;
    private static final float FLOOR_LINE = 2.4f;
    private static final float LIMIT_LINE = 2.0f;
    private static final float PLACE_LINE = 1.4f;
    private static final double MARKER = 7.0;

    private static final String FOLDER = "/com/formdev/flatlaf/fonts/roboto/";
    private static final Font REGULAR = load("Roboto-Regular.ttf", Font.PLAIN);
    private static final Font BOLD = load("Roboto-Bold.ttf", Font.BOLD);

    private Look() {}

    /** The typeface comes with the program, so that a picture looks the same on every machine. */
    private static Font load(String file, int style) {
        try (InputStream stream = Look.class.getResourceAsStream(FOLDER + file)) {
            if (stream != null) {
                return Font.createFont(Font.TRUETYPE_FONT, stream);
            }
        } catch (IOException | FontFormatException unreadable) {
            // lettering in the machine's own typeface is legible too
            return new Font(Font.SANS_SERIF, style, 1);
        }
        return new Font(Font.SANS_SERIF, style, 1);
    }

    /** The regular typeface. */
    static Font regular(double size) {
        return REGULAR.deriveFont((float) size);
    }

    /** The regular typeface, or one of the machine's that has every letter of a text. */
    static Font regular(String text, double size) {
        return withLetters(REGULAR, Font.PLAIN, text, size);
    }

    /** The bold typeface, or one of the machine's that has every letter of a text. */
    static Font bold(String text, double size) {
        return withLetters(BOLD, Font.BOLD, text, size);
    }

    private static Font withLetters(Font font, int style, String text, double size) {
        Font chosen = font.canDisplayUpTo(text) < 0 ? font : new Font(Font.SANS_SERIF, style, 1);
        return chosen.deriveFont((float) size);
    }

    /** The colour of a trace. */
    static Color colour(Trace.Role role, int number) {
        return switch (role) {
            case CANDIDATE, POINTS, ZONE, REGION -> COLOURS.get(number % COLOURS.size());
            case FLOOR -> INK;
            case LIMIT -> RULE;
        };
    }

    /** The line of a trace. */
    static BasicStroke stroke(Trace.Role role, int number, double scale) {
        return switch (role) {
            case ZONE -> stroke(ZONE_LINE, new float[0], scale);
            case CANDIDATE, POINTS, REGION -> stroke(LINE, DASHES[number % DASHES.length], scale);
            case FLOOR -> stroke(FLOOR_LINE, FLOOR_DASH, scale);
            case LIMIT -> stroke(LIMIT_LINE, LIMIT_DASH, scale);
        };
    }

    /** The line at a marked place. */
    static BasicStroke placeStroke(double scale) {
        return stroke(PLACE_LINE, PLACE_DASH, scale);
    }

    /** A plain line. */
    static BasicStroke plain(double width, double scale) {
        return stroke((float) width, new float[0], scale);
    }

    private static BasicStroke stroke(float width, float[] dash, double scale) {
        float scaled = (float) (width * scale);
        if (dash.length == 0) {
            return new BasicStroke(scaled, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND);
        }
        float[] lengths = new float[dash.length];
        for (int k = 0; k < dash.length; k++) {
            lengths[k] = dash[k] * scaled;
        }
        return new BasicStroke(scaled, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 1f, lengths, 0f);
    }

    /** The marker of a candidate about the origin. */
    static Shape marker(int number, double scale) {
        Shape shape = switch (number % MARKERS) {
            case 0 -> disc(1.0);
            case 1 -> square(0.9);
            case 2 -> polygon(0.0, -1.25, 1.15, 0.85, -1.15, 0.85);
            case 3 -> polygon(0.0, -1.3, 1.3, 0.0, 0.0, 1.3, -1.3, 0.0);
            case 4 -> without(disc(1.1), disc(0.6));
            case 5 -> polygon(0.0, 1.25, 1.15, -0.85, -1.15, -0.85);
            case 6 -> cross();
            case 7 -> without(square(1.05), square(0.55));
            case 8 -> AffineTransform.getRotateInstance(Math.PI / 4.0).createTransformedShape(cross());
            case 9 -> polygon(-0.4, -1.4, 0.4, -1.4, 0.4, 1.4, -0.4, 1.4);
            default -> polygon(-1.2, -1.0, 1.2, 1.0, 1.2, -1.0, -1.2, 1.0);
        };
        double size = MARKER * scale;
        return AffineTransform.getScaleInstance(size, size).createTransformedShape(shape);
    }

    private static Shape disc(double radius) {
        return new Ellipse2D.Double(-radius, -radius, 2.0 * radius, 2.0 * radius);
    }

    private static Shape square(double half) {
        return new Rectangle2D.Double(-half, -half, 2.0 * half, 2.0 * half);
    }

    private static Shape cross() {
        Area area = new Area(polygon(-1.35, -0.32, 1.35, -0.32, 1.35, 0.32, -1.35, 0.32));
        area.add(new Area(polygon(-0.32, -1.35, 0.32, -1.35, 0.32, 1.35, -0.32, 1.35)));
        return area;
    }

    private static Shape without(Shape whole, Shape hole) {
        Area area = new Area(whole);
        area.subtract(new Area(hole));
        return area;
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
