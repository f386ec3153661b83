package flowshy.report.chart.paper;

import java.awt.Color;

/** Grounds behind a curve; a word over each says the same to those who see no colour. */
public enum Shade {
    /** motion is read */
    MOTION(0xC4DCF0),
    /** both are read */
    MIXED(0xE6E6E6),
    /** flow is read */
    FLOW(0xF8CDB0),
    /** neither is read */
    NOTHING(0xFFFFFF),
    /** a model has ended */
    UNDECIDED(0xF0E6A0);

    private final int rgb;

    Shade(int rgb) {
        this.rgb = rgb;
    }

    Color colour() {
        return new Color(rgb);
    }
}
