package flowshy.study;

import flowshy.hair.Hair;
import flowshy.hair.LengthModel;
import flowshy.medium.Medium;
import flowshy.medium.MediumException;
import flowshy.medium.MediumQuery;
import flowshy.response.Device;
import flowshy.response.Hold;
import flowshy.response.Suspension;
import flowshy.response.SuspensionException;
import flowshy.response.SuspensionStatement;
import flowshy.stream.Source;
import flowshy.stream.UnfitMediumException;
import flowshy.stream.cover.Cover;
import flowshy.study.keys.Form;
import flowshy.study.text.Problem;
import flowshy.study.text.Problems;
import flowshy.study.text.StudyException;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.envelope.StatesOfUse;
import flowshy.verdict.error.Motion;
import flowshy.verdict.lid.Candidate;
import java.nio.file.Path;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.concurrent.ConcurrentHashMap;

/**
 * A study some of whose numbers vary: only what depends on them is made anew, the rest is the base's. What was measured of the
 * suspension is solved on the base and held; a number of the measurement itself that varies, such as {@code suspension.quality.value}, is
 * solved anew on the base's hair. A default that the base took from another key stays as it was taken: a can filled at the base's temperature
 * is then used at another.
 */
public final class VariedStudy implements StatesOfUse {
    /** Keys of the suspension that were measured; the others say how it is built. */
    private static final List<String> MEASURED = List.of(
            "suspension.stiffness",
            "suspension.resonance.",
            "suspension.damping.",
            "suspension.quality.",
            "suspension.ring-down.");

    /** Media kept for a grid that comes back to them; moist air takes twenty times as long as the rest of a point. */
    private static final int KEPT = 4096;

    private static final List<String> MATERIAL = List.of("hair.density", "hair.youngs-modulus", "hair.foot-gap");

    private final Form form;
    private final FilesRead files;
    private final Study base;
    private final Hold hold;
    private final List<NumberKey> numbers;
    private final List<String> paths;
    private final Moving moving;
    private final LengthModel model;
    private final boolean surrounded;
    private final DevicePlace place;
    private final Map<List<Double>, Medium> known = new ConcurrentHashMap<>();

    private VariedStudy(
            Form form,
            FilesRead files,
            Study base,
            Hold hold,
            List<NumberKey> numbers,
            boolean surrounded,
            DevicePlace place) {
        this.form = form;
        this.files = files;
        this.base = base;
        this.hold = hold;
        this.numbers = List.copyOf(numbers);
        this.paths = List.copyOf(numbers.stream().map(NumberKey::path).toList()); // a copy that needs no copy
        this.moving = Moving.of(paths, place.path());
        this.model = over(base.device().hair().lengthModel(), paths);
        this.surrounded = surrounded;
        this.place = place;
    }

    /**
     * A study with numbers that vary; what the study says under {@code hold} is held.
     *
     * @param reader of the study
     * @param numbers the numbers, of {@link StudyReader#numbers}
     * @return the space of these numbers
     * @throws StudyException with every problem of the study
     */
    public static VariedStudy of(StudyReader reader, List<NumberKey> numbers) {
        return of(reader, numbers, reader.hold());
    }

    /**
     * A study with numbers that vary.
     *
     * @param reader of the study
     * @param numbers the numbers, of {@link StudyReader#numbers}
     * @param hold what of the suspension stays
     * @return the space of these numbers
     * @throws StudyException with every problem of the study
     */
    public static VariedStudy of(StudyReader reader, List<NumberKey> numbers, Hold hold) {
        Form form = reader.form();
        Study base = reader.study(form);
        return new VariedStudy(
                form, new FilesRead(reader.folder()), base, hold, numbers, true, DevicePlace.own(base.device()));
    }

    /** The space of a study that is made already. */
    static VariedStudy of(Form form, Path folder, Study base, Hold hold, List<NumberKey> numbers) {
        return of(form, new FilesRead(folder), base, hold, numbers);
    }

    /** The same, whose files have been read. */
    static VariedStudy of(Form form, FilesRead files, Study base, Hold hold, List<NumberKey> numbers) {
        return new VariedStudy(form, files, base, hold, numbers, true, DevicePlace.own(base.device()));
    }

    /**
     * The study as it stands.
     *
     * @return the base
     */
    public Study base() {
        return base;
    }

    /**
     * What of the suspension stays.
     *
     * @return as chosen
     */
    public Hold hold() {
        return hold;
    }

