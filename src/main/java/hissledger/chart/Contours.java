package hissledger.chart;

import hissledger.choose.Surface;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;

/**
 * Lines of equal value on a surface, and the areas above a value, by marching squares: between two neighbouring places the
 * surface is taken as a straight line over the logarithm of the place. Where a cell's corners lie crosswise above and below,
 * their mean decides which of them hang together.
 */
final class Contours {
    private static final int CORNERS = 4;

    private Contours() {}

    /**
     * A line through points in the units of the axes.
     *
     * @param x places across
     * @param y places up
     */
    record Line(List<Double> x, List<Double> y) {
        Line {
            x = List.copyOf(x);
            y = List.copyOf(y);
        }

        private static Line through(List<double[]> points) {
            return new Line(
                    points.stream().map(point -> point[0]).toList(),
                    points.stream().map(point -> point[1]).toList());
        }
    }

    /** All lines of one value. A closed line ends where it begins. */
    static List<Line> lines(Surface surface, double level) {
        Map<Integer, List<Integer>> neighbours = new LinkedHashMap<>();
        for (int k = 0; k + 1 < surface.across().size(); k++) {
            for (int j = 0; j + 1 < surface.up().size(); j++) {
                connect(new Cell(surface, level, k, j), neighbours);
            }
        }
        List<Line> lines = new ArrayList<>();
        Set<Integer> left = new LinkedHashSet<>(neighbours.keySet());
        for (boolean open : new boolean[] {true, false}) {
            for (Map.Entry<Integer, List<Integer>> start : neighbours.entrySet()) {
                boolean begins = left.contains(start.getKey())
                        && (!open || start.getValue().size() == 1);
                if (begins) {
                    lines.add(follow(surface, level, start.getKey(), neighbours, left));
                }
            }
        }
        return lines;
    }

    private static void connect(Cell cell, Map<Integer, List<Integer>> neighbours) {
        List<Integer> crossed = new ArrayList<>();
        for (int side = 0; side < CORNERS; side++) {
            if (cell.isAbove(side) != cell.isAbove(side + 1)) {
                crossed.add(side);
            }
        }
        // of four crossed sides, those on either side of a corner that stands alone belong together
        boolean joined = crossed.size() == CORNERS && cell.isAbove(0) == cell.meanIsAbove();
        for (int pair = 0; pair + 1 < crossed.size(); pair += 2) {
            int one = crossed.get(pair);
            int other = crossed.get(pair + 1);
            if (crossed.size() == CORNERS && !joined) {
                one = pair == 0 ? CORNERS - 1 : 1;
                other = pair == 0 ? 0 : 2;
            }
            int from = cell.edge(one);
            int to = cell.edge(other);
            neighbours.computeIfAbsent(from, edge -> new ArrayList<>()).add(to);
            neighbours.computeIfAbsent(to, edge -> new ArrayList<>()).add(from);
        }
    }

    private static Line follow(
            Surface surface, double level, int start, Map<Integer, List<Integer>> neighbours, Set<Integer> left) {
        List<double[]> points = new ArrayList<>();
        int edge = start;
        boolean more = true;
        while (more) {
            left.remove(edge);
            points.add(crossing(surface, level, edge));
            more = false;
            for (int next : neighbours.getOrDefault(edge, List.of())) {
                if (left.contains(next)) {
                    edge = next;
                    more = true;
                    break;
                }
            }
        }
        boolean closed =
                edge != start && neighbours.getOrDefault(edge, List.of()).contains(start) && points.size() > 2;
        if (closed) {
            points.add(points.get(0));
        }
        return Line.through(points);
    }

    /** Where a line crosses an edge of the grid: even numbers run across, odd ones up, from the place that is their half. */
    private static double[] crossing(Surface surface, double level, int edge) {
        int k = edge / 2 / surface.up().size();
        int j = edge / 2 % surface.up().size();
        boolean up = edge % 2 == 1;
        return between(surface, level, k, j, up ? k : k + 1, up ? j + 1 : j);
    }

    private static double[] between(Surface surface, double level, int k0, int j0, int k1, int j1) {
        double v0 = surface.at(k0, j0);
        double part = (level - v0) / (surface.at(k1, j1) - v0);
        double x0 = surface.across().get(k0);
        double y0 = surface.up().get(j0);
        return new double[] {
            x0 * Math.pow(surface.across().get(k1) / x0, part),
            y0 * Math.pow(surface.up().get(j1) / y0, part)
        };
    }

    /** The area where a surface is at or above a value, as polygons that do not overlap. */
    static List<Line> areas(Surface surface, double level) {
        List<Line> areas = new ArrayList<>();
        for (int j = 0; j + 1 < surface.up().size(); j++) {
            int runStart = 0;
            for (int k = 0; k + 1 < surface.across().size(); k++) {
                Cell cell = new Cell(surface, level, k, j);
                if (cell.isWhollyAbove()) {
                    continue;
                }
                strip(surface, runStart, k, j, areas);
                runStart = k + 1;
                cell.addPart(areas);
            }
            strip(surface, runStart, surface.across().size() - 1, j, areas);
        }
        return areas;
    }

    private static void strip(Surface surface, int from, int to, int j, List<Line> areas) {
        if (to > from) {
            double left = surface.across().get(from);
            double right = surface.across().get(to);
            double bottom = surface.up().get(j);
            double top = surface.up().get(j + 1);
            areas.add(new Line(List.of(left, right, right, left), List.of(bottom, bottom, top, top)));
        }
    }

    /** Four neighbouring places, corners and sides counted round from the lower left and the lower side. */
    private record Cell(Surface surface, double level, int k, int j) {
        int across(int corner) {
            int turn = corner % CORNERS;
            return turn == 1 || turn == 2 ? k + 1 : k;
        }

        int up(int corner) {
            return corner % CORNERS >= 2 ? j + 1 : j;
        }

        double value(int corner) {
            return surface.at(across(corner), up(corner));
        }

        boolean isAbove(int corner) {
            return value(corner) >= level;
        }

        boolean isWhollyAbove() {
            return isAbove(0) && isAbove(1) && isAbove(2) && isAbove(3);
        }

        boolean meanIsAbove() {
            return (value(0) + value(1) + value(2) + value(3)) / CORNERS >= level;
        }

        /** The number of the grid's edge that is a side of this cell. */
        int edge(int side) {
            int rows = surface.up().size();
            return switch (side) {
                case 0 -> 2 * (k * rows + j);
                case 1 -> 2 * ((k + 1) * rows + j) + 1;
                case 2 -> 2 * (k * rows + j + 1);
                default -> 2 * (k * rows + j) + 1;
            };
        }

        /** The part of this cell at or above the level: corners and crossings in turn; crosswise corners are joined. */
        void addPart(List<Line> areas) {
            List<double[]> points = new ArrayList<>();
            for (int corner = 0; corner < CORNERS; corner++) {
                int next = corner + 1;
                if (isAbove(corner)) {
                    points.add(new double[] {
                        surface.across().get(across(corner)), surface.up().get(up(corner))
                    });
                }
                if (isAbove(corner) != isAbove(next)) {
                    points.add(between(surface, level, across(corner), up(corner), across(next), up(next)));
                }
            }
            if (points.size() > 2) {
                areas.add(Line.through(points));
            }
        }
    }
}
