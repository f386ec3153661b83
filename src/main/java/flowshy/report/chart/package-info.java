/** Charts of an answer: one class a picture, each with the table behind it. Nothing is computed here; drawing itself is left to {@code paper}. */
package flowshy.report.chart;
