package flowshy.verdict.size;

import java.util.List;

/**
 * A sizing searched by an estimate and answered by a full model.
 *
 * @param sized the answer; every figure in it is the full model's, slopes and prices are those of the estimate corrected there to first order
 * @param corrected the problem by the estimate so corrected; the problem itself if there is one model only
 * @param rounds places at which the two were compared, in order; empty if there is one model only
 * @param settled whether another round would gain nothing that counts
 * @param solutions how often the full model was asked
 */
public record Agreement(Sized sized, SizingProblem corrected, List<Round> rounds, boolean settled, int solutions) {
    /** Copies the list. */
    public Agreement {
        rounds = List.copyOf(rounds);
    }

    /**
     * An answer by one model.
     *
     * @param sized the answer
     * @return nothing to be agreed
     */
    public static Agreement of(Sized sized) {
        return new Agreement(sized, sized.problem(), List.of(), true, 0);
    }
}
