package hissledger.chart;

import hissledger.physics.Require;
import java.awt.Color;
import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;

/**
 * A picture that can be drawn at any size. Type and lines grow with the area and the layout follows, so that a small picture
 * stays legible. What is drawn does not depend on the file format.
 */
public final class Picture {
    /** Usual width, pixels. */
    public static final int USUAL_WIDTH = 1600;

    /** Usual height, pixels. */
    public static final int USUAL_HEIGHT = 1000;

    /** Least width that leaves room for lettering, pixels. */
    public static final int LEAST_WIDTH = 640;

    /** Least height that leaves room for lettering, pixels. */
    public static final int LEAST_HEIGHT = 400;

    /** Greatest width or height, pixels: an image of both takes 1 GB. */
    public static final int GREATEST_PIXELS = 16_384;

    /** Below this scale lettering shrinks no further: 11 pixels are still read with ease. */
    private static final double LEAST_SCALE = 0.6;

    /** Printed at its own resolution, a picture has lettering of about 7 points whatever its size. */
    private static final double DOTS_PER_INCH_AT_USUAL_SIZE = 200.0;

    /** Draws into an area whose lettering is to be scaled by a factor. */
    @FunctionalInterface
    interface Drawing {
        /** Draws; the factor is 1 at the usual size. */
        void draw(Graphics2D graphics, Rectangle2D area, double scale);
    }

    private final Drawing drawing;

    Picture(Drawing drawing) {
        this.drawing = drawing;
    }

    /** Draws the picture, on white, into an area. */
    public void draw(Graphics2D graphics, Rectangle2D area) {
        Graphics2D own = (Graphics2D) graphics.create();
        try {
            own.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
            own.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
            own.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
            own.setRenderingHint(RenderingHints.KEY_STROKE_CONTROL, RenderingHints.VALUE_STROKE_PURE);
            own.setPaint(Color.WHITE);
            own.fill(area);
            drawing.draw(own, area, scale(area.getWidth(), area.getHeight()));
        } finally {
            own.dispose();
        }
    }

    /** The picture as a PNG of the usual size. */
    public byte[] png() {
        return png(USUAL_WIDTH, USUAL_HEIGHT);
    }

    /**
     * The picture as a PNG that states its physical size; equal pictures give equal bytes.
     *
     * @param width pixels; {@link #LEAST_WIDTH} to {@link #GREATEST_PIXELS}
     * @param height pixels; {@link #LEAST_HEIGHT} to {@link #GREATEST_PIXELS}
     * @throws IllegalArgumentException if one is outside its range
     */
    public byte[] png(int width, int height) {
        atMost("width", Require.atLeast("width", width, LEAST_WIDTH));
        atMost("height", Require.atLeast("height", height, LEAST_HEIGHT));
        BufferedImage image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
        Graphics2D graphics = image.createGraphics();
        try {
            draw(graphics, new Rectangle2D.Double(0.0, 0.0, width, height));
        } finally {
            graphics.dispose();
        }
        return Png.encode(image, DOTS_PER_INCH_AT_USUAL_SIZE * scale(width, height));
    }

    private static double scale(double width, double height) {
        return Math.max(LEAST_SCALE, Math.min(width / USUAL_WIDTH, height / USUAL_HEIGHT));
    }

    private static void atMost(String name, int pixels) {
        if (pixels > GREATEST_PIXELS) {
            throw new IllegalArgumentException(name + " must be at most " + GREATEST_PIXELS + ", was " + pixels);
        }
    }
}
