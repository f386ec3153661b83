package flowshy.stream;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import org.assertj.core.api.Assertions;

/** Numbers made outside the project, from a comma-separated file beside the test; # opens a remark, the first row names the columns. */
public final class ReferenceRows {
    private ReferenceRows() {}

    /**
     * All rows of a file.
     *
     * @param beside the test class whose package holds the file
     * @param file its name
     * @param count how many rows it must hold
     * @return one map a row: column name to number
     */
    public static List<Map<String, Double>> read(Class<?> beside, String file, int count) {
        List<Map<String, Double>> rows = new ArrayList<>();
        List<String> names = List.of();
        for (String line : text(beside, file).lines().toList()) {
            if (line.isBlank() || line.startsWith("#")) {
                continue;
            }
            List<String> cells = List.of(line.split(",", -1));
            if (names.isEmpty()) {
                names = cells;
                continue;
            }
            Assertions.assertThat(cells).as("%s: %s", file, line).hasSameSizeAs(names);
            Map<String, Double> row = new LinkedHashMap<>();
            for (int i = 0; i < cells.size(); i++) {
                double value = Double.parseDouble(cells.get(i));
                Assertions.assertThat(value).as("%s: %s", file, line).isFinite();
                row.put(names.get(i), value);
            }
            rows.add(row);
        }
        Assertions.assertThat(rows).as("rows of %s", file).hasSize(count);
        return rows;
    }

    private static String text(Class<?> beside, String file) {
        try (InputStream in = beside.getResourceAsStream(file)) {
            Assertions.assertThat(in).as("resource %s", file).isNotNull();
            return new String(in.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(file, e);
        }
    }
}
