package hissledger.chart;

import java.awt.Graphics2D;
import java.awt.RenderingHints;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageTypeSpecifier;
import javax.imageio.ImageWriter;
import javax.imageio.metadata.IIOMetadata;
import javax.imageio.metadata.IIOMetadataNode;
import javax.imageio.stream.ImageOutputStream;
import org.jfree.chart.JFreeChart;

/** A chart ready to be drawn. It is laid out once, 1600 units wide, and drawn to any size in the same proportions of type. */
public final class Picture {
    private static final double LAYOUT_WIDTH = 1600.0;
    /** Printed 8 inches wide, a chart of 1600 pixels has 200 pixels an inch. */
    private static final double PRINTED_WIDTH_METRES = 0.2032;

    private final JFreeChart chart;

    Picture(JFreeChart chart) {
        this.chart = chart;
    }

    /** The chart itself, for tests that look into it. */
    JFreeChart chart() {
        return chart;
    }

    /** Draws the chart into an area. */
    public void draw(Graphics2D graphics, Rectangle2D area) {
        Graphics2D scaled = (Graphics2D) graphics.create();
        double scale = area.getWidth() / LAYOUT_WIDTH;
        scaled.translate(area.getX(), area.getY());
        scaled.scale(scale, scale);
        scaled.setRenderingHint(RenderingHints.KEY_ANTIALIASING, RenderingHints.VALUE_ANTIALIAS_ON);
        scaled.setRenderingHint(RenderingHints.KEY_TEXT_ANTIALIASING, RenderingHints.VALUE_TEXT_ANTIALIAS_ON);
        scaled.setRenderingHint(RenderingHints.KEY_FRACTIONALMETRICS, RenderingHints.VALUE_FRACTIONALMETRICS_ON);
        chart.draw(scaled, new Rectangle2D.Double(0.0, 0.0, LAYOUT_WIDTH, area.getHeight() / scale));
        scaled.dispose();
    }

    /** The chart as a PNG with its physical size; the same input gives the same bytes. */
    public byte[] png(int widthPixels, int heightPixels) {
        BufferedImage image = new BufferedImage(widthPixels, heightPixels, BufferedImage.TYPE_INT_RGB);
        Graphics2D graphics = image.createGraphics();
        draw(graphics, new Rectangle2D.Double(0.0, 0.0, widthPixels, heightPixels));
        graphics.dispose();
        ImageWriter writer = ImageIO.getImageWritersByFormatName("png").next();
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (ImageOutputStream stream = ImageIO.createImageOutputStream(bytes)) {
            writer.setOutput(stream);
            writer.write(new IIOImage(image, null, physicalSize(writer, image, widthPixels)));
        } catch (IOException impossible) {
            throw new IllegalStateException("writing to memory failed", impossible);
        } finally {
            writer.dispose();
        }
        return bytes.toByteArray();
    }

    private static IIOMetadata physicalSize(ImageWriter writer, BufferedImage image, int widthPixels)
            throws IOException {
        IIOMetadata metadata = writer.getDefaultImageMetadata(ImageTypeSpecifier.createFromRenderedImage(image), null);
        String perMetre = String.valueOf(Math.round(widthPixels / PRINTED_WIDTH_METRES));
        IIOMetadataNode size = new IIOMetadataNode("pHYs");
        size.setAttribute("pixelsPerUnitXAxis", perMetre);
        size.setAttribute("pixelsPerUnitYAxis", perMetre);
        size.setAttribute("unitSpecifier", "meter");
        IIOMetadataNode root = new IIOMetadataNode("javax_imageio_png_1.0");
        root.appendChild(size);
        metadata.mergeTree("javax_imageio_png_1.0", root);
        return metadata;
    }
}
