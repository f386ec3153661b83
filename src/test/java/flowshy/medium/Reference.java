package flowshy.medium;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import java.util.List;

/** Rows of a reference file beside the tests; a file without the expected number of rows fails. */
final class Reference {
    private Reference() {}

    /** Rows of numbers. */
    static List<double[]> rows(String file, int expected) throws IOException {
        return words(file, expected).stream()
                .map(row -> Arrays.stream(row).mapToDouble(Double::parseDouble).toArray())
                .toList();
    }

    /** Rows with words in some of their cells. */
    static List<String[]> words(String file, int expected) throws IOException {
        try (InputStream in = Reference.class.getResourceAsStream(file)) {
            assertThat(in).as(file).isNotNull();
            List<String[]> rows = new String(in.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .filter(line -> !line.startsWith("#"))
                    .skip(1)
                    .map(line -> line.split(",", -1))
                    .toList();
            assertThat(rows).hasSize(expected);
            return rows;
        }
    }
}
