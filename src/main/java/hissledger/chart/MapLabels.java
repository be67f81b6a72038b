package hissledger.chart;

import hissledger.choose.Surface;
import java.awt.Color;
import java.awt.Font;
import java.awt.Graphics2D;
import java.awt.geom.Point2D;
import java.awt.geom.Rectangle2D;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Optional;
import org.jfree.chart.plot.XYPlot;

/** Writes the names of regions inside them and the values of lines on them, none over another, on patches of white. */
final class MapLabels {
    private static final Color PATCH = new Color(0xFF, 0xFF, 0xFF, 0xE0);
    private static final double PADDING = 4.0;
    /** Room around a name for its place to be called roomy, the roomiest first, as a factor. */
    private static final double[] ROOMS = {3.0, 2.0, 1.5, 1.2, 1.0};
    /** A line bears its value if it is this many times longer. */
    private static final double LEAST_LENGTH = 2.5;
    /** Where along a line its value may stand, the best first. */
    private static final double[] PARTS = {
        0.5, 0.4, 0.6, 0.3, 0.7, 0.2, 0.8, 0.1, 0.9, 0.45, 0.55, 0.35, 0.65, 0.25, 0.75
    };

    private final Graphics2D graphics;
    private final XYPlot plot;
    private final Rectangle2D field;
    private final double scale;
    private final List<Rectangle2D> taken;

    /** Labels in a field of which some rectangles are taken already. */
    MapLabels(Graphics2D graphics, XYPlot plot, Rectangle2D field, double scale, List<Rectangle2D> taken) {
        this.graphics = graphics;
        this.plot = plot;
        this.field = field;
        this.scale = scale;
        this.taken = new ArrayList<>(taken);
    }

    /** Names every piece of a region that has room for its name. */
    void name(Region region, double size) {
        Font font = Look.bold(region.name(), size);
        List<Lettering> settings = List.of(
                Lettering.broken(region.name(), font, field.getWidth(), 1),
                Lettering.broken(region.name(), font, Lettering.width(region.name(), font) * 0.6, 3));
        for (boolean[][] piece : pieces(region.advantage())) {
            for (Lettering name : settings) {
                Optional<Point2D> middle = roomiest(region.advantage(), piece, name);
                if (middle.isPresent()) {
                    write(name, middle.get());
                    break;
                }
            }
        }
    }

    /** Writes the value of a line on each of its pieces that is long enough, wherever there is room. */
    void value(Isoline isoline, double size) {
        Lettering label = new Lettering(List.of(isoline.label()), Look.regular(isoline.label(), size));
        for (Contours.Line line : Contours.lines(isoline.surface(), isoline.level())) {
            List<Point2D> points = points(line);
            double length = length(points);
            if (length < LEAST_LENGTH * label.width()) {
                continue;
            }
            for (double part : PARTS) {
                Point2D middle = along(points, part * length);
                if (isFree(patch(label, middle))) {
                    write(label, middle);
                    break;
                }
            }
        }
    }

    private void write(Lettering label, Point2D middle) {
        Rectangle2D patch = patch(label, middle);
        graphics.setPaint(PATCH);
        graphics.fill(patch);
        graphics.setPaint(Look.INK);
        label.draw(graphics, middle.getX() - label.width() / 2.0, middle.getY() - label.height() / 2.0);
        taken.add(patch);
    }

    private Rectangle2D patch(Lettering label, Point2D middle) {
        double width = label.width() + 2.0 * PADDING * scale;
        return new Rectangle2D.Double(
                middle.getX() - width / 2.0, middle.getY() - label.height() / 2.0, width, label.height());
    }

    private boolean isFree(Rectangle2D patch) {
        return field.contains(patch) && taken.stream().noneMatch(patch::intersects);
    }

    private Point2D place(double x, double y) {
        return new Point2D.Double(
                plot.getDomainAxis().valueToJava2D(x, field, plot.getDomainAxisEdge()),
                plot.getRangeAxis().valueToJava2D(y, field, plot.getRangeAxisEdge()));
    }

    private List<Point2D> points(Contours.Line line) {
        List<Point2D> points = new ArrayList<>();
        for (int k = 0; k < line.x().size(); k++) {
            points.add(place(line.x().get(k), line.y().get(k)));
        }
        return points;
    }

