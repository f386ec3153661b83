package flowshy.report;

import flowshy.hair.Hair;
import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Figures;
import flowshy.medium.Medium;
import flowshy.medium.PropertySource;
import flowshy.response.Calibration;
import flowshy.response.ResponsePoint;
import flowshy.response.Suspension;
import flowshy.study.Study;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.DeviceFacts;
import flowshy.verdict.Levers;
import flowshy.verdict.Limit;
import flowshy.verdict.ReadingBand;
import flowshy.verdict.force.ForceAlong;
import flowshy.verdict.measured.Compared;
import java.util.EnumSet;
import java.util.List;
import java.util.Optional;
import java.util.Set;
import org.hipparchus.util.FastMath;

/** The answer of {@code bands} for a terminal: the decision first, 80 columns, no colour; every caveat under its number. */
public final class BandsText {
    private static final Set<Subject> ABOUT_DEVICE =
            EnumSet.of(Subject.HAIR, Subject.SUSPENSION, Subject.RESONANCE, Subject.COVER);
    private static final Set<Subject> ABOUT_POINTS =
            EnumSet.of(Subject.MOTION, Subject.FLOW, Subject.NOISE, Subject.ERROR);

    private final TextPage page = new TextPage();
    private final Study study;
    private final BandsAnswer answer;

    private BandsText(Study study, BandsAnswer answer) {
        this.study = study;
        this.answer = answer;
    }

    /**
     * The printed answer.
     *
     * @param study what was asked
     * @param answer what was found
     * @param why explanations of edges and failed limits, and what to tighten first
     * @param measured what was measured, beside the model; empty if nothing was
     * @param forces along the hair; none if the list is empty
     * @return text with a line end after every line
     */
    public static String of(
            Study study, BandsAnswer answer, Why why, List<Compared> measured, List<ForceAlong> forces) {
        BandsText text = new BandsText(study, answer);
        text.decision();
        text.taken();
        text.medium();
        text.device();
        text.bands();
        answer.envelope().ifPresent(states -> EnvelopeReport.print(text.page, states));
        answer.error().ifPresent(budget -> ErrorReport.print(text.page, budget, text.spectral()));
        text.points();
        MeasuredReport.print(text.page, "Measured beside the model", measured);
        text.explain(why.levers());
        SensitivityReport.print(text.page, why.slopes());
        ForceReport.print(text.page, forces);
        text.page.line("");
        text.page.paragraph(Cautions.SHORT);
        return text.page.toString();
    }

    private void decision() {
        page.line("Flowshy " + Version.number() + "   bands   " + study.origin().file());
        if (!study.title().isEmpty()) {
            page.line(study.title());
        }
        study.origin().settings().forEach(setting -> page.line("with --set " + setting));
        page.heading("Decision: " + answer.verdict().decision().word());
        page.paragraph(answer.verdict().sentence());
        for (Limit limit : answer.verdict().limits()) {
            String found =
                    limit.found().isPresent() ? "found " + figure(limit.found().getAsDouble(), limit) : "no figure";
            String at = limit.at().isPresent() ? " at " + Figures.of(limit.at().getAsDouble(), 4) + " Hz" : "";
            String reason = limit.reason().isEmpty() ? "" : " (" + limit.reason() + ")";
            page.row(
                    limit.name(),
                    limit.decision().word() + ": required " + sense(limit) + figure(limit.required(), limit) + ", "
                            + found + at + reason);
        }
    }

    private static String figure(double value, Limit limit) {
        return (Figures.of(value, 4) + " " + limit.unit()).strip();
    }

    /** Rejection and error are limits in one sense only, which needs no word. */
    private static String sense(Limit limit) {
        boolean plain = limit.name().equals("rejection") || limit.name().equals("error");
        return plain ? "" : limit.sense().words() + " ";
    }

    private void taken() {
        if (study.takenAs().isEmpty()) {
            return;
        }
        page.heading("Taken as (not stated in the study)");
        study.takenAs().forEach(taken -> page.row(taken.key(), taken.value() + " (" + taken.why() + ")"));
    }

    private void medium() {
        Medium around = answer.device().around();
        page.heading("Medium around the hair: " + around.name());
        page.row(
                "state",
                Figures.of(around.temperature() - 273.15, 4) + " degC, " + Figures.of(around.pressure() / 1000.0, 6)
                        + " kPa");
        page.row("density", Figures.of(around.density(), 6) + " kg/m3" + source(around, "density"));
        page.row("viscosity", Figures.of(around.viscosity(), 5) + " Pa.s" + source(around, "viscosity"));
        page.row("kinematic viscosity", Figures.of(around.kinematicViscosity(), 5) + " m2/s");
        caveats(EnumSet.of(Subject.MEDIUM));
    }

