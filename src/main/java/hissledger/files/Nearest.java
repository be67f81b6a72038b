package hissledger.files;

import java.util.Collection;
import java.util.Comparator;
import java.util.List;
import java.util.Locale;

/** Known words near a mistyped one. */
public final class Nearest {
    private static final int MOST = 3;

    private Nearest() {}

    /**
     * The known words that a given one may have been meant to be, nearest first; at most three, and none that differs in more
     * than a third of its letters.
     */
    public static List<String> of(String given, Collection<String> known) {
        String low = given.toLowerCase(Locale.ROOT);
        return known.stream()
                .filter(word -> Math.abs(word.length() - low.length()) <= farthest(word))
                .filter(word -> distance(low, word.toLowerCase(Locale.ROOT)) <= farthest(word))
                .sorted(Comparator.comparingInt((String word) -> distance(low, word.toLowerCase(Locale.ROOT)))
                        .thenComparing(Comparator.naturalOrder()))
                .limit(MOST)
                .toList();
    }

    /** A third of the letters, at least one, but never all of them. */
    private static int farthest(String word) {
        return Math.min(word.length() - 1, Math.max(1, word.length() / 3));
    }

    /** Insertions, deletions, changes and swaps of neighbours between two words (optimal string alignment). */
    static int distance(String a, String b) {
        int[][] d = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                if (i == 0 || j == 0) {
                    d[i][j] = i + j;
                    continue;
                }
                int change = d[i - 1][j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                d[i][j] = Math.min(change, Math.min(d[i - 1][j], d[i][j - 1]) + 1);
                boolean swapped =
                        i > 1 && j > 1 && a.charAt(i - 1) == b.charAt(j - 2) && a.charAt(i - 2) == b.charAt(j - 1);
                if (swapped) {
                    d[i][j] = Math.min(d[i][j], d[i - 2][j - 2] + 1);
                }
            }
        }
        return d[a.length()][b.length()];
    }
}
