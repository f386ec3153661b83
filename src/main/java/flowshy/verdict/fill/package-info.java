/**
 * Which gas or liquid should a device stand in? The device of a study in every fill at one state, bare and sealed. Leaves the lid
 * itself to other questions.
 */
package flowshy.verdict.fill;
