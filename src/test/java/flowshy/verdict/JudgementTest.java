package flowshy.verdict;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.response.Device;
import flowshy.verdict.figure.Sense;
import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

class JudgementTest {
    private static final Band BAND = new Band(20.0, 800.0);
    private static final Device OPEN = Devices.bare(Devices.ROD, 1190.0, Devices.AIR);
    private static final Device SEALED = Devices.sealed(Devices.ROD, 1190.0, Devices.AIR);

    private static Acceptance asked(OptionalDouble rejection, OptionalDouble error) {
        return new Acceptance(rejection, error);
    }

    private static Verdict verdict(Device device, Acceptance acceptance) {
        return new BandsQuestion(device, BAND, acceptance).answer().verdict();
    }

    @Test
    void meetsOrFailsByTheLeastRejectionInTheBand() {
        double least = new BandsQuestion(OPEN, BAND, Acceptance.NONE)
                .answer()
                .least()
                .orElseThrow()
                .rejection();
        Verdict met = verdict(OPEN, asked(OptionalDouble.of(least), OptionalDouble.empty()));
        assertThat(met.decision()).isEqualTo(Decision.MEETS);
        assertThat(met.sentence()).contains("Every limit that can be judged is met.");
        Verdict failed = verdict(OPEN, asked(OptionalDouble.of(least + 1e-9), OptionalDouble.empty()));
        assertThat(failed.decision()).isEqualTo(Decision.FAILS);
        assertThat(failed.sentence()).contains("A limit is not met.").contains("Decided at equal accelerations");
        Limit limit = failed.limits().get(0);
        assertThat(limit.name()).isEqualTo("rejection");
        assertThat(limit.unit()).isEqualTo("dB");
        assertThat(limit.required()).isEqualTo(least + 1e-9);
        assertThat(limit.found().orElseThrow()).isEqualTo(least);
        assertThat(limit.at().orElseThrow()).isCloseTo(20.0, within(1e-12));
    }

    @Test
    void saysWhatItReadsAndThatNothingWasAsked() {
        Verdict verdict = verdict(OPEN, Acceptance.NONE);
        assertThat(verdict.decision()).isEqualTo(Decision.NOT_ASKED);
        assertThat(verdict.limits()).isEmpty();
        assertThat(verdict.sentence())
                .startsWith("Reads ")
                .contains("at a margin of 20")
                .contains("Least rejection")
                .contains("No limit was judged.");
    }

    /** The error needs surroundings; the largest speed stands point by point instead. */
    @Test
    void leavesTheErrorUnjudgedWithoutSurroundings() {
        Verdict verdict = verdict(OPEN, asked(OptionalDouble.empty(), OptionalDouble.of(0.1)));
        assertThat(verdict.decision()).isEqualTo(Decision.NOT_ASKED);
        assertThat(verdict.limits()).hasSize(1);
        assertThat(verdict.limits().get(0).decision()).isEqualTo(Decision.NOT_ASKED);
        assertThat(verdict.limits().get(0).found()).isEmpty();
        assertThat(verdict.limits().get(0).reason()).contains("needs surroundings");
        Verdict both = verdict(OPEN, asked(OptionalDouble.of(60.0), OptionalDouble.of(0.1)));
        assertThat(both.decision()).isEqualTo(Decision.FAILS);
        assertThat(both.limits()).hasSize(2);
    }

    @Test
    void aSealedCoverKeepsEveryErrorOut() {
        Verdict verdict = verdict(SEALED, asked(OptionalDouble.of(60.0), OptionalDouble.of(0.1)));
        assertThat(verdict.decision()).isEqualTo(Decision.MEETS);
        assertThat(verdict.limits().get(1).found()).hasValue(0.0);
        assertThat(verdict.limits().get(1).reason()).contains("no flow enters");
    }

    /** What reads nothing reads no error either, but meets no limit by that. */
    @Test
    void whatReadsNothingMeetsNothing() {
        Device dead = Devices.sealed(Devices.ROD, 998.2, Devices.WATER);
        for (Acceptance acceptance : List.of(
                asked(OptionalDouble.of(20.0), OptionalDouble.empty()),
                asked(OptionalDouble.empty(), OptionalDouble.of(0.1)),
                asked(OptionalDouble.of(20.0), OptionalDouble.of(0.1)))) {
            Verdict verdict = verdict(dead, acceptance);
            assertThat(verdict.decision()).isEqualTo(Decision.FAILS);
            assertThat(verdict.limits())
                    .isNotEmpty()
                    .allSatisfy(limit -> assertThat(limit.decision()).isEqualTo(Decision.FAILS));
            assertThat(verdict.sentence()).contains("reads nothing").doesNotContain("Decided at equal");
        }
    }

    @ParameterizedTest
    @CsvSource({
        "MEETS, NOT_ASKED, MEETS",
        "MEETS, FAILS, FAILS",
        "UNDECIDED, MEETS, UNDECIDED",
        "UNDECIDED, FAILS, FAILS",
        "NOT_ASKED, NOT_ASKED, NOT_ASKED",
        "NOT_ASKED, UNDECIDED, UNDECIDED"
    })
    void theWorstLimitDecides(Decision one, Decision other, Decision whole) {
        assertThat(Verdict.worst(List.of(limit(one), limit(other)))).isEqualTo(whole);
        assertThat(Verdict.worst(List.of(limit(other), limit(one)))).isEqualTo(whole);
    }

    private static Limit limit(Decision decision) {
        return new Limit(
                "rejection", "dB", Sense.AT_LEAST, 20.0, OptionalDouble.empty(), OptionalDouble.empty(), decision, "");
    }

    @Test
    void theMarginIsTheRejectionAskedOrTenToOne() {
        assertThat(Acceptance.NONE.margin()).isEqualTo(20.0);
        assertThat(asked(OptionalDouble.of(14.0), OptionalDouble.empty()).margin())
                .isEqualTo(14.0);
        assertThat(Verdict.worst(List.of())).isEqualTo(Decision.NOT_ASKED);
    }
}
