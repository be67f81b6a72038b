package hissledger.chart;

import java.awt.Color;
import java.awt.Composite;
import java.awt.Font;
import java.awt.FontMetrics;
import java.awt.Graphics;
import java.awt.Graphics2D;
import java.awt.GraphicsConfiguration;
import java.awt.Image;
import java.awt.Paint;
import java.awt.Rectangle;
import java.awt.RenderingHints;
import java.awt.Shape;
import java.awt.Stroke;
import java.awt.font.FontRenderContext;
import java.awt.font.GlyphVector;
import java.awt.geom.AffineTransform;
import java.awt.geom.Area;
import java.awt.geom.Rectangle2D;
import java.awt.image.BufferedImage;
import java.awt.image.BufferedImageOp;
import java.awt.image.ImageObserver;
import java.awt.image.RenderedImage;
import java.awt.image.renderable.RenderableImage;
import java.text.AttributedCharacterIterator;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import org.jspecify.annotations.Nullable;

/** Draws into an image and keeps what was written and where. */
final class RecordingGraphics extends Graphics2D {
    /**
     * A piece of lettering.
     *
     * @param text what is written
     * @param ink the bounds of its letters on the page
     * @param seen the part of them that the clip lets through
     * @param size the size of the font
     */
    record Written(String text, Rectangle2D ink, Rectangle2D seen, double size) {
        boolean isCut() {
            return !seen.contains(ink) && !seen.equals(ink);
        }
    }

    private final Graphics2D target;
    private final List<Written> written;

    private RecordingGraphics(Graphics2D target, List<Written> written) {
        this.target = target;
        this.written = written;
    }

    /** Everything that a picture writes at a size, in the order of writing. */
    static List<Written> written(Picture picture, int width, int height) {
        List<Written> written = new ArrayList<>();
        BufferedImage image = new BufferedImage(width, height, BufferedImage.TYPE_INT_RGB);
        picture.draw(
                new RecordingGraphics(image.createGraphics(), written),
                new Rectangle2D.Double(0.0, 0.0, width, height));
        return written;
    }

    private void keep(String text, double x, double y) {
        if (text.isBlank()) {
            return;
        }
        Shape letters =
                getFont().createGlyphVector(getFontRenderContext(), text).getOutline((float) x, (float) y);
        Rectangle2D ink = getTransform().createTransformedShape(letters).getBounds2D();
        Rectangle2D seen = ink;
        Shape clip = target.getClip();
        if (clip != null) {
            Area area = new Area(getTransform().createTransformedShape(clip));
            area.intersect(new Area(ink));
            seen = area.getBounds2D();
        }
        written.add(new Written(text, ink, seen, getFont().getSize2D()));
    }

    @Override
    public Graphics create() {
        return new RecordingGraphics((Graphics2D) target.create(), written);
    }

    @Override
    public void drawString(String text, int x, int y) {
        keep(text, x, y);
        target.drawString(text, x, y);
    }

    @Override
    public void drawString(String text, float x, float y) {
        keep(text, x, y);
        target.drawString(text, x, y);
    }

    @Override
    public void drawString(AttributedCharacterIterator text, int x, int y) {
        throw new UnsupportedOperationException("attributed text becomes outlines in vector files");
    }

    @Override
    public void drawString(AttributedCharacterIterator text, float x, float y) {
        throw new UnsupportedOperationException("attributed text becomes outlines in vector files");
    }

    @Override
    public void drawGlyphVector(GlyphVector letters, float x, float y) {
        throw new UnsupportedOperationException("glyph vectors become outlines in vector files");
    }

    @Override
    public void draw(Shape shape) {
        target.draw(shape);
    }

    @Override
    public void fill(Shape shape) {
        target.fill(shape);
    }

    @Override
    public boolean drawImage(Image image, AffineTransform transform, @Nullable ImageObserver observer) {
        return target.drawImage(image, transform, observer);
    }

    @Override
    public void drawImage(BufferedImage image, BufferedImageOp operation, int x, int y) {
        target.drawImage(image, operation, x, y);
    }

    @Override
    public void drawRenderedImage(RenderedImage image, AffineTransform transform) {
        target.drawRenderedImage(image, transform);
    }

    @Override
    public void drawRenderableImage(RenderableImage image, AffineTransform transform) {
        target.drawRenderableImage(image, transform);
    }

    @Override
    public boolean hit(Rectangle rectangle, Shape shape, boolean onStroke) {
        return target.hit(rectangle, shape, onStroke);
    }

    @Override
    public GraphicsConfiguration getDeviceConfiguration() {
        return target.getDeviceConfiguration();
    }

    @Override
    public void setComposite(Composite composite) {
        target.setComposite(composite);
    }

    @Override
    public void setPaint(Paint paint) {
        target.setPaint(paint);
    }

    @Override
    public void setStroke(Stroke stroke) {
        target.setStroke(stroke);
    }

    @Override
    public void setRenderingHint(RenderingHints.Key key, Object value) {
        target.setRenderingHint(key, value);
    }

    @Override
    public Object getRenderingHint(RenderingHints.Key key) {
        return target.getRenderingHint(key);
    }

    @Override
    public void setRenderingHints(Map<?, ?> hints) {
        target.setRenderingHints(hints);
    }

    @Override
    public void addRenderingHints(Map<?, ?> hints) {
        target.addRenderingHints(hints);
    }

    @Override
    public RenderingHints getRenderingHints() {
        return target.getRenderingHints();
    }

    @Override
    public void translate(int x, int y) {
        target.translate(x, y);
    }

    @Override
    public void translate(double x, double y) {
        target.translate(x, y);
    }

