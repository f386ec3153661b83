/**
 * Numbers with units as people write them, turned into SI once and rounded once. The table of units is closed: what is not
 * in it is refused, never guessed.
 */
package flowshy.study.units;
