package flowshy.medium;

import java.util.List;
import java.util.OptionalDouble;
import java.util.function.Function;
import java.util.function.ToDoubleFunction;
import org.apache.commons.math3.analysis.interpolation.SplineInterpolator;
import org.apache.commons.math3.analysis.polynomials.PolynomialSplineFunction;
import org.apache.commons.math3.util.FastMath;

/**
 * Smooth curves through the rows of a table: natural cubic splines of the logarithm of each property over ln T, which makes
 * the power laws of gases straight lines and keeps every value positive; the logarithm of the saturation pressure over 1/T. Outside the rows the splines throw, nothing is extrapolated.
 */
final class TableCurves {
    private final Curve density;
    private final Curve viscosity;
    private final List<Curve> soundSpeed;
    private final VirialCurve secondVirial;
    private final List<Curve> saturation;

    TableCurves(List<TableRow> rows) {
        this.density = through(rows, TableCurves::abscissa, row -> FastMath.log(row.density()));
        this.viscosity = through(rows, TableCurves::abscissa, row -> FastMath.log(row.viscosity()));
        this.soundSpeed = optional(
                rows,
                TableRow::soundSpeed,
                TableCurves::abscissa,
                r -> FastMath.log(r.soundSpeed().orElseThrow()));
        boolean real = rows.stream().allMatch(row -> row.secondVirial().isPresent());
        this.secondVirial = real ? VirialCurve.through(rows) : VirialCurve.none();
        this.saturation = optional(
                rows,
                TableRow::saturationPressure,
                row -> -1.0 / row.temperature(),
                r -> FastMath.log(r.saturationPressure().orElseThrow()));
    }

    double density(double temperature) {
        return FastMath.exp(density.at(FastMath.log(temperature)));
    }

    double viscosity(double temperature) {
        return FastMath.exp(viscosity.at(FastMath.log(temperature)));
    }

    OptionalDouble soundSpeed(double temperature) {
        return soundSpeed.isEmpty()
                ? OptionalDouble.empty()
                : OptionalDouble.of(FastMath.exp(soundSpeed.get(0).at(FastMath.log(temperature))));
    }

    /** Second virial coefficient with its slopes, zero where the table has no such column. */
    Virial virial(double temperature) {
        return secondVirial.at(temperature);
    }

    /** Saturation pressure [Pa], empty where the table has none at this temperature. */
    OptionalDouble saturationPressure(double temperature) {
        double x = -1.0 / temperature;
        if (saturation.isEmpty() || !saturation.get(0).covers(x)) {
            return OptionalDouble.empty();
        }
        return OptionalDouble.of(FastMath.exp(saturation.get(0).at(x)));
    }

    /** Temperature [K] at which the saturation pressure is the given one, empty if that is not within the rows. */
    OptionalDouble saturationTemperature(double pressure) {
        if (saturation.isEmpty()) {
            return OptionalDouble.empty();
        }
        Curve curve = saturation.get(0);
        double low = curve.first();
        double high = curve.last();
        double aim = FastMath.log(pressure);
        if (!(curve.at(low) <= aim && aim <= curve.at(high))) {
            return OptionalDouble.empty();
        }
        // Vapour pressure rises strictly; sixty halvings reach the last bit.
        for (int i = 0; i < 60; i++) {
            double middle = 0.5 * (low + high);
            if (curve.at(middle) < aim) {
                low = middle;
            } else {
                high = middle;
            }
        }
        return OptionalDouble.of(-1.0 / (0.5 * (low + high)));
    }

    private static double abscissa(TableRow row) {
        return FastMath.log(row.temperature());
    }

    private static Curve through(List<TableRow> rows, ToDoubleFunction<TableRow> x, ToDoubleFunction<TableRow> y) {
        return Curve.through(
                rows.stream().mapToDouble(x).toArray(),
                rows.stream().mapToDouble(y).toArray());
    }

    private static List<Curve> optional(
            List<TableRow> rows,
            Function<TableRow, OptionalDouble> property,
            ToDoubleFunction<TableRow> x,
            ToDoubleFunction<TableRow> y) {
        List<TableRow> filled =
                rows.stream().filter(row -> property.apply(row).isPresent()).toList();
        return filled.size() < MediumTable.FEWEST_ROWS ? List.of() : List.of(through(filled, x, y));
    }

    /** A spline with its ends. */
    private record Curve(PolynomialSplineFunction spline, double first, double last) {
        /** The abscissa of an end may differ from its knot by a rounding; that much is moved back. */
        private static final double SLACK = 1e-12;

        static Curve through(double[] x, double[] y) {
            return new Curve(new SplineInterpolator().interpolate(x, y), x[0], x[x.length - 1]);
        }

        boolean covers(double x) {
            double slack = SLACK * FastMath.abs(last);
            return x > first - slack && x < last + slack;
        }

        /** Throws the range exception of the library where the rows end. */
        double at(double x) {
            return spline.value(covers(x) ? FastMath.min(FastMath.max(x, first), last) : x);
        }
    }
}
