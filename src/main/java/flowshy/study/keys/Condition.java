package flowshy.study.keys;

/**
 * A key that has a meaning only beside a certain word of its group.
 *
 * @param sibling the other key, or a path below the group such as {@code in.name}
 * @param word the word it is compared with
 * @param equal true if the key needs that word, false if it needs any other
 * @param refuses whether the key is refused otherwise; if not, it only has no default then
 */
public record Condition(String sibling, String word, boolean equal, boolean refuses) {
    static Condition onlyIf(String sibling, String word) {
        return new Condition(sibling, word, true, true);
    }

    static Condition unless(String sibling, String word) {
        return new Condition(sibling, word, false, true);
    }

    static Condition asksUnless(String sibling, String word) {
        return new Condition(sibling, word, false, false);
    }

    boolean holds(String said) {
        return said.equals(word) == equal;
    }

    String words() {
        return (equal ? "it belongs to " : "it has no meaning with ") + sibling + ": " + word;
    }
}
