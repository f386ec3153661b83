package flowshy.verdict.map;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import java.util.ArrayList;
import java.util.List;
import java.util.concurrent.CancellationException;
import java.util.concurrent.CountDownLatch;
import java.util.concurrent.atomic.AtomicBoolean;
import java.util.concurrent.atomic.AtomicInteger;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.Timeout;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The runner of grids: order, threads, reasons, progress, stopping. */
class GridRunTest {
    private static final Axis ACROSS = new Axis("x", 4e-5, 1.2e-4, 17, false);
    private static final Axis DOWN = new Axis("y", 1.0, 1000.0, 13, true);

    private static final Surface WAVES = y -> x -> x * 1e4 > 1.0 && y > 300.0
            ? Spot.none("too thick")
            : Spot.of(FastMath.sin(1e5 * x) * FastMath.cos(FastMath.log(y)));

    @ParameterizedTest
    @ValueSource(ints = {2, 3, 8, 40})
    void theNumberOfThreadsChangesNothing(int threads) {
        Grid one = new GridRun(1, GridRun.Progress.NONE).fill(WAVES, ACROSS, DOWN);
        Grid several = new GridRun(threads, GridRun.Progress.NONE).fill(WAVES, ACROSS, DOWN);
        assertThat(several).isEqualTo(one);
        assertThat(one.spots()).hasSize(17 * 13);
    }

    @Test
    void everyPlaceHoldsItsOwnValue() {
        Grid grid = new GridRun(2, GridRun.Progress.NONE).fill(y -> x -> Spot.of(x + 1000.0 * y), ACROSS, DOWN);
        for (int j = 0; j < 13; j++) {
            for (int i = 0; i < 17; i++) {
                assertThat(grid.at(i, j).value()).isEqualTo(ACROSS.value(i) + 1000.0 * DOWN.value(j));
                assertThat(grid.turned().at(j, i)).isEqualTo(grid.at(i, j));
            }
        }
        assertThat(grid.least()).hasValue(0);
        assertThat(grid.largest()).hasValue(17 * 13 - 1);
    }

    @Test
    void aPlaceWithoutANumberSaysWhy() {
        Grid grid = new GridRun(2, GridRun.Progress.NONE).fill(WAVES, ACROSS, DOWN);
        int thick = 0;
        for (int j = 0; j < 13; j++) {
            for (int i = 0; i < 17; i++) {
                thick += ACROSS.value(i) * 1e4 > 1.0 && DOWN.value(j) > 300.0 ? 1 : 0;
            }
        }
        assertThat(thick).isPositive();
        assertThat(grid.reasons()).containsExactly(new Grid.Reason("too thick", thick, true, false));
        Spot cold = Spot.none("from -60 to 150, -70.5 was asked for");
        Spot hot = Spot.none("from -60 to 150, 160 was asked for");
        Spot dry = Spot.none("no suspension");
        Grid four = new Grid(
                new Axis("x", 1.0, 2.0, 2, false),
                new Axis("y", 1.0, 2.0, 2, false),
                List.of(dry, cold, hot, Spot.of(1.0)));
        assertThat(four.reasons())
                .containsExactly(
                        new Grid.Reason(cold.reason(), 2, false, false), new Grid.Reason(dry.reason(), 1, true, false));
        assertThatThrownBy(() -> new Spot(Double.POSITIVE_INFINITY, "")).hasMessageContaining("reason");
    }

    @Test
    void valuesAreThoseATablePrints() {
        assertThat(ACROSS.value(0)).isEqualTo(4e-5);
        assertThat(ACROSS.value(1)).isEqualTo(4.5e-5); // 4.5000000000000005e-5 without the rounding
        assertThat(ACROSS.value(16)).isEqualTo(1.2e-4);
        assertThat(DOWN.value(12)).isEqualTo(1000.0);
        assertThat(DOWN.value(4)).isEqualTo(10.0);
        assertThat(DOWN.at(DOWN.place(37.0))).isCloseTo(37.0, within(1e-12));
        assertThat(ACROSS.at(ACROSS.place(9.1e-5))).isCloseTo(9.1e-5, within(1e-17));
    }

    @Test
    void sidesThatMakeNoSenseAreRefused() {
        assertThatThrownBy(() -> new Axis("x", 2.0, 1.0, 5, false)).hasMessageContaining("upside down");
        assertThatThrownBy(() -> new Axis("x", 0.0, 1.0, 5, true)).hasMessageContaining("spaced");
        assertThatThrownBy(() -> new Axis("x", 0.0, 1.0, 1, false)).hasMessageContaining("spaced");
        assertThatThrownBy(() -> new GridRun(0, GridRun.Progress.NONE)).hasMessageContaining("threads");
    }

    @Test
    @Timeout(60)
    void progressRisesAndNamesTheTimeLeft() {
        List<Double> shares = new ArrayList<>();
        List<Double> left = new ArrayList<>();
        CountDownLatch told = new CountDownLatch(3);
        GridRun run = new GridRun(2, (done, seconds) -> {
            shares.add(done);
            left.add(seconds);
            told.countDown();
        });
        run.fill(
                y -> x -> {
                    if (y > 50.0) {
                        await(told); // the run goes on once progress was told three times
                    }
                    return Spot.of(x);
                },
                ACROSS,
                DOWN);
        assertThat(shares).hasSizeGreaterThanOrEqualTo(3).isSorted().allMatch(share -> share >= 0.0 && share <= 1.0);
        for (int k = 0; k < shares.size(); k++) {
            assertThat(left.get(k))
                    .matches(shares.get(k) == 0.0 ? seconds -> seconds.isNaN() : seconds -> seconds >= 0.0);
        }
    }

    @Test
    @Timeout(60)
    void anInterruptedRunEndsAndKeepsNothing() throws InterruptedException {
        AtomicInteger asked = new AtomicInteger();
        CountDownLatch running = new CountDownLatch(1);
        CountDownLatch never = new CountDownLatch(1);
        AtomicBoolean cancelled = new AtomicBoolean();
        Thread caller = new Thread(() -> {
            try {
                new GridRun(2, GridRun.Progress.NONE)
                        .fill(
                                y -> x -> {
                                    asked.incrementAndGet();
                                    running.countDown();
                                    await(never);
                                    return Spot.of(x);
                                },
                                ACROSS,
                                DOWN);
            } catch (CancellationException e) {
                cancelled.set(Thread.currentThread().isInterrupted());
            }
        });
        caller.start();
        running.await();
        caller.interrupt();
        caller.join();
        assertThat(cancelled).isTrue();
        assertThat(asked.get()).isLessThanOrEqualTo(4); // no thread starts another place
    }

    @Test
    void aFaultOfASurfaceComesThrough() {
        Surface broken = y -> x -> {
            throw new IllegalStateException("planted");
        };
        GridRun run = new GridRun(2, GridRun.Progress.NONE);
        assertThatThrownBy(() -> run.fill(broken, ACROSS, DOWN)).hasMessage("planted");
    }

    private static void await(CountDownLatch latch) {
        try {
            latch.await();
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
        }
    }
}
