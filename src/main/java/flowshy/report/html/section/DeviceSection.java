package flowshy.report.html.section;

import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.math.Caveat.Subject;
import flowshy.report.html.Html;
import flowshy.response.Calibration;
import flowshy.response.Device;
import flowshy.response.Suspension;
import flowshy.verdict.DeviceFacts;
import flowshy.verdict.DeviceFacts.Swing;
import java.util.EnumSet;
import java.util.Optional;

/** Hair, suspension and cover in figures. */
final class DeviceSection implements ReportSection {
    @Override
    public String id() {
        return "device";
    }

    @Override
    public String heading() {
        return "Device";
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        Device device = report.answer().device();
        words.charts(id());
        words.facts("Hair", () -> hair(html, words, report.answer().facts(), device));
        if (device.suspension().isPresent()) {
            words.facts("Suspension and movement", () -> movement(html, words, report));
        } else {
            words.paragraph("No suspension is stated: torques and bands are given, movements are not.");
        }
        words.caveats(EnumSet.of(Subject.HAIR, Subject.SUSPENSION, Subject.RESONANCE, Subject.COVER));
    }

    private static void hair(Html html, Words words, DeviceFacts facts, Device device) {
        Hair hair = device.hair();
        Profile profile = hair.profile();
        words.fact("shape", profile.shape());
        words.fact("cover", device.cover().words());
        words.fact("length", profile.length(), "m", 4);
        words.fact("largest diameter", 2.0 * profile.largestRadius(), "m", 4);
        words.fact("length over diameter", facts.slenderness(), "", 3);
        words.fact("density", hair.density(), "kg/m3", 5);
        words.fact("mass", facts.mass(), "kg", 4);
        words.fact("moment of inertia about the pivot", facts.inertia(), "kg.m2", 4);
        words.fact("inertial torque", facts.inertialTorque(), "N.m per m/s2", 4);
        words.fact("Womersley number over the band", () -> {
            words.amount(facts.womersley().least(), "", 3);
            html.text(" to ");
            words.amount(facts.womersley().largest(), "", 3);
        });
        words.fact(
                "Stokes layer at the lower end of the band",
                () -> layer(html, words, profile, facts.layer().largest()));
        words.fact(
                "Stokes layer at the upper end",
                () -> layer(html, words, profile, facts.layer().least()));
        words.fact("Knudsen number on the thinnest radius", () -> {
            if (facts.knudsen() > 0.0) {
                words.amount(facts.knudsen(), "", 2);
            } else {
                html.text("none: no mean free path is known");
            }
        });
        facts.bendingFrequency().ifPresent(bending -> words.fact("first bending, in the medium", bending, "Hz", 4));
        facts.bendingStiffness().ifPresent(stiffness -> words.fact("bending stiffness EI/L", stiffness, "N.m/rad", 3));
    }

    private static void layer(Html html, Words words, Profile profile, double thickness) {
        words.amount(thickness, "m", 4);
        html.text(" (");
        words.amount(thickness / profile.length(), "", 2);
        html.text(" of the length, ");
        words.amount(thickness / profile.largestRadius(), "", 2);
        html.text(" of the radius)");
    }

    private static void movement(Html html, Words words, StudyReport report) {
        Device device = report.answer().device();
        DeviceFacts facts = report.answer().facts();
        Suspension held = device.suspension().orElseThrow();
        words.fact("stiffness", held.stiffness(), "N.m/rad", 5);
        words.fact("structural damping", held.damping(), "N.m.s/rad", 4);
        if (held.film().isPresent()) {
            words.fact("damping of the film", held.filmDamping(Optional.of(device.around())), "N.m.s/rad", 4);
        }
        words.fact("attitude", held.attitude().word());
        words.fact("gravity adds", facts.gravityStiffness(), "N.m/rad", 3);
        if (facts.staticTilt() != 0.0) {
            words.fact("static tilt under gravity", facts.staticTilt(), "rad", 4);
        }
        facts.vacuum().ifPresent(swing -> words.fact("in vacuum", () -> swing(html, words, swing)));
        facts.medium().ifPresent(swing -> words.fact("in the medium", () -> swing(html, words, swing)));
        report.study().calibration().ifPresent(calibration -> calibration(html, words, calibration, device));
    }

    private static void swing(Html html, Words words, Swing swing) {
        html.text("resonance ");
        words.amount(swing.resonance(), "Hz", 5);
        double quality = swing.decay().quality();
        if (Double.isInfinite(quality)) {
            html.text(", no damping");
        } else {
            html.text(", Q ");
            words.amount(quality, "", 4);
        }
        html.text(swing.decay().overdamped() ? ", overdamped" : "");
    }

    private static void calibration(Html html, Words words, Calibration calibration, Device device) {
        Calibration.Figures figures = calibration.figures(device);
        words.fact("calibration", () -> {
            words.amount(figures.sensitivity(), figures.angle() ? "rad per m/s2" : "N.m per m/s2", 4);
            html.text(" at ");
            words.amount(calibration.frequency(), "Hz", 4);
            html.text(", cover " + calibration.cover().kind());
        });
        words.fact("sensitivity in use against calibration", () -> {
            if (figures.change() == 1.0) {
                html.text("the same");
                return;
            }
            words.amount(figures.percent(), "%", 3);
            html.text(", ");
            words.amount(figures.level(), "dB", 3);
        });
    }
}
