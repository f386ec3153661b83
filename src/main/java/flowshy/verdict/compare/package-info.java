/**
 * Devices side by side, as they are or scaled until one quantity equals that of the first. Leaves reading variants of a study to
 * {@code study}.
 */
package flowshy.verdict.compare;
