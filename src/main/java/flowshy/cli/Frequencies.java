package flowshy.cli;

import flowshy.study.units.Dimension;
import flowshy.study.units.Quantity;
import flowshy.study.units.QuantityException;
import java.util.Arrays;
import java.util.List;
import picocli.CommandLine.ITypeConverter;
import picocli.CommandLine.TypeConversionException;

/** A list of frequencies as one word: {@code "80 Hz, 320 Hz"}. */
record Frequencies(List<Double> values) {
    /** Reads the list. */
    static final class Converter implements ITypeConverter<Frequencies> {
        @Override
        public Frequencies convert(String text) {
            return new Frequencies(
                    Arrays.stream(text.split(",")).map(Converter::frequency).toList());
        }

        private static double frequency(String word) {
            try {
                double value = Quantity.read(word, Dimension.FREQUENCY).value();
                if (!(value > 0.0)) {
                    throw new TypeConversionException("'" + word.strip() + "': a frequency is above zero");
                }
                return value;
            } catch (QuantityException e) {
                throw new TypeConversionException(e.getMessage());
            }
        }
    }
}
