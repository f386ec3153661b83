/** The report as PDF: the same page laid out on A4, its own typeface in it. The only home of the page maker and of PDFBox. */
package flowshy.report.pdf;
