package flowshy.verdict.envelope;

import static flowshy.math.Figures.say;

import flowshy.medium.MediumQuery;
import flowshy.stream.cover.Cover;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.Limit;
import flowshy.verdict.Verdict;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.envelope.EnvelopeAnswer.Against;
import flowshy.verdict.envelope.EnvelopeAnswer.AtState;
import flowshy.verdict.envelope.EnvelopeAnswer.Impossible;
import flowshy.verdict.envelope.EnvelopeAnswer.Worst;
import flowshy.verdict.error.StreamTooFastException;
import flowshy.verdict.lid.Candidate;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.stream.IntStream;

/**
 * Every state that a device must bear: all combinations of the values of its sides. The worst need not be a corner, so a range holds values
 * inside; between them nothing is judged.
 *
 * @param space the study as a function of the numbers that move
 * @param sides one a number, same order as the space's
 */
public record Envelope(StatesOfUse space, List<Side> sides) {
    /** Copies the list. */
    public Envelope {
        sides = List.copyOf(sides);
    }

    /**
     * The same states under another cover.
     *
     * @param candidate as {@link StatesOfUse#under} takes it
     * @return envelope of the device under it
     */
    public Envelope under(Candidate candidate) {
        return new Envelope(space.under(candidate), sides);
    }

    /**
     * The same states in another fluid.
     *
     * @param fluid at the study's own state
     * @param cover stands over the hair
     * @return as {@link StatesOfUse#filled} makes it
     */
    public Envelope filled(MediumQuery fluid, Cover cover) {
        return new Envelope(space.filled(fluid, cover), sides);
    }

    /**
     * The same states without what flows around the device.
     *
     * @return envelope without sources
     */
    public Envelope still() {
        return new Envelope(space.still(), sides);
    }

    /**
     * How many states there are.
     *
     * @return product of the numbers of values
     */
    public int count() {
        return sides.stream().mapToInt(side -> side.values().size()).reduce(1, Math::multiplyExact);
    }

    /**
     * One state and what is asked there.
     *
     * @param words its numbers
     * @param corner whether it is a corner
     * @param question about the device at this state
     */
    public record Asked(String words, boolean corner, BandsQuestion question) {}

    /**
     * The question at every state that makes a device.
     *
     * @return in the order of the sides, the last one moving first
     */
    public List<Asked> asked() {
        return IntStream.range(0, count())
                .mapToObj(this::asked)
                .flatMap(Optional::stream)
                .toList();
    }

    private Optional<Asked> asked(int index) {
        Place place = place(index);
        try {
            return Optional.of(new Asked(place.words(), place.corner(), space.at(place.numbers())));
        } catch (NoDesignException e) {
            return Optional.empty(); // the answer names it
        }
    }

    /** A state by its numbers. */
    private record Place(List<Double> values, String words, boolean corner) {
        double[] numbers() {
            return values.stream().mapToDouble(Double::doubleValue).toArray();
        }
    }

    /** One state and what was found there. */
    private record State(String words, boolean corner, BandsAnswer answer, String impossible) {
        AtState worth(double value, OptionalDouble at) {
            return new AtState(value, at, words, corner);
        }
    }

    /**
     * Judges every state.
     *
     * @return the worst of each limit and of all
     */
    public EnvelopeAnswer answer() {
        return answer(answer -> List.of());
    }

    /**
     * Judges every state, and asks what else speaks against the device there.
     *
     * @param against what speaks against it in words, which do not differ from state to state
     * @return the worst of each limit and of all
     */
    public EnvelopeAnswer answer(Function<BandsAnswer, List<String>> against) {
        State[] states = new State[count()];
        IntStream.range(0, states.length).parallel().forEach(i -> states[i] = state(i));
        List<Impossible> impossible = new ArrayList<>();
        List<State> possible = new ArrayList<>();
        for (State state : states) {
            if (state.answer() == null) {
                impossible.add(new Impossible(state.words(), state.impossible()));
            } else {
                possible.add(state);
            }
        }
        List<Worst> worst = limits(possible);
        Decision decision = impossible.isEmpty() ? Decision.NOT_ASKED : Decision.UNDECIDED;
        for (State state : possible) {
            decision = decision.worse(state.answer().verdict().decision());
        }
        return new EnvelopeAnswer(
                sides,
                states.length,
                (int) java.util.Arrays.stream(states).filter(State::corner).count(),
                worst,
                least(possible),
                most(possible),
                error(possible),
                against(possible, against),
                impossible,
                decision,
                sentence(possible, worst, impossible, states.length, decision));
    }

    private Place place(int index) {
        List<Double> values = new ArrayList<>();
        List<String> words = new ArrayList<>();
        boolean corner = true;
        int rest = index;
        for (int s = sides.size() - 1; s >= 0; s--) {
            Side side = sides.get(s);
            int at = rest % side.values().size();
            rest /= side.values().size();
            values.add(0, side.values().get(at));
            words.add(0, side.key() + " " + side.words().get(at));
            corner &= side.corner(at);
        }
        return new Place(values, String.join(", ", words), corner);
    }

