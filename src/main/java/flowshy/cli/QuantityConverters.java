package flowshy.cli;

import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.study.units.QuantityException;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** Options with units, read and bounded as a study reads its keys; the values are SI. */
final class QuantityConverters {
    private QuantityConverters() {}

    private abstract static class Reader implements ITypeConverter<Double> {
        private final Dimension dimension;
        private final String least;
        private final String most;

        Reader(Dimension dimension, String least, String most) {
            this.dimension = dimension;
            this.least = least;
            this.most = most;
        }

        @Override
        public Double convert(String text) {
            try {
                double value = Quantity.read(text, dimension).value();
                if (value >= Quantity.read(least, dimension).value()
                        && value <= Quantity.read(most, dimension).value()) {
                    return value;
                }
            } catch (QuantityException e) {
                throw new TypeConversionException(e.getMessage());
            }
            throw new TypeConversionException("'" + text.strip() + "'; " + dimension.phrase() + " of " + least + " to "
                    + most + " is wanted here");
        }
    }

    /** A height over the wall [m]. */
    static final class Height extends Reader {
        Height() {
            super(Dimension.LENGTH, "0 m", "1 m");
        }
    }

    /** A diameter [m]. */
    static final class Diameter extends Reader {
        Diameter() {
            super(Dimension.LENGTH, "10 nm", "1 m");
        }
    }

    /** A frequency [Hz]. */
    static final class Frequency extends Reader {
        Frequency() {
            super(Dimension.FREQUENCY, "1 mHz", "10 MHz");
        }
    }

    /** A temperature [K]. */
    static final class Temperature extends Reader {
        Temperature() {
            super(Dimension.TEMPERATURE, "1 K", "3000 K");
        }
    }

    /** A pressure [Pa]. */
    static final class Pressure extends Reader {
        Pressure() {
            super(Dimension.PRESSURE, "1 mPa", "1 GPa");
        }
    }

    /** A share [-]. */
    static final class Share extends Reader {
        Share() {
            super(Dimension.SHARE, "0 %", "100 %");
        }
    }

    /** A practical salinity [-]. */
    static final class Salinity extends Reader {
        Salinity() {
            super(Dimension.NUMBER, "0", "1000");
        }
    }

    /** A kinematic viscosity [m²/s]. */
    static final class Grade extends Reader {
        Grade() {
            super(Dimension.KINEMATIC_VISCOSITY, "0.1 cSt", "1e6 cSt");
        }
    }
}
