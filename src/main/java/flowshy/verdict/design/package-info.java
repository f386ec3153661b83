/**
 * A device as a function of a few numbers of its study: what maps, sizings and tolerance runs walk through. Which numbers a
 * study has, and in which units they are written, is left to the study.
 */
package flowshy.verdict.design;
