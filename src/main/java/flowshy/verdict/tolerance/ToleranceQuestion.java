package flowshy.verdict.tolerance;

import static flowshy.math.Figures.say;

import flowshy.medium.Medium;
import flowshy.medium.PropertySource;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.figure.Evaluated;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.tolerance.ToleranceAnswer.Chance;
import flowshy.verdict.tolerance.ToleranceAnswer.FanPoint;
import flowshy.verdict.tolerance.ToleranceAnswer.InputEffect;
import flowshy.verdict.tolerance.ToleranceAnswer.Spread;
import flowshy.verdict.tolerance.Tolerances.StatedFlow;
import flowshy.verdict.tolerance.sampling.Effect;
import flowshy.verdict.tolerance.sampling.Effects;
import flowshy.verdict.tolerance.sampling.Interval;
import flowshy.verdict.tolerance.sampling.Output;
import flowshy.verdict.tolerance.sampling.Progress;
import flowshy.verdict.tolerance.sampling.Sample;
import flowshy.verdict.tolerance.sampling.Sampling;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * How sure is the verdict of a study?
 *
 * @param tolerances what the study says about its numbers
 * @param wanted further figures to be spread, beside those that are limited
 */
public record ToleranceQuestion(Tolerances tolerances, List<Figure> wanted) {
    /** Frequencies of the fan, even on a logarithmic scale over the band. */
    public static final int FREQUENCIES = 200;

    private static final String FLOW = "drag law";

    /** Copies the list. */
    public ToleranceQuestion {
        wanted = List.copyOf(wanted);
    }

    /** What a run needs to know. */
    private record Plan(
            BandsQuestion nominal,
            List<Double> numbers,
            List<Uncertain> inputs,
            FlowModel flow,
            List<Double> frequencies,
            List<Condition> conditions) {
        Trials trials(DesignSpace space, List<Figure> figures, List<Condition> held) {
            Evaluated known = new Evaluated(nominal);
            double[] own = figures.stream()
                    .mapToDouble(figure -> figure.of(known).value())
                    .toArray();
            return new Trials(
                            space, nominalNumbers(), inputs, flow, frequencies, figures, held, Trials.neutral(figures))
                    .corrected(own);
        }

        /** The nominal device. */
        Target.Point point() {
            return new Target.Point(nominalNumbers());
        }

        private double[] nominalNumbers() {
            return numbers.stream().mapToDouble(Double::doubleValue).toArray();
        }
    }

    /**
     * Runs.
     *
     * @param effort how much
     * @param progress is told
     * @return what was found
     */
    public ToleranceAnswer answer(Effort effort, Progress progress) {
        BandsQuestion nominal = tolerances.base();
        List<Double> frequencies =
                nominal.device().cover().closed() ? List.of() : nominal.band().even(FREQUENCIES);
        FlowModel flow = FlowModel.of(nominal.device(), frequencies);
        List<String> left = new ArrayList<>();
        List<Uncertain> inputs = new ArrayList<>(tolerances.stated());
        inputs.addAll(properties(nominal.device().around(), left));
        if (tolerances.flowStated().isPresent()) {
            flow = flow.stated(tolerances.flowStated().get().size());
        }
        inputs.addAll(model(flow, frequencies, left));
        Plan plan = new Plan(nominal, tolerances.nominal(), inputs, flow, frequencies, Condition.of(nominal));
        return run(plan, left, effort, progress);
    }

    private List<Uncertain> properties(Medium around, List<String> left) {
        List<Uncertain> inputs = new ArrayList<>();
        for (String property : List.of("density", "viscosity")) {
            Optional<PropertySource> source = around.sources().stream()
                    .filter(s -> s.property().equals(property))
                    .findFirst();
            OptionalDouble size = source.map(PropertySource::uncertainty).orElse(OptionalDouble.empty());
            if (!tolerances.properties()) {
                left.add("The " + property + " of " + around.name() + " counts as certain: medium-properties is off.");
            } else if (size.isEmpty() || size.getAsDouble() == 0.0) {
                left.add("No uncertainty is known of the " + property + " of " + around.name()
                        + ": it counts as certain.");
            } else {
                double relative = size.getAsDouble();
                inputs.add(new Uncertain(
                        property + " of " + around.name(),
                        Shape.NORMAL,
                        say("%.3g %%", 100.0 * relative),
                        source.orElseThrow().source(),
                        List.of(
                                property.equals("density")
                                        ? new Target.OfDensity(relative)
                                        : new Target.OfViscosity(relative))));
            }
        }
        return inputs;
    }

