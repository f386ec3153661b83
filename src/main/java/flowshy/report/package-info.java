/**
 * Tells a result: terminal text, CSV and JSON, from one set of tables. Computes nothing.
 */
package flowshy.report;
