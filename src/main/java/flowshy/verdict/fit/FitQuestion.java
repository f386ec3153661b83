package flowshy.verdict.fit;

import static flowshy.math.Figures.say;

import flowshy.response.Device;
import flowshy.verdict.Band;
import flowshy.verdict.DeviceFacts;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.measured.BesideModel;
import flowshy.verdict.measured.Compared;
import flowshy.verdict.measured.Measurand;
import flowshy.verdict.measured.MeasuredPoint;
import flowshy.verdict.measured.MeasuredResponse;
import flowshy.verdict.measured.Prediction;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.linear.RealMatrix;
import org.hipparchus.util.FastMath;

/**
 * Which device explains what was measured on it? Weighted least squares on the natural logarithm of the sizes and on the phases, each over
 * its standard uncertainty.
 *
 * @param space the device as a function of the numbers of the study that are free; of none if none is
 * @param base the device as the study has it
 * @param band of use, for the figures that follow
 * @param free numbers that may change, in the order of the space where they are its own; gains are freed here
 * @param responses measured responses; sizes and phases count
 * @param swings recorded swings
 * @param robustness how residuals far out count
 */
public record FitQuestion(
        DesignSpace space,
        Device base,
        Band band,
        List<Freed> free,
        List<MeasuredResponse> responses,
        List<MeasuredSwing> swings,
        Robustness robustness) {
    /** Copies the lists. */
    public FitQuestion {
        free = List.copyOf(free);
        responses = List.copyOf(responses);
        swings = List.copyOf(swings);
    }

    /**
     * Fits.
     *
     * @return the device, how sure it is, and whether it agrees with what was measured
     * @throws FitException if the data do not tell, or the search ends nowhere
     */
    public FitAnswer answer() {
        List<Compared> before = BesideModel.of(base, responses);
        List<Freed> all = new ArrayList<>(free);
        gain(before, true).ifPresent(all::add);
        gain(before, false).ifPresent(all::add);
        FitModel model = new FitModel(space, base, all, responses, swings);
        model.turned(turned(before, true), turned(before, false));
        List<FitModel.Datum> numbers = model.numbers();
        if (all.isEmpty()) {
            throw new FitException("nothing is free to be fitted: name keys with --free");
        }
        if (numbers.size() <= all.size()) {
            throw new FitException(say(
                    "%s measured numbers cannot settle %s free ones: measure more, or free fewer",
                    numbers.size(), all.size()));
        }
        if (Arrays.stream(model.residuals(all.stream().mapToDouble(Freed::start).toArray()))
                .anyMatch(r -> r >= FitModel.NO_DEVICE)) {
            throw new FitException(
                    "the study's own device predicts nothing for a part of what was measured: no flow under the cover, or a suspension that does not hold the hair");
        }
        return answer(model, all, numbers, before);
    }

    private Optional<Freed> gain(List<Compared> before, boolean volts) {
        return before.stream()
                .filter(c -> c.freed() && c.measured().reading().volts() == volts)
                .findFirst()
                .map(c -> new Freed(
                        volts ? "gain" : "angle-gain",
                        volts ? Freed.Kind.VOLTS : Freed.Kind.ANGLES,
                        volts ? "V/rad" : "1",
                        FastMath.abs(c.gain()),
                        0.0,
                        Double.POSITIVE_INFINITY));
    }

    private static boolean turned(List<Compared> before, boolean volts) {
        return before.stream()
                .anyMatch(c ->
                        c.freed() && c.gain() < 0.0 && c.measured().reading().volts() == volts);
    }

    private FitAnswer answer(FitModel model, List<Freed> all, List<FitModel.Datum> numbers, List<Compared> before) {
        FitSearch search =
                new FitSearch(model, all, all.stream().mapToDouble(this::scale).toArray(), robustness);
        double[] values = search.best();
        FitStatistics statistics =
                new FitStatistics(all, values, search, numbers, cofactor(search, all, values), robustness);
        Device device = model.device(values)
                .filter(made -> new Prediction(made).holds())
                .orElseThrow(() -> new FitException("the best numbers make no device that stands; free fewer keys"));
        List<FitAnswer.Scatter> scatters = scatters(numbers, search);
        List<MeasuredResponse> read = read(model, values, scatters);
        return new FitAnswer(
                statistics.estimates().stream()
                        .map(estimate -> turned(estimate, before))
                        .toList(),
                statistics.correlations(),
                statistics.residuals(),
                statistics.outliers(),
                robustness,
                statistics.freedom(),
                statistics.chiSquare(),
                statistics.chance(),
                statistics.core(),
                statistics.enlarged(),
                scatters,
                new DerivedFigures(model, all, values, statistics, base, band).all(),
                device,
                before,
                BesideModel.of(device, read),
                BesideModel.of(device, without(read, statistics.outliers())),
                statistics.warnings());
    }

    /** A damping that starts at zero counts in units of a tenth of the critical one. */
    private double scale(Freed freed) {
        if (freed.start() > 0.0) {
            return freed.start();
        }
        double stiffness = base.suspension().orElseThrow().stiffness();
        return 0.2 * FastMath.sqrt(stiffness * DeviceFacts.of(base, band).inertia());
    }

    /** Where a readout turns the sense round, its gain is negative. */
    private static Estimate turned(Estimate estimate, List<Compared> before) {
        Freed.Kind kind = estimate.freed().kind();
        boolean negative = (kind == Freed.Kind.VOLTS && turned(before, true))
                || (kind == Freed.Kind.ANGLES && turned(before, false));
        return negative
                ? new Estimate(
                        estimate.freed(),
                        -estimate.value(),
                        estimate.uncertainty(),
                        -estimate.high(),
                        -estimate.low(),
                        estimate.bound())
                : estimate;
    }

    private static RealMatrix cofactor(FitSearch search, List<Freed> all, double[] values) {
        try {
            return search.plain().cofactor(values);
        } catch (DegenerateException e) {
            double[] direction = e.direction();
            List<String> together = new ArrayList<>();
            for (int i = 0; i < direction.length; i++) {
                if (FastMath.abs(direction[i]) > 0.1) {
                    together.add(all.get(i).key());
                }
            }
            throw new FitException(
                    together.size() == 1
                            ? "nothing that was measured depends on " + together.get(0) + "; do not free it"
                            : "what was measured does not tell " + String.join(", ", together)
                                    + " apart: free fewer of them, state a gain, or measure something else besides");
        }
    }

    private static List<FitAnswer.Scatter> scatters(List<FitModel.Datum> numbers, FitSearch search) {
        List<FitAnswer.Scatter> scatters = new ArrayList<>();
        for (int i = 0; i < numbers.size(); i++) {
            FitModel.Datum number = numbers.get(i);
            if (!number.stated() && scatters.stream().noneMatch(s -> s.name().equals(number.name()))) {
                scatters.add(new FitAnswer.Scatter(number.name(), search.deviation(i)));
            }
        }
        return scatters;
    }

    /** The responses as read by the fitted gain; where no uncertainty was stated, with that of the scatter. */
    private List<MeasuredResponse> read(FitModel model, double[] values, List<FitAnswer.Scatter> scatters) {
        List<MeasuredResponse> read = new ArrayList<>();
        for (MeasuredResponse response : responses) {
            OptionalDouble gain = response.of() == Measurand.REJECTION
                    ? OptionalDouble.empty()
                    : OptionalDouble.of(model.gain(response, values));
            OptionalDouble scatter = scatters.stream()
                    .filter(s -> s.name().equals(response.name()))
                    .mapToDouble(FitAnswer.Scatter::share)
                    .findFirst();
            List<MeasuredPoint> points = scatter.isEmpty()
                    ? response.points()
                    : response.points().stream()
                            .map(p -> new MeasuredPoint(
                                    p.frequency(), p.amplitude(), p.phase(), capped(scatter), capped(scatter)))
                            .toList();
            read.add(new MeasuredResponse(response.name(), response.of(), response.reading(), gain, points));
        }
        return read;
    }

    /** Responses without the frequencies at which an outlier stands; one of which too little is left is left out. */
    private static List<MeasuredResponse> without(List<MeasuredResponse> responses, List<Residual> outliers) {
        List<MeasuredResponse> left = new ArrayList<>();
        for (MeasuredResponse response : responses) {
            List<MeasuredPoint> points = response.points().stream()
                    .filter(point -> outliers.stream()
                            .noneMatch(o -> o.name().equals(response.name()) && o.frequency() == point.frequency()))
                    .toList();
            if (points.size() > 1) {
                left.add(new MeasuredResponse(
                        response.name(), response.of(), response.reading(), response.gain(), points));
            }
        }
        return left;
    }

    private static OptionalDouble capped(OptionalDouble scatter) {
        return OptionalDouble.of(FastMath.min(1.0, scatter.getAsDouble()));
    }
}
