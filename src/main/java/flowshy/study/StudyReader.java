package flowshy.study;

import flowshy.response.Hold;
import flowshy.study.keys.Field;
import flowshy.study.keys.Form;
import flowshy.study.keys.Keys;
import flowshy.study.keys.Overlay;
import flowshy.study.text.Node;
import flowshy.study.text.Problems;
import flowshy.study.text.Setting;
import flowshy.study.text.StudyException;
import flowshy.study.text.StudyText;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.design.Sensitivities;
import flowshy.verdict.design.SensitivityQuestion;
import java.nio.file.Path;
import java.util.Comparator;
import java.util.List;
import java.util.Map;
import java.util.Optional;

/** From a file and the settings of the command line to a study; every problem is told at once. */
public final class StudyReader {
    private final StudyText text;
    private final Path folder;
    private final List<String> settings;

    private StudyReader(StudyText text, Path folder, List<String> settings) {
        this.text = text;
        this.folder = folder;
        this.settings = List.copyOf(settings);
    }

    /**
     * Reads a study.
     *
     * @param file study file; the files it names are looked for beside it
     * @param settings KEY=VALUE words that overlay the file, the later one wins
     * @return the study
     * @throws StudyException with every problem of file and settings
     */
    public static Study read(Path file, List<String> settings) {
        return open(file, settings).study();
    }

    /**
     * Opens a study file without reading its values yet.
     *
     * @param file study file
     * @param settings KEY=VALUE words
     * @return a reader of this one study
     * @throws StudyException if the file is not readable or not YAML
     */
    public static StudyReader open(Path file, List<String> settings) {
        Path parent = file.toAbsolutePath().getParent();
        return new StudyReader(StudyText.read(file), parent == null ? file : parent, settings);
    }

    /**
     * The study as written, settings laid over.
     *
     * @return the study
     * @throws StudyException with every problem
     */
    public Study study() {
        Problems problems = new Problems();
        Node.Mapping root = overlaid(problems);
        Form form = Keys.read(root, problems);
        List<Study.Understood> variants = family(root).understood(problems);
        return build(form, problems).alsoUnderstood(variants);
    }

    /**
     * The study with its variants, each held to the base's suspension.
     *
     * @param chosen what of the suspension stays, empty for what the study or a variant says
     * @return base and variants
     * @throws StudyException with every problem
     */
    public Family family(Optional<Hold> chosen) {
        Study base = study();
        Form form = form();
        Hold hold = chosen.orElseGet(() -> hold(form));
        return new Family(
                Variant.of(base.origin().file(), List.of(), hold, form, folder, base),
                hold,
                family(overlaid(new Problems())).variants(base, hold, chosen.isPresent()));
    }

    /**
     * What every dimension and property does to the rejection: at the frequency of comparison and where the rejection is least.
     *
     * @param study read by this reader
     * @param answer to its question
     * @return by each positive number of the study's hair, cover and medium, and some of them together
     */
    public Sensitivities sensitivities(Study study, BandsAnswer answer) {
        return new SensitivityQuestion(study.device(), Knobs.of(this, study), Knobs.places(study, answer)).answer();
    }

    private FamilyReader family(Node.Mapping root) {
        return new FamilyReader(root, text.file(), folder, settings);
    }

    /**
     * The checked values, for commands that replace one of them many times.
     *
     * @return values by path
     * @throws StudyException with every problem
     */
    public Form form() {
        Problems problems = new Problems();
        Form form = Keys.read(overlaid(problems), problems);
        problems.throwIfAny();
        return form;
    }

    /**
     * The numbers of the study that can be varied.
     *
     * @return by the path of their key
     * @throws StudyException with every problem
     */
    public NumberKeys numbers() {
        return new NumberKeys(form());
    }

    /**
     * What of the suspension stays when another hair takes the place of the one measured.
     *
     * @return as the study says, else the stiffness
     * @throws StudyException with every problem
     */
    public Hold hold() {
        return hold(form());
    }

    static Hold hold(Form form) {
        String word = form.word("hold").orElse(Hold.STIFFNESS.word());
        return word.equals(Hold.RESONANCE.word()) ? Hold.RESONANCE : Hold.STIFFNESS;
    }

    /**
     * The study of changed values; nothing is parsed again.
     *
     * @param form values by path
     * @return the study
     * @throws StudyException if the values do not go together
     */
    public Study study(Form form) {
        return build(form, new Problems());
    }

    /** A reader of a text that is not in a file yet; the files it names are looked for in a folder. */
    static StudyReader of(StudyText text, Path folder) {
        return new StudyReader(text, folder, List.of());
    }

    /** The file as named, made absolute. */
    Path file() {
        return Path.of(text.file().name()).toAbsolutePath().normalize();
    }

    /** The text of the file. */
    String text() {
        return text.file().text();
    }

    /** Settings laid over it, in order. */
    List<String> settings() {
        return settings;
    }

    /**
     * The text of the study file with numbers replaced where they stand; all else stays as it was.
     *
     * @param numbers values as a study writes them, by the path of their key
     * @return the text
     * @throws StudyException if a number does not stand in the file itself
     */
    public String rewritten(Map<String, String> numbers) {
        Form form = form();
        Rewriting rewriting = new Rewriting(text.file().text());
        numbers.entrySet().stream()
                .map(number -> Map.entry(form.field(number.getKey()).orElseThrow(), number.getValue()))
                .sorted(Map.Entry.<Field, String>comparingByKey(Comparator.comparing(Field::position))
                        .reversed()) // from the end: what stands before keeps its place
                .forEach(number -> rewriting.replace(number.getKey(), number.getValue()));
        return rewriting.text();
    }

    /** Folder in which the files that the study names are looked for. */
    Path folder() {
        return folder;
    }

    private Study build(Form form, Problems problems) {
        return new StudyBuilder(form, problems, new FilesRead(folder)).build(text.file(), settings);
    }

    private Node.Mapping overlaid(Problems problems) {
        Node.Mapping root = text.root();
        for (String setting : settings) {
            try {
                root = Overlay.set(root, Setting.read("--set", setting));
            } catch (StudyException e) {
                e.problems().forEach(problems::add);
            }
        }
        return root;
    }
}
