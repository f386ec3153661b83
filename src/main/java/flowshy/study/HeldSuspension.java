package flowshy.study;

import flowshy.hair.Hair;
import flowshy.response.Hold;
import flowshy.response.Suspension;
import flowshy.response.SuspensionStatement;
import java.util.Optional;

/**
 * The suspension of a variant: measured on the hair of the base, held under the variant's own.
 *
 * @param base the base study
 * @param hold what stays
 * @param anew whether the variant states another measurement, which is then solved on the base's hair
 */
record HeldSuspension(Study base, Hold hold, boolean anew) {
    Hair measured() {
        return base.device().hair();
    }

    /** The suspension under a hair; empty if none is stated or it has a problem, which the builder has noted. */
    Optional<Suspension> under(Hair hair, SuspensionBuilder builder) {
        Optional<SuspensionStatement> statement = builder.statement();
        Optional<Suspension> solved = anew || base.device().suspension().isEmpty()
                ? builder.solved(statement, measured())
                : base.device().suspension();
        return statement.isEmpty() || solved.isEmpty()
                ? Optional.empty()
                : Optional.of(hold.on(hair, measured(), solved.get(), statement.get()));
    }
}