    @Override
    public void rotate(double angle) {
        target.rotate(angle);
    }

    @Override
    public void rotate(double angle, double x, double y) {
        target.rotate(angle, x, y);
    }

    @Override
    public void scale(double x, double y) {
        target.scale(x, y);
    }

    @Override
    public void shear(double x, double y) {
        target.shear(x, y);
    }

    @Override
    public void transform(AffineTransform transform) {
        target.transform(transform);
    }

    @Override
    public void setTransform(AffineTransform transform) {
        target.setTransform(transform);
    }

    @Override
    public AffineTransform getTransform() {
        return target.getTransform();
    }

    @Override
    public Paint getPaint() {
        return target.getPaint();
    }

    @Override
    public Composite getComposite() {
        return target.getComposite();
    }

    @Override
    public void setBackground(Color colour) {
        target.setBackground(colour);
    }

    @Override
    public Color getBackground() {
        return target.getBackground();
    }

    @Override
    public Stroke getStroke() {
        return target.getStroke();
    }

    @Override
    public void clip(Shape shape) {
        target.clip(shape);
    }

    @Override
    public FontRenderContext getFontRenderContext() {
        return target.getFontRenderContext();
    }

    @Override
    public Color getColor() {
        return target.getColor();
    }

    @Override
    public void setColor(Color colour) {
        target.setColor(colour);
    }

    @Override
    public void setPaintMode() {
        target.setPaintMode();
    }

    @Override
    public void setXORMode(Color colour) {
        target.setXORMode(colour);
    }

    @Override
    public Font getFont() {
        return target.getFont();
    }

    @Override
    public void setFont(Font font) {
        target.setFont(font);
    }

    @Override
    public FontMetrics getFontMetrics(Font font) {
        return target.getFontMetrics(font);
    }

    @Override
    public @Nullable Rectangle getClipBounds() {
        return target.getClipBounds();
    }

    @Override
    public void clipRect(int x, int y, int width, int height) {
        target.clipRect(x, y, width, height);
    }

    @Override
    public void setClip(int x, int y, int width, int height) {
        target.setClip(x, y, width, height);
    }

    @Override
    public @Nullable Shape getClip() {
        return target.getClip();
    }

    @Override
    public void setClip(@Nullable Shape clip) {
        target.setClip(clip);
    }

    @Override
    public void copyArea(int x, int y, int width, int height, int dx, int dy) {
        target.copyArea(x, y, width, height, dx, dy);
    }

    @Override
    public void drawLine(int x1, int y1, int x2, int y2) {
        target.drawLine(x1, y1, x2, y2);
    }

    @Override
    public void fillRect(int x, int y, int width, int height) {
        target.fillRect(x, y, width, height);
    }

    @Override
    public void clearRect(int x, int y, int width, int height) {
        target.clearRect(x, y, width, height);
    }

    @Override
    public void drawRoundRect(int x, int y, int width, int height, int arcWidth, int arcHeight) {
        target.drawRoundRect(x, y, width, height, arcWidth, arcHeight);
    }

    @Override
    public void fillRoundRect(int x, int y, int width, int height, int arcWidth, int arcHeight) {
        target.fillRoundRect(x, y, width, height, arcWidth, arcHeight);
    }

    @Override
    public void drawOval(int x, int y, int width, int height) {
        target.drawOval(x, y, width, height);
    }

    @Override
    public void fillOval(int x, int y, int width, int height) {
        target.fillOval(x, y, width, height);
    }

    @Override
    public void drawArc(int x, int y, int width, int height, int start, int angle) {
        target.drawArc(x, y, width, height, start, angle);
    }

    @Override
    public void fillArc(int x, int y, int width, int height, int start, int angle) {
        target.fillArc(x, y, width, height, start, angle);
    }

    @Override
    public void drawPolyline(int[] x, int[] y, int count) {
        target.drawPolyline(x, y, count);
    }

    @Override
    public void drawPolygon(int[] x, int[] y, int count) {
        target.drawPolygon(x, y, count);
    }

    @Override
    public void fillPolygon(int[] x, int[] y, int count) {
        target.fillPolygon(x, y, count);
    }

    @Override
    public boolean drawImage(Image image, int x, int y, @Nullable ImageObserver observer) {
        return target.drawImage(image, x, y, observer);
    }

    @Override
    public boolean drawImage(Image image, int x, int y, int width, int height, @Nullable ImageObserver observer) {
        return target.drawImage(image, x, y, width, height, observer);
    }

    @Override
    public boolean drawImage(Image image, int x, int y, Color background, @Nullable ImageObserver observer) {
        return target.drawImage(image, x, y, background, observer);
    }

    @Override
    public boolean drawImage(
            Image image, int x, int y, int width, int height, Color background, @Nullable ImageObserver observer) {
        return target.drawImage(image, x, y, width, height, background, observer);
    }

    @Override
    public boolean drawImage(
            Image image,
            int dx1,
            int dy1,
            int dx2,
            int dy2,
            int sx1,
            int sy1,
            int sx2,
            int sy2,
            @Nullable ImageObserver observer) {
        return target.drawImage(image, dx1, dy1, dx2, dy2, sx1, sy1, sx2, sy2, observer);
    }

    @Override
    public boolean drawImage(
            Image image,
            int dx1,
            int dy1,
            int dx2,
            int dy2,
            int sx1,
            int sy1,
            int sx2,
            int sy2,
            Color background,
            @Nullable ImageObserver observer) {
        return target.drawImage(image, dx1, dy1, dx2, dy2, sx1, sy1, sx2, sy2, background, observer);
    }

    @Override
    public void dispose() {
        target.dispose();
    }
}
