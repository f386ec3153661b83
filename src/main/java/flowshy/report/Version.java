package flowshy.report;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;

/** The version that made an answer. */
public final class Version {
    private Version() {}

    /**
     * Version of this build.
     *
     * @return as in the pom, e.g. {@code 0.1.0}
     */
    public static String number() {
        try (InputStream file = Version.class.getResourceAsStream("version.txt")) {
            return new String(file.readAllBytes(), StandardCharsets.UTF_8).strip();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
