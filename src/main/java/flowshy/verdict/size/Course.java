package flowshy.verdict.size;

import java.util.concurrent.atomic.AtomicInteger;
import java.util.function.DoubleConsumer;
import org.hipparchus.util.FastMath;

/**
 * How far a sizing is: trials of its stages against what such stages usually take. A guess for a line of progress, no part of the answer.
 */
final class Course {
    /** Usual trials of a search over the ranges, of the rounds, and of slopes and prices; along one number, then for each of several. */
    private static final double[] ONE = {150.0, 60.0, 60.0};

    private static final double[] EACH = {1500.0, 300.0, 400.0};

    private final double[] usual;
    private final double all;
    private final DoubleConsumer progress;
    private final AtomicInteger tried = new AtomicInteger();
    private final AtomicInteger before = new AtomicInteger();
    private final AtomicInteger stage = new AtomicInteger();

    Course(int numbers, DoubleConsumer progress) {
        this.progress = progress;
        this.usual = new double[ONE.length];
        double sum = 0.0;
        for (int i = 0; i < usual.length; i++) {
            usual[i] = numbers == 1 ? ONE[i] : numbers * EACH[i];
            sum += usual[i];
        }
        this.all = sum;
    }

    /** The next stage begins. */
    void next() {
        before.set(tried.get());
        stage.incrementAndGet();
    }

    /** One more trial. */
    void step() {
        int now = tried.incrementAndGet();
        int here = FastMath.min(stage.get(), usual.length - 1);
        double done = 0.0;
        for (int i = 0; i < here; i++) {
            done += usual[i];
        }
        // a stage that takes longer than usual comes ever closer to its end
        double share = (now - before.get()) / usual[here];
        done += usual[here] * (share < 0.8 ? share : 1.0 - 0.2 * FastMath.exp(4.0 - 5.0 * share));
        progress.accept(done / all);
    }

    /** Trials so far. */
    int tried() {
        return tried.get();
    }
}
