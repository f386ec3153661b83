package flowshy.study.units;

import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/** What a number measures: which units it may carry, and which SI unit it has inside. */
public enum Dimension {
    /** length [m] */
    LENGTH("a length", "m", "um mm m nm cm in mil"),
    /** area [m²] */
    AREA("an area", "m2", "mm2 cm2 um2 m2"),
    /** volume [m³] */
    VOLUME("a volume", "m3", "mm3 mL cm3 uL m3"),
    /** mass [kg] */
    MASS("a mass", "kg", "ug mg g kg ng"),
    /** time [s] */
    TIME("a time", "s", "s ms us min h"),
    /** frequency [Hz]; an angular frequency in rad/s is not taken for one */
    FREQUENCY("a frequency", "Hz", "Hz kHz mHz MHz rpm"),
    /** angle [rad] */
    ANGLE("an angle", "rad", "deg rad mrad urad"),
    /** temperature [K] */
    TEMPERATURE("a temperature", "K", "degC K degF"),
    /** step of temperature [K] */
    TEMPERATURE_STEP("a step of temperature", "K", "K degC mK"),
    /** pressure [Pa] */
    PRESSURE("a pressure", "Pa", "kPa hPa Pa bar mbar atm Torr psi"),
    /** elastic modulus [Pa] */
    ELASTIC_MODULUS("an elastic modulus", "Pa", "GPa MPa Pa"),
    /** density [kg/m³] */
    DENSITY("a density", "kg/m3", "g/cm3 kg/m3 kg/L g/L"),
    /** dynamic viscosity [Pa·s] */
    VISCOSITY("a dynamic viscosity", "Pa.s", "mPa.s Pa.s uPa.s cP"),
    /** kinematic viscosity [m²/s] */
    KINEMATIC_VISCOSITY("a kinematic viscosity", "m2/s", "cSt mm2/s m2/s St"),
    /** speed [m/s] */
    SPEED("a speed", "m/s", "m/s mm/s um/s cm/s km/h"),
    /** acceleration [m/s²]; in its units g is standard gravity */
    ACCELERATION("an acceleration", "m/s2", "m/s2 mm/s2 g mg ug"),
    /** one-sided density of an acceleration [(m/s²)²/Hz]; in its units g is standard gravity */
    ACCELERATION_DENSITY("an acceleration density", "(m/s2)2/Hz", "g2/Hz (m/s2)2/Hz mg2/Hz (mm/s2)2/Hz"),
    /** volume flow [m³/s] */
    VOLUME_FLOW("a volume flow", "m3/s", "L/min m3/h mL/min m3/s"),
    /** force [N] */
    FORCE("a force", "N", "N uN nN"),
    /** torsional stiffness [N·m/rad] */
    STIFFNESS("a torsional stiffness", "N.m/rad", "N.m/rad uN.m/rad nN.m/rad"),
    /** torsional damping [N·m·s/rad] */
    DAMPING("a torsional damping", "N.m.s/rad", "N.m.s/rad nN.m.s/rad"),
    /** moment of inertia [kg·m²] */
    INERTIA("a moment of inertia", "kg.m2", "kg.m2 g.mm2 mg.mm2"),
    /** amplitude density of an angle [rad/√Hz] */
    ANGLE_NOISE("an angle noise", "rad/rtHz", "rad/rtHz urad/rtHz nrad/rtHz"),
    /** amplitude density of an acceleration [m/s²/√Hz]; in its units g is standard gravity */
    ACCELERATION_NOISE("an acceleration noise", "m/s2/rtHz", "m/s2/rtHz ug/rtHz mg/rtHz"),
    /** torque per acceleration [N·m per m/s²] */
    TORQUE_PER_ACCELERATION("a torque per acceleration", "N.m/(m/s2)", "N.m/(m/s2) kg.m"),
    /** angle per acceleration [rad per m/s²]; in its units g is standard gravity */
    ANGLE_PER_ACCELERATION("an angle per acceleration", "rad/(m/s2)", "rad/(m/s2) mrad/(m/s2) urad/(m/s2) mrad/g"),
    /** angle per speed [rad per m/s] */
    ANGLE_PER_SPEED("an angle per speed", "rad/(m/s)", "rad/(m/s) mrad/(m/s)"),
    /** acceleration per speed [m/s² per m/s] */
    ACCELERATION_PER_SPEED("an acceleration per speed", "m/s2/(m/s)", "m/s2/(m/s) mm/s2/(mm/s)"),
    /** gain of a readout [V/rad] */
    READOUT_GAIN("a gain of a readout", "V/rad", "V/rad mV/mrad V/deg"),
    /** response of a device behind its readout [V per m/s²]; in its units g is standard gravity */
    VOLTAGE_PER_ACCELERATION("a voltage per acceleration", "V/(m/s2)", "V/(m/s2) mV/(m/s2) mV/g"),
    /** response of a device behind its readout [V per m/s] */
    VOLTAGE_PER_SPEED("a voltage per speed", "V/(m/s)", "V/(m/s) mV/(m/s)"),
    /** level [dB], kept in decibels */
    LEVEL("a level", "dB", "dB"),
    /** share of a whole [-] */
    SHARE("a share", "1", "% ppm"),
    /** pure number [-], written without a unit */
    NUMBER("a pure number", "1", "");

