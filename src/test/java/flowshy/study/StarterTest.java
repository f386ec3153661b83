package flowshy.study;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;

import flowshy.stream.cover.Covers;
import flowshy.study.text.StudyException;
import flowshy.verdict.Decision;
import flowshy.verdict.Verdict;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** What the starter writes is a study. */
class StarterTest {
    @TempDir
    private Path folder;

    @ParameterizedTest
    @CsvSource({
        "cylinder, open",
        "cylinder, sealed",
        "taper, open",
        "taper, sealed",
        "club, open",
        "club, sealed",
        "profile, open",
        "profile, sealed"
    })
    void everyShapeAndCoverIsAccepted(String shape, String cover) throws IOException {
        String text = Starter.study(shape, cover);
        Study study = StudyReader.read(Files.writeString(folder.resolve("mine.yaml"), text), List.of());
        assertThat(study.device().hair().profile().shape()).isEqualTo(shape);
        assertThat(study.device().cover()).isEqualTo(cover.equals("open") ? Covers.OPEN : Covers.SEALED);
        assertThat(study.device().suspension()).isPresent();
        assertThat(study.surroundings()).hasSize(1);
        Verdict verdict = study.question().answer().verdict();
        assertThat(verdict.decision()).isEqualTo(Decision.MEETS);
        assertThat(verdict.limits()).hasSize(2);
        assertThat(study.understood()).hasSizeGreaterThan(20);
        assertThat(text.lines().filter(line -> line.contains("#")).count()).isGreaterThan(20);
        assertThat(text.lines())
                .allSatisfy(line -> assertThat(line).hasSizeLessThan(120).doesNotEndWith(" "));
    }

    @Test
    void unknownWordsAreRefused() {
        assertThatThrownBy(() -> Starter.study("cylindre", "open"))
                .isInstanceOf(StudyException.class)
                .hasMessage(
                        "--shape: unknown word cylindre; one of cylinder, taper, club, profile is wanted here; did you mean cylinder?");
        assertThatThrownBy(() -> Starter.study("cylinder", "roofed"))
                .isInstanceOf(StudyException.class)
                .hasMessage("--cover: unknown word roofed; one of open, sealed is wanted here");
    }
}