    private State state(int index) {
        Place place = place(index);
        try {
            return new State(
                    place.words(), place.corner(), space.at(place.numbers()).judged(), "");
        } catch (NoDesignException | StreamTooFastException e) {
            return new State(place.words(), place.corner(), null, e.getMessage());
        }
    }

    /** Limit by limit: the worst decision, and of several the one nearest to, or farthest beyond, the limit. */
    private static List<Worst> limits(List<State> states) {
        Map<String, List<Worst>> all = new LinkedHashMap<>();
        for (State state : states) {
            for (Limit limit : state.answer().verdict().limits()) {
                all.computeIfAbsent(limit.name() + limit.sense().word(), name -> new ArrayList<>())
                        .add(new Worst(limit, state.words(), state.corner()));
            }
        }
        Comparator<Worst> order = Comparator.comparingInt(
                        (Worst one) -> -one.limit().decision().severity())
                .thenComparingDouble(Worst::margin);
        return all.values().stream()
                .map(found -> found.stream().min(order).orElseThrow())
                .toList();
    }

    private static Optional<AtState> least(List<State> states) {
        return states.stream()
                .flatMap(state -> state.answer().least().stream()
                        .map(least -> state.worth(least.rejection(), OptionalDouble.of(least.frequency()))))
                .min(Comparator.comparingDouble(AtState::value));
    }

    private static OptionalDouble most(List<State> states) {
        return states.stream()
                .flatMap(state -> state.answer().least().stream())
                .mapToDouble(BandsAnswer.Extreme::rejection)
                .max();
    }

    private static Optional<AtState> error(List<State> states) {
        return states.stream()
                .flatMap(state ->
                        state.answer().error().stream().map(error -> state.worth(error.rms(), OptionalDouble.empty())))
                .filter(found -> Double.isFinite(found.value()))
                .max(Comparator.comparingDouble(AtState::value));
    }

    private static List<Against> against(List<State> states, Function<BandsAnswer, List<String>> judge) {
        Map<String, Against> found = new LinkedHashMap<>();
        for (State state : states) {
            for (String reason : judge.apply(state.answer())) {
                found.merge(
                        reason,
                        new Against(reason, state.words(), 1),
                        (first, next) -> new Against(reason, first.state(), first.states() + 1));
            }
        }
        return List.copyOf(found.values());
    }

    private static String sentence(
            List<State> possible, List<Worst> worst, List<Impossible> impossible, int count, Decision decision) {
        StringBuilder text = new StringBuilder(say("Over the envelope of %s states: %s.", count, decision.word()));
        for (Worst one : worst) {
            boolean boundless = one.limit().decision() == Decision.MEETS
                    && one.limit().found().orElse(0.0) == 0.0; // no flow enters
            if (one.limit().decision() != Decision.NOT_ASKED && !boundless) {
                text.append(say(
                        " Worst for %s%s: at %s%s.",
                        one.limit().name(),
                        one.limit().found().isPresent()
                                ? say(
                                        ", %.4g %s",
                                        one.limit().found().getAsDouble(),
                                        one.limit().unit())
                                : "",
                        one.state(),
                        one.corner() ? "" : " (inside, not at a corner)"));
            }
        }
        if (worst.isEmpty() || worst.stream().allMatch(one -> one.limit().decision() == Decision.NOT_ASKED)) {
            least(possible)
                    .ifPresent(
                            least -> text.append(say(" Least rejection %.4g dB at %s.", least.value(), least.state())));
        }
        if (!impossible.isEmpty()) {
            text.append(say(
                    " %s states cannot be worked out, for example %s: %s.",
                    impossible.size(),
                    impossible.get(0).state(),
                    impossible.get(0).reason()));
        }
        return text.toString();
    }

    /**
     * The verdict of a study under its envelope: every limit at its worst.
     *
     * @param nominal verdict at the study's own state, which counts too
     * @param found over the envelope
     * @return the worse of both
     */
    public static Verdict together(Verdict nominal, EnvelopeAnswer found) {
        List<Limit> limits = new ArrayList<>();
        for (Limit limit : nominal.limits()) {
            Worst own = new Worst(limit, "", true);
            limits.add(found.limits().stream()
                    .filter(one -> one.limit().name().equals(limit.name())
                            && one.limit().sense() == limit.sense()
                            && one.beyond(own))
                    .findFirst()
                    .map(Worst::named)
                    .orElse(limit));
        }
        return new Verdict(
                nominal.decision().worse(found.decision()),
                limits,
                found.sentence() + " At the study's own state: " + nominal.sentence());
    }
}
