package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Random;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;

/**
 * Example studies, spoiled at random with a fixed seed. Whatever comes in, the command answers with one of its exit codes, never
 * with a stack trace, and every number of an accepted study is finite or null with its reason.
 */
@Tag("long")
class FuzzTest {
    private static final long SEED = 20260917L;
    private static final int MUTANTS = 3000;

    /** One accepted mutant of so many is also asked for its lid, and one for its fill: these take longer. */
    private static final int LID_EVERY = 12;

    private static final int FILL_EVERY = 40;

    private static final Pattern QUANTITY =
            Pattern.compile("(?<=[ :])([+-]?\\d+(?:\\.\\d+)?(?:e-?\\d+)?)( [a-zA-Z%/][\\w./%]*)");
    private static final List<String> UNITS = List.of(
            " um",
            " mm",
            " m",
            " kg",
            " Hz",
            " kHz",
            " degC",
            " K",
            " kPa",
            " g/cm3",
            " kg/m3",
            " %",
            " dB",
            " nN.m/rad",
            " m/s2",
            " s",
            "");
    private static final List<String> NUMBERS = List.of(
            "0", "-1", "NaN", ".inf", "1e308", "1e-308", "1e999", "1,5", "abc", "''", "~", "true", "0x10", "1_000");
    private static final String CHARACTERS = "abz019 :,-#{}[]&*!|>'\"%@`\t\n\u00b5\u03bc\u0000\u202e\ud83d\ude00";

    private final Random random = new Random(SEED);

    @TempDir
    Path folder;

    @Test
    void neverBreaks() throws IOException {
        List<Path> studies = studies();
        assertThat(studies).hasSizeGreaterThanOrEqualTo(4);
        int accepted = 0;
        int refused = 0;
        int values = 0;
        int lids = 0;
        int fills = 0;
        for (int i = 0; i < MUTANTS; i++) {
            Path base = studies.get(i % studies.size());
            String text = Files.readString(base);
            boolean valueLevel = random.nextInt(100) < 60;
            String mutant = valueLevel ? spoilValue(text) : spoilText(text);
            values += valueLevel ? 1 : 0;
            Path file = base.resolveSibling("mutant.yaml");
            Files.write(file, mutant.getBytes(StandardCharsets.UTF_8)); // half an emoji becomes a question mark
            Run run = Run.of("bands", file.toString(), "--json", "--why");
            assertThat(run.code()).as("%s%n%s", run.err(), mutant).isIn(0, 2, 3);
            assertThat(run.err()).as(mutant).doesNotContain("\tat ").doesNotContain("Exception");
            if (run.code() == 2) {
                refused++;
                assertThat(run.err()).as(mutant).contains("mutant.yaml");
                assertThat(Json.objects(Json.object(Json.parse(run.err())).get("problems")))
                        .isNotEmpty();
                assertThat(run.out()).isEmpty();
            } else {
                accepted++;
                assertThat(run.err()).isEmpty();
                assertThat(Json.numbers(Json.parse(run.out()), mutant)).isGreaterThan(50);
                lids += accepted % LID_EVERY == 0 ? answers("lid", file, mutant) : 0;
                fills += accepted % FILL_EVERY == 0 ? answers("fill", file, mutant) : 0;
            }
        }
        assertThat(lids).isGreaterThan(50);
        assertThat(fills).isGreaterThan(15);
        assertThat(accepted + refused).isEqualTo(MUTANTS);
        assertThat(values).isGreaterThanOrEqualTo(MUTANTS * 30 / 100);
        assertThat(accepted).isGreaterThanOrEqualTo(MUTANTS * 10 / 100);
        assertThat(refused).isGreaterThanOrEqualTo(MUTANTS * 10 / 100);
    }

    /** A study that bands accepts is one that the other commands answer. */
    private static int answers(String command, Path study, String mutant) {
        Run run = Run.of(command, study.toString(), "--json");
        assertThat(run.code()).as("%s: %s%n%s", command, run.err(), mutant).isIn(0, 3);
        assertThat(run.err()).as(mutant).isEmpty();
        assertThat(Json.numbers(Json.parse(run.out()), mutant)).isGreaterThan(10);
        return 1;
    }

    /** Copies of the examples, with the files they name. */
    private List<Path> studies() throws IOException {
        List<Path> copies = new ArrayList<>();
        for (Path example : ExamplesTest.examples()) {
            Path copy =
                    Files.createDirectory(folder.resolve(example.getFileName().toString()));
            try (Stream<Path> files = Files.list(example)) {
                for (Path file : files.toList()) {
                    Files.copy(file, copy.resolve(file.getFileName().toString()));
                }
            }
            copies.add(copy.resolve("study.yaml"));
        }
        return copies;
    }

    private String spoilValue(String text) {
        List<int[]> spans = new ArrayList<>();
        Matcher matcher = QUANTITY.matcher(text);
        while (matcher.find()) {
            spans.add(new int[] {matcher.start(1), matcher.end(1), matcher.end(2)});
        }
        int[] span = spans.get(random.nextInt(spans.size()));
        String number = text.substring(span[0], span[1]);
        String unit = text.substring(span[1], span[2]);
        int kind = random.nextInt(10);
        if (kind < 6) {
            double scaled = Double.parseDouble(number) * Math.pow(10.0, 2.0 * random.nextDouble() - 1.0);
            number = String.format(Locale.ROOT, "%.4g", scaled);
        } else if (kind < 8) {
            number = NUMBERS.get(random.nextInt(NUMBERS.size()));
        } else {
            unit = UNITS.get(random.nextInt(UNITS.size()));
        }
        return text.substring(0, span[0]) + number + unit + text.substring(span[2]);
    }

    private String spoilText(String text) {
        List<String> lines = new ArrayList<>(text.lines().toList());
        int at = random.nextInt(lines.size());
        switch (random.nextInt(6)) {
            case 0 -> lines.remove(at);
            case 1 -> lines.add(at, lines.get(random.nextInt(lines.size())));
            case 2 -> lines.set(at, "  " + lines.get(at));
            case 3 -> lines.set(at, lines.get(at).strip());
            default -> lines.set(at, spoilLine(lines.get(at)));
        }
        return String.join("\n", lines) + "\n";
    }

    private String spoilLine(String line) {
        StringBuilder spoiled = new StringBuilder(line);
        int at = random.nextInt(line.length() + 1);
        int which = random.nextInt(CHARACTERS.length());
        if (random.nextBoolean() || at == line.length()) {
            spoiled.insert(at, CHARACTERS.charAt(which));
        } else {
            spoiled.deleteCharAt(at);
        }
        return spoiled.toString();
    }
}
