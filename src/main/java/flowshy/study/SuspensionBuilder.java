package flowshy.study;

import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.response.Attitude;
import flowshy.response.Suspension;
import flowshy.response.SuspensionException;
import flowshy.response.SuspensionSolver;
import flowshy.response.SuspensionStatement;
import flowshy.response.SuspensionStatement.Damping;
import flowshy.response.SuspensionStatement.Dashpot;
import flowshy.response.SuspensionStatement.Quality;
import flowshy.response.SuspensionStatement.Resonance;
import flowshy.response.SuspensionStatement.RingDown;
import flowshy.response.SuspensionStatement.Spring;
import flowshy.response.SuspensionStatement.Stiffness;
import flowshy.study.keys.Form;
import flowshy.study.text.Problems;
import java.util.Arrays;
import java.util.Optional;

/** From what is stated of the suspension to stiffness and damping; solved once, here. */
final class SuspensionBuilder {
    private static final String GROUP = "suspension";

    private final Form form;
    private final Problems problems;
    private final MediumBuilder media;

    SuspensionBuilder(Form form, Problems problems, MediumBuilder media) {
        this.form = form;
        this.problems = problems;
        this.media = media;
    }

    /** The suspension; empty if none is stated or it has a problem. */
    Optional<Suspension> build(Optional<Hair> hair) {
        if (!form.has(GROUP) || problems.touches(GROUP)) {
            return Optional.empty();
        }
        Optional<Stiffness> stiffness = stiffness();
        Damping damping = damping();
        boolean swing = damping instanceof RingDown ring && ring.frequency().isPresent();
        if (stiffness.isEmpty() && !swing) {
            problems.add(
                    form.position(GROUP),
                    GROUP,
                    "one of stiffness, resonance is missing",
                    "state one of them, or the frequency of the ring-down");
        }
        if (problems.touches(GROUP) || hair.isEmpty()) {
            return Optional.empty();
        }
        return solved(
                hair.get(),
                new SuspensionStatement(
                        stiffness,
                        damping,
                        form.si("suspension.plate-inertia"),
                        form.si("suspension.pivot-depth"),
                        attitude(),
                        form.siIfAny("suspension.readout-noise")));
    }

    private Optional<Suspension> solved(Hair hair, SuspensionStatement statement) {
        try {
            return Optional.of(new SuspensionSolver(hair, statement).solve());
        } catch (SuspensionException e) {
            String path = GROUP + "." + e.key();
            problems.add(form.position(path), path, e.getMessage(), "");
            return Optional.empty();
        }
    }

    private Optional<Stiffness> stiffness() {
        if (form.has("suspension.stiffness")) {
            return Optional.of(new Spring(form.si("suspension.stiffness")));
        }
        return form.has("suspension.resonance")
                ? Optional.of(new Resonance(form.si("suspension.resonance.frequency"), in("resonance")))
                : Optional.empty();
    }

    private Damping damping() {
        if (form.has("suspension.quality")) {
            return new Quality(form.si("suspension.quality.value"), in("quality"));
        }
        if (form.has("suspension.ring-down")) {
            return new RingDown(
                    form.siIfAny("suspension.ring-down.frequency"),
                    form.si("suspension.ring-down.decay-time"),
                    in("ring-down"));
        }
        return new Dashpot(form.si("suspension.damping.value"), in("damping"));
    }

    /** What surrounded the hair, empty for vacuum. */
    private Optional<Medium> in(String key) {
        String path = GROUP + "." + key + ".in";
        return media.isVacuum(path) ? Optional.empty() : media.build(path);
    }

    private Attitude attitude() {
        String word = form.word("suspension.attitude").orElseThrow();
        return Arrays.stream(Attitude.values())
                .filter(a -> a.word().equals(word))
                .findFirst()
                .orElseThrow();
    }
}
