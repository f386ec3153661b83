package flowshy.torque.finite;

import org.hipparchus.complex.Complex;

/**
 * What the medium does to the hair in one kind of motion, per unit of that motion: of a stream per unit velocity [m/s], of
 * rocking per unit angular velocity [rad/s]. Time factor e^{+iωt}.
 *
 * @param torque about the pivot, ∫ ((z+h) t_x − x t_z) dS over the wetted surface [N·m per unit]
 * @param lateralTorque the part of the force along x alone, ∫ (z+h) f dz, the one that strip theory knows [N·m per unit]
 * @param force along x, ∫ f dz [N per unit]
 * @param torqueError relative change of the torque from the coarser mesh to the finer one, whose values these are [-]; more than
 *     the error that is left wherever both are fine enough
 * @param forceError the same of the force [-]
 */
public record FluidLoad(Complex torque, Complex lateralTorque, Complex force, double torqueError, double forceError) {}
