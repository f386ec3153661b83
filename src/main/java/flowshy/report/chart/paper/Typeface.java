package flowshy.report.chart.paper;

import flowshy.report.OwnTypeface;
import java.awt.Color;
import java.awt.Font;

/** The letters of a sheet. */
final class Typeface {
    /** What a browser is asked for: the widths of these are alike. */
    static final String FAMILIES = "DejaVu Sans, Verdana, Geneva, sans-serif";

    static final Font TITLE = OwnTypeface.bold(13.0f);
    static final Font TEXT = OwnTypeface.plain(11.0f);
    static final Font SMALL = OwnTypeface.plain(10.0f);

    /** Text: 15 : 1 on white. */
    static final Color DARK = new Color(0x222222);

    /** Text of less weight: 7 : 1 on white. */
    static final Color GREY = new Color(0x505050);

    private Typeface() {}
}
