/**
 * The medium's force on a hair of finite length on its wall: linear unsteady Stokes flow past the body of revolution, with
 * tip, wall and the flow along the hair. Leaves strips of endless cylinders, and what a device does with the torque, to the
 * packages above.
 */
package flowshy.torque.finite;