    private static String source(Medium medium, String property) {
        for (PropertySource source : medium.sources()) {
            if (source.property().equals(property)) {
                String uncertainty = source.uncertainty().isPresent()
                        ? "u " + Figures.of(100.0 * source.uncertainty().getAsDouble(), 2) + " %, "
                        : "";
                return " (" + uncertainty + source.reading().words() + ": " + source.source() + ")";
            }
        }
        return " (given in the study)";
    }

    private void device() {
        DeviceFacts facts = answer.facts();
        Hair hair = answer.device().hair();
        page.heading("Device: " + hair.profile().shape() + ", cover "
                + answer.device().cover().kind());
        page.row(
                "hair",
                "length " + Figures.of(1e6 * hair.profile().length(), 4) + " um, largest diameter "
                        + Figures.of(2e6 * hair.profile().largestRadius(), 4) + " um, length over diameter "
                        + Figures.of(facts.slenderness(), 3));
        page.row("mass", Figures.of(facts.mass(), 4) + " kg");
        page.row("moment of inertia", Figures.of(facts.inertia(), 4) + " kg.m2 about the pivot");
        page.row("inertial torque", Figures.of(facts.inertialTorque(), 4) + " N.m per m/s2");
        page.row(
                "Womersley number",
                Figures.of(facts.womersley().least(), 3) + " to "
                        + Figures.of(facts.womersley().largest(), 3) + " over the band");
        page.row(
                "Stokes layer",
                layer(facts.layer().largest()) + " at the lower end of the band, "
                        + layer(facts.layer().least()) + " at the upper");
        page.row(
                "Knudsen number",
                facts.knudsen() > 0.0 ? Figures.of(facts.knudsen(), 2) + " on the thinnest radius" : "none: a liquid");
        movement(facts);
        if (facts.bendingFrequency().isPresent()) {
            page.row(
                    "first bending",
                    Figures.of(facts.bendingFrequency().getAsDouble(), 4) + " Hz in the medium, EI/L "
                            + Figures.of(facts.bendingStiffness().orElseThrow(), 3) + " N.m/rad");
        }
        caveats(ABOUT_DEVICE);
    }

    private String layer(double thickness) {
        double length = answer.device().hair().profile().length();
        double radius = answer.device().hair().profile().largestRadius();
        return Figures.of(1e6 * thickness, 4) + " um (" + Figures.of(thickness / length, 2) + " of the length, "
                + Figures.of(thickness / radius, 2) + " of the radius)";
    }

    private void movement(DeviceFacts facts) {
        if (answer.device().suspension().isEmpty()) {
            page.row("suspension", "not stated: torques and bands are given, movements are not");
            return;
        }
        Suspension held = answer.device().suspension().get();
        page.row(
                "suspension",
                "stiffness " + Figures.of(held.stiffness(), 5) + " N.m/rad, structural damping "
                        + Figures.of(held.damping(), 4) + " N.m.s/rad"
                        + (held.film().isEmpty() ? "" : ", film " + Figures.of(film(held), 4) + " N.m.s/rad")
                        + "; "
                        + held.attitude().word() + ", gravity adds "
                        + Figures.of(facts.gravityStiffness(), 3) + " N.m/rad");
        facts.vacuum().ifPresent(swing -> page.row("in vacuum", swing(swing)));
        facts.medium().ifPresent(swing -> page.row("in the medium", swing(swing)));
        study.calibration().ifPresent(calibration -> page.row("calibration", calibration(calibration)));
        ResponsePoint first = answer.points().get(0);
        ResponsePoint last = answer.points().get(answer.points().size() - 1);
        if (first.thermalNoise().isPresent()) {
            page.row(
                    "thermal noise",
                    Figures.of(first.thermalNoise().getAsDouble(), 3) + " m/s2/rtHz at "
                            + Figures.of(first.frequency(), 4) + " Hz, "
                            + Figures.of(last.thermalNoise().orElseThrow(), 3) + " at "
                            + Figures.of(last.frequency(), 4) + " Hz");
        }
        if (first.readoutNoise().isPresent()) {
            page.row(
                    "readout noise",
                    Figures.of(first.readoutNoise().getAsDouble(), 3) + " m/s2/rtHz at "
                            + Figures.of(first.frequency(), 4) + " Hz, "
                            + Figures.of(last.readoutNoise().orElseThrow(), 3) + " at "
                            + Figures.of(last.frequency(), 4) + " Hz");
        }
    }

