package flowshy.medium;

import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.InputStream;
import java.nio.ByteBuffer;
import java.nio.CharBuffer;
import java.nio.charset.CharsetDecoder;
import java.nio.charset.CoderResult;
import java.nio.charset.CodingErrorAction;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;

/** Text of a table with its places, and the faults found so far. */
final class TableText {
    /** A property table has some hundred short lines; a megabyte is a wrong file. */
    private static final int LARGEST = 1 << 20;

    private final String file;
    private final List<TableProblem> problems = new ArrayList<>();

    TableText(String file) {
        this.file = file;
    }

    String file() {
        return file;
    }

    List<TableProblem> problems() {
        return problems;
    }

    void problem(int line, int column, String found, String accepted) {
        problems.add(new TableProblem(file, line, column, found, accepted));
    }

    /** @throws MediumTableException with every fault, if there is one */
    void judge() {
        if (!problems.isEmpty()) {
            throw new MediumTableException(problems);
        }
    }

    /** Lines without their ends; a byte order mark is dropped. */
    List<String> lines(InputStream in) throws IOException {
        byte[] bytes = in.readNBytes(LARGEST + 1);
        if (bytes.length > LARGEST) {
            problem(1, 1, "a file of more than " + LARGEST + " bytes", "a property table, some hundred lines of text");
            judge();
        }
        String text = decode(bytes);
        if (text.startsWith("\uFEFF")) {
            text = text.substring(1);
        }
        return text.lines().toList();
    }

    private String decode(byte[] bytes) {
        CharsetDecoder decoder = StandardCharsets.UTF_8
                .newDecoder()
                .onMalformedInput(CodingErrorAction.REPORT)
                .onUnmappableCharacter(CodingErrorAction.REPORT);
        ByteBuffer from = ByteBuffer.wrap(bytes);
        CharBuffer to = CharBuffer.allocate(bytes.length + 1);
        CoderResult result = decoder.decode(from, to, true);
        String read = to.flip().toString();
        if (result.isError()) {
            int line = (int) read.chars().filter(c -> c == '\n').count() + 1;
            int column = read.length() - read.lastIndexOf('\n');
            ByteArrayOutputStream bad = new ByteArrayOutputStream();
            bad.write(bytes, from.position(), result.length());
            problem(line, column, "the byte 0x" + hex(bad.toByteArray()), "text in UTF-8");
            judge();
        }
        return read;
    }

    private static String hex(byte[] bytes) {
        StringBuilder text = new StringBuilder();
        for (byte b : bytes) {
            text.append(Character.forDigit((b >> 4) & 0xF, 16)).append(Character.forDigit(b & 0xF, 16));
        }
        return text.toString();
    }
}
