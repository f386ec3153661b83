package flowshy.study.text;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.time.Duration;
import java.util.List;
import java.util.Random;
import org.junit.jupiter.api.Assertions;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Places of keys and values, and input that is wrong or meant to hurt. */
class StudyTextTest {
    @TempDir
    private Path folder;

    private static StudyText read(String text) {
        return StudyText.of("duct.yaml", text.getBytes(StandardCharsets.UTF_8));
    }

    private static List<String> problems(String text) {
        return problems(text.getBytes(StandardCharsets.UTF_8));
    }

    private static List<String> problems(byte[] bytes) {
        try {
            StudyText.of("duct.yaml", bytes);
            return List.of();
        } catch (StudyException e) {
            return e.problems().stream().map(Problem::text).toList();
        }
    }

    @Test
    void keepsThePlaceOfEveryKeyAndValue() {
        Node.Mapping root =
                read("# duct\ntitle: µ-duct\nhair: {length: 640 um, \"diameter\": '95 um'}\nlist:\n  - a\n  -   b\n")
                        .root();
        assertThat(root.position()).hasToString("duct.yaml:2:1");
        assertThat(root.entries()).extracting(Node.Entry::key).containsExactly("title", "hair", "list");
        Node.Mapping hair = (Node.Mapping) root.entry("hair").orElseThrow().value();
        Node.Entry diameter = hair.entry("diameter").orElseThrow();
        assertThat(hair.position()).hasToString("duct.yaml:3:7");
        assertThat(diameter.position()).hasToString("duct.yaml:3:24");
        assertThat(diameter.value()).isEqualTo(new Node.Scalar("95 um", new Position("duct.yaml", 3, 36)));
        Node.Sequence list = (Node.Sequence) root.entry("list").orElseThrow().value();
        assertThat(list.items())
                .containsExactly(
                        new Node.Scalar("a", new Position("duct.yaml", 5, 5)),
                        new Node.Scalar("b", new Position("duct.yaml", 6, 7)));
    }

    @Test
    void columnsCountCharactersNotBytesOrHalves() {
        Node.Mapping root = read("{t: \"😀µ\", u: x}").root();
        assertThat(root.entry("u").orElseThrow().position()).hasToString("duct.yaml:1:11");
    }

    @Test
    void wordsStayWords() {
        Node.Mapping root = read("finite-length: off\nrevision: 2.10\nyes: no\nempty:\ntilde: ~\n")
                .root();
        assertThat(root.entries())
                .extracting(e -> ((Node.Scalar) e.value()).text())
                .containsExactly("off", "2.10", "no", "", "~");
    }

    @Test
    void acceptsAByteOrderMarkWindowsLineEndsAndOneDocumentMark() {
        Node.Mapping root =
                read("\uFEFF%YAML 1.2\n---\r\ntitle: a\r\nhair: b\r\n...\r\n").root();
        assertThat(root.entry("title").orElseThrow().value().position()).hasToString("duct.yaml:3:8");
        assertThat(root.entry("hair").orElseThrow().position()).hasToString("duct.yaml:4:1");
    }

