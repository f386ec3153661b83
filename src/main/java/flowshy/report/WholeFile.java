package flowshy.report;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;

/** Files are written whole or not at all: to a temporary name beside the target, then moved. */
public final class WholeFile {
    private WholeFile() {}

    /**
     * Writes a text, UTF-8, over whatever was there.
     *
     * @param target file to be written
     * @param text its content
     * @throws IOException if the folder cannot be written or is full; nothing is left behind then
     */
    public static void write(Path target, String text) throws IOException {
        // beside the target and not a system temporary file: that would be its owner's alone, and perhaps on another
        // disk
        Path half = target.resolveSibling(
                "." + target.toFile().getName() + "." + ProcessHandle.current().pid() + ".part");
        try {
            Files.write(half, text.getBytes(StandardCharsets.UTF_8), StandardOpenOption.CREATE_NEW);
            try {
                Files.move(half, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
            } catch (AtomicMoveNotSupportedException e) {
                Files.move(half, target, StandardCopyOption.REPLACE_EXISTING);
            }
        } finally {
            Files.deleteIfExists(half);
        }
    }
}