    /**
     * The numbers that vary.
     *
     * @return in the order of the values
     */
    public List<NumberKey> numbers() {
        return numbers;
    }

    /**
     * The model of finite length over numbers that vary: each shape, and each depth of the pivot, would be solved anew.
     *
     * @param model of the study
     * @param paths of the numbers
     * @return the estimate in place of auto where they change the shape, else the same
     */
    static LengthModel over(LengthModel model, List<String> paths) {
        return shape(paths) || paths.contains("suspension.pivot-depth") ? model.overShapes() : model;
    }

    private static boolean shape(List<String> paths) {
        return paths.stream().anyMatch(path -> path.startsWith("hair.") && !MATERIAL.contains(path));
    }

    /**
     * How the length of the hair is seen at every point: over many shapes the estimate stands for a solution that is taken by default.
     *
     * @return off, the estimate, auto or on
     */
    public LengthModel model() {
        return model;
    }

    @Override
    public List<String> keys() {
        return paths;
    }

    @Override
    public StatesOfUse still() {
        return new VariedStudy(form, files, base, hold, numbers, false, place);
    }

    @Override
    public StatesOfUse under(Candidate candidate) {
        return at(DevicePlace.under(base, candidate));
    }

    @Override
    public StatesOfUse filled(MediumQuery fluid, Cover cover) {
        return at(DevicePlace.filled(fluid, cover));
    }

    private VariedStudy at(DevicePlace there) {
        return new VariedStudy(form, files, base, hold, numbers, surrounded, there);
    }

    @Override
    public BandsQuestion at(double... values) {
        if (values.length != numbers.size()) {
            throw new IllegalArgumentException(values.length + " values for " + numbers.size() + " keys");
        }
        for (int i = 0; i < values.length; i++) {
            NumberKey key = numbers.get(i);
            if (!key.admits(values[i])) {
                String found = Double.isFinite(values[i]) ? key.written(values[i]) : "no finite number";
                throw new NoDesignException(key.path() + ": " + found + " lies outside "
                        + key.measure().least() + " to " + key.measure().most());
            }
        }
        Problems problems = new Problems();
        try {
            Optional<BandsQuestion> question = new Point(form.with(paths, values), problems).question();
            if (question.isPresent() && problems.count() == 0) {
                return question.get();
            }
        } catch (StudyException e) {
            e.problems().forEach(problems::add);
        } catch (SuspensionException e) {
            throw new NoDesignException("suspension." + e.key() + ": " + e.getMessage());
        } catch (MediumException | UnfitMediumException e) {
            throw new NoDesignException(e.getMessage()); // of a fluid in place of the study's
        }
        throw new NoDesignException(problems.first().map(VariedStudy::said).orElse("the values make no device"));
    }

    private static String said(Problem problem) {
        String accepted = problem.accepted().isEmpty() ? "" : "; " + problem.accepted();
        return problem.path() + ": " + problem.found() + accepted;
    }

    /** Which parts of a study have numbers that vary; of a cover, those of the medium and the band it depends on count too. */
    private record Moving(
            boolean hair,
            boolean shape,
            boolean medium,
            boolean cover,
            boolean suspension,
            boolean measured,
            boolean band,
            boolean acceptance,
            boolean motion,
            boolean surroundings) {
        static Moving of(List<String> paths, String cover) {
            boolean medium = any(paths, List.of("medium."));
            boolean band = any(paths, List.of("band."));
            return new Moving(
                    any(paths, List.of("hair.")),
                    VariedStudy.shape(paths),
                    medium,
                    !cover.isEmpty() && (medium || band || any(paths, List.of(cover + "."))),
                    any(paths, List.of("suspension.")),
                    any(paths, MEASURED),
                    band,
                    any(paths, List.of("accept.")),
                    any(paths, List.of("motion.")),
                    any(paths, List.of("surroundings.")));
        }

        private static boolean any(List<String> paths, List<String> beginnings) {
            return paths.stream().anyMatch(path -> beginnings.stream().anyMatch(path::startsWith));
        }
    }

    /** One point of the space: each part made anew only where it depends on what varies. */
    private final class Point {
        private final Form now;
        private final Problems problems;

        Point(Form now, Problems problems) {
            this.now = now;
            this.problems = problems;
        }

        private StudyBuilder studies() {
            return new StudyBuilder(now, problems, files.again());
        }

        private MediumBuilder media() {
            return new MediumBuilder(now, problems, files.again());
        }

        private CoverBuilder covers() {
            return new CoverBuilder(now, problems, files.again(), media());
        }