    private static double length(List<Point2D> points) {
        double length = 0.0;
        for (int k = 1; k < points.size(); k++) {
            length += points.get(k).distance(points.get(k - 1));
        }
        return length;
    }

    private static Point2D along(List<Point2D> points, double length) {
        double left = length;
        for (int k = 1; k < points.size(); k++) {
            double step = points.get(k).distance(points.get(k - 1));
            if (step >= left) {
                return points.get(k);
            }
            left -= step;
        }
        return points.get(points.size() - 1);
    }

    /** The places of a surface that are not negative, parted into pieces that hang together. */
    private static List<boolean[][]> pieces(Surface surface) {
        int columns = surface.across().size();
        int rows = surface.up().size();
        boolean[][] seen = new boolean[columns][rows];
        List<boolean[][]> pieces = new ArrayList<>();
        for (int k = 0; k < columns; k++) {
            for (int j = 0; j < rows; j++) {
                if (seen[k][j] || surface.at(k, j) < 0.0) {
                    continue;
                }
                boolean[][] piece = new boolean[columns][rows];
                Deque<int[]> open = new ArrayDeque<>();
                open.add(new int[] {k, j});
                while (!open.isEmpty()) {
                    int[] at = open.remove();
                    boolean inside = at[0] >= 0 && at[0] < columns && at[1] >= 0 && at[1] < rows;
                    if (!inside || seen[at[0]][at[1]] || surface.at(at[0], at[1]) < 0.0) {
                        continue;
                    }
                    seen[at[0]][at[1]] = true;
                    piece[at[0]][at[1]] = true;
                    open.add(new int[] {at[0] + 1, at[1]});
                    open.add(new int[] {at[0] - 1, at[1]});
                    open.add(new int[] {at[0], at[1] + 1});
                    open.add(new int[] {at[0], at[1] - 1});
                }
                pieces.add(piece);
            }
        }
        return pieces;
    }

    /** Where a label has most room in a piece and no other label stands; of equal places the one nearest its centre. */
    private Optional<Point2D> roomiest(Surface surface, boolean[][] piece, Lettering label) {
        int columns = piece.length;
        int rows = piece[0].length;
        int[][] sums = new int[columns + 1][rows + 1];
        double centreK = 0.0;
        double centreJ = 0.0;
        for (int k = 0; k < columns; k++) {
            for (int j = 0; j < rows; j++) {
                int here = piece[k][j] ? 1 : 0;
                sums[k + 1][j + 1] = sums[k][j + 1] + sums[k + 1][j] - sums[k][j] + here;
                centreK += here * (double) k;
                centreJ += here * (double) j;
            }
        }
        centreK /= sums[columns][rows];
        centreJ /= sums[columns][rows];
        Rectangle2D patch = patch(label, new Point2D.Double());
        for (double room : ROOMS) {
            int halfK = (int) Math.ceil(room * patch.getWidth() / field.getWidth() * (columns - 1) / 2.0);
            int halfJ = (int) Math.ceil(room * patch.getHeight() / field.getHeight() * (rows - 1) / 2.0);
            Optional<Point2D> best = Optional.empty();
            double least = Double.POSITIVE_INFINITY;
            for (int k = halfK; k + halfK < columns; k++) {
                for (int j = halfJ; j + halfJ < rows; j++) {
                    int filled = sums[k + halfK + 1][j + halfJ + 1]
                            - sums[k - halfK][j + halfJ + 1]
                            - sums[k + halfK + 1][j - halfJ]
                            + sums[k - halfK][j - halfJ];
                    boolean whole = filled == (2 * halfK + 1) * (2 * halfJ + 1);
                    double distance = Math.hypot((k - centreK) / columns, (j - centreJ) / rows);
                    if (!whole || distance >= least) {
                        continue;
                    }
                    Point2D middle = place(surface.across().get(k), surface.up().get(j));
                    if (isFree(patch(label, middle))) {
                        best = Optional.of(middle);
                        least = distance;
                    }
                }
            }
            if (best.isPresent()) {
                return best;
            }
        }
        return Optional.empty();
    }
}
