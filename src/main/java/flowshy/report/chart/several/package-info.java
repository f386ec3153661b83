/** Charts of several devices: covers, fills and variants side by side, maps, the spread of tolerances. */
package flowshy.report.chart.several;