        Optional<BandsQuestion> question() {
            Optional<Hair> hair = hair();
            Optional<Medium> outside = outside();
            Optional<Band> band = moving.band() ? studies().band() : Optional.of(base.band());
            if (hair.isEmpty() || outside.isEmpty() || band.isEmpty()) {
                return Optional.empty();
            }
            Optional<CoverBuilder.Fitted> cover = cover(hair.get(), outside.get(), band.get());
            if (cover.isEmpty()) {
                return Optional.empty();
            }
            Device device = new Device(
                    hair.get(),
                    suspension(hair.get()),
                    outside.get(),
                    cover.get().cover(),
                    cover.get().around());
            Acceptance acceptance = moving.acceptance() ? studies().acceptance() : base.acceptance();
            Motion motion = moving.motion() ? new MotionBuilder(now, problems, files.again()).build() : base.motion();
            List<Source> sources = surrounded ? sources(hair.get(), outside.get()) : List.of();
            return Optional.of(
                    new BandsQuestion(device, band.get(), acceptance, motion, sources, reference(band.get())));
        }

        private Optional<Medium> outside() {
            if (place.fluid().isPresent()) {
                return Optional.of(place.fluidAt(
                        now.si("medium.temperature"),
                        now.siIfAny("medium.pressure")
                                .orElse(base.device().outside().pressure())));
            }
            return moving.medium() ? medium() : Optional.of(base.device().outside());
        }

        private double reference(Band band) {
            return base.calibration().isPresent() ? now.si("calibration.frequency") : band.middle();
        }

        private Optional<Medium> medium() {
            List<Double> state = paths.stream()
                    .filter(path -> path.startsWith("medium."))
                    .map(now::si)
                    .toList();
            Optional<Medium> kept = Optional.ofNullable(known.get(state));
            if (kept.isPresent()) {
                return kept;
            }
            Optional<Medium> made = media().build("medium");
            if (known.size() >= KEPT) {
                known.clear();
            }
            made.ifPresent(medium -> known.put(state, medium));
            return made;
        }

        private Optional<Hair> hair() {
            Hair there = base.device().hair();
            if (!moving.hair()) {
                return Optional.of(there.lengthModel() == model ? there : there.seenAs(model));
            }
            HairBuilder builder = new HairBuilder(now, problems, files.again());
            return moving.shape() ? builder.build(model) : Optional.of(builder.of(there, model));
        }

        private Optional<CoverBuilder.Fitted> cover(Hair hair, Medium outside, Band band) {
            String path = place.path();
            if (moving.cover()) {
                return covers().build(path, Optional.of(hair), Optional.of(outside), Optional.of(band));
            }
            return new CoverFit(now, problems).fits(path.isEmpty() ? "cover" : path, place.cover(), hair)
                    ? Optional.of(new CoverBuilder.Fitted(
                            place.cover(),
                            path.isEmpty() ? outside : place.around().orElse(outside)))
                    : Optional.empty();
        }

        private Optional<Suspension> suspension(Hair hair) {
            Optional<Suspension> there = base.device().suspension();
            boolean anew = moving.suspension() || (moving.hair() && hold != Hold.STIFFNESS);
            if (there.isEmpty() || !anew) {
                return there;
            }
            Hair measured =
                    moving.measured() ? base.measuredOn() : base.device().hair();
            SuspensionBuilder builder =
                    new SuspensionBuilder(now, problems, media(), covers(), files.again(), Optional.of(measured));
            Optional<SuspensionStatement> statement = builder.statement();
            Optional<Suspension> solved = moving.measured() ? builder.solved(statement, measured) : there;
            return statement.isEmpty() || solved.isEmpty()
                    ? Optional.empty()
                    : Optional.of(hold.on(hair, measured, solved.get(), statement.get()));
        }

        private List<Source> sources(Hair hair, Medium outside) {
            if (place.fluid().isPresent()) {
                // what the study has outside need not bear the state: its sources are taken over from its own
                List<Source> stated = sources(
                        moving.surroundings() || moving.hair(),
                        hair,
                        base.device().outside());
                return place.cover().closed()
                        ? stated
                        : stated.stream().map(source -> source.in(outside)).toList();
            }
            return sources(moving.surroundings() || moving.hair() || moving.medium(), hair, outside);
        }

        private List<Source> sources(boolean anew, Hair hair, Medium outside) {
            return base.surroundings().isEmpty() || !anew
                    ? base.surroundings()
                    : new SurroundingsBuilder(now, problems, files.again(), outside, hair).build();
        }
    }
}
