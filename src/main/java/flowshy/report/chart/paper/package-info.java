/** Sheets to draw on: axes, lines, shaded bands, notes and keys laid out with known bounds, as SVG or PNG. Knows nothing of hairs. */
package flowshy.report.chart.paper;
