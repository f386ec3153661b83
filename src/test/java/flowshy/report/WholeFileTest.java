package flowshy.report;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIOException;

import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

class WholeFileTest {
    @TempDir
    Path folder;

    @Test
    void writesOverAndLeavesNothingBeside() throws IOException {
        Path file = folder.resolve("answer.json");
        WholeFile.write(file, "first");
        WholeFile.write(file, "µ second");
        assertThat(file).hasContent("µ second");
        assertThat(names()).containsExactly("answer.json");
    }

    @Test
    void leavesNothingWhereItCannotWrite() throws IOException {
        Path blocked = folder.resolve("a-folder");
        Files.createDirectories(blocked.resolve("inside"));
        assertThatIOException().isThrownBy(() -> WholeFile.write(blocked, "text"));
        assertThatIOException().isThrownBy(() -> WholeFile.write(folder.resolve("missing/answer.json"), "text"));
        assertThat(names()).containsExactly("a-folder");
    }

    private String[] names() throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString()).sorted().toArray(String[]::new);
        }
    }
}
