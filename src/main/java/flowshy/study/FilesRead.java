package flowshy.study;

import flowshy.medium.MediumTable;
import flowshy.medium.MediumTableException;
import flowshy.study.keys.Form;
import flowshy.study.text.Position;
import flowshy.study.text.Printable;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.text.TextFile;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.InvalidPathException;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.ConcurrentHashMap;
import java.util.regex.Pattern;

/** Reads the files that a study names, beside the study, and remembers their digests. */
final class FilesRead {
    /** A record of a swing may have a million lines. */
    private static final int LIMIT = 32 * 1024 * 1024;

    private final Path folder;
    private final List<Study.FileRead> read = new ArrayList<>();
    /** What was read once is not read again, also by {@link #again} others. */
    private final Map<Path, TextFile> texts;

    private final Map<String, MediumTable> tables;

    FilesRead(Path folder) {
        this(folder, new ConcurrentHashMap<>(), new ConcurrentHashMap<>());
    }

    private FilesRead(Path folder, Map<Path, TextFile> texts, Map<String, MediumTable> tables) {
        this.folder = folder;
        this.texts = texts;
        this.tables = tables;
    }

    /** The same files for another study of this folder, as they were read; its list of files read begins anew. */
    FilesRead again() {
        return new FilesRead(folder, texts, tables);
    }

    /**
     * The table in the file that a key names.
     *
     * @throws StudyException with every problem of the file; one that cannot be opened is told at the key
     */
    ColumnFile table(Form form, String key, List<ColumnFile.Column> wanted, int most) {
        return ColumnFile.read(text(form.word(key).orElseThrow(), form.position(key), key), wanted, most);
    }

    /** Whether the header of a table names a column; a file that cannot be opened has none, its reader tells why. */
    boolean heads(Form form, String key, String column) {
        TextFile file = text(form.word(key).orElseThrow(), form.position(key), key);
        return file.text()
                .lines()
                .filter(line -> !line.isBlank() && !line.startsWith("#"))
                .findFirst()
                .filter(line -> Pattern.compile("(^|[;,\\t])\\s*" + Pattern.quote(column) + "\\b")
                        .matcher(line)
                        .find())
                .isPresent();
    }

    /**
     * The text of the file that a key names.
     *
     * @throws StudyException if it cannot be opened or is no text
     */
    TextFile text(Form form, String key) {
        return text(form.word(key).orElseThrow(), form.position(key), key);
    }

    /**
     * A medium's table in the file that a key names.
     *
     * @throws StudyException with every problem of the table, at its own lines
     */
    MediumTable medium(Form form, String key) {
        String name = form.word(key).orElseThrow();
        TextFile file = text(name, form.position(key), key);
        MediumTable known = tables.get(name);
        return known == null ? table(file, name, key) : known;
    }

    private MediumTable table(TextFile file, String name, String key) {
        try {
            MediumTable table =
                    MediumTable.read(new ByteArrayInputStream(file.text().getBytes(StandardCharsets.UTF_8)), name);
            tables.put(name, table);
            return table;
        } catch (MediumTableException e) {
            Problems problems = new Problems();
            e.problems()
                    .forEach(fault -> problems.add(
                            new Position(fault.file(), fault.line(), fault.column()),
                            key,
                            fault.found(),
                            fault.accepted()));
            problems.throwIfAny();
            throw e;
        } catch (IOException e) { // a stream over memory never fails; the signature says it could
            throw new UncheckedIOException(e);
        }
    }

    private TextFile text(String name, Position at, String key) {
        Path path;
        try {
            path = folder.resolve(name);
        } catch (InvalidPathException e) {
            throw new StudyException(Problem.of(at, key, Printable.of(name) + " is no file name", "name a text file"));
        }
        TextFile file = texts.get(path);
        if (file == null) {
            if (!Files.isRegularFile(path)) {
                String found = Files.exists(path) ? " is not a plain file" : ": no such file beside the study";
                throw new StudyException(Problem.of(at, key, Printable.of(name) + found, "name a text file"));
            }
            file = TextFile.read(path, name, LIMIT);
            texts.put(path, file);
        }
        Study.FileRead entry = new Study.FileRead(name, file.sha256());
        if (!read.contains(entry)) {
            read.add(entry);
        }
        return file;
    }

    List<Study.FileRead> read() {
        return List.copyOf(read);
    }
}
