package flowshy.verdict.figure;

import flowshy.math.Caveat.Subject;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;
import java.util.function.Function;
import org.hipparchus.util.FastMath;

/**
 * The named quantities of a device. What is said to be at the frequency of comparison belongs to {@link Evaluated#frequency}; the rest
 * belongs to the device, or to its whole band of use. The numbers are those of an answer to the main question.
 */
public enum Figure {
    /** mass */
    MASS(
            "mass",
            "mass of the hair",
            FigureUnit.MASS,
            Sense.AT_MOST,
            Subject.HAIR,
            device ->
                    Found.of(device.device().hair().density() * device.moments().volume())),
    /** volume */
    VOLUME(
            "volume",
            "volume of the hair",
            FigureUnit.VOLUME,
            Sense.NONE,
            Subject.HAIR,
            device -> Found.of(device.moments().volume())),
    /** moment of inertia */
    INERTIA(
            "inertia",
            "moment of inertia of the hair about the pivot",
            FigureUnit.INERTIA,
            Sense.NONE,
            Subject.HAIR,
            device ->
                    Found.of(device.device().hair().density() * device.moments().second())),
    /** inertial torque */
    INERTIAL_TORQUE(
            "inertial-torque",
            "torque of the hair's own inertia per acceleration",
            FigureUnit.TORQUE_PER_ACCELERATION,
            Sense.AT_LEAST,
            Subject.HAIR,
            device ->
                    Found.of(device.device().hair().density() * device.moments().first())),
    /** largest diameter */
    FOOTPRINT(
            "footprint",
            "largest diameter of the hair, the circle it needs seen from above",
            FigureUnit.LENGTH,
            Sense.AT_MOST,
            Subject.HAIR,
            device -> Found.of(2.0 * device.device().hair().profile().largestRadius())),
    /** length */
    LENGTH(
            "length",
            "length of the hair from wall to tip",
            FigureUnit.LENGTH,
            Sense.AT_MOST,
            Subject.HAIR,
            device -> Found.of(device.device().hair().profile().length())),
    /** slenderness */
    SLENDERNESS(
            "slenderness",
            "length over largest diameter",
            FigureUnit.NUMBER,
            Sense.AT_LEAST,
            Subject.HAIR,
            device -> Found.of(device.device().hair().profile().length()
                    / (2.0 * device.device().hair().profile().largestRadius()))),
    /** resonance */
    RESONANCE(
            "resonance",
            "resonance in the medium around the hair",
            FigureUnit.FREQUENCY,
            Sense.NONE,
            Subject.RESONANCE,
            Swinging::resonance),
    /** quality factor */
    QUALITY(
            "quality",
            "quality factor in the medium around the hair",
            FigureUnit.NUMBER,
            Sense.NONE,
            Subject.RESONANCE,
            Swinging::quality),
    /** sensitivity */
    SENSITIVITY(
            "sensitivity",
            "angle per acceleration of the base, at the frequency of comparison",
            FigureUnit.ANGLE_PER_ACCELERATION,
            Sense.AT_LEAST,
            Subject.MOTION,
            Swinging::sensitivity),
    /** flow sensitivity */
    FLOW_SENSITIVITY(
            "flow-sensitivity",
            "angle per speed of the flow outside, at the frequency of comparison",
            FigureUnit.ANGLE_PER_SPEED,
            Sense.AT_MOST,
            Subject.FLOW,
            Swinging::flowSensitivity),
    /** noise */
    NOISE(
            "noise",
            "thermal and readout noise as acceleration, at the frequency of comparison",
            FigureUnit.ACCELERATION_NOISE,
            Sense.AT_MOST,
            Subject.NOISE,
            Swinging::noise),
    /** worst noise */
    WORST_NOISE(
            "worst-noise",
            "the same where it is largest in the band",
            FigureUnit.ACCELERATION_NOISE,
            Sense.AT_MOST,
            Subject.NOISE,
            Swinging::worstNoise),
    /** noise over the band */
    NOISE_RMS(
            "noise-rms",
            "thermal and readout noise as acceleration over the band, rms",
            FigureUnit.ACCELERATION,
            Sense.AT_MOST,
            Subject.NOISE,
            Swinging::noiseRms),
    /** rejection */
    REJECTION(
            "rejection",
            "motion over flow response at equal acceleration, at the frequency of comparison",
            FigureUnit.LEVEL,
            Sense.AT_LEAST,
            Subject.REJECTION,
            device -> Rejecting.at(device, device.frequency())),
    /** least rejection */
    LEAST_REJECTION(
            "least-rejection",
            "least rejection in the band",
            FigureUnit.LEVEL,
            Sense.AT_LEAST,
            Subject.REJECTION,
            Rejecting::least),
    /** rejection at the lower end of the band */
    REJECTION_FROM(
            "rejection-from",
            "rejection at the lower end of the band",
            FigureUnit.LEVEL,
            Sense.AT_LEAST,
            Subject.REJECTION,
            device -> Rejecting.at(device, device.question().band().from())),
    /** rejection at the upper end of the band */
    REJECTION_TO(
            "rejection-to",
            "rejection at the upper end of the band",
            FigureUnit.LEVEL,
            Sense.AT_LEAST,
            Subject.REJECTION,
            device -> Rejecting.at(device, device.question().band().to())),
    /** width of what reads motion */
    MOTION_WIDTH(
            "motion-width",
            "width of all of the band that reads motion",
            FigureUnit.FREQUENCY,
            Sense.AT_LEAST,
            Subject.REJECTION,
            device -> Rejecting.width(device, (from, to) -> to - from)),
    /** the same in octaves */
    MOTION_OCTAVES(
            "motion-octaves",
            "the same in octaves",
            FigureUnit.NUMBER,
            Sense.AT_LEAST,
            Subject.REJECTION,
            device -> Rejecting.width(device, (from, to) -> FastMath.log(to / from) / FastMath.log(2.0))),
    /** lowest frequency that reads motion */
    MOTION_FROM(
            "motion-from",
            "lowest frequency of the band that reads motion",
            FigureUnit.FREQUENCY,
            Sense.AT_MOST,
            Subject.REJECTION,
            Rejecting::motionFrom),
    /** highest frequency that reads motion */
    MOTION_TO(
            "motion-to",
            "highest frequency of the band that reads motion",
            FigureUnit.FREQUENCY,
            Sense.AT_LEAST,
            Subject.REJECTION,
            Rejecting::motionTo),
    /** equivalent acceleration per flow speed */
    EQUIVALENT(
            "equivalent",
            "acceleration that reads as much as flow of unit speed, at the frequency of comparison",
            FigureUnit.ACCELERATION_PER_SPEED,
            Sense.AT_MOST,
            Subject.REJECTION,
            Rejecting::equivalent),
    /** largest flow speed */
    LARGEST_SPEED(
            "largest-speed",
            "largest flow speed that keeps the error limit, at the frequency of comparison",
            FigureUnit.SPEED,
            Sense.AT_LEAST,
            Subject.REJECTION,
            Rejecting::largestSpeed),
    /** error of the surroundings */
    ERROR(
            "error",
            "error of the surroundings over the band, rms",
            FigureUnit.ACCELERATION,
            Sense.AT_MOST,
            Subject.ERROR,
            Disturbed::error),
    /** offset of mean streams */
    OFFSET(
            "offset",
            "offset by mean streams as acceleration, its size",
            FigureUnit.ACCELERATION,
            Sense.AT_MOST,
            Subject.ERROR,
            Disturbed::offset),
    /** smallest readable motion */
    SMALLEST_READABLE(
            "smallest-readable",
            "acceleration that equals error and noise together over the band, rms",
            FigureUnit.ACCELERATION,
            Sense.AT_MOST,
            Subject.ERROR,
            Disturbed::smallestReadable),
    /** dynamic range */
    DYNAMIC_RANGE(
            "dynamic-range",
            "full scale of the motion over the smallest readable",
            FigureUnit.LEVEL,
            Sense.AT_LEAST,
            Subject.ERROR,
            Disturbed::dynamicRange),
    /** static tilt */
    STATIC_TILT(
            "static-tilt",
            "largest static tilt: that of gravity and that of mean streams together",
            FigureUnit.ANGLE,
            Sense.AT_MOST,
            Subject.MOTION,
            Disturbed::staticTilt),
    /** tilt by gravity */
    GRAVITY_TILT(
            "gravity-tilt",
            "static tilt by gravity, its size",
            FigureUnit.ANGLE,
            Sense.AT_MOST,
            Subject.MOTION,
            Disturbed::gravityTilt),
    /** tilt by mean streams */
    STREAM_TILT(
            "stream-tilt",
            "static tilt by mean streams, its size",
            FigureUnit.ANGLE,
            Sense.AT_MOST,
            Subject.ERROR,
            Disturbed::streamTilt),
    /** first bending frequency */
    BENDING_FREQUENCY(
            "bending-frequency",
            "first bending frequency of the hair in the medium around it",
            FigureUnit.FREQUENCY,
            Sense.AT_LEAST,
            Subject.HAIR,
            Bending::frequency),
    /** bending frequency over resonance */
    BENDING_RATIO(
            "bending-ratio",
            "first bending frequency over resonance",
            FigureUnit.NUMBER,
            Sense.AT_LEAST,
            Subject.HAIR,
            Bending::ratio),
    /** bending stiffness */
    BENDING_STIFFNESS(
            "bending-stiffness",
            "bending stiffness of the hair at its foot, EI/L",
            FigureUnit.STIFFNESS,
            Sense.AT_LEAST,
            Subject.HAIR,
            Bending::stiffness),
    /** bending stiffness over the suspension's */
    BENDING_STIFFNESS_RATIO(
            "bending-stiffness-ratio",
            "bending stiffness over that of the suspension",
            FigureUnit.NUMBER,
            Sense.AT_LEAST,
            Subject.HAIR,
            Bending::stiffnessRatio),
    /** room over the tip */
    TIP_CLEARANCE(
            "tip-clearance",
            "room between the tip and the roof or cavity over it",
            FigureUnit.LENGTH,
            Sense.AT_LEAST,
            Subject.COVER,
            Bending::clearance);

