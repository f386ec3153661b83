package flowshy.study;

import static flowshy.math.Figures.say;

import flowshy.hair.Hair;
import flowshy.response.Device;
import flowshy.response.Suspension;
import flowshy.response.SuspensionException;
import flowshy.response.SuspensionStatement;
import flowshy.study.keys.Form;
import flowshy.study.text.Problems;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.compare.Scaling;
import flowshy.verdict.design.NoDesignException;
import java.util.Optional;

/** All diameters of a hair multiplied by one factor; length and density stay, the suspension is held. */
final class DiameterScaling implements Scaling {
    /** No hair is made a thousand times thinner. */
    private static final double THINNEST = 1e-3;

    private final ScaledStates states;
    private final BandsQuestion question;
    private final double room;
    private final Optional<SuspensionStatement> statement;

    DiameterScaling(ScaledStates states) {
        Study study = states.study();
        Form form = states.form();
        this.states = states;
        this.question = study.question();
        this.room = study.device().room();
        Problems problems = new Problems();
        FilesRead files = new FilesRead(states.folder());
        MediumBuilder media = new MediumBuilder(form, problems, files);
        CoverBuilder covers = new CoverBuilder(form, problems, files, media);
        this.statement = new SuspensionBuilder(
                        form,
                        problems,
                        media,
                        covers,
                        files,
                        Optional.of(study.device().hair()))
                .statement();
    }

    @Override
    public String words() {
        return "all diameters of the hair";
    }

    @Override
    public double start() {
        return 1.0;
    }

    @Override
    public double least() {
        return THINNEST;
    }

    @Override
    public double most() {
        return room;
    }

    @Override
    public String written(double value) {
        return say("times %.5g", value);
    }

    @Override
    public String change(double value) {
        return words() + " " + written(value);
    }

    @Override
    public BandsQuestion at(double factor) {
        Device device = question.device();
        Hair hair = device.hair().reshaped(device.hair().profile().thickened(factor));
        Optional<Suspension> suspension = device.suspension().map(solved -> carried(hair, solved));
        BandsQuestion scaled =
                question.about(new Device(hair, suspension, device.outside(), device.cover(), device.around()));
        return states.bear(scaled, states.form());
    }

    private Suspension carried(Hair hair, Suspension solved) {
        if (statement.isEmpty()) {
            return solved;
        }
        try {
            return states.hold().on(hair, question.device().hair(), solved, statement.get());
        } catch (SuspensionException e) {
            throw new NoDesignException("suspension." + e.key() + ": " + e.getMessage());
        }
    }
}
