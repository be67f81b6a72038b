package hissledger.chart;

import java.util.ArrayList;
import java.util.List;

/** Moves labels apart: each stays as near as it can to where it belongs, none covers another, their order stays. */
final class Spread {
    private Spread() {}

    /** Labels that lie close together and share their shift. */
    private record Group(int count, double sum) {
        double mean() {
            return sum / count;
        }

        Group with(Group next) {
            return new Group(count + next.count, sum + next.sum);
        }
    }

    /**
     * The middles of labels along a line, the sum of squares of their shifts least (isotonic regression by pooling adjacent
     * violators).
     *
     * @param wanted where each belongs, rising
     * @param extents how much room each takes
     * @param from start of the room; the labels together fit into it
     * @param to end of the room
     */
    static double[] middles(double[] wanted, double[] extents, double from, double to) {
        int n = wanted.length;
        double[] before = new double[n];
        double total = 0.0;
        for (int k = 0; k < n; k++) {
            before[k] = total + extents[k] / 2.0;
            total += extents[k];
        }
        List<Group> groups = new ArrayList<>();
        for (int k = 0; k < n; k++) {
            Group group = new Group(1, wanted[k] - before[k]);
            while (!groups.isEmpty() && groups.get(groups.size() - 1).mean() > group.mean()) {
                group = groups.remove(groups.size() - 1).with(group);
            }
            groups.add(group);
        }
        double[] middles = new double[n];
        int k = 0;
        for (Group group : groups) {
            double shift = Math.max(from, Math.min(to - total, group.mean()));
            for (int member = 0; member < group.count(); member++) {
                middles[k] = shift + before[k];
                k++;
            }
        }
        return middles;
    }
}
