package flowshy.verdict.envelope;

import static flowshy.math.Figures.say;

import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.Limit;
import flowshy.verdict.Verdict;
import flowshy.verdict.design.DesignSpace;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.envelope.EnvelopeAnswer.Impossible;
import flowshy.verdict.envelope.EnvelopeAnswer.Worst;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import java.util.function.UnaryOperator;
import java.util.stream.IntStream;

/**
 * Every state that a device must bear: all combinations of the values of its sides. The worst need not be a corner, so a range holds values
 * inside; between them nothing is judged.
 *
 * @param space the study as a function of the numbers that move
 * @param sides one a number, same order as the space's
 */
public record Envelope(DesignSpace space, List<Side> sides) {
    /** Copies the list. */
    public Envelope {
        sides = List.copyOf(sides);
    }

    /**
     * How many states there are.
     *
     * @return product of the numbers of values
     */
    public int count() {
        return sides.stream().mapToInt(side -> side.values().size()).reduce(1, Math::multiplyExact);
    }

    /** One state and what was found there. */
    private record State(String words, boolean corner, BandsAnswer answer, String impossible) {}

    /**
     * Judges every state.
     *
     * @param device what is done to the question of a state before it is answered, e.g. another cover put on
     * @return the worst of each limit and of all
     */
    public EnvelopeAnswer answer(UnaryOperator<BandsQuestion> device) {
        State[] states = new State[count()];
        IntStream.range(0, states.length).parallel().forEach(i -> states[i] = state(i, device));
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
                least(possible, false),
                least(possible, true),
                impossible,
                decision,
                sentence(possible, worst, impossible, states.length, decision));
    }

    private State state(int index, UnaryOperator<BandsQuestion> device) {
        double[] values = new double[sides.size()];
        List<String> words = new ArrayList<>();
        boolean corner = true;
        int rest = index;
        for (int s = sides.size() - 1; s >= 0; s--) {
            Side side = sides.get(s);
            int at = rest % side.values().size();
            rest /= side.values().size();
            values[s] = side.values().get(at);
            words.add(0, side.key() + " " + side.words().get(at));
            corner &= side.corner(at);
        }
        String state = String.join(", ", words);
        try {
            BandsQuestion question = device.apply(space.at(values));
            return new State(state, corner, question.answer(List.of(question.reference())), "");
        } catch (NoDesignException e) {
            return new State(state, corner, null, e.getMessage());
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

    private static OptionalDouble least(List<State> states, boolean largest) {
        var values = states.stream()
                .flatMap(state -> state.answer().least().stream())
                .mapToDouble(BandsAnswer.Extreme::rejection);
        return largest ? values.max() : values.min();
    }

    private static String sentence(
            List<State> possible, List<Worst> worst, List<Impossible> impossible, int count, Decision decision) {
        StringBuilder text = new StringBuilder(say("Over the envelope of %s states: %s.", count, decision.word()));
        for (Worst one : worst) {
            if (one.limit().decision() != Decision.NOT_ASKED) {
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
            possible.stream()
                    .filter(state -> state.answer().least().isPresent())
                    .min(Comparator.comparingDouble(
                            state -> state.answer().least().orElseThrow().rejection()))
                    .ifPresent(state -> text.append(say(
                            " Least rejection %.4g dB at %s.",
                            state.answer().least().orElseThrow().rejection(), state.words())));
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
