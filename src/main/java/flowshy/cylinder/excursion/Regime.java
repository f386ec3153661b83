package flowshy.cylinder.excursion;

import flowshy.math.Range;
import org.hipparchus.util.FastMath;

/**
 * Where one strip stands at one frequency.
 *
 * @param reynolds Re = max(|Ū|, û) d/ν, on the diameter [-]
 * @param womersley Wo = a √(ω/ν), on the radius [-]
 * @param keuleganCarpenter KC = 2π A/d, A = û/ω the amplitude of displacement [-]
 * @param excursionRatio X = (max(|Ū|, û)/ω)/max(a, δ) [-]
 * @param kind which law governs
 */
public record Regime(double reynolds, double womersley, double keuleganCarpenter, double excursionRatio, Kind kind) {
    /** Excursion ratios between which the linear law gives way to steady drag. */
    public static final Range MIXED = new Range("X", 0.3, 3.0);

    /** Least frequency parameter at which the instability of the attached flow was observed (2025 review, seen). */
    private static final double LEAST_UNSTABLE_BETA = 52.0;

    /** Which law governs a strip. */
    public enum Kind {
        /** the oscillating cylinder's linear law */
        LINEAR("linear"),
        /** between the two */
        MIXED("mixed"),
        /** steady drag, instant by instant */
        QUASI_STEADY("quasi-steady"),
        /** beyond the drag law or the slip law */
        OUT_OF_RANGE("out of range");

        private final String words;

        Kind(String words) {
            this.words = words;
        }

        /**
         * What a report prints.
         *
         * @return the plain words
         */
        public String words() {
            return words;
        }
    }

    /**
     * Stokes's frequency parameter β = f d²/ν = 2 Wo²/π.
     *
     * @return β [-]
     */
    public double stokesBeta() {
        return 2.0 * womersley * womersley / FastMath.PI;
    }

    /**
     * Keulegan–Carpenter number above which the attached flow is unstable to rows of small vortices.
     *
     * <p>5.778 β^-1/4 (1 + 0.205 β^-1/4), Hall 1984, J. Fluid Mech. 146:347 (from memory), asymptotic for large β.
     *
     * @return KC [-]
     */
    public double hallThreshold() {
        double root = FastMath.pow(stokesBeta(), -0.25);
        return 5.778 * root * (1.0 + 0.205 * root);
    }

    /**
     * Whether the oscillating flow leaves the attached state of the linear law: measured drag departs from it near here
     * (Sarpkaya 1986, J. Fluid Mech. 165:61, abstract seen).
     *
     * @return true if β is at least 52 and KC lies above Hall's threshold
     */
    public boolean unstable() {
        return stokesBeta() >= LEAST_UNSTABLE_BETA && keuleganCarpenter > hallThreshold();
    }
}
