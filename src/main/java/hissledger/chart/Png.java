package hissledger.chart;

import java.awt.image.BufferedImage;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import javax.imageio.IIOImage;
import javax.imageio.ImageIO;
import javax.imageio.ImageTypeSpecifier;
import javax.imageio.ImageWriter;
import javax.imageio.metadata.IIOMetadata;
import javax.imageio.metadata.IIOMetadataNode;
import javax.imageio.stream.MemoryCacheImageOutputStream;

/** PNG files with a physical resolution and nothing that depends on the clock. */
final class Png {
    private static final String FORMAT = "javax_imageio_png_1.0";
    private static final double METRES_PER_INCH = 0.0254;

    private Png() {}

    /** The bytes of an image. */
    static byte[] encode(BufferedImage image, double dotsPerInch) {
        ImageWriter writer = ImageIO.getImageWritersByFormatName("png").next();
        ByteArrayOutputStream bytes = new ByteArrayOutputStream();
        try (MemoryCacheImageOutputStream stream = new MemoryCacheImageOutputStream(bytes)) {
            writer.setOutput(stream);
            IIOMetadata metadata =
                    writer.getDefaultImageMetadata(ImageTypeSpecifier.createFromRenderedImage(image), null);
            metadata.mergeTree(FORMAT, resolution(Math.round(dotsPerInch / METRES_PER_INCH)));
            writer.write(new IIOImage(image, null, metadata));
        } catch (IOException impossible) {
            throw new UncheckedIOException("writing to memory failed", impossible);
        } finally {
            writer.dispose();
        }
        return bytes.toByteArray();
    }

    private static IIOMetadataNode resolution(long pixelsPerMetre) {
        IIOMetadataNode size = new IIOMetadataNode("pHYs");
        size.setAttribute("pixelsPerUnitXAxis", String.valueOf(pixelsPerMetre));
        size.setAttribute("pixelsPerUnitYAxis", String.valueOf(pixelsPerMetre));
        size.setAttribute("unitSpecifier", "meter");
        IIOMetadataNode root = new IIOMetadataNode(FORMAT);
        root.appendChild(size);
        return root;
    }
}
