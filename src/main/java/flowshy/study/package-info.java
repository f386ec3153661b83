/**
 * The study file: reads it, checks it, takes defaults and says so, and hands immutable records of the domain to the
 * decision. All units and all text of users end here.
 */
package flowshy.study;
