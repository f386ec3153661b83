package flowshy.verdict.curve;

import flowshy.response.ResponsePoint;

/**
 * One point of a device's curves.
 *
 * @param response to motion and flow
 * @param parts what its torques are made of
 */
public record CurvePoint(ResponsePoint response, TorqueParts parts) {}
