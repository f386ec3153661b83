package flowshy.verdict.envelope;

import static org.assertj.core.api.Assertions.assertThat;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.medium.MediumQuery;
import flowshy.response.Device;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.lid.Candidate;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class EnvelopeTest {
    private static final Medium AIR = Medium.of("air", 1.2, 1.82e-5);

    /** The hair is lightest, and the rejection least, where the first number is 5; the second moves the length a little. */
    private static final class Valley implements StatesOfUse {
        @Override
        public List<String> keys() {
            return List.of("x", "y");
        }

        @Override
        public BandsQuestion at(double... values) {
            if (values[1] > 2.5) {
                throw new NoDesignException("y is too much");
            }
            double density = 1000.0 + 60.0 * (values[0] - 5.0) * (values[0] - 5.0);
            Hair hair = new Hair(new Cylinder(7e-4 + 1e-5 * values[1], 4e-5), density, OptionalDouble.empty());
            return new BandsQuestion(
                    new Device(hair, Optional.empty(), AIR, Covers.OPEN, AIR),
                    new Band(50.0, 500.0),
                    new Acceptance(OptionalDouble.of(21.0), OptionalDouble.empty()));
        }

        @Override
        public StatesOfUse still() {
            return this;
        }

        @Override
        public StatesOfUse under(Candidate candidate) {
            return this;
        }

        @Override
        public StatesOfUse filled(MediumQuery fluid, Cover cover) {
            return this;
        }
    }

    private static Side range(String key, int to) {
        List<Double> values = new ArrayList<>();
        List<String> words = new ArrayList<>();
        for (int i = 0; i <= to; i++) {
            values.add((double) i);
            words.add(i + " units");
        }
        return new Side(key, values, words, true);
    }

    @Test
    void theWorstMayLieInsideAndIsNamed() {
        EnvelopeAnswer answer = new Envelope(new Valley(), List.of(range("x", 10), range("y", 2))).answer();
        assertThat(answer.states()).isEqualTo(33);
        assertThat(answer.corners()).isEqualTo(4);
        assertThat(answer.limits()).singleElement().satisfies(worst -> {
            assertThat(worst.state()).startsWith("x 5 units, y ");
            assertThat(worst.corner()).isFalse();
            assertThat(worst.limit().found().getAsDouble())
                    .isEqualTo(answer.least().getAsDouble());
        });
        assertThat(answer.sentence()).contains("x 5 units").contains("inside, not at a corner");
        assertThat(answer.most().getAsDouble()).isGreaterThan(answer.least().getAsDouble() + 3.0);
    }

    /** Corners alone would have missed it. */
    @Test
    void cornersAloneJudgeOtherwise() {
        Side ends = new Side("x", List.of(0.0, 10.0), List.of("0", "10"), false);
        Side one = new Side("y", List.of(1.0), List.of("1"), false);
        EnvelopeAnswer corners = new Envelope(new Valley(), List.of(ends, one)).answer();
        EnvelopeAnswer whole = new Envelope(new Valley(), List.of(range("x", 10), one)).answer();
        assertThat(corners.least().getAsDouble()).isGreaterThan(whole.least().getAsDouble() + 3.0);
    }

    @Test
    void aStateWithoutAnAnswerLeavesItUndecidedAtBest() {
        Side y = new Side("y", List.of(1.0, 3.0), List.of("1", "3"), false);
        Side x = new Side("x", List.of(0.0), List.of("0"), false);
        EnvelopeAnswer answer = new Envelope(new Valley(), List.of(x, y)).answer();
        assertThat(answer.impossible()).containsExactly(new EnvelopeAnswer.Impossible("x 0, y 3", "y is too much"));
        assertThat(answer.decision()).isEqualTo(Decision.UNDECIDED);
    }
}
