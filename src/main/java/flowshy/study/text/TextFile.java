package flowshy.study.text;

import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;

/**
 * A file of text as read: strict UTF-8 without control characters.
 *
 * @param name as the user wrote it
 * @param text without a byte order mark
 * @param sha256 of the bytes read, lower-case hexadecimal
 */
public record TextFile(String name, String text, String sha256) {
    /**
     * Reads a regular file.
     *
     * @param path the file
     * @param name what to call it in messages
     * @param limit the most bytes it may have
     * @return its text
     * @throws StudyException if it cannot be read, is too long, is not UTF-8 or holds control characters
     */
    public static TextFile read(Path path, String name, int limit) {
        Position start = new Position(Printable.of(name), 1, 1);
        if (!Files.isRegularFile(path)) {
            String found = Files.exists(path) ? "is not a plain file" : "no such file";
            throw new StudyException(Problem.of(Position.label(Printable.of(name)), "", found, "name a text file"));
        }
        byte[] bytes;
        try (InputStream in = Files.newInputStream(path)) {
            bytes = in.readNBytes(limit + 1);
        } catch (IOException e) {
            throw new StudyException(Problem.of(
                    Position.label(Printable.of(name)), "", "cannot be read: " + Printable.of(e.toString()), ""));
        }
        if (bytes.length > limit) {
            throw new StudyException(
                    Problem.of(start, "", "more than " + limit / 1024 + " KiB", "at most that much is read"));
        }
        return of(name, bytes);
    }

    /**
     * Decodes bytes.
     *
     * @param name what to call them
     * @param bytes the bytes
     * @return their text
     * @throws StudyException if they are not UTF-8 or hold control characters
     */
    public static TextFile of(String name, byte[] bytes) {
        String printed = Printable.of(name);
        ByteBuffer in = ByteBuffer.wrap(bytes);
        CharBuffer out = CharBuffer.allocate(bytes.length + 1);
        CharsetDecoder decoder = StandardCharsets.UTF_8.newDecoder();
        CoderResult result = decoder.decode(in, out, true);
        String text = out.flip().toString();
        if (result.isError()) {
            throw new StudyException(notUtf8(bytes, in.position(), end(printed, text)));
        }
        String plain = text.startsWith("\uFEFF") ? text.substring(1) : text;
        refuseControls(printed, plain);
        return new TextFile(name, plain, sha256(bytes));
    }

    private static Problem notUtf8(byte[] bytes, int offset, Position position) {
        boolean utf16 = bytes.length > 1 && (bytes[0] & 0xFF) + (bytes[1] & 0xFF) == 0xFE + 0xFF;
        int bad = bytes[offset] & 0xFF;
        String found = String.format("byte %d (0x%02X) is not UTF-8", offset + 1, bad);
        String guess = utf16
                ? "; it looks like UTF-16"
                : bad == 0xB5 ? "; 0xB5 is µ in Latin-1" : bad == 0xB0 ? "; 0xB0 is ° in Latin-1" : "";
        return Problem.of(position, "", found, "save the file as UTF-8" + guess);
    }

    private static void refuseControls(String name, String text) {
        Problems problems = new Problems();
        for (int i = 0; i < text.length(); ) {
            int c = text.codePointAt(i);
            boolean blank = c == '\t' || c == '\n' || c == '\r';
            boolean unassigned = c >= 0xFFFE && (c & 0xFFFE) == 0xFFFE;
            if (!blank && (Character.isISOControl(c) || unassigned)) {
                problems.add(
                        end(name, text.substring(0, i)),
                        "",
                        String.format("control character U+%04X", c),
                        "plain text only");
                if (problems.count() == 5) {
                    break;
                }
            }
            i += Character.charCount(c);
        }
        problems.throwIfAny();
    }

    /** The place behind some text; line ends are LF, CR LF or CR. */
    private static Position end(String name, String text) {
        int line = 1;
        int column = 1;
        for (int i = 0; i < text.length(); ) {
            int c = text.codePointAt(i);
            i += Character.charCount(c);
            boolean firstOfTwo = c == '\r' && i < text.length() && text.charAt(i) == '\n';
            if (c == '\n' || (c == '\r' && !firstOfTwo)) {
                line++;
                column = 1;
            } else if (!firstOfTwo && c != 0xFEFF) {
                column++;
            }
        }
        return new Position(name, line, column);
    }

    private static String sha256(byte[] bytes) {
        try {
            return HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        } catch (NoSuchAlgorithmException e) {
            throw new IllegalStateException("every Java platform has SHA-256", e);
        }
    }
}
