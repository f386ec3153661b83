/** A device's answer in steps fine enough to be drawn: what a chart and the table behind it share. */
package flowshy.verdict.curve;
