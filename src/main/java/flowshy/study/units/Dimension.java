package flowshy.study.units;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** What a number measures: which units it may carry, and which SI unit it has inside. */
public enum Dimension {
    /** length [m] */
    LENGTH("a length", "m", Exponents.of(1, 0, 0), "um", "mm", "m", "nm", "cm", "in", "mil"),
    /** area [m²] */
    AREA("an area", "m2", Exponents.of(2, 0, 0), "mm2", "cm2", "um2", "m2"),
    /** volume [m³] */
    VOLUME("a volume", "m3", Exponents.of(3, 0, 0), "mm3", "mL", "cm3", "uL", "m3"),
    /** mass [kg] */
    MASS("a mass", "kg", Exponents.of(0, 1, 0), "ug", "mg", "g", "kg", "ng"),
    /** time [s] */
    TIME("a time", "s", Exponents.of(0, 0, 1), "s", "ms", "us", "min", "h"),
    /** frequency [Hz]; an angular frequency in rad/s is not taken for one */
    FREQUENCY("a frequency", "Hz", Exponents.of(0, 0, -1).with(0, 1), "Hz", "kHz", "mHz", "MHz", "rpm"),
    /** angle [rad] */
    ANGLE("an angle", "rad", Exponents.NONE.with(1, 0), "deg", "rad", "mrad", "urad"),
    /** temperature [K] */
    TEMPERATURE("a temperature", "K", new Exponents(0, 0, 0, 2, 0, 0, 0), "degC", "K", "degF"),
    /** step of temperature [K] */
    TEMPERATURE_STEP("a step of temperature", "K", new Exponents(0, 0, 0, 2, 0, 0, 0), "K", "degC", "mK"),
    /** pressure [Pa] */
    PRESSURE("a pressure", "Pa", Exponents.of(-1, 1, -2), "kPa", "hPa", "Pa", "bar", "mbar", "atm", "Torr", "psi"),
    /** elastic modulus [Pa] */
    ELASTIC_MODULUS("an elastic modulus", "Pa", Exponents.of(-1, 1, -2), "GPa", "MPa", "Pa"),
    /** density [kg/m³] */
    DENSITY("a density", "kg/m3", Exponents.of(-3, 1, 0), "g/cm3", "kg/m3", "kg/L", "g/L"),
    /** dynamic viscosity [Pa·s] */
    VISCOSITY("a dynamic viscosity", "Pa.s", Exponents.of(-1, 1, -1), "mPa.s", "Pa.s", "uPa.s", "cP"),
    /** kinematic viscosity [m²/s] */
    KINEMATIC_VISCOSITY("a kinematic viscosity", "m2/s", Exponents.of(2, 0, -1), "cSt", "mm2/s", "m2/s", "St"),
    /** speed [m/s] */
    SPEED("a speed", "m/s", Exponents.of(1, 0, -1), "m/s", "mm/s", "um/s", "cm/s", "km/h"),
    /** acceleration [m/s²]; in its units g is standard gravity */
    ACCELERATION("an acceleration", "m/s2", Exponents.of(1, 0, -2), "m/s2", "mm/s2", "g", "mg", "ug"),
    /** volume flow [m³/s] */
    VOLUME_FLOW("a volume flow", "m3/s", Exponents.of(3, 0, -1), "L/min", "m3/h", "mL/min", "m3/s"),
    /** force [N] */
    FORCE("a force", "N", Exponents.of(1, 1, -2), "N", "uN", "nN"),
    /** torsional stiffness [N·m/rad] */
    STIFFNESS(
            "a torsional stiffness", "N.m/rad", Exponents.of(2, 1, -2).with(-1, 0), "N.m/rad", "uN.m/rad", "nN.m/rad"),
    /** torsional damping [N·m·s/rad] */
    DAMPING("a torsional damping", "N.m.s/rad", Exponents.of(2, 1, -1).with(-1, 0), "N.m.s/rad", "nN.m.s/rad"),
    /** moment of inertia [kg·m²] */
    INERTIA("a moment of inertia", "kg.m2", Exponents.of(2, 1, 0), "kg.m2", "g.mm2", "mg.mm2"),
    /** amplitude density of an angle [rad/√Hz] */
    ANGLE_NOISE(
            "an angle noise", "rad/rtHz", new Exponents(0, 0, 1, 0, 2, -1, 0), "rad/rtHz", "urad/rtHz", "nrad/rtHz"),
    /** level [dB], kept in decibels */
    LEVEL("a level", "dB", new Exponents(0, 0, 0, 0, 0, 0, 2), "dB"),
    /** share of a whole [-] */
    SHARE("a share", "1", Exponents.NONE, "%", "ppm"),
    /** pure number [-], written without a unit */
    NUMBER("a pure number", "1", Exponents.NONE);

    private final String phrase;
    private final String siUnit;
    private final Exponents exponents;
    private final List<String> units;

    Dimension(String phrase, String siUnit, Exponents exponents, String... units) {
        this.phrase = phrase;
        this.siUnit = siUnit;
        this.exponents = exponents;
        this.units = List.of(units);
    }

    /**
     * Its name with an article, for a message.
     *
     * @return e.g. {@code a length}
     */
    public String phrase() {
        return phrase;
    }

    /**
     * Its name in plain words.
     *
     * @return e.g. {@code length}
     */
    public String words() {
        return phrase.substring(phrase.indexOf(' ') + 1);
    }

    /**
     * The unit that its values have inside the program.
     *
     * @return SI unit as a study would write it; {@code 1} for shares and pure numbers; {@code dB} for levels
     */
    public String siUnit() {
        return siUnit;
    }

    /**
     * Units to propose, the likeliest first.
     *
     * @return spellings that are accepted; empty for a pure number
     */
    public List<String> units() {
        return units;
    }

    /**
     * Whether rms or peak may follow the unit.
     *
     * @return true for accelerations and speeds
     */
    public boolean swings() {
        return this == ACCELERATION || this == SPEED;
    }

    /** Exponents of its SI unit. */
    Exponents exponents() {
        return exponents;
    }

    /** Whether {@code g} in its units is standard gravity, not the gram. */
    boolean gravity() {
        return this == ACCELERATION;
    }

    /** Whether a unit of these exponents fits. Leaving out the radian is usual for stiffness; an angle must have it. */
    boolean accepts(Exponents found) {
        boolean radian = found.radian() == exponents.radian() || (found.radian() == 0 && this != ANGLE);
        boolean cycle = found.cycle() == exponents.cycle() || (found.cycle() == 0 && this != FREQUENCY);
        return this != NUMBER && radian && cycle && found.sameKind(exponents);
    }

    /** The first dimension that such a unit belongs to. */
    static Optional<Dimension> of(Exponents found) {
        return Arrays.stream(values()).filter(d -> d.accepts(found)).findFirst();
    }
}
