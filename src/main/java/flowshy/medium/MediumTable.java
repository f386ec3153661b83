package flowshy.medium;

import java.io.IOException;
import java.io.InputStream;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;

/**
 * Properties of one medium by rising temperature, with what its header says of them.
 *
 * @param file the name under which messages point at it
 * @param header what the table says of itself
 * @param rows by rising temperature, those of one grade together; empty if a formula replaces them
 */
public record MediumTable(String file, TableHeader header, List<TableRow> rows) {
    /** A table needs as many rows as a cubic spline needs points. */
    static final int FEWEST_ROWS = 3;

    /** @throws IllegalArgumentException if the temperatures do not rise, or there are too few rows and no formula */
    public MediumTable {
        rows = List.copyOf(rows);
        if (header.law().isEmpty() && rows.size() < FEWEST_ROWS) {
            throw new IllegalArgumentException(file + ": a table needs " + FEWEST_ROWS + " rows, has " + rows.size());
        }
        for (int i = 1; i < rows.size(); i++) {
            boolean sameGrade = rows.get(i).grade().equals(rows.get(i - 1).grade());
            if (sameGrade && !(rows.get(i).temperature() > rows.get(i - 1).temperature())) {
                throw new IllegalArgumentException(file + ": temperature must rise, row " + (i + 1));
            }
        }
    }

    /**
     * Reads a table of the user.
     *
     * @param path the file
     * @param name how messages call it, usually the path as the study writes it
     * @return the table
     * @throws IOException if the file cannot be read
     * @throws MediumTableException if its text is at fault; carries every fault with line and column
     */
    public static MediumTable read(Path path, String name) throws IOException {
        try (InputStream in = Files.newInputStream(path)) {
            return read(in, name);
        }
    }

    /**
     * Reads a table from a stream.
     *
     * @param in bytes in UTF-8, left open
     * @param name how messages call it
     * @return the table
     * @throws IOException if the stream fails
     * @throws MediumTableException if the text is at fault; carries every fault with line and column
     */
    public static MediumTable read(InputStream in, String name) throws IOException {
        return new MediumTableReader(name).read(in);
    }

    /**
     * The name of the medium.
     *
     * @return as the header states it
     */
    public String medium() {
        return header.medium();
    }
}
