package flowshy.stream.surroundings;

import flowshy.stream.SourceKind;
import flowshy.stream.Stated;
import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** The list of named surroundings and the defaults of a bare stream, out of the table {@code named.txt} beside this class. */
public final class NamedSurroundings {
    private static final String FILE = "named.txt";
    private static final String DEFAULTS = "stream";

    /** Read when first asked for. */
    private static final class Table {
        static final List<NamedSurrounding> ALL = read();
    }

    private NamedSurroundings() {}

    /**
     * All of them, without the defaults.
     *
     * @return in the order of the table
     */
    public static List<NamedSurrounding> all() {
        return Table.ALL.stream()
                .filter(named -> !named.name().equals(DEFAULTS))
                .toList();
    }

    /**
     * One of them.
     *
     * @param name e.g. {@code still room}
     * @return its values, empty if there is none of this name
     */
    public static Optional<NamedSurrounding> of(String name) {
        return all().stream().filter(named -> named.name().equals(name)).findFirst();
    }

    /**
     * What a stream has of which only the mean speed is stated.
     *
     * @param key turbulence, length-scale or fetch
     * @return the assumed number with its source
     * @throws IllegalArgumentException for another key
     */
    public static Stated ofBareStream(String key) {
        return Table.ALL.stream()
                .filter(named -> named.name().equals(DEFAULTS))
                .flatMap(named -> named.number(key).stream())
                .findFirst()
                .orElseThrow(() -> new IllegalArgumentException("a stream has no default " + key));
    }

    private static List<NamedSurrounding> read() {
        List<NamedSurrounding> all = new ArrayList<>();
        for (String line : text().lines().toList()) {
            if (line.isBlank() || line.startsWith("#")) {
                continue;
            }
            List<String> cells =
                    Arrays.stream(line.split("\\|", -1)).map(String::strip).toList();
            if (!line.startsWith(" ")) {
                all.add(new NamedSurrounding(cells.get(0), kind(cells.get(1)), cells.get(2), List.of()));
            } else {
                NamedSurrounding last = all.remove(all.size() - 1);
                List<NamedSurrounding.StartingValue> numbers = new ArrayList<>(last.numbers());
                Stated stated = Stated.assumed(cells.get(0), Double.parseDouble(cells.get(1)), cells.get(3));
                numbers.add(new NamedSurrounding.StartingValue(stated, cells.get(2)));
                all.add(new NamedSurrounding(last.name(), last.kind(), last.about(), numbers));
            }
        }
        return List.copyOf(all);
    }

    private static SourceKind kind(String word) {
        return Arrays.stream(SourceKind.values())
                .filter(kind -> kind.word().equals(word))
                .findFirst()
                .orElseThrow(() -> new IllegalStateException(FILE + ": no kind of source is called " + word));
    }

    private static String text() {
        try (InputStream in = NamedSurroundings.class.getResourceAsStream(FILE)) {
            if (in == null) {
                throw new IllegalStateException("the table " + FILE + " is missing");
            }
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(FILE, e);
        }
    }
}
