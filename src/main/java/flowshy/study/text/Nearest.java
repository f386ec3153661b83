package flowshy.study.text;

import java.util.Collection;
import java.util.Locale;
import java.util.Optional;

/** Finds the known word that a mistyped one most likely meant. */
public final class Nearest {
    /** Words longer than this are not compared: the work grows with the product of the lengths. */
    private static final int LONGEST = 64;

    private Nearest() {}

    /**
     * The known word with the fewest slips (insertions, deletions, replacements, swaps of neighbours) from the typed one;
     * letters in the wrong case count nothing. At most a third of the letters may be wrong.
     *
     * @param typed what was written
     * @param known the words to choose from; the first of equals wins
     * @return the nearest word, empty if none is near
     */
    public static Optional<String> among(String typed, Collection<String> known) {
        String nearest = null;
        int fewest = Integer.MAX_VALUE;
        for (String word : known) {
            int slips = slips(typed.toLowerCase(Locale.ROOT), word.toLowerCase(Locale.ROOT));
            int allowed = Math.max(1, Math.min(typed.length(), word.length()) / 3);
            boolean oneLetter = word.length() == 1 && slips > 0;
            if (slips <= allowed && slips < fewest && !oneLetter) {
                fewest = slips;
                nearest = word;
            }
        }
        return Optional.ofNullable(nearest);
    }

    /** Optimal string alignment distance (Damerau 1964, Levenshtein 1966). */
    private static int slips(String a, String b) {
        if (a.length() > LONGEST || b.length() > LONGEST) {
            return Integer.MAX_VALUE;
        }
        int[][] cost = new int[a.length() + 1][b.length() + 1];
        for (int i = 0; i <= a.length(); i++) {
            for (int j = 0; j <= b.length(); j++) {
                cost[i][j] = i == 0 || j == 0 ? i + j : step(cost, a, b, i, j);
            }
        }
        return cost[a.length()][b.length()];
    }

    private static int step(int[][] cost, String a, String b, int i, int j) {
        char last = a.charAt(i - 1);
        char other = b.charAt(j - 1);
        int best = Math.min(cost[i - 1][j] + 1, cost[i][j - 1] + 1);
        best = Math.min(best, cost[i - 1][j - 1] + (last == other ? 0 : 1));
        boolean swapped = i > 1 && j > 1 && last == b.charAt(j - 2) && a.charAt(i - 2) == other;
        return swapped ? Math.min(best, cost[i - 2][j - 2] + 1) : best;
    }
}
