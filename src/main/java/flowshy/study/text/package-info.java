/**
 * The text of a study as a tree that remembers where everything stood, and the problems found in it. Knows no key and no
 * unit: that is left to {@code keys} and {@code units}.
 */
package flowshy.study.text;
