package flowshy.medium;

import java.util.Optional;

/** What can be said of a medium beside its name, and so what can be wrong with it. */
public enum MediumParameter {
    /** the name itself */
    NAME("name", "-"),
    /** temperature [K] */
    TEMPERATURE("temperature", "K"),
    /** pressure [Pa] */
    PRESSURE("pressure", "Pa"),
    /** relative humidity over liquid water, 0 to 1 [-] */
    HUMIDITY("humidity", "-"),
    /** mass of the named substance per mass of its mixture with water, 0 to 1 [-] */
    MASS_FRACTION("mass-fraction", "-"),
    /** practical salinity (PSS-78) [-]; ocean water has 35 */
    SALINITY("salinity", "-"),
    /** nominal kinematic viscosity that names an oil [m²/s], at the temperature its table states */
    GRADE("grade", "m2/s"),
    /** mole fraction of a second gas, 0 to 1 [-] */
    SHARE("share", "-"),
    /** density stated by the user [kg/m³] */
    DENSITY("density", "kg/m3"),
    /** dynamic viscosity stated by the user [Pa·s] */
    VISCOSITY("viscosity", "Pa.s"),
    /** sound speed stated by the user [m/s] */
    SOUND_SPEED("sound-speed", "m/s");

    private final String key;
    private final String unit;

    MediumParameter(String key, String unit) {
        this.key = key;
        this.unit = unit;
    }

    /**
     * The word that a study or a table header uses.
     *
     * @return a word in ASCII, parts joined by hyphens
     */
    public String key() {
        return key;
    }

    /**
     * The SI unit in which queries carry the value.
     *
     * @return unit, a hyphen for a pure number
     */
    public String unit() {
        return unit;
    }

    /** The parameter that a table header names so, of those with a range of their own. */
    static Optional<MediumParameter> ofHeader(String key) {
        for (MediumParameter parameter : new MediumParameter[] {HUMIDITY, MASS_FRACTION, SALINITY, GRADE}) {
            if (parameter.key.equals(key)) {
                return Optional.of(parameter);
            }
        }
        return Optional.empty();
    }
}
