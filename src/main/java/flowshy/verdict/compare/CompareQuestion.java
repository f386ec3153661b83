package flowshy.verdict.compare;

import flowshy.response.Response;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.Decision;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.error.StreamTooFastException;
import flowshy.verdict.figure.Evaluated;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Found;
import java.util.EnumMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.stream.IntStream;
import java.util.stream.Stream;

/**
 * Which of these devices does better, and by how much?
 *
 * @param contenders the devices; the first is the one that the others are compared with
 * @param equal quantity that the others are first made equal in, empty: as they are
 */
public record CompareQuestion(List<Contender> contenders, Optional<Figure> equal) {
    /** @throws IllegalArgumentException if there is no device */
    public CompareQuestion {
        contenders = List.copyOf(contenders);
        if (contenders.isEmpty()) {
            throw new IllegalArgumentException("a comparison needs a device");
        }
    }

    /**
     * Every device, side by side.
     *
     * @return in the order of the contenders
     */
    public List<ComparedDevice> answer() {
        Contender first = contenders.get(0);
        Optional<Found> target =
                equal.flatMap(figure -> first.question().map(asked -> figure.of(new Evaluated(asked))));
        // each device by itself, in its own place: the threads change nothing but the time
        return IntStream.range(0, contenders.size())
                .parallel()
                .mapToObj(i -> i == 0 || target.isEmpty()
                        ? compared(contenders.get(i), contenders.get(i).question(), Optional.empty())
                        : scaled(contenders.get(i), target.get()))
                .toList();
    }

    /**
     * The frequency at which devices are compared: that of the first, whichever the others are limited at.
     *
     * @return [Hz]
     * @throws java.util.NoSuchElementException if the first has no question
     */
    public double reference() {
        return contenders.get(0).question().orElseThrow().reference();
    }

    /**
     * Whether there is a device among them that does what is asked.
     *
     * @param devices an answer
     * @return meets if one meets every limit; else undecided or fails, as the nearest of them; not-asked where none has a limit
     */
    public static Decision decision(List<ComparedDevice> devices) {
        List<Decision> decisions = devices.stream()
                .flatMap(device -> device.answer().stream())
                .map(answer -> answer.verdict().decision())
                .toList();
        return Stream.of(Decision.MEETS, Decision.UNDECIDED, Decision.FAILS)
                .filter(decisions::contains)
                .findFirst()
                .orElse(Decision.NOT_ASKED);
    }

    private ComparedDevice scaled(Contender contender, Found target) {
        if (target.number().isEmpty()) {
            return none(contender, "the first has no such quantity: " + target.reason());
        }
        if (contender.question().isEmpty()) {
            return none(contender, contender.reason());
        }
        Figure figure = equal.orElseThrow();
        Found now = figure.of(new Evaluated(contender.question().get(), reference()));
        if (contender.scaling().isEmpty() && now.number().isPresent() && Equalizer.met(now.value(), target.value())) {
            Scaled still = new Scaled(
                    figure,
                    "",
                    "",
                    1.0,
                    now.value(),
                    now.value(),
                    contender.question().get());
            return compared(contender, contender.question(), Optional.of(still));
        }
        if (contender.scaling().isEmpty()) {
            return none(contender, contender.reason());
        }
        try {
            Scaled scaled =
                    new Equalizer(figure, target.value(), contender.scaling().get(), reference()).solve();
            return compared(contender, Optional.of(scaled.question()), Optional.of(scaled));
        } catch (NoSolutionException | NoDesignException e) {
            return none(contender, e.getMessage());
        }
    }

    private static ComparedDevice none(Contender contender, String reason) {
        return new ComparedDevice(contender, Optional.empty(), Optional.empty(), Map.of(), Optional.empty(), reason);
    }

    private ComparedDevice compared(Contender contender, Optional<BandsQuestion> question, Optional<Scaled> scaled) {
        if (question.isEmpty()) {
            return none(contender, contender.reason());
        }
        try {
            BandsQuestion asked = question.get();
            BandsAnswer answer = asked.answer();
            Response response = new Response(asked.device());
            Evaluated device = new Evaluated(asked, reference(), response, asked.reading(response), answer.error());
            Map<Figure, Found> figures = new EnumMap<>(Figure.class);
            for (Figure figure : Figure.values()) {
                figures.put(figure, figure.of(device));
            }
            return new ComparedDevice(contender, question, Optional.of(answer), figures, scaled, "");
        } catch (StreamTooFastException e) {
            return none(contender, e.getMessage());
        }
    }
}
