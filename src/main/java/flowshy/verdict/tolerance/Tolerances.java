package flowshy.verdict.tolerance;

import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.DesignSpace;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/**
 * What a study says about how surely its numbers are known.
 *
 * @param base the question of the study as it stands
 * @param space the study as a function of the numbers that vary
 * @param nominal their nominal values, SI, same order
 * @param stated the uncertain inputs of the study
 * @param properties whether the uncertainty of the medium's properties counts
 * @param flow whether the model's uncertainty of the flow's torque counts
 * @param flowStated that uncertainty where the study states it; empty: the model's own
 * @param yield share of all devices that must meet every limit, absent if none is asked
 */
public record Tolerances(
        BandsQuestion base,
        DesignSpace space,
        List<Double> nominal,
        List<Uncertain> stated,
        boolean properties,
        boolean flow,
        Optional<StatedFlow> flowStated,
        OptionalDouble yield) {
    /** A space without numbers. */
    private record Fixed(BandsQuestion question) implements DesignSpace {
        @Override
        public List<String> keys() {
            return List.of();
        }

        @Override
        public BandsQuestion at(double... values) {
            return question;
        }

        @Override
        public DesignSpace still() {
            return new Fixed(new BandsQuestion(
                    question.device(),
                    question.band(),
                    question.acceptance(),
                    question.motion(),
                    List.of(),
                    question.reference()));
        }
    }

    /**
     * A study that states no tolerances: model and medium are uncertain all the same.
     *
     * @param question of the study
     * @return with what counts by default
     */
    public static Tolerances of(BandsQuestion question) {
        return new Tolerances(
                question,
                new Fixed(question),
                List.of(),
                List.of(),
                true,
                true,
                Optional.empty(),
                OptionalDouble.empty());
    }

    /** Copies the lists. */
    public Tolerances {
        nominal = List.copyOf(nominal);
        stated = List.copyOf(stated);
    }

    /**
     * Uncertainty of the flow's torque as a study states it, the same at every frequency.
     *
     * @param shape how it is spread
     * @param size relative [-]
     * @param written as the study writes it
     */
    public record StatedFlow(Shape shape, double size, String written) {}
}
