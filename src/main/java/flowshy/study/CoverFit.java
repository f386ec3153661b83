package flowshy.study;

import flowshy.cylinder.ConfinedCylinder;
import flowshy.hair.Hair;
import flowshy.stream.cover.Cavity;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.RoofedCover;
import flowshy.stream.cover.SealedCover;
import flowshy.study.keys.Form;
import flowshy.study.text.Problems;

/**
 * Whether a hair stands under a cover.
 *
 * @param form the keys of the cover, for what is told
 * @param problems where it is told
 */
record CoverFit(Form form, Problems problems) {
    /** Whether it does; the problem is told if not. */
    boolean fits(String path, Cover cover, Hair hair) {
        double length = hair.profile().length();
        if (cover instanceof RoofedCover roof && !(roof.gap() > length)) {
            return refuse(
                    path + ".gap",
                    "a roof " + form.word(path + ".gap").orElse("") + " above the wall touches the hair",
                    "a gap above the hair's length");
        }
        if (cover instanceof SealedCover sealed && sealed.cavity().isPresent()) {
            Cavity cavity = sealed.cavity().get();
            if (!(cavity.height() > length)) {
                return refuse(
                        path + ".height",
                        "a cavity " + form.word(path + ".height").orElse("") + " high touches the hair",
                        "a height above the hair's length");
            }
        }
        if (cover.cavityRadius().isPresent()
                && !(cover.cavityRadius().getAsDouble()
                        > ConfinedCylinder.NARROWEST * hair.profile().largestRadius())) {
            return refuse(
                    path + ".kind",
                    "a cavity hardly wider than the hair",
                    "a cavity radius of 1.01 of the hair's or more, where the law of the confined cylinder holds");
        }
        return true;
    }

    private boolean refuse(String key, String found, String accepted) {
        problems.add(form.position(key), key, found, accepted);
        return false;
    }
}
