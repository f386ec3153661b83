package flowshy.study;

import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.response.Calibration;
import flowshy.response.Device;
import flowshy.response.Suspension;
import flowshy.stream.Source;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.study.keys.Field;
import flowshy.study.keys.Form;
import flowshy.study.keys.Keys;
import flowshy.study.text.Problems;
import flowshy.study.text.TextFile;
import flowshy.study.units.Quantity;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.envelope.Envelope;
import flowshy.verdict.error.Motion;
import flowshy.verdict.lid.Candidate;
import flowshy.verdict.measured.MeasuredResponse;
import flowshy.verdict.tolerance.Tolerances;
import java.util.ArrayList;
import java.util.Comparator;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.BiFunction;
import java.util.stream.Stream;

/** From checked values to the things they describe; says where values do not go together. */
final class StudyBuilder {
    private final Form form;
    private final Problems problems;
    private final FilesRead files;
    private final MediumBuilder media;
    private final Optional<HeldSuspension> held;

    StudyBuilder(Form form, Problems problems, FilesRead files) {
        this(form, problems, files, Optional.empty());
    }

    /** A variant, whose suspension was measured on another hair. */
    StudyBuilder(Form form, Problems problems, FilesRead files, Optional<HeldSuspension> held) {
        this.held = held;
        this.form = form;
        this.problems = problems;
        this.files = files;
        this.media = new MediumBuilder(form, problems, files);
    }

    Study build(TextFile file, List<String> settings) {
        Optional<Hair> hair = new HairBuilder(form, problems, files).build();
        Optional<Medium> outside = media.build("medium");
        Optional<Band> band = band();
        CoverBuilder covers = new CoverBuilder(form, problems, files, media);
        Optional<CoverBuilder.Fitted> cover = covers.build("cover", hair, outside, band);
        List<Candidate> candidates = candidates(covers, hair, outside, band);
        Optional<Hair> measuredOn = held.map(HeldSuspension::measured).or(() -> hair);
        SuspensionBuilder suspensions = new SuspensionBuilder(form, problems, media, covers, files, measuredOn);
        Optional<Suspension> suspension =
                held.isPresent() ? hair.flatMap(own -> held.get().under(own, suspensions)) : suspensions.build();
        Optional<Calibration> calibration = calibration(cover);
        MotionBuilder motions = new MotionBuilder(form, problems, files);
        Motion motion = motions.build();
        List<Form.Taken> fitted = new ArrayList<>(suspensions.taken());
        fitted.addAll(motions.taken());
        List<Source> surroundings = new ArrayList<>();
        if (outside.isPresent() && hair.isPresent()) {
            SurroundingsBuilder sources = new SurroundingsBuilder(form, problems, files, outside.get(), hair.get());
            surroundings.addAll(sources.build());
            fitted.addAll(sources.taken());
        }
        Acceptance acceptance = acceptance();
        MeasurementBuilder measured = new MeasurementBuilder(form, problems, files);
        List<MeasuredResponse> measurements = measured.build();
        fitted.addAll(measured.taken());
        problems.throwIfAny();
        Device device = new Device(
                hair.orElseThrow(),
                suspension,
                outside.orElseThrow(),
                cover.orElseThrow().cover(),
                cover.orElseThrow().around());
        BiFunction<Optional<Envelope>, Tolerances, Study> known = (envelope, tolerances) -> new Study(
                form.word("title").orElse(""),
                new Study.Origin(file.name(), file.text(), file.sha256(), files.read(), settings),
                device,
                measuredOn.orElseThrow(),
                band.orElseThrow(),
                acceptance,
                calibration,
                candidates,
                motion,
                surroundings,
                measurements,
                envelope,
                tolerances,
                document(),
                takenAs(fitted),
                understood());
        BandsQuestion question = new BandsQuestion(
                device,
                band.orElseThrow(),
                acceptance,
                motion,
                surroundings,
                calibration.map(Calibration::frequency).orElseGet(band.orElseThrow()::middle));
        Study plain = known.apply(Optional.empty(), Tolerances.of(question));
        return form.has("tolerances") || form.has("envelope") ? known.apply(envelope(plain), tolerances(plain)) : plain;
    }

