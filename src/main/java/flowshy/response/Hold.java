package flowshy.response;

import flowshy.hair.Hair;
import flowshy.response.SuspensionStatement.Dashpot;
import flowshy.response.SuspensionStatement.Resonance;
import flowshy.response.SuspensionStatement.Stiffness;
import java.util.Optional;
import org.hipparchus.util.FastMath;

/** What of a suspension stays as it was measured on the base device when another hair or fluid takes the base's place. */
public enum Hold {
    /** stiffness and structural damping: the same springs carry another hair */
    STIFFNESS("stiffness") {
        @Override
        public Suspension on(Hair hair, Hair base, Suspension solved, SuspensionStatement statement) {
            return with(solved.stiffness(), solved.damping(), statement);
        }
    },
    /**
     * resonance as stated, in the medium and under the cover in which it was stated, and structural damping: other springs are made for
     * another hair. Where a stiffness or a ring-down was stated, the base's resonance in vacuum.
     */
    RESONANCE("resonance") {
        @Override
        public Suspension on(Hair hair, Hair base, Suspension solved, SuspensionStatement statement) {
            Stiffness tuned =
                    statement.stiffness().filter(Resonance.class::isInstance).orElseGet(() -> inVacuum(base, solved));
            Suspension known = with(solved.stiffness(), solved.damping(), statement);
            SuspensionStatement other = new SuspensionStatement(
                    Optional.of(tuned),
                    new Dashpot(solved.damping(), Optional.empty()),
                    known.plateInertia(),
                    known.pivotDepth(),
                    known.attitude(),
                    known.readoutNoise(),
                    known.film());
            return new SuspensionSolver(hair, other).solve();
        }
    };

    private final String word;

    Hold(String word) {
        this.word = word;
    }

    /**
     * The word a study uses.
     *
     * @return stiffness or resonance
     */
    public String word() {
        return word;
    }

    /**
     * The suspension under another hair.
     *
     * @param hair the other hair
     * @param base the hair on which the suspension was measured
     * @param solved the suspension as solved on the base
     * @param statement what was stated; plate inertia, pivot depth, attitude, readout noise and film are taken from here
     * @return the suspension that carries the other hair
     * @throws SuspensionException if the resonance cannot be held
     */
    public abstract Suspension on(Hair hair, Hair base, Suspension solved, SuspensionStatement statement);

    private static Resonance inVacuum(Hair base, Suspension solved) {
        Oscillator swing = new Oscillator(base, solved, Optional.empty());
        if (!swing.stands()) {
            throw new SuspensionException(
                    "stiffness", "a resonance is to be held, but the base's upright hair falls over and has none");
        }
        return new Resonance(swing.resonance() / (2.0 * FastMath.PI), Optional.empty());
    }

    private static Suspension with(double stiffness, double damping, SuspensionStatement statement) {
        return new Suspension(
                stiffness,
                damping,
                statement.plateInertia(),
                statement.pivotDepth(),
                statement.attitude(),
                statement.readoutNoise(),
                statement.film());
    }
}
