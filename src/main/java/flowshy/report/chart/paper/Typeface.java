package flowshy.report.chart.paper;

import java.awt.Color;
import java.awt.Font;

/** The letters of a sheet. */
final class Typeface {
    /** What a browser is asked for: the widths of these are alike. */
    static final String FAMILIES = "DejaVu Sans, Verdana, Geneva, sans-serif";

    static final Font TITLE = new Font(Font.SANS_SERIF, Font.BOLD, 13);
    static final Font TEXT = new Font(Font.SANS_SERIF, Font.PLAIN, 11);
    static final Font SMALL = new Font(Font.SANS_SERIF, Font.PLAIN, 10);

    /** Text: 15 : 1 on white. */
    static final Color DARK = new Color(0x222222);

    /** Text of less weight: 7 : 1 on white. */
    static final Color GREY = new Color(0x505050);

    private Typeface() {}
}