    private final String word;
    private final String words;
    private final FigureUnit unit;
    private final Sense sense;
    private final Subject subject;

    /** A method reference or lambda without captured state, which the checker cannot see. */
    @SuppressWarnings("ImmutableEnumChecker")
    private final Function<Evaluated, Found> law;

    Figure(String word, String words, FigureUnit unit, Sense sense, Subject subject, Function<Evaluated, Found> law) {
        this.word = word;
        this.words = words;
        this.unit = unit;
        this.sense = sense;
        this.subject = subject;
        this.law = law;
    }

    /**
     * Its name in studies and options.
     *
     * @return words with hyphens, e.g. {@code inertial-torque}
     */
    public String word() {
        return word;
    }

    /**
     * What it is.
     *
     * @return a clause
     */
    public String words() {
        return words;
    }

    /**
     * Its unit.
     *
     * @return SI unit and the one that is printed
     */
    public FigureUnit unit() {
        return unit;
    }

    /**
     * Which way it is good.
     *
     * @return the sense of a limit that is a plain number
     */
    public Sense sense() {
        return sense;
    }

    /**
     * Which caveats touch it: one of them that says a model has ended leaves a limit on it undecided.
     *
     * @return the subject
     */
    public Subject subject() {
        return subject;
    }

    /**
     * Its name for programs.
     *
     * @return ends in its unit, e.g. {@code mass_kg}
     */
    public String column() {
        String name = word.replace('-', '_');
        return unit.suffix().isEmpty() ? name : name + "_" + unit.suffix();
    }

    /**
     * Its value for a device.
     *
     * @param device the device
     * @return the value in SI, or why there is none
     */
    public Found of(Evaluated device) {
        return law.apply(device);
    }

    /**
     * The quantity of a name.
     *
     * @param word its name
     * @return empty if there is none
     */
    public static Optional<Figure> named(String word) {
        return Arrays.stream(values())
                .filter(figure -> figure.word.equals(word))
                .findFirst();
    }

    /**
     * Every name.
     *
     * @return in the order of the table
     */
    public static List<String> names() {
        return Arrays.stream(values()).map(Figure::word).toList();
    }
}
