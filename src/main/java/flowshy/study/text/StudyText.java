package flowshy.study.text;

import java.nio.file.Path;

/**
 * A study as read: its text and its tree.
 *
 * @param file the text it came from
 * @param root its keys
 */
public record StudyText(TextFile file, Node.Mapping root) {
    /** A study is a page or two; more is an accident or an attack. */
    private static final int LIMIT = 256 * 1024;

    /**
     * Reads a study file of at most 256 KiB.
     *
     * @param path the file
     * @return its tree
     * @throws StudyException with every problem of encoding, YAML and repeated keys
     */
    public static StudyText read(Path path) {
        return of(TextFile.read(path, path.toString(), LIMIT));
    }

    /**
     * Reads a study from bytes.
     *
     * @param name what to call it in messages
     * @param bytes at most 256 KiB
     * @return its tree
     * @throws StudyException with every problem of encoding, YAML and repeated keys
     */
    public static StudyText of(String name, byte[] bytes) {
        if (bytes.length > LIMIT) {
            Position start = new Position(Printable.of(name), 1, 1);
            throw new StudyException(Problem.of(start, "", "more than 256 KiB", "at most that much is read"));
        }
        return of(TextFile.of(name, bytes));
    }

    private static StudyText of(TextFile file) {
        Problems problems = new Problems();
        Node root = TreeReader.file(Printable.of(file.name()), file.text(), problems);
        if (!(root instanceof Node.Mapping) && problems.count() == 0) {
            boolean empty = root instanceof Node.Scalar s && s.text().isEmpty();
            problems.add(
                    root.position(),
                    "",
                    empty ? "the study is empty" : "the study is not made of keys with values",
                    "the smallest has two keys, hair: and medium:");
        }
        problems.throwIfAny();
        return new StudyText(file, (Node.Mapping) root);
    }
}