    private Optional<Envelope> envelope(Study base) {
        return form.has("envelope")
                ? new EnvelopeBuilder(form, problems)
                        .build(
                                !base.surroundings().isEmpty(),
                                numbers -> VariedStudy.of(form, files.again(), base, StudyReader.hold(form), numbers))
                : Optional.empty();
    }

    private Tolerances tolerances(Study base) {
        if (!form.has("tolerances")) {
            problems.throwIfAny();
            return base.tolerances();
        }
        Tolerances stated = new ToleranceBuilder(form, problems)
                .build(
                        base.question(),
                        numbers -> VariedStudy.of(form, files.again(), base, StudyReader.hold(form), numbers));
        problems.throwIfAny();
        return stated;
    }

    private List<Candidate> candidates(
            CoverBuilder covers, Optional<Hair> hair, Optional<Medium> outside, Optional<Band> band) {
        List<Candidate> candidates = new ArrayList<>();
        for (int i = 0; form.has("candidates[" + i + "].kind"); i++) {
            covers.build("candidates[" + i + "]", hair, outside, band)
                    .ifPresent(fitted -> candidates.add(new Candidate(fitted.cover(), fitted.around())));
        }
        return candidates;
    }

    Acceptance acceptance() {
        return new AcceptanceBuilder(form, problems).build();
    }

    Optional<Band> band() {
        OptionalDouble from = form.siIfAny("band.from");
        OptionalDouble to = form.siIfAny("band.to");
        if (from.isEmpty() || to.isEmpty()) {
            return Optional.empty();
        }
        if (from.getAsDouble() < to.getAsDouble()) {
            return Optional.of(new Band(from.getAsDouble(), to.getAsDouble()));
        }
        String path = form.given("band.from") ? "band.from" : "band.to";
        String found = "a band from " + form.word("band.from").orElseThrow() + " to "
                + form.word("band.to").orElseThrow() + " is upside down";
        problems.add(form.position(path), path, found, "from lies below to");
        return Optional.empty();
    }

    /** A calibration under the study's own cover, bare, or in a closed cavity far from the hair. */
    private Optional<Calibration> calibration(Optional<CoverBuilder.Fitted> used) {
        if (problems.touches("calibration") || !form.has("calibration.frequency") || used.isEmpty()) {
            return Optional.empty();
        }
        String word = form.word("calibration.cover").orElseThrow();
        Cover own = used.get().cover();
        Optional<Cover> cover = word.equals(own.kind())
                ? Optional.of(own)
                : Stream.of(Covers.OPEN, Covers.SEALED)
                        .filter(c -> c.kind().equals(word))
                        .findFirst();
        if (cover.isEmpty()) {
            problems.add(
                    form.position("calibration.cover"),
                    "calibration.cover",
                    word + " in calibration, but " + own.kind() + " in use",
                    "open, sealed, or the kind that stands under cover");
        }
        return cover.map(c -> new Calibration(form.si("calibration.frequency"), c));
    }

    private Map<String, String> document() {
        Map<String, String> entries = new LinkedHashMap<>();
        for (Field field : form.fields()) {
            if (field.path().startsWith("document.")) {
                entries.put(field.path().substring("document.".length()), field.written());
            }
        }
        return entries;
    }

    private List<Study.TakenAs> takenAs(List<Form.Taken> fitted) {
        List<Form.Taken> all = new ArrayList<>(form.taken());
        all.addAll(fitted);
        all.addAll(media.taken());
        List<String> sources = form.names("surroundings");
        return all.stream()
                .map(t -> new Placed(
                        Keys.place(t.path()),
                        sources.indexOf(source(t.path())),
                        new Study.TakenAs(t.path(), t.value(), t.why())))
                .sorted(Comparator.comparingInt(Placed::place).thenComparingInt(Placed::source))
                .map(Placed::taken)
                .toList();
    }

    /** A default with its place in the list of keys, and among the sources. */
    private record Placed(int place, int source, Study.TakenAs taken) {}

    /** The name in a path of the surroundings, empty for any other. */
    private static String source(String path) {
        String[] words = path.split("\\.", -1);
        return words.length > 1 && words[0].equals("surroundings") ? words[1] : "";
    }

    private List<Study.Understood> understood() {
        return form.fields().stream()
                .filter(field -> field.given() || field.path().startsWith("surroundings."))
                .map(f -> new Study.Understood(
                        f.path(), f.written(), f.quantity().map(Quantity::si).orElse(f.written())))
                .toList();
    }
}
