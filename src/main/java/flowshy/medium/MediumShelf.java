package flowshy.medium;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.net.JarURLConnection;
import java.net.URI;
import java.net.URL;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.jar.JarEntry;
import java.util.regex.Pattern;
import java.util.stream.Stream;

/**
 * The tables that come with the program, one file a medium. A medium is looked for under the name of its file, so that one
 * is read and no other; only an alias needs all headers.
 */
final class MediumShelf {
    private static final String FOLDER = "media-tables";
    private static final String SUFFIX = ".csv";

    /** A table that is always there and so leads to the others. */
    private static final String ANCHOR = "/" + FOLDER + "/air" + SUFFIX;

    private static final Pattern STEM = Pattern.compile("[a-z0-9-]+");

    private MediumShelf() {}

    /** The name of the file in which a medium of this name stands, without its ending. */
    static String stem(String name) {
        return name.strip().toLowerCase(Locale.ROOT).replaceAll("[\\s_-]+", "-");
    }

    /** The table of a file, by its stem; empty if there is none. */
    static Optional<MediumTable> find(String stem) {
        return read(stem, (in, file) -> MediumTable.read(in, file));
    }

    /** Every header, by the order of the file names; the rows are not read. */
    static List<TableHeader> headers() {
        return stems().stream()
                .map(stem -> read(stem, (in, file) -> new MediumTableReader(file).readHeader(in))
                        .orElseThrow())
                .toList();
    }

    private static <T> Optional<T> read(String stem, Reading<T> reading) {
        if (!STEM.matcher(stem).matches()) {
            return Optional.empty();
        }
        String file = FOLDER + "/" + stem + SUFFIX;
        try (InputStream in = MediumShelf.class.getResourceAsStream("/" + file)) {
            return in == null ? Optional.empty() : Optional.of(reading.of(in, file));
        } catch (IOException e) {
            throw new UncheckedIOException(file, e);
        }
    }

    /** What is taken from a file. */
    private interface Reading<T> {
        T of(InputStream in, String file) throws IOException;
    }

    private static List<String> stems() {
        URL anchor = MediumShelf.class.getResource(ANCHOR);
        if (anchor == null) {
            throw new IllegalStateException("the program was built without " + ANCHOR);
        }
        try {
            Stream<String> files = anchor.getProtocol().equals("jar")
                    ? ((JarURLConnection) anchor.openConnection())
                            .getJarFile().stream().map(JarEntry::getName).filter(name -> name.startsWith(FOLDER + "/"))
                    : files(Path.of(URI.create(anchor.toString())).getParent());
            return files.filter(name -> name.endsWith(SUFFIX))
                    .map(name -> name.substring(name.lastIndexOf('/') + 1, name.length() - SUFFIX.length()))
                    .sorted()
                    .toList();
        } catch (IOException e) {
            throw new UncheckedIOException(ANCHOR, e);
        }
    }

    private static Stream<String> files(Path folder) throws IOException {
        try (Stream<Path> paths = Files.list(folder)) {
            return paths.map(path -> String.valueOf(path.getFileName())).toList().stream();
        }
    }
}
