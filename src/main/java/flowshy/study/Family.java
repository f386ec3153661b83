package flowshy.study;

import flowshy.response.Hold;
import java.util.ArrayList;
import java.util.List;

/**
 * A study and its variants.
 *
 * @param base the study as it stands
 * @param hold what of its suspension stays where a variant says nothing else
 * @param variants in the order of the text
 */
public record Family(Variant base, Hold hold, List<Variant> variants) {
    /** Copies the list. */
    public Family {
        variants = List.copyOf(variants);
    }

    /**
     * The study as it stands.
     *
     * @return the base's
     */
    public Study study() {
        return base.study().orElseThrow();
    }

    /**
     * Base and variants.
     *
     * @return the base first
     */
    public List<Variant> all() {
        List<Variant> all = new ArrayList<>(List.of(base));
        all.addAll(variants);
        return all;
    }
}
