package flowshy.report;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.AtomicMoveNotSupportedException;
import java.nio.file.FileAlreadyExistsException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.nio.file.StandardCopyOption;
import java.nio.file.StandardOpenOption;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;

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
        write(target, text.getBytes(StandardCharsets.UTF_8));
    }

    /**
     * Writes bytes over whatever was there.
     *
     * @param target file to be written
     * @param bytes its content
     * @throws IOException if the folder cannot be written or is full; nothing is left behind then
     */
    public static void write(Path target, byte[] bytes) throws IOException {
        // beside the target and not a system temporary file: that would be its owner's alone, and perhaps on another
        // disk
        Path half = half(target);
        try {
            Files.write(half, bytes, StandardOpenOption.CREATE_NEW);
            move(half, target);
        } finally {
            Files.deleteIfExists(half);
        }
    }

    /**
     * Writes several files of a folder: all of them are on the disk before the first takes its name.
     *
     * @param folder made, with those above it, if it is not there
     * @param files their bytes, each directly in the folder
     * @throws IOException if one cannot be written; none is changed then and a folder that was made is gone again
     */
    public static void writeAll(Path folder, Map<Path, byte[]> files) throws IOException {
        List<Path> made = new ArrayList<>();
        for (Path above = folder.toAbsolutePath(); above != null && Files.notExists(above); above = above.getParent()) {
            made.add(above);
        }
        Map<Path, Path> halves = new LinkedHashMap<>();
        boolean done = false;
        try {
            Files.createDirectories(folder);
            for (Map.Entry<Path, byte[]> file : files.entrySet()) {
                if (Files.isDirectory(file.getKey())) {
                    throw new FileAlreadyExistsException(file.getKey().toString(), null, "it is a folder");
                }
                halves.put(file.getKey(), half(file.getKey()));
                Files.write(halves.get(file.getKey()), file.getValue(), StandardOpenOption.CREATE_NEW);
            }
            for (Map.Entry<Path, Path> file : halves.entrySet()) {
                move(file.getValue(), file.getKey());
            }
            done = true;
        } finally {
            for (Path half : halves.values()) {
                Files.deleteIfExists(half);
            }
            for (Path folderMade : done ? List.<Path>of() : made) {
                if (Files.isDirectory(folderMade)) {
                    Files.delete(folderMade);
                }
            }
        }
    }

    /** Gone also when the program is stopped from outside while it is written. */
    private static Path half(Path target) {
        Path half = target.resolveSibling(
                "." + target.toFile().getName() + "." + ProcessHandle.current().pid() + ".part");
        half.toFile().deleteOnExit();
        return half;
    }

    private static void move(Path half, Path target) throws IOException {
        try {
            Files.move(half, target, StandardCopyOption.ATOMIC_MOVE, StandardCopyOption.REPLACE_EXISTING);
        } catch (AtomicMoveNotSupportedException e) {
            Files.move(half, target, StandardCopyOption.REPLACE_EXISTING);
        }
    }
}
