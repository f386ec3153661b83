/** Quadrature points along a hair: where they lie, and which of them stand for parts too thin for the laws. */
package flowshy.torque.strips;
