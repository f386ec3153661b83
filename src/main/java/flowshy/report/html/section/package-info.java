/**
 * The report that one signs: what is told of a study, section by section, and the one list of sections in their order. How it looks is
 * left to {@code html}.
 */
package flowshy.report.html.section;
