package flowshy.report.chart.several;

import org.hipparchus.util.FastMath;

/**
 * Colours of maps, told apart by the colour-blind and in a grey print: of signed numbers the hues of motion and of flow to both sides of white,
 * darker the further out; of others one row from light to dark.
 */
final class MapColours {
    private static final int WHITE = 0xFFFFFF;
    private static final int[] MOTION = {WHITE, 0x9CC9E6, 0x2F83BD, 0x0B3E66};
    private static final int[] FLOW = {WHITE, 0xF6BE98, 0xD2691E, 0x6B2B00};
    private static final int[] RISING = {0xFBF3D0, 0xC9DDB0, 0x7FB8A6, 0x3E849B, 0x274B7A, 0x1A1F45};

    private MapColours() {}

    /**
     * Colour of a signed number.
     *
     * @param share −1 and beyond: full colour of flow; 0: white; 1 and beyond: full colour of motion
     * @return red, green, blue
     */
    static int signed(double share) {
        return between(share < 0.0 ? FLOW : MOTION, FastMath.min(FastMath.abs(share), 1.0));
    }

    /**
     * Colour of a number that only rises.
     *
     * @param share 0: lightest; 1: darkest
     * @return red, green, blue
     */
    static int rising(double share) {
        return between(RISING, FastMath.min(FastMath.max(share, 0.0), 1.0));
    }

    private static int between(int[] row, double share) {
        double place = share * (row.length - 1);
        int low = FastMath.min((int) place, row.length - 2);
        double part = place - low;
        int mixed = 0;
        for (int shift = 16; shift >= 0; shift -= 8) {
            double one = (row[low] >> shift) & 0xFF;
            double other = (row[low + 1] >> shift) & 0xFF;
            mixed |= (int) FastMath.round(one + (other - one) * part) << shift;
        }
        return mixed;
    }
}
