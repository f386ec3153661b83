/** Charts of one device: what it reads, why, what flows around it, what was measured on it. Several beside each other are left to {@code several}. */
package flowshy.report.chart.device;
