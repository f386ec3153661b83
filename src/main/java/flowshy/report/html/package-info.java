/**
 * Pages: an HTML builder that escapes by default, numbers and units as print sets them, the palette and the style. What a report
 * says is left to {@code section}.
 */
package flowshy.report.html;
