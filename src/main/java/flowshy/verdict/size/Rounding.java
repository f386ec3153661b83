package flowshy.verdict.size;

import flowshy.math.Figures;
import java.math.BigDecimal;
import java.math.MathContext;
import java.math.RoundingMode;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;
import org.hipparchus.util.FastMath;

/** The numbers of an answer in few digits, each rounded to the side that keeps the limits. */
public final class Rounding {
    private static final int FEWEST_DIGITS = 6;

    private Rounding() {}

    /**
     * Rounds.
     *
     * @param agreement the answer
     * @return one a variable, in SI, with the fewest digits by which the full model keeps every limit; to the nearest if no limits are kept anyhow;
     *     the digits found if none do or there is no device
     */
    public static List<Double> of(Agreement agreement) {
        Sized sized = agreement.sized();
        SizingProblem full = sized.problem();
        for (int digits = FEWEST_DIGITS; sized.trial().there() && digits <= Figures.FULL; digits++) {
            if (!sized.fits()) {
                List<Double> nearest = rounded(sized, digits, -1);
                if (full.at(nearest).trial().there()) {
                    return nearest;
                }
                continue;
            }
            for (Candidate tried : choices(agreement, digits)) {
                if (full.at(tried.values()).keepsAll()) {
                    return tried.values();
                }
            }
        }
        return sized.values();
    }

    /** Every way up or down that keeps the limits by the corrected estimate, the best two. */
    private static List<Candidate> choices(Agreement agreement, int digits) {
        List<Candidate> choices = new ArrayList<>();
        for (int choice = 0; choice < 1 << agreement.sized().values().size(); choice++) {
            Candidate tried = agreement.corrected().at(rounded(agreement.sized(), digits, choice));
            if (tried.keepsAll()) {
                choices.add(tried);
            }
        }
        choices.sort(Comparator.comparingDouble(Candidate::cost));
        return choices.subList(0, FastMath.min(2, choices.size()));
    }

    private static List<Double> rounded(Sized sized, int digits, int choice) {
        List<Double> rounded = new ArrayList<>();
        for (int i = 0; i < sized.values().size(); i++) {
            Variable range = sized.problem().variables().get(i);
            RoundingMode mode = choice < 0
                    ? RoundingMode.HALF_EVEN
                    : (choice >> i & 1) == 0 ? RoundingMode.FLOOR : RoundingMode.CEILING;
            double value = new BigDecimal(sized.values().get(i))
                    .round(new MathContext(digits, mode))
                    .doubleValue();
            rounded.add(FastMath.min(FastMath.max(value, range.from()), range.to()));
        }
        return rounded;
    }
}