    private List<Uncertain> model(FlowModel flow, List<Double> frequencies, List<String> left) {
        if (frequencies.isEmpty()) {
            return List.of();
        }
        if (tolerances.flowStated().isPresent()) {
            StatedFlow stated = tolerances.flowStated().get();
            return List.of(
                    new Uncertain(FLOW, stated.shape(), stated.written(), flow.source(), List.of(new Target.OfFlow())));
        }
        if (!tolerances.flow()) {
            left.add("The drag law counts as certain: drag-law is off.");
            return List.of();
        }
        return List.of(new Uncertain(FLOW, Shape.NORMAL, flow.size(), flow.source(), List.of(new Target.OfFlow())));
    }

    private ToleranceAnswer run(Plan plan, List<String> left, Effort effort, Progress progress) {
        BandsQuestion nominal = plan.nominal();
        List<Condition> cheap = plan.conditions().stream()
                .filter(condition -> !condition.costly(nominal))
                .toList();
        List<Figure> quick = figures(cheap, nominal, false);
        List<Figure> slow = figures(plan.conditions(), nominal, true);
        Trials trials = plan.trials(tolerances.space().still(), quick, cheap);
        int inputs = Math.max(1, plan.inputs().size());
        Sample sample = new Sampling(inputs, trials::at, effort.seed())
                .run(
                        effort.samples(),
                        found -> effort.precision()
                                .reached(found, plan.frequencies().size()),
                        progress);
        List<Spread> spreads = new ArrayList<>(quick(plan, trials, quick, sample, effort, progress));
        List<Chance> chances = new ArrayList<>(chances(cheap, sample));
        Interval yield = sample.events().get(cheap.size());
        int errorDevices = 0;
        if (!slow.isEmpty()) {
            List<Figure> all = new ArrayList<>(quick);
            all.addAll(slow);
            Trials whole = plan.trials(tolerances.space(), all, plan.conditions());
            Sample found =
                    new Sampling(inputs, whole::at, effort.seed()).run(effort.errorSamples(), none -> false, progress);
            errorDevices = found.trials();
            double[] known = whole.at(plan.point()).values();
            for (int k = quick.size(); k < all.size(); k++) {
                int at = plan.frequencies().size() + k;
                spreads.add(spread(all.get(k), known[at], found.outputs().get(at), List.of()));
            }
            List<Condition> costly =
                    plan.conditions().stream().filter(c -> c.costly(nominal)).toList();
            for (Condition condition : costly) {
                chances.add(chance(condition, found, plan.conditions().indexOf(condition)));
            }
            yield = costly.isEmpty()
                    ? yield
                    : found.events().get(plan.conditions().size());
        }
        boolean asked = plan.conditions().stream().anyMatch(Condition::asked);
        Optional<Interval> stated = asked ? Optional.of(yield) : Optional.empty();
        BandsAnswer answer = nominal.answer();
        Decision decision = decision(answer, stated);
        return new ToleranceAnswer(
                answer,
                plan.inputs(),
                left,
                plan.flow().words(),
                effort,
                sample.trials(),
                errorDevices,
                refused(sample, cheap.size() + 1, trials),
                fan(plan, trials, sample),
                spreads,
                chances,
                stated,
                tolerances.yield(),
                decision,
                sentence(plan, decision, stated, spreads));
    }

    /** Least rejection first, then what is limited, then what is wanted. */
    private List<Figure> figures(List<Condition> conditions, BandsQuestion nominal, boolean costly) {
        List<Figure> figures = new ArrayList<>();
        if (!costly) {
            figures.add(Figure.LEAST_REJECTION);
        }
        List<Figure> all =
                new ArrayList<>(conditions.stream().map(Condition::figure).toList());
        all.addAll(wanted);
        for (Figure figure : all) {
            if (Condition.costly(figure, nominal) == costly && !figures.contains(figure)) {
                figures.add(figure);
            }
        }
        return figures;
    }

    private static ToleranceAnswer.Refused refused(Sample sample, int event, Trials trials) {
        long count = Math.round(sample.events().get(event).estimate() * sample.trials());
        return new ToleranceAnswer.Refused(count, trials.refusal());
    }