    @Test
    void hashIsThatOfTheBytes() {
        // printf 'abc' | sha256sum; also FIPS 180-2, appendix B.1
        assertThat(TextFile.of("x", "abc".getBytes(StandardCharsets.UTF_8)).sha256())
                .isEqualTo("ba7816bf8f01cfea414140de5dae2223b00361a396177a9cb410ff61f20015ad");
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "'a: 1\nb: 2\na: 3' | duct.yaml:3:1: a: repeated key; first given at duct.yaml:1:1; keep one",
                "'h: {x: 1, x: 2}' | duct.yaml:1:11: h.x: repeated key; first given at duct.yaml:1:5; keep one",
                "'a: &n 1' | duct.yaml:1:4: a: an anchor (&); leave it out",
                "'a: *n' | duct.yaml:1:4: a: an alias (*); write the value out; aliases and anchors are not read",
                "'a: !!str 1' | duct.yaml:1:4: a: a tag (tag:yaml.org,2002:str); leave it out",
                "'a: !x {b: 1}' | duct.yaml:1:4: a: a tag (!x); leave it out",
                "'a: 1\n---\nb: 2' | duct.yaml:2:1: a second document; one file holds one study",
                "'[a, b]: 1' | duct.yaml:1:1: a key that is no plain word; a key is one word",
                "'- a' | duct.yaml:1:1: the study is not made of keys with values; the smallest has two keys, hair: and medium:",
                "'only words' | duct.yaml:1:1: the study is not made of keys with values; the smallest has two keys, hair: and medium:",
                "'# nothing' | duct.yaml:1:1: the study is empty; the smallest has two keys, hair: and medium:",
                "'' | duct.yaml:1:1: the study is empty; the smallest has two keys, hair: and medium:",
                "'a: b: c' | duct.yaml:1:5: not readable as YAML: mapping values are not allowed here; put quotes around a value that holds a colon; keys of one group start in the same column",
                "'hair:\n\tlength: 1' | duct.yaml:2:1: a tab where a value or key should start; indent by blanks",
                "'hair: {length: 1' | duct.yaml:1:17: not readable as YAML: expected ',' or '}', but got <stream end>; check indentation, brackets and quotes",
                "'hair:\n  a: 1\n b: 2' | duct.yaml:3:2: not readable as YAML: expected <block end>, but found '<block mapping start>'; keys of one group start in the same column",
                "'a: \"open' | duct.yaml:1:9: not readable as YAML: found unexpected end of stream; check indentation, brackets and quotes",
            })
    void saysWhereAndWhat(String text, String problem) {
        assertThat(problems(text)).containsExactly(problem);
    }

    @Test
    void tellsEveryProblemAtOnceInTheOrderOfTheText() {
        assertThat(problems("a: &n 1\nb: !t 2\na: *n\nc: {d: 1, d: 2}\n"))
                .containsExactly(
                        "duct.yaml:1:4: a: an anchor (&); leave it out",
                        "duct.yaml:2:4: b: a tag (!t); leave it out",
                        "duct.yaml:3:1: a: repeated key; first given at duct.yaml:1:1; keep one",
                        "duct.yaml:3:4: a: an alias (*); write the value out; aliases and anchors are not read",
                        "duct.yaml:4:11: c.d: repeated key; first given at duct.yaml:4:5; keep one");
    }

    @Test
    void encodingIsStrict() {
        assertThat(problems("a: 1\nb: 80 µm".getBytes(StandardCharsets.ISO_8859_1)))
                .containsExactly(
                        "duct.yaml:2:7: byte 12 (0xB5) is not UTF-8; save the file as UTF-8; 0xB5 is µ in Latin-1");
        assertThat(problems("a: 22 °C".getBytes(StandardCharsets.ISO_8859_1)))
                .containsExactly(
                        "duct.yaml:1:7: byte 7 (0xB0) is not UTF-8; save the file as UTF-8; 0xB0 is ° in Latin-1");
        assertThat(problems("a: 1".getBytes(StandardCharsets.UTF_16)))
                .containsExactly(
                        "duct.yaml:1:1: byte 1 (0xFE) is not UTF-8; save the file as UTF-8; it looks like UTF-16");
        byte[] cut = {'a', ':', ' ', (byte) 0xC2};
        assertThat(problems(cut)).containsExactly("duct.yaml:1:4: byte 4 (0xC2) is not UTF-8; save the file as UTF-8");
        byte[] overlong = {'a', ':', ' ', (byte) 0xC0, (byte) 0x80};
        assertThat(problems(overlong)).hasSize(1);
        byte[] surrogate = {'a', ':', ' ', (byte) 0xED, (byte) 0xA0, (byte) 0x80};
        assertThat(problems(surrogate)).hasSize(1);
    }

    @Test
    void controlCharactersAreToldAndNeverRepeated() {
        List<String> found = problems("a: 1\u0000\nb: \u001B[31mred\n");
        assertThat(found)
                .containsExactly(
                        "duct.yaml:1:5: control character U+0000; plain text only",
                        "duct.yaml:2:4: control character U+001B; plain text only");
        assertThat(problems("\u0007".repeat(1000))).hasSize(5);
        assertThat(problems("\"x\\e[31m\": *a")).singleElement().asString().doesNotContain("\u001B");
        assertThat(problems("a: \uFFFF")).hasSize(1);
    }

    @ParameterizedTest
    @ValueSource(strings = {"[", "{a: ", "- ", "? ", "a:\n "})
    void deepNestingEndsAtOnce(String level) {
        String text = level.repeat(20000);
        Assertions.assertTimeoutPreemptively(
                Duration.ofSeconds(10), () -> assertThat(problems(text)).isNotEmpty());
        String deep = "k: " + "[".repeat(40) + "]".repeat(40);
        assertThat(problems(deep)).singleElement().asString().contains("nested deeper than 16 levels");
    }

    @Test
    void fifteenLevelsBelowTheFirstAreRead() {
        String text = "k: " + "[".repeat(15) + "]".repeat(15);
        assertThat(problems(text)).isEmpty();
        assertThat(problems("k: " + "[".repeat(16) + "]".repeat(16))).hasSize(1);
    }

    @Test
    void anchorBombIsRefusedWithoutBurning() {
        StringBuilder bomb = new StringBuilder("a0: &a0 [x]\n");
        for (int i = 1; i < 40; i++) {
            bomb.append("a").append(i).append(": &a").append(i).append(" [");
            bomb.append(("*a" + (i - 1) + ",").repeat(10)).append("]\n");
        }
        Assertions.assertTimeoutPreemptively(
                Duration.ofSeconds(5),
                () -> assertThat(problems(bomb.toString()))
                        .hasSize(100)
                        .allMatch(p -> p.contains("an anchor") || p.contains("an alias")));
    }

    @Test
    void hugeFilesAreRefusedUnread() throws IOException {
        Path big = folder.resolve("big.yaml");
        Files.writeString(big, "a: 1\n" + "# padding\n".repeat(30000));
        assertThatThrownBy(() -> StudyText.read(big))
                .isInstanceOf(StudyException.class)
                .hasMessage(big + ":1:1: more than 256 KiB; at most that much is read");
        byte[] bytes = new byte[256 * 1024 + 1];
        assertThat(problems(bytes)).containsExactly("duct.yaml:1:1: more than 256 KiB; at most that much is read");
        Path fits = folder.resolve("fits.yaml");
        Files.writeString(fits, "a: 1\n" + "#".repeat(256 * 1024 - 5));
        assertThat(StudyText.read(fits).root().entries()).hasSize(1);
    }

    @Test
    void missingFilesAndFoldersAreNamed() {
        Path none = folder.resolve("none.yaml");
        assertThatThrownBy(() -> StudyText.read(none))
                .isInstanceOf(StudyException.class)
                .hasMessage(none + ": no such file; name a text file");
        assertThatThrownBy(() -> StudyText.read(folder))
                .isInstanceOf(StudyException.class)
                .hasMessage(folder + ": is not a plain file; name a text file");
    }

    @Test
    void manyProblemsAreCountedNotPrinted() {
        StringBuilder text = new StringBuilder();
        for (int i = 0; i < 250; i++) {
            text.append("a: 1\n");
        }
        assertThatThrownBy(() -> read(text.toString()))
                .isInstanceOf(StudyException.class)
                .hasMessageEndingWith("\nand 149 more");
    }

    /** A small study with random characters struck in: a tree or problems, never another exception. */
    @Test
    void noiseNeverBreaksTheReader() {
        Random random = new Random(20260101L);
        String marks = "ab: \n\t-[]{},'\"#&*!|>?%@`~<=.0\r\u00B5\u0085\u2028";
        int trees = 0;
        int refused = 0;
        for (int i = 0; i < 5000; i++) {
            StringBuilder text = new StringBuilder("a: {b: 1, c: 'd'}\ne:\n  - f\n  - \"g\"\n");
            int strokes = 1 + random.nextInt(i % 2 == 0 ? 3 : 30);
            for (int j = 0; j < strokes; j++) {
                text.setCharAt(random.nextInt(text.length()), marks.charAt(random.nextInt(marks.length())));
            }
            if (problems(text.toString()).isEmpty()) {
                trees++;
            } else {
                refused++;
            }
        }
        assertThat(trees).isGreaterThan(500);
        assertThat(refused).isGreaterThan(2000);
    }
}