    private double film(Suspension held) {
        return held.filmDamping(Optional.of(answer.device().around()));
    }

    private String calibration(Calibration calibration) {
        Calibration.Figures figures = calibration.figures(answer.device());
        String inUse = figures.change() == 1.0
                ? "the same in use"
                : "in use " + Figures.of(figures.percent(), 3) + " % (" + Figures.of(figures.level(), 3) + " dB) off";
        return Figures.of(figures.sensitivity(), 4) + (figures.angle() ? " rad" : " N.m") + " per m/s2 at "
                + Figures.of(calibration.frequency(), 4) + " Hz, cover "
                + calibration.cover().kind() + "; " + inUse;
    }

    private static String swing(DeviceFacts.Swing swing) {
        double quality = swing.decay().quality();
        String decay = Double.isInfinite(quality) ? "no damping" : "Q " + Figures.of(quality, 4);
        return "resonance " + Figures.of(swing.resonance(), 5) + " Hz, " + decay
                + (swing.decay().overdamped() ? ", overdamped" : "");
    }

    private void bands() {
        page.heading("Bands at a margin of " + Figures.of(answer.acceptance().margin(), 4) + " dB");
        for (ReadingBand band : answer.bands()) {
            String edges = Double.isFinite(band.rejectionFrom())
                    ? "   rejection " + Figures.of(band.rejectionFrom(), 4) + " to " + Figures.of(band.rejectionTo(), 4)
                            + " dB"
                    : "";
            page.line(String.format(
                    "  %-10s %10s Hz to %10s Hz%s",
                    band.reads().word(), Figures.of(band.from(), 6), Figures.of(band.to(), 6), edges));
        }
        answer.least()
                .ifPresent(least -> page.row(
                        "least rejection",
                        Figures.of(least.rejection(), 4) + " dB at " + Figures.of(least.frequency(), 5) + " Hz"));
        answer.largest()
                .ifPresent(most -> page.row(
                        "largest rejection",
                        Figures.of(most.rejection(), 4) + " dB at " + Figures.of(most.frequency(), 5) + " Hz"));
        caveats(EnumSet.of(Subject.REJECTION));
    }

    private boolean spectral() {
        return study.motion().spectrum().isPresent();
    }

    private void points() {
        boolean moving =
                answer.points().stream().allMatch(point -> point.motion().isPresent());
        boolean corrected =
                answer.points().stream().anyMatch(point -> point.finiteLength().isPresent());
        page.heading("Response by frequency");
        page.table(
                PointTable.printed(answer.acceptance(), moving, corrected),
                answer.points(),
                point -> point.frequency() < answer.band().from() * (1.0 - 1e-9)
                        || point.frequency() > answer.band().to() * (1.0 + 1e-9));
        page.paragraph((corrected ? "finite: what tip and wall change in the rejection of strip theory. " : "")
                + "equiv.: acceleration of the base that reads as much as flow of unit velocity."
                + (answer.acceptance().error().isPresent()
                        ? " speed: largest flow speed that keeps the error limit."
                        : "")
                + (moving ? "" : " Response columns are left out: no suspension is stated that holds the hair.")
                + " *: outside the band of use.");
        caveats(ABOUT_POINTS);
    }

    private void explain(List<Levers> why) {
        for (Levers levers : why) {
            page.heading(
                    "Why " + Figures.of(levers.rejection(), 4) + " dB at " + Figures.of(levers.frequency(), 5) + " Hz");
            page.row("torque of inertia", Figures.of(levers.inertial(), 4) + " N.m per m/s2 (hair less fluid carried)");
            page.row(
                    "torque of flow",
                    "viscous drag " + Figures.of(levers.drag(), 4) + ", added mass "
                            + Figures.of(levers.addedMass(), 4) + ", pressure gradient "
                            + Figures.of(levers.gradient(), 4) + " N.m per m/s2: " + levers.dominant() + " dominates");
            for (Levers.Lever lever : levers.levers()) {
                String edge = lever.edge().isPresent()
                        ? "; the same rejection at " + Figures.of(lever.edge().getAsDouble(), 4) + " Hz"
                        : "";
                page.row(
                        lever.what(),
                        (lever.gain() >= 0.0 ? "+" : "-") + Figures.of(FastMath.abs(lever.gain()), 3) + " dB" + edge);
            }
        }
    }

    private void caveats(Set<Subject> subjects) {
        for (Caveat caveat : answer.caveats()) {
            if (subjects.contains(caveat.about())) {
                page.note("[" + caveat.weight().words() + "]", caveat.text());
            }
        }
    }
}
