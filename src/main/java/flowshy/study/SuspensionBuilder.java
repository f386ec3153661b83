package flowshy.study;

import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.response.Attitude;
import flowshy.response.FreeSwing;
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
import flowshy.response.TiltingPlateFilm;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.study.keys.Form;
import flowshy.study.text.Problems;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** From what is stated of the suspension to stiffness and damping; solved once, here. */
final class SuspensionBuilder {
    private static final String GROUP = "suspension";

    private final Form form;
    private final Problems problems;
    private final MediumBuilder media;
    private final CoverBuilder covers;
    private final FilesRead files;
    private final Optional<Hair> hair;
    private final List<Form.Taken> taken = new ArrayList<>();

    SuspensionBuilder(
            Form form,
            Problems problems,
            MediumBuilder media,
            CoverBuilder covers,
            FilesRead files,
            Optional<Hair> hair) {
        this.hair = hair;
        this.files = files;
        this.covers = covers;
        this.form = form;
        this.problems = problems;
        this.media = media;
    }

    /** What was read off a record in place of written keys. */
    List<Form.Taken> taken() {
        return List.copyOf(taken);
    }

    /** The suspension; empty if none is stated or it has a problem. */
    Optional<Suspension> build() {
        return statement().flatMap(statement -> solved(hair.orElseThrow(), statement));
    }

    /** What is stated of the suspension; empty if nothing is, or it or the hair has a problem. */
    Optional<SuspensionStatement> statement() {
        if (!form.has(GROUP) || problems.touches(GROUP)) {
            return Optional.empty();
        }
        Optional<Stiffness> stiffness = stiffness();
        Optional<Damping> stated = damping();
        if (stated.isEmpty()) {
            return Optional.empty();
        }
        Damping damping = stated.get();
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
        return Optional.of(new SuspensionStatement(
                stiffness,
                damping,
                form.si("suspension.plate-inertia"),
                form.si("suspension.pivot-depth"),
                attitude(),
                form.siIfAny("suspension.readout-noise"),
                film()));
    }

    /** The suspension of a statement on the hair that was measured; empty if there is no statement or no solution. */
    Optional<Suspension> solved(Optional<SuspensionStatement> statement, Hair measured) {
        return statement.flatMap(stated -> solved(measured, stated));
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
                ? Optional.of(
                        new Resonance(form.si("suspension.resonance.frequency"), in("resonance"), under("resonance")))
                : Optional.empty();
    }

    /** How the damping is stated; empty if it was to be read off a record and could not. */
    private Optional<Damping> damping() {
        if (form.has("suspension.quality")) {
            return Optional.of(new Quality(form.si("suspension.quality.value"), in("quality"), under("quality")));
        }
        if (form.has("suspension.ring-down.file")) {
            return fitted();
        }
        if (form.has("suspension.ring-down")) {
            return Optional.of(new RingDown(
                    form.siIfAny("suspension.ring-down.frequency"),
                    form.si("suspension.ring-down.decay-time"),
                    in("ring-down"),
                    under("ring-down")));
        }
        return Optional.of(new Dashpot(form.si("suspension.damping.value"), in("damping"), under("damping")));
    }

    private Optional<Damping> fitted() {
        RingDownReader reader = new RingDownReader(form, problems, files);
        Optional<FreeSwing> swing = reader.read();
        swing.ifPresent(s -> taken.addAll(reader.taken(s)));
        return swing.map(s ->
                new RingDown(OptionalDouble.of(s.frequency()), s.decayTime(), in("ring-down"), under("ring-down")));
    }

    /** What surrounded the hair, empty for vacuum. */
    private Optional<Medium> in(String key) {
        String path = GROUP + "." + key + ".in";
        return media.isVacuum(path) ? Optional.empty() : media.build(path);
    }

    /** What stood over the hair; open where nothing is said. */
    private Cover under(String key) {
        return covers.measuredUnder(GROUP + "." + key + ".cover", hair).orElse(Covers.OPEN);
    }

    private Optional<TiltingPlateFilm> film() {
        return form.has("suspension.film")
                ? Optional.of(new TiltingPlateFilm(
                        form.si("suspension.film.length"),
                        form.si("suspension.film.width"),
                        form.si("suspension.film.gap")))
                : Optional.empty();
    }

    private Attitude attitude() {
        String word = form.word("suspension.attitude").orElseThrow();
        return Arrays.stream(Attitude.values())
                .filter(a -> a.word().equals(word))
                .findFirst()
                .orElseThrow();
    }
}
