package flowshy.verdict.size;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CopyOnWriteArrayList;
import java.util.concurrent.atomic.AtomicInteger;
import java.util.stream.Stream;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Tag;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;

/**
 * Searches by a wrong model that end at the optimum of the right one. The right model is a published problem of {@link SizerValidationTest}, whose
 * optimum is known; the wrong one bends its objective and every limit, so that its own optimum lies elsewhere.
 */
@Tag("long")
class CorrectedSearchValidationTest {
    private static final Sizer SIZER = new Sizer(1);

    static Stream<SizerValidationTest.Known> published() {
        return SizerValidationTest.published().stream()
                .filter(known ->
                        List.of("HS 24", "HS 35", "HS 36", "HS 43", "g06").contains(known.name()));
    }

    /** Shifts, tilts and bends every figure by a few per cent of the ranges' own effect. */
    private static SizingProblem bent(SizingProblem problem) {
        return problem.by(values -> {
            Trial right = problem.trials().at(values);
            double[] shares = problem.shares(values);
            double bend = 0.0;
            for (int i = 0; i < shares.length; i++) {
                bend += FastMath.sin(2.0 + (i + 1.5) * shares[i]);
            }
            List<Double> found = new ArrayList<>();
            for (int c = 0; c < right.found().size(); c++) {
                found.add(right.found().get(c) + 0.2 * (c + 1) * bend);
            }
            return right.there() ? Trial.of(right.objective() * (1.0 + 0.05 * bend) + 0.1, found) : right;
        });
    }

    @ParameterizedTest
    @MethodSource("published")
    void aBentEstimateEndsAtThePublishedOptimum(SizerValidationTest.Known known) {
        SizingProblem estimate = bent(known.problem());
        Sized alone = SIZER.solve(estimate, List.of());
        double scale = FastMath.max(1.0, FastMath.abs(known.optimum()));
        Candidate elsewhere = known.problem().at(alone.values());
        boolean offOrShort =
                !elsewhere.keepsAll() || FastMath.abs(elsewhere.trial().objective() - known.optimum()) > 1e-4 * scale;
        assertThat(offOrShort).as("the estimate alone goes wrong").isTrue();

        Agreement agreement = SIZER.solve(estimate, known.problem().trials(), List.of());
        Sized sized = agreement.sized();
        assertThat(sized.fits()).isTrue();
        assertThat(agreement.settled()).isTrue();
        assertThat(agreement.rounds()).hasSizeBetween(2, 11);
        assertThat(known.problem().at(sized.values()).keepsAll()).isTrue();
        assertThat(sized.trial()).isEqualTo(known.problem().trials().at(sized.values()));
        assertThat(sized.trial().objective()).isCloseTo(known.optimum(), within(2e-5 * scale));
    }

    /** The price at the optimum is the right model's: that of HS 35, 2/9 by hand. */
    @Test
    void pricesAreThoseOfTheFullModel() {
        SizingProblem right = SizerValidationTest.published().get(1).problem();
        Sized sized = SIZER.solve(bent(right), right.trials(), List.of()).sized();
        assertThat(sized.binding()).containsExactly(0);
        assertThat(sized.prices().get(0).value().orElseThrow()).isCloseTo(2.0 / 9.0, within(5e-3));
    }

