package flowshy.medium;

import flowshy.math.Range;

/**
 * A parameter that a medium needs beside temperature and pressure.
 *
 * @param parameter which
 * @param range in which it may lie, in the SI unit of the parameter
 */
public record AcceptedParameter(MediumParameter parameter, Range range) {}
