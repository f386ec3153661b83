package flowshy.report.html.section;

import flowshy.report.html.Html;

/** One part of the report. A new one is a class here and a line in {@link ReportPage#SECTIONS}. */
public interface ReportSection {
    /**
     * Its anchor in the page.
     *
     * @return lower-case letters and hyphens, one of a kind
     */
    String id();

    /**
     * Its heading.
     *
     * @return a few words
     */
    String heading();

    /**
     * Whether the study asks for it; one that is not asked for is absent.
     *
     * @param report what is told
     * @return true if it is to be written
     */
    default boolean asked(StudyReport report) {
        return true;
    }

    /**
     * Writes what stands under the heading.
     *
     * @param html where to write
     * @param report what is told
     */
    void write(Html html, StudyReport report);
}
