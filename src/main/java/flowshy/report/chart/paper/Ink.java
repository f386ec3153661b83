package flowshy.report.chart.paper;

import java.awt.BasicStroke;
import java.awt.Color;
import java.awt.Stroke;

/**
 * How a line is drawn: a colour that the colour-blind can tell apart and a dash that survives a black-and-white print. One meaning has one
 * ink in every chart.
 *
 * <p>Hues after Okabe &amp; Ito 2008 (Color Universal Design, jfly.uni-koeln.de, from memory), the light ones darkened so that every line
 * keeps a contrast of 3 : 1 on white.
 */
public enum Ink {
    /** response to motion, and its whole torque */
    MOTION(0x0072B2, 2.0f, ""),
    /** response to flow, and its whole torque */
    FLOW(0xC84E00, 2.0f, "7 3"),
    /** pressure gradient that drives the flow */
    GRADIENT(0x8A6500, 1.6f, "12 3 2 3"),
    /** the hair's own inertia */
    INERTIA(0x4A3F96, 1.6f, "14 4"),
    /** added mass */
    ADDED_MASS(0x00805C, 1.6f, "5 2 1.5 2"),
    /** viscous drag and damping */
    DAMPING(0xA34E86, 1.6f, "2 2"),
    /** noise of the device itself */
    NOISE(0x5A5A5A, 1.6f, "1.2 2.4"),
    /** a limit asked for */
    LIMIT(0x111111, 1.4f, "10 4"),
    /** what was measured */
    MEASURED(0x111111, 1.2f, ""),
    /** what was measured of the response to flow */
    MEASURED_FLOW(0x7A2E00, 1.2f, ""),
    /** edge between two ranges of a model */
    BOUNDARY(0x6A6A6A, 0.9f, ""),
    /** first of several alike */
    FIRST(0x7A3E9D, 1.8f, ""),
    /** second of several alike */
    SECOND(0x00805C, 1.8f, "9 3"),
    /** third of several alike */
    THIRD(0x8A6500, 1.8f, "5 2 1.5 2"),
    /** fourth of several alike */
    FOURTH(0xA8446F, 1.8f, "2.5 2"),
    /** fifth of several alike */
    FIFTH(0x3F5F7F, 1.8f, "12 3 2 3 2 3"),
    /** sixth of several alike */
    SIXTH(0x6B4A3A, 1.8f, "1.2 3");

    private final int rgb;
    private final float width;
    /** Lengths on and off, separated by spaces; empty for a whole line. */
    private final String dash;

    Ink(int rgb, float width, String dash) {
        this.rgb = rgb;
        this.width = width;
        this.dash = dash;
    }

    /**
     * Its colour.
     *
     * @return opaque
     */
    public Color colour() {
        return new Color(rgb);
    }

    /**
     * Its stroke.
     *
     * @return width and dash in units of the sheet
     */
    public Stroke stroke() {
        if (dash.isEmpty()) {
            return new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND);
        }
        String[] lengths = dash.split(" ", -1);
        float[] pattern = new float[lengths.length];
        for (int i = 0; i < pattern.length; i++) {
            pattern[i] = Float.parseFloat(lengths[i]);
        }
        return new BasicStroke(width, BasicStroke.CAP_BUTT, BasicStroke.JOIN_ROUND, 10.0f, pattern, 0.0f);
    }

    /**
     * Ink of one of several things of one kind, none of them the colour of motion or of flow.
     *
     * @param index from zero; after the sixth they begin anew
     * @return the ink
     */
    public static Ink alike(int index) {
        Ink[] several = {FIRST, SECOND, THIRD, FOURTH, FIFTH, SIXTH};
        return several[index % several.length];
    }
}
