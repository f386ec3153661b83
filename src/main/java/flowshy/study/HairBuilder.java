package flowshy.study;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.study.keys.Form;
import flowshy.study.text.Problems;
import java.util.Optional;

/** From the keys of the hair to its shape; refuses what is no hair and says what to do. */
final class HairBuilder {
    private final Form form;
    private final Problems problems;
    private final FilesRead files;

    HairBuilder(Form form, Problems problems, FilesRead files) {
        this.form = form;
        this.problems = problems;
        this.files = files;
    }

    /** The hair; empty if it has a problem. */
    Optional<Hair> build() {
        return build(form.word("finite-length").map(LengthModel::of).orElse(LengthModel.AUTO));
    }

    /** The same under a model of its length. */
    Optional<Hair> build(LengthModel model) {
        if (problems.touches("hair") || !form.has("hair")) {
            return Optional.empty();
        }
        Optional<Profile> profile = switch (form.word("hair.shape").orElseThrow()) {
            case "cylinder" -> cylinder();
            case "taper" -> taper();
            case "club" -> club();
            default -> new ProfileReader(form, problems, files).read();
        };
        return profile.map(p -> new Hair(
                p, form.si("hair.density"), form.siIfAny("hair.youngs-modulus"), model, form.siIfAny("hair.foot-gap")));
    }

    /** The hair of a known shape, where nothing but its material changes. */
    Hair of(Hair base, LengthModel model) {
        return new Hair(
                base.profile(),
                form.si("hair.density"),
                form.siIfAny("hair.youngs-modulus"),
                model,
                form.siIfAny("hair.foot-gap"));
    }

    private Optional<Profile> cylinder() {
        return slender("hair.diameter")
                ? Optional.of(new Cylinder(form.si("hair.length"), radius("hair.diameter")))
                : Optional.empty();
    }

    private Optional<Profile> taper() {
        boolean base = slender("hair.base-diameter");
        boolean tip = slender("hair.tip-diameter");
        return base && tip
                ? Optional.of(
                        new Taper(form.si("hair.length"), radius("hair.base-diameter"), radius("hair.tip-diameter")))
                : Optional.empty();
    }

    private Optional<Profile> club() {
        double length = form.si("hair.length");
        double stalk = radius("hair.stalk-diameter");
        double head = radius("hair.head-diameter");
        Club.End end = form.word("hair.end").orElseThrow().equals("round") ? Club.End.ROUND : Club.End.FLAT;
        boolean fits = slender("hair.head-diameter");
        if (!(head >= stalk)) {
            fits = refuse(
                    "hair.head-diameter",
                    "a head of " + written("hair.head-diameter") + " on a stalk of " + written("hair.stalk-diameter"),
                    "a club's head is at least as thick as its stalk: swap the two, or take shape: taper");
        }
        double left =
                Club.headStraight(length, form.si("hair.stalk-length"), form.si("hair.shoulder-length"), head, end);
        if (!(left >= -1e-12 * length)) {
            String parts = end == Club.End.ROUND ? "stalk, shoulder and round end" : "stalk and shoulder";
            fits = refuse(
                    "hair.stalk-length",
                    parts + " are together longer than the hair's " + written("hair.length"),
                    "length is the total from wall to tip");
        }
        return fits
                ? Optional.of(new Club(
                        length, stalk, form.si("hair.stalk-length"), form.si("hair.shoulder-length"), head, end))
                : Optional.empty();
    }

    private boolean slender(String path) {
        if (form.si(path) <= form.si("hair.length")) {
            return true;
        }
        return refuse(
                path,
                written(path) + " wide and " + written("hair.length") + " long",
                "a hair is at least as long as wide: swap the two or lengthen it");
    }

    private boolean refuse(String path, String found, String accepted) {
        problems.add(form.position(path), path, found, accepted);
        return false;
    }

    private String written(String path) {
        return form.word(path).orElseThrow();
    }

    private double radius(String path) {
        return 0.5 * form.si(path);
    }
}
