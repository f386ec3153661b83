/** What a chart is: words, the table behind it, a picture, a folder. Charts themselves are left to {@code device} and {@code several}, drawing to {@code paper}; nothing is computed here. */
package flowshy.report.chart;
