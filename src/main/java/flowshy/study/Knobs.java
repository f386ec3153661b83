package flowshy.study;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.medium.Medium;
import flowshy.response.Device;
import flowshy.study.units.Dimension;
import flowshy.verdict.Band;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.Knob;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.design.Sensitivities.Place;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.TreeMap;
import java.util.function.DoubleFunction;

/** Every dimension and property of a study on which the rejection may depend. */
final class Knobs {
    private static final List<String> GROUPS = List.of("hair.", "cover.", "medium.");
    private static final String PIVOT = "suspension.pivot-depth";

    /** Points of a measured profile: all diameters and all lengths stand for them. */
    private static final String POINTS = "hair.points";

    private Knobs() {}

    static List<Knob> of(StudyReader reader, Study study) {
        List<Knob> knobs = new ArrayList<>();
        for (NumberKey number : reader.numbers().all()) {
            if (counts(number)) {
                VariedStudy space = VariedStudy.of(reader, List.of(number));
                knobs.add(new Knob(
                        number.path(),
                        number.base(),
                        number.dimension() == Dimension.TEMPERATURE,
                        value -> space.still().at(value)));
            }
        }
        BandsQuestion question = study.question();
        Device device = question.device();
        if (!(device.hair().profile() instanceof Cylinder)) {
            knobs.add(shape("all diameters of the hair", question, Profile::thickened));
            knobs.add(shape("all lengths of the hair", question, Profile::lengthened));
        }
        Medium medium = device.around();
        knobs.add(fluid(
                "density of the medium", medium.density(), question, value -> with(medium, value, medium.viscosity())));
        knobs.add(fluid(
                "viscosity of the medium",
                medium.viscosity(),
                question,
                value -> with(medium, medium.density(), value)));
        return knobs;
    }

    /** At the frequency of comparison and where the rejection is least, which may be the same. */
    static List<Place> places(Study study, BandsAnswer answer) {
        Map<Double, String> words = new TreeMap<>();
        answer.least().ifPresent(least -> words.put(least.frequency(), least(least.frequency(), study.band())));
        words.merge(
                study.reference(),
                study.calibration().isPresent() ? "calibration" : "middle of the band",
                (one, other) -> one + ", " + other);
        return words.entrySet().stream()
                .map(place -> new Place(place.getKey(), place.getValue()))
                .toList();
    }

    private static String least(double frequency, Band band) {
        String end = frequency == band.from() ? ", its lower end" : frequency == band.to() ? ", its upper end" : "";
        return "least rejection of the band" + end;
    }

    private static boolean counts(NumberKey number) {
        String path = number.path();
        return number.base() > 0.0
                && !path.startsWith(POINTS)
                && (path.equals(PIVOT) || GROUPS.stream().anyMatch(path::startsWith));
    }

    /** One way of making a shape larger. */
    private interface Stretch {
        Profile of(Profile profile, double factor);
    }

    /** The suspension stays: it cancels in the rejection. */
    private static Knob shape(String name, BandsQuestion question, Stretch stretch) {
        Hair hair = question.device().hair();
        return new Knob(name, 1.0, false, factor -> {
            if (factor > hair.profile().room() || factor < 1.0 / hair.profile().room()) {
                throw new NoDesignException(name + ": no room");
            }
            return question.about(question.device().with(hair.reshaped(stretch.of(hair.profile(), factor))));
        });
    }

    private static Knob fluid(String name, double value, BandsQuestion question, DoubleFunction<Medium> law) {
        Device device = question.device();
        return new Knob(name, value, false, changed -> {
            Medium other = law.apply(changed);
            return question.about(
                    new Device(device.hair(), device.suspension(), device.outside(), device.cover(), other));
        });
    }

    private static Medium with(Medium medium, double density, double viscosity) {
        return new Medium(
                medium.name(),
                medium.phase(),
                medium.temperature(),
                medium.pressure(),
                density,
                viscosity,
                medium.soundSpeed(),
                medium.meanFreePath(),
                medium.sources(),
                medium.caveats());
    }
}
