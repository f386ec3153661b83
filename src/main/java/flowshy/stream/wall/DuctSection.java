package flowshy.stream.wall;

import flowshy.math.Positive;
import org.hipparchus.util.FastMath;

/** Cross-section of a duct, seen from the middle of the wall that the hair stands on. */
public sealed interface DuctSection {
    /**
     * Hydraulic diameter, four times the area over the wetted perimeter.
     *
     * @return D_h [m]
     */
    double hydraulicDiameter();

    /**
     * Area that the flow has.
     *
     * @return [m²]
     */
    double area();

    /**
     * Distance from the hair's wall to the opposite one.
     *
     * @return [m]
     */
    double depth();

    /**
     * Velocity of developed laminar flow over the mean speed, above the middle of the hair's wall.
     *
     * @param height z, from zero to the depth [m]
     * @return u/U [-]
     */
    double laminarShare(double height);

    /**
     * A pipe.
     *
     * @param diameter D [m]
     */
    record Round(double diameter) implements DuctSection {
        /** @throws IllegalArgumentException if the diameter is not positive and finite */
        public Round {
            Positive.check("duct diameter [m]", diameter);
        }

        @Override
        public double hydraulicDiameter() {
            return diameter;
        }

        @Override
        public double area() {
            return 0.25 * FastMath.PI * diameter * diameter;
        }

        @Override
        public double depth() {
            return diameter;
        }

        /** Poiseuille flow: 8 (z/D)(1 − z/D), which is 2 on the axis. */
        @Override
        public double laminarShare(double height) {
            double place = height / diameter;
            return 8.0 * place * (1.0 - place);
        }
    }

    /**
     * A rectangular duct.
     *
     * @param width W, of the wall that the hair stands on, across the flow [m]
     * @param height H, from that wall to the opposite one [m]
     */
    record Rectangular(double width, double height) implements DuctSection {
        /** @throws IllegalArgumentException if a side is not positive and finite */
        public Rectangular {
            Positive.check("duct width [m]", width);
            Positive.check("duct height [m]", height);
        }

        @Override
        public double hydraulicDiameter() {
            return 2.0 * width * height / (width + height);
        }

        @Override
        public double area() {
            return width * height;
        }

        @Override
        public double depth() {
            return height;
        }

        /**
         * Series of developed flow in a rectangle (Boussinesq 1868; White, Viscous Fluid Flow, from memory), the parabola between
         * endless plates split off so that the rest converges exponentially:
         * u ∝ ½ζ(1−ζ) − (4/π³) Σ sin(nπζ)/(n³ cosh(nπW/2H)), ζ = z/H, n odd; mean ∝ (1/12)[1 − (192H/π⁵W) Σ tanh(nπW/2H)/n⁵].
         */
        @Override
        public double laminarShare(double z) {
            double pi = FastMath.PI;
            double ratio = 0.5 * pi * width / height;
            double place = z / height;
            double corner = 0.0;
            double loss = 0.0;
            for (int n = 1; n < 2000; n += 2) {
                double cube = (double) n * n * n;
                corner += FastMath.sin(n * pi * place) / (cube * FastMath.cosh(FastMath.min(n * ratio, 700.0)));
                loss += FastMath.tanh(n * ratio) / (cube * n * n);
                if (n > 60 && n * ratio > 40.0) {
                    break; // what is left of Σ1/n⁵ is below 1e-8, of the other sum 1e-17
                }
            }
            double local = 0.5 * place * (1.0 - place) - 4.0 / (pi * pi * pi) * corner;
            double mean = (1.0 - 192.0 * height / (FastMath.pow(pi, 5) * width) * loss) / 12.0;
            return local / mean;
        }
    }
}
