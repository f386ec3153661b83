package flowshy.verdict.figure;

import flowshy.verdict.BandReading;
import flowshy.verdict.BandsAnswer.Extreme;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.Reads;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleBinaryOperator;

/** Quantities of motion against flow. */
final class Rejecting {
    private static final String NO_FLOW = "no flow reaches the hair under a sealed cover: it has no bound";
    private static final String NOTHING = "the hair is as dense as the fluid carried with it: it reads nothing";
    private static final String ENDED = "a model has ended; see the caveats";
    private static final String NO_MOTION = "nowhere in the band does it read motion";
    private static final String NO_LIMIT = "no error limit is stated";

    private Rejecting() {}

    static Found at(Evaluated device, double frequency) {
        return found(device, device.response().rejection(frequency), OptionalDouble.of(frequency));
    }

    static Found least(Evaluated device) {
        Optional<Extreme> least = device.reading().least();
        return least.map(extreme -> found(device, extreme.rejection(), OptionalDouble.of(extreme.frequency())))
                .orElseGet(() -> found(device, Double.POSITIVE_INFINITY, OptionalDouble.empty()));
    }

    private static Found found(Evaluated device, double value, OptionalDouble at) {
        if (Double.isFinite(value)) {
            return new Found(value, at, Found.State.NUMBER, "");
        }
        return BandReading.readsNothing(device.device()) || Double.isNaN(value)
                ? Found.hasNone(NOTHING)
                : Found.unbounded(NO_FLOW);
    }

    /** Sum over every interval that reads motion. */
    static Found width(Evaluated device, DoubleBinaryOperator of) {
        return decided(device)
                .orElseGet(() -> Found.of(motion(device).stream()
                        .mapToDouble(band -> of.applyAsDouble(band.from(), band.to()))
                        .sum()));
    }

    static Found motionFrom(Evaluated device) {
        return decided(device)
                .orElseGet(() -> motion(device).stream()
                        .findFirst()
                        .map(band -> Found.of(band.from()))
                        .orElseGet(() -> Found.hasNone(NO_MOTION)));
    }

    static Found motionTo(Evaluated device) {
        return decided(device)
                .orElseGet(() -> motion(device).stream()
                        .reduce((before, last) -> last)
                        .map(band -> Found.of(band.to()))
                        .orElseGet(() -> Found.hasNone(NO_MOTION)));
    }

    /** Why no interval can be given, if that is so. */
    private static Optional<Found> decided(Evaluated device) {
        return switch (device.bands().get(0).reads()) {
            case NOTHING -> Optional.of(Found.hasNone(NOTHING));
            case UNDECIDED -> Optional.of(Found.ended(ENDED));
            case MOTION, MIXED, FLOW -> Optional.empty();
        };
    }

    private static List<ReadingBand> motion(Evaluated device) {
        return device.bands().stream()
                .filter(band -> band.reads() == Reads.MOTION)
                .toList();
    }

    static Found equivalent(Evaluated device) {
        double equivalent = device.point().equivalent();
        return Double.isFinite(equivalent) ? Found.at(equivalent, device.frequency()) : Found.hasNone(NOTHING);
    }

    static Found largestSpeed(Evaluated device) {
        OptionalDouble limit = device.question().acceptance().error();
        if (limit.isEmpty()) {
            return Found.notStated(NO_LIMIT);
        }
        double speed = limit.getAsDouble() / device.point().equivalent();
        if (Double.isNaN(speed)) {
            return Found.hasNone(NOTHING);
        }
        return Double.isInfinite(speed)
                ? Found.unbounded("no flow reaches the hair, any speed keeps the limit")
                : Found.at(speed, device.frequency());
    }
}
