package flowshy.study;

import flowshy.response.Hold;
import flowshy.study.keys.Form;
import flowshy.study.keys.Keys;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import flowshy.verdict.compare.Contender;
import flowshy.verdict.compare.Scaling;
import java.nio.file.Path;
import java.util.List;
import java.util.Optional;

/** A device of a family: the base of a study, or the base with some keys laid over. */
public final class Variant {
    private final String name;
    private final List<String> changes;
    private final Hold hold;
    private final Form form;
    private final Path folder;
    private final Optional<Study> study;
    private final String reason;

    private Variant(
            String name,
            List<String> changes,
            Hold hold,
            Form form,
            Path folder,
            Optional<Study> study,
            String reason) {
        this.name = name;
        this.changes = List.copyOf(changes);
        this.hold = hold;
        this.form = form;
        this.folder = folder;
        this.study = study;
        this.reason = reason;
    }

    static Variant of(String name, List<String> changes, Hold hold, Form form, Path folder, Study study) {
        return new Variant(name, changes, hold, form, folder, Optional.of(study), "");
    }

    static Variant none(String name, List<String> changes, Hold hold, Form form, Path folder, String reason) {
        return new Variant(name, changes, hold, form, folder, Optional.empty(), reason);
    }

    /**
     * The user's name for it.
     *
     * @return as written; for the base the name of its file
     */
    public String name() {
        return name;
    }

    /**
     * Keys that it states.
     *
     * @return each with its value as written, in the order of the text; empty for the base
     */
    public List<String> changes() {
        return changes;
    }

    /**
     * What of the base's suspension stays in it.
     *
     * @return stiffness or resonance
     */
    public Hold hold() {
        return hold;
    }

    /**
     * The varied study, its suspension solved on the base's hair and held.
     *
     * @return empty where that has no solution
     */
    public Optional<Study> study() {
        return study;
    }

    /**
     * Takes part in a comparison, scaled by all diameters of its hair if it is to be made equal.
     *
     * @return the contender
     */
    public Contender contender() {
        return contender(study.map(own -> new DiameterScaling(states(own))));
    }

    /**
     * Takes part in a comparison, scaled by one of its numbers if it is to be made equal.
     *
     * @param option what to print as the place of a fault
     * @param key path of the number
     * @return the contender; without a scaling, and with the reason, where it has no such number
     * @throws StudyException if no study can have such a number
     */
    public Contender contender(String option, String key) {
        try {
            NumberKey number = new NumberKeys(form).key(option, key);
            return contender(study.map(own ->
                    new KeyScaling(VariedStudy.of(form, folder, own, hold, List.of(number)), number, states(own))));
        } catch (StudyException e) {
            if (Keys.measure(key).isEmpty()) { // no device ever has it
                throw e;
            }
            Problem problem = e.problems().get(0);
            return new Contender(
                    name,
                    changes,
                    study.map(Study::question),
                    Optional.empty(),
                    reason.isEmpty() ? problem.path() + ": " + problem.found() : reason);
        }
    }

    private ScaledStates states(Study own) {
        return new ScaledStates(own, hold, form, folder);
    }

    private Contender contender(Optional<Scaling> scaling) {
        return new Contender(name, changes, study.map(Study::question), scaling, reason);
    }
}