    /** The least x with x³ ≥ 8 by an estimate of 1.1 x³ − 0.3; and with x³ + a step of 1e-4 at 2, which no x meets exactly. */
    @Test
    void alongOneNumberTheFullModelKeepsItsLimitAlsoWhereItSteps() {
        SizingProblem estimate = new SizingProblem(
                List.of(new Variable("x", 1.0, 5.0, true)),
                false,
                List.of(new Constraint("x3", true, 8.0, 8.0)),
                x -> Trial.of(x.get(0), List.of(1.1 * FastMath.pow(x.get(0), 3) - 0.3)));
        AtomicInteger asked = new AtomicInteger();
        Agreement smooth = SIZER.solve(
                estimate,
                x -> {
                    asked.incrementAndGet();
                    return Trial.of(x.get(0), List.of(FastMath.pow(x.get(0), 3)));
                },
                List.of());
        assertThat(smooth.sized().values().get(0)).isBetween(2.0, 2.0 * (1.0 + 1e-6));
        assertThat(smooth.solutions()).isEqualTo(asked.get()).isLessThan(20);
        assertThat(smooth.rounds().get(0).expected().found().get(0)).isCloseTo(8.0, within(1e-9));
        assertThat(smooth.rounds().get(0).solved().found().get(0)).isLessThan(7.7);

        Agreement stepped = SIZER.solve(
                estimate,
                x -> Trial.of(x.get(0), List.of(FastMath.pow(x.get(0), 3) + (x.get(0) < 2.0 ? -5e-5 : 5e-5))),
                List.of());
        assertThat(stepped.sized().fits()).isTrue();
        assertThat(stepped.sized().values().get(0)).isBetween(2.0, 2.0 * (1.0 + 1e-5));
    }

    /** By the estimate everything fits from 1.9 on, by the full model nothing below 6, where the range ends at 5. */
    @Test
    void whatOnlyTheEstimateKeepsIsNotCalledKept() {
        SizingProblem estimate = new SizingProblem(
                List.of(new Variable("x", 1.0, 5.0, true)),
                false,
                List.of(new Constraint("x", true, 1.9, 1.0)),
                x -> Trial.of(x.get(0), List.of(x.get(0))));
        Agreement agreement = SIZER.solve(estimate, x -> Trial.of(x.get(0), List.of(x.get(0) - 4.1)), List.of());
        assertThat(agreement.sized().fits()).isFalse();
        assertThat(agreement.sized().values().get(0)).isCloseTo(5.0, within(1e-9));
        assertThat(agreement.sized().shortfalls().get(0)).isCloseTo(1.0, within(1e-9));
    }

    /** And the other way round: the estimate keeps nothing, the full model does. */
    @Test
    void whatTheEstimateAloneMissesIsFound() {
        SizingProblem estimate = new SizingProblem(
                List.of(new Variable("x", 1.0, 5.0, true), new Variable("y", 1.0, 5.0, true)),
                false,
                List.of(new Constraint("xy", true, 30.0, 30.0)),
                v -> Trial.of(v.get(0) + v.get(1), List.of(0.8 * v.get(0) * v.get(1))));
        Agreement agreement = SIZER.solve(
                estimate, v -> Trial.of(v.get(0) + v.get(1), List.of(1.5 * v.get(0) * v.get(1))), List.of());
        // least x + y with xy ≥ 20 is at x = y
        assertThat(agreement.sized().fits()).isTrue();
        assertThat(agreement.sized().trial().objective()).isCloseTo(2.0 * FastMath.sqrt(20.0), within(1e-4));
    }

    /** Told from several threads, so not quite in order; the guess stays a share and comes near its end. */
    @Test
    void tellsHowFarItIs() {
        List<Double> told = new CopyOnWriteArrayList<>();
        SizingProblem right = SizerValidationTest.published().get(1).problem();
        new Sizer(1, told::add).solve(bent(right), right.trials(), List.of());
        assertThat(told)
                .hasSizeGreaterThan(100)
                .allSatisfy(share -> assertThat(share).isGreaterThan(0.0).isLessThanOrEqualTo(1.0));
        assertThat(told.get(0)).isLessThan(0.05);
        assertThat(told.get(told.size() - 1)).isGreaterThan(0.7);
    }

    @Test
    void aFullModelThatEndsIsTold() {
        SizingProblem estimate = new SizingProblem(
                List.of(new Variable("x", 1.0, 5.0, true)), false, List.of(), x -> Trial.of(x.get(0), List.of()));
        Agreement agreement = SIZER.solve(estimate, x -> Trial.none("ended"), List.of());
        assertThat(agreement.sized().fits()).isFalse();
        assertThat(agreement.sized().trial().reason()).isEqualTo("ended");
        assertThat(Rounding.of(agreement)).isEqualTo(agreement.sized().values());
    }
}
