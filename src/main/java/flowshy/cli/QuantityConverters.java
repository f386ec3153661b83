package flowshy.cli;

import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.study.units.QuantityException;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Options with units, read as a study reads them; the values are SI. */
final class QuantityConverters {
    private QuantityConverters() {}

    private abstract static class Reader implements ITypeConverter<Double> {
        private final Dimension dimension;

        Reader(Dimension dimension) {
            this.dimension = dimension;
        }

        @Override
        public Double convert(String text) {
            try {
                return Quantity.read(text, dimension).value();
            } catch (QuantityException e) {
                throw new TypeConversionException(e.getMessage());
            }
        }
    }

    /** A length above zero [m]. */
    static final class Length extends Reader {
        Length() {
            super(Dimension.LENGTH);
        }

        @Override
        public Double convert(String text) {
            double value = super.convert(text);
            if (!(value >= 0.0)) {
                throw new TypeConversionException("'" + text + "': a length is zero or more");
            }
            return value;
        }
    }

    /** A temperature [K]. */
    static final class Temperature extends Reader {
        Temperature() {
            super(Dimension.TEMPERATURE);
        }
    }

    /** A pressure [Pa]. */
    static final class Pressure extends Reader {
        Pressure() {
            super(Dimension.PRESSURE);
        }
    }

    /** A share [-]. */
    static final class Share extends Reader {
        Share() {
            super(Dimension.SHARE);
        }
    }

    /** A kinematic viscosity [m²/s]. */
    static final class Grade extends Reader {
        Grade() {
            super(Dimension.KINEMATIC_VISCOSITY);
        }
    }
}
