package flowshy.study;

import flowshy.response.Hold;
import flowshy.response.SuspensionException;
import flowshy.study.keys.Field;
import flowshy.study.keys.Form;
import flowshy.study.keys.Keys;
import flowshy.study.keys.Overlay;
import flowshy.study.text.Node;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.study.text.TextFile;
import flowshy.study.units.Quantity;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;

/** Lays each variant over its study; every problem of every variant is told at once, at its place. */
final class FamilyReader {
    private static final String VARIANTS = "variants";

    private final Node.Mapping root;
    private final TextFile file;
    private final Path folder;
    private final List<String> settings;

    FamilyReader(Node.Mapping root, TextFile file, Path folder, List<String> settings) {
        this.root = root;
        this.file = file;
        this.folder = folder;
        this.settings = settings;
    }

    /** The parts that have keys; what is wrong with the others the key table tells. */
    private List<Part> parts() {
        Optional<Node> value = root.entry(VARIANTS).map(Node.Entry::value);
        if (value.isEmpty() || !(value.get() instanceof Node.Mapping all)) {
            return List.of();
        }
        return all.entries().stream()
                .filter(entry -> entry.value() instanceof Node.Mapping)
                .map(Part::new)
                .toList();
    }

    private Node.Mapping laid(Part part) {
        return Overlay.merge(root.without(List.of(VARIANTS)), part.over());
    }

    /** Every value that variants state, as understood; notes what is wrong with their keys, but not what the base has wrong already. */
    List<Study.Understood> understood(Problems problems) {
        List<Study.Understood> values = new ArrayList<>();
        for (Part part : parts()) {
            for (Field field : form(part, problems).fields()) {
                if (field.given() && part.says(field.position())) {
                    values.add(new Study.Understood(
                            part.path(field.path()),
                            field.written(),
                            field.quantity().map(Quantity::si).orElse(field.written())));
                }
            }
        }
        return values;
    }

    private Form form(Part part, Problems problems) {
        Problems own = new Problems();
        Form form = Keys.read(laid(part), own);
        note(part, own.all(), problems);
        return form;
    }

    private void note(Part part, List<Problem> own, Problems problems) {
        own.stream()
                .filter(problem -> problems.all().stream().noneMatch(told -> same(told, problem)))
                .map(part::inside)
                .forEach(problems::add);
    }

    /** What is accepted may differ: another shape has other keys. */
    private static boolean same(Problem told, Problem own) {
        return told.position().equals(own.position())
                && told.path().equals(own.path())
                && told.found().equals(own.found());
    }

    /** The variants of a base. */
    List<Variant> variants(Study base, Hold hold, boolean chosen) {
        Problems problems = new Problems();
        List<Variant> variants = new ArrayList<>();
        for (Part part : parts()) {
            int before = problems.count();
            Form form = form(part, problems);
            if (problems.count() > before) {
                continue;
            }
            Hold own = chosen || part.over().entry("hold").isEmpty() ? hold : StudyReader.hold(form);
            HeldSuspension held = new HeldSuspension(base, own, part.measuresAnew());
            Problems built = new Problems();
            try {
                Study study =
                        new StudyBuilder(form, built, new FilesRead(folder), Optional.of(held)).build(file, settings);
                variants.add(Variant.of(part.name(), part.changes(), own, form, folder, study));
            } catch (SuspensionException e) {
                String why = "suspension." + e.key() + ": " + e.getMessage();
                variants.add(Variant.none(part.name(), part.changes(), own, form, folder, why));
            } catch (StudyException e) {
                note(part, e.problems(), problems);
            }
        }
        problems.throwIfAny();
        return variants;
    }
}
