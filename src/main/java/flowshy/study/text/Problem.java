package flowshy.study.text;

import java.util.Optional;

/**
 * One thing in a study that its writer has to mend.
 *
 * @param position where it stands
 * @param path the key's path, e.g. {@code hair.diameter}; empty where no key is concerned
 * @param found what was found
 * @param accepted what would be right, or what to do
 * @param nearest the known key or word that was most likely meant
 */
public record Problem(Position position, String path, String found, String accepted, Optional<String> nearest) {
    /**
     * A problem without a near word.
     *
     * @param position where it stands
     * @param path the key's path, may be empty
     * @param found what was found
     * @param accepted what would be right
     * @return the problem
     */
    public static Problem of(Position position, String path, String found, String accepted) {
        return new Problem(position, path, found, accepted, Optional.empty());
    }

    /**
     * The problem on one line: position, path, found, accepted, nearest.
     *
     * @return text without control characters
     */
    public String text() {
        StringBuilder line = new StringBuilder(position.toString());
        boolean told = position.line() == 0 && position.origin().endsWith(" " + path);
        if (!path.isEmpty() && !told) {
            line.append(": ").append(Printable.of(path));
        }
        line.append(": ").append(found);
        if (!accepted.isEmpty()) {
            line.append("; ").append(accepted);
        }
        nearest.ifPresent(word -> line.append("; did you mean ").append(word).append('?'));
        return line.toString();
    }
}