    private List<Spread> quick(
            Plan plan, Trials trials, List<Figure> figures, Sample sample, Effort effort, Progress progress) {
        int first = plan.frequencies().size();
        double[] centres = new double[figures.size()];
        for (int k = 0; k < centres.length; k++) {
            double mean = sample.outputs().get(first + k).mean().estimate();
            centres[k] = Double.isFinite(mean) ? mean : 0.0;
        }
        List<List<Effect>> effects = plan.inputs().isEmpty()
                ? figures.stream().map(f -> List.<Effect>of()).toList()
                : new Effects(
                                plan.inputs().size(),
                                uniform -> trials.at(uniform).from(first),
                                effort.seed())
                        .run(effort.base(), centres, progress);
        double[] known = trials.at(plan.point()).values();
        List<Spread> spreads = new ArrayList<>();
        for (int k = 0; k < figures.size(); k++) {
            List<InputEffect> sorted = new ArrayList<>();
            for (int i = 0; i < effects.get(k).size(); i++) {
                Effect effect = effects.get(k).get(i);
                if (Double.isFinite(effect.total().estimate())) {
                    sorted.add(new InputEffect(plan.inputs().get(i).name(), effect));
                }
            }
            sorted.sort(Comparator.comparingDouble(
                    (InputEffect one) -> -one.effect().total().estimate()));
            spreads.add(
                    spread(figures.get(k), known[first + k], sample.outputs().get(first + k), sorted));
        }
        return spreads;
    }

    private static Spread spread(Figure figure, double nominal, Output output, List<InputEffect> effects) {
        return new Spread(
                figure.word(),
                figure.words(),
                figure.unit(),
                nominal,
                output.counted(),
                output.mean(),
                output.deviation(),
                ToleranceAnswer.PERCENTILES.stream()
                        .map(p -> output.quantile(p / 100.0))
                        .toList(),
                effects);
    }

    private static List<Chance> chances(List<Condition> conditions, Sample sample) {
        List<Chance> chances = new ArrayList<>();
        for (int c = 0; c < conditions.size(); c++) {
            chances.add(chance(conditions.get(c), sample, c));
        }
        return chances;
    }

    private static Chance chance(Condition condition, Sample sample, int event) {
        return new Chance(
                condition.name(),
                condition.sense().words(),
                condition.value(),
                condition.figure().unit(),
                condition.asked(),
                sample.events().get(event),
                sample.trials());
    }

    private static List<FanPoint> fan(Plan plan, Trials trials, Sample sample) {
        double[] known = trials.at(plan.point()).values();
        List<FanPoint> fan = new ArrayList<>();
        for (int i = 0; i < plan.frequencies().size(); i++) {
            Output output = sample.outputs().get(i);
            fan.add(new FanPoint(
                    plan.frequencies().get(i),
                    known[i],
                    ToleranceAnswer.PERCENTILES.stream()
                            .map(p -> output.quantile(p / 100.0))
                            .toList()));
        }
        return fan;
    }

    /** By the yield that is required, if one is; else by the nominal device. A model that has ended decides nothing. */
    private Decision decision(BandsAnswer nominal, Optional<Interval> yield) {
        Decision known = nominal.verdict().decision();
        if (tolerances.yield().isEmpty() || yield.isEmpty() || known == Decision.UNDECIDED) {
            return known;
        }
        double required = tolerances.yield().getAsDouble();
        if (yield.get().low() >= required) {
            return Decision.MEETS;
        }
        return yield.get().high() < required ? Decision.FAILS : Decision.UNDECIDED;
    }

    private String sentence(Plan plan, Decision decision, Optional<Interval> yield, List<Spread> spreads) {
        StringBuilder text = new StringBuilder();
        yield.ifPresent(share -> text.append(say(
                "%s of all devices meet every limit that can be judged (95 %% confidence: %s to %s).",
                percent(share.estimate()), percent(share.low()), percent(share.high()))));
        if (yield.isEmpty()) {
            text.append("No limit is stated.");
        }
        tolerances
                .yield()
                .ifPresent(required -> text.append(say(" Required are %s: ", percent(required)))
                        .append(
                                switch (decision) {
                                    case MEETS -> "met.";
                                    case FAILS -> "not met.";
                                    case UNDECIDED -> "undecided; a model has ended, or more samples are needed.";
                                    case NOT_ASKED -> "not judged.";
                                }));
        Spread least = spreads.get(0);
        if (least.counted() > 0) {
            text.append(say(
                    " Least rejection in the band: %.4g dB nominal, %.4g to %.4g dB in 95 of 100 devices.",
                    least.nominal(),
                    least.percentiles().get(0).estimate(),
                    least.percentiles().get(least.percentiles().size() - 1).estimate()));
        } else if (plan.nominal().device().cover().closed()) {
            text.append(" No flow enters: the rejection has no bound.");
        }
        if (!least.effects().isEmpty()) {
            InputEffect first = least.effects().get(0);
            text.append(say(
                    " Most of its spread comes from %s (%s of the variance).",
                    first.input(), percent(first.effect().total().estimate())));
        }
        return text.toString();
    }

    private static String percent(double share) {
        return say("%.4g %%", 100.0 * share);
    }
}
