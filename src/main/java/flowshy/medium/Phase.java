package flowshy.medium;

/** State of matter of a medium. */
public enum Phase {
    /** a gas */
    GAS,
    /** a liquid */
    LIQUID,
    /** given by density and viscosity alone */
    UNSTATED
}
