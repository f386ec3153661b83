package flowshy.torque.finite;

/**
 * Point of a meridian.
 *
 * @param radius r, zero or more
 * @param height z above the wall
 */
record MeridianPoint(double radius, double height) {}