    private final String phrase;
    private final String siUnit;
    private final String units;

    Dimension(String phrase, String siUnit, String units) {
        this.phrase = phrase;
        this.siUnit = siUnit;
        this.units = units;
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
        return units.isEmpty() ? List.of() : List.of(units.split(" "));
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
        return switch (this) {
            case LENGTH -> Exponents.of(1, 0, 0);
            case AREA -> Exponents.of(2, 0, 0);
            case VOLUME -> Exponents.of(3, 0, 0);
            case MASS -> Exponents.of(0, 1, 0);
            case TIME -> Exponents.of(0, 0, 1);
            case FREQUENCY -> Exponents.of(0, 0, -1).with(0, 1);
            case ANGLE -> Exponents.NONE.with(1, 0);
            case TEMPERATURE, TEMPERATURE_STEP -> new Exponents(0, 0, 0, 2, 0, 0, 0, 0);
            case PRESSURE, ELASTIC_MODULUS -> Exponents.of(-1, 1, -2);
            case DENSITY -> Exponents.of(-3, 1, 0);
            case VISCOSITY -> Exponents.of(-1, 1, -1);
            case KINEMATIC_VISCOSITY -> Exponents.of(2, 0, -1);
            case SPEED -> Exponents.of(1, 0, -1);
            case ACCELERATION -> Exponents.of(1, 0, -2);
            case ACCELERATION_DENSITY -> Exponents.of(2, 0, -3).with(0, -1);
            case VOLUME_FLOW -> Exponents.of(3, 0, -1);
            case FORCE -> Exponents.of(1, 1, -2);
            case STIFFNESS -> Exponents.of(2, 1, -2).with(-1, 0);
            case DAMPING -> Exponents.of(2, 1, -1).with(-1, 0);
            case INERTIA -> Exponents.of(2, 1, 0);
            case ANGLE_NOISE -> new Exponents(0, 0, 1, 0, 2, -1, 0, 0);
            case ACCELERATION_NOISE -> new Exponents(2, 0, -3, 0, 0, -1, 0, 0);
            case TORQUE_PER_ACCELERATION -> Exponents.of(1, 1, 0);
            case ANGLE_PER_ACCELERATION -> Exponents.of(-1, 0, 2).with(1, 0);
            case ANGLE_PER_SPEED -> Exponents.of(-1, 0, 1).with(1, 0);
            case ACCELERATION_PER_SPEED -> Exponents.of(0, 0, -1);
            case READOUT_GAIN -> Exponents.NONE.with(-1, 0).volts(1);
            case VOLTAGE_PER_ACCELERATION -> Exponents.of(-1, 0, 2).volts(1);
            case VOLTAGE_PER_SPEED -> Exponents.of(-1, 0, 1).volts(1);
            case LEVEL -> new Exponents(0, 0, 0, 0, 0, 0, 2, 0);
            case SHARE, NUMBER -> Exponents.NONE;
        };
    }

    /** Whether {@code g} in its units is standard gravity, not the gram. */
    boolean gravity() {
        return this == ACCELERATION
                || this == ACCELERATION_DENSITY
                || this == ACCELERATION_NOISE
                || this == ANGLE_PER_ACCELERATION
                || this == VOLTAGE_PER_ACCELERATION;
    }

    /** Whether its units must name the angle. */
    private boolean angular() {
        return this == ANGLE || this == ANGLE_PER_ACCELERATION || this == ANGLE_PER_SPEED;
    }

    /** Whether a unit of these exponents fits. Leaving out the radian is usual for stiffness; an angle must have it. */
    boolean accepts(Exponents found) {
        boolean radian = found.radian() == exponents().radian() || (found.radian() == 0 && !angular());
        boolean cycle = found.cycle() == exponents().cycle() || (found.cycle() == 0 && this != FREQUENCY);
        return this != NUMBER && radian && cycle && found.sameKind(exponents());
    }

    /** The first dimension that such a unit belongs to. */
    static Optional<Dimension> of(Exponents found) {
        return Arrays.stream(values()).filter(d -> d.accepts(found)).findFirst();
    }
}
