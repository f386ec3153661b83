package flowshy.medium;

/** How far one word is from another. */
final class Spelling {
    private Spelling() {}

    /** Levenshtein distance: the fewest letters to insert, delete or replace. */
    static int distance(String a, String b) {
        int[] previous = new int[b.length() + 1];
        for (int j = 0; j <= b.length(); j++) {
            previous[j] = j;
        }
        for (int i = 1; i <= a.length(); i++) {
            int[] current = new int[b.length() + 1];
            current[0] = i;
            for (int j = 1; j <= b.length(); j++) {
                int replace = previous[j - 1] + (a.charAt(i - 1) == b.charAt(j - 1) ? 0 : 1);
                current[j] = Math.min(replace, 1 + Math.min(previous[j], current[j - 1]));
            }
            previous = current;
        }
        return previous[b.length()];
    }
}
