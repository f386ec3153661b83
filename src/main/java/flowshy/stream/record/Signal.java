package flowshy.stream.record;

/** What was measured. */
public enum Signal {
    /** velocity of the flow [m/s] */
    VELOCITY,
    /** sound pressure [Pa] */
    PRESSURE,
    /** acceleration of the base [m/s²] */
    ACCELERATION
}
