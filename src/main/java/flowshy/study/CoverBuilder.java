package flowshy.study;

import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.stream.cover.Cavity;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.OpenCover;
import flowshy.stream.cover.RoofedCover;
import flowshy.stream.cover.SealedCover;
import flowshy.stream.cover.VentedCover;
import flowshy.study.keys.Form;
import flowshy.study.text.Problems;
import flowshy.verdict.Band;
import java.util.Optional;

/** From the keys of a cover to what stands over the hair; refuses one that the hair does not fit under. */
final class CoverBuilder {
    private final Form form;
    private final Problems problems;
    private final FilesRead files;
    private final MediumBuilder media;
    private final CoverFit fit;

    /**
     * A cover with the medium under it.
     *
     * @param cover the cover
     * @param around what touches the hair
     */
    record Fitted(Cover cover, Medium around) {}

    CoverBuilder(Form form, Problems problems, FilesRead files, MediumBuilder media) {
        this.form = form;
        this.problems = problems;
        this.files = files;
        this.media = media;
        this.fit = new CoverFit(form, problems);
    }

    /** The cover of a group; empty if it, or the hair or medium it needs, has a problem. */
    Optional<Fitted> build(String path, Optional<Hair> hair, Optional<Medium> outside, Optional<Band> band) {
        if (problems.touches(path)) {
            return Optional.empty();
        }
        Optional<Cover> cover = cover(path, outside, band);
        if (cover.isEmpty() || outside.isEmpty() || (hair.isPresent() && !fit.fits(path, cover.get(), hair.get()))) {
            return Optional.empty();
        }
        if (!cover.get().closed() || !form.has(path + ".fill")) {
            return Optional.of(new Fitted(cover.get(), outside.get()));
        }
        return media.sealed(path + ".fill", outside.get().temperature()).map(fill -> new Fitted(cover.get(), fill));
    }

    /** The cover under which something was measured; empty if none is stated or the hair does not fit under it. */
    Optional<Cover> measuredUnder(String path, Optional<Hair> hair) {
        if (!form.word(path + ".kind").orElse("open").equals("sealed")) {
            return Optional.empty();
        }
        Cover cover = sealed(path);
        return hair.isEmpty() || fit.fits(path, cover, hair.get()) ? Optional.of(cover) : Optional.empty();
    }

    private Optional<Cover> cover(String path, Optional<Medium> outside, Optional<Band> band) {
        return switch (form.word(path + ".kind").orElse("open")) {
            case "roofed" -> Optional.of(new RoofedCover(form.si(path + ".gap"), form.si(path + ".length")));
            case "vented" -> vented(path, outside);
            case "sealed" -> Optional.of(sealed(path));
            case "measured" -> new AttenuationReader(form, problems, files).read(path, band);
            default -> Optional.of(new OpenCover());
        };
    }

    private Cover sealed(String path) {
        return new SealedCover(
                form.has(path + ".diameter") && form.has(path + ".height")
                        ? Optional.of(new Cavity(form.si(path + ".diameter"), form.si(path + ".height")))
                        : Optional.empty());
    }

    private Optional<Cover> vented(String path, Optional<Medium> outside) {
        double holes = form.si(path + ".holes");
        if (holes != Math.rint(holes)) {
            return refuse(path + ".holes", "a share of a hole", "a whole number of holes");
        }
        if (outside.filter(medium -> medium.soundSpeed().isEmpty()).isPresent()) {
            return refuse(
                    path + ".kind",
                    "the sound speed of " + outside.get().name() + " is not known",
                    "a vented cover breathes by the compliance of its cavity: state medium.sound-speed");
        }
        return Optional.of(new VentedCover(
                (int) holes,
                form.si(path + ".hole-diameter"),
                form.si(path + ".hole-depth"),
                form.word(path + ".sides").orElse("one").equals("through"),
                form.si(path + ".cavity-volume"),
                form.si(path + ".cavity-section")));
    }

    private Optional<Cover> refuse(String key, String found, String accepted) {
        problems.add(form.position(key), key, found, accepted);
        return Optional.empty();
    }
}
