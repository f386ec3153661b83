package flowshy.report;

import static flowshy.math.Figures.say;

import flowshy.verdict.BandsQuestion;
import flowshy.verdict.compare.ComparedDevice;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Found;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.Function;
import org.hipparchus.util.FastMath;

/** A comparison as a table: one line a quantity, one column a device. The same for terminal and page. */
public final class CompareTable {
    static final List<Figure> SHOWN = List.of(
            Figure.MASS,
            Figure.INERTIA,
            Figure.INERTIAL_TORQUE,
            Figure.FOOTPRINT,
            Figure.LENGTH,
            Figure.RESONANCE,
            Figure.QUALITY,
            Figure.SENSITIVITY,
            Figure.NOISE,
            Figure.REJECTION_FROM,
            Figure.REJECTION_TO,
            Figure.LEAST_REJECTION,
            Figure.MOTION_WIDTH,
            Figure.MOTION_OCTAVES,
            Figure.EQUIVALENT,
            Figure.ERROR,
            Figure.OFFSET,
            Figure.STATIC_TILT,
            Figure.BENDING_FREQUENCY,
            Figure.BENDING_RATIO,
            Figure.TIP_CLEARANCE);

    private CompareTable() {}

    /**
     * One line.
     *
     * @param name of the quantity, with its unit
     * @param value of a device, in that unit
     */
    public record Row(String name, Function<ComparedDevice, OptionalDouble> value) {}

    /**
     * Letters as column heads: names are as long as users like.
     *
     * @param index from zero
     * @return A to Z, AA and so on
     */
    public static String letter(int index) {
        return index < 26 ? String.valueOf((char) ('A' + index)) : letter(index / 26 - 1) + letter(index % 26);
    }

    /**
     * The lines that have a number for any device.
     *
     * @param devices the first is the one the others are set against
     * @return in order
     */
    public static List<Row> rows(List<ComparedDevice> devices) {
        return all(devices).stream()
                .filter(row -> devices.stream()
                        .anyMatch(device -> row.value().apply(device).isPresent()))
                .toList();
    }

    /**
     * One column a device.
     *
     * @param devices all
     * @param shown which of them
     * @return columns headed by letters
     */
    public static List<Column<Row>> columns(List<ComparedDevice> devices, List<Integer> shown) {
        List<Column<Row>> columns = new ArrayList<>();
        for (int index : shown) {
            columns.add(new Column<>(
                    letter(index),
                    letter(index),
                    "",
                    4,
                    row -> Cell.of(row.value().apply(devices.get(index)), "it has no such number, or it is infinite")));
        }
        return columns;
    }

    /**
     * At which frequency, and over which bands, the quantities are those of the devices.
     *
     * @param devices the first is the one the others are set against, and has a question
     * @return sentences
     */
    public static String frame(List<ComparedDevice> devices) {
        Map<String, List<String>> bands = new LinkedHashMap<>();
        List<String> elsewhere = new ArrayList<>();
        double reference = reference(devices.get(0)).orElseThrow();
        for (int i = 0; i < devices.size(); i++) {
            String letter = letter(i);
            Optional<BandsQuestion> asked = devices.get(i).contender().question();
            asked.ifPresent(question -> bands.computeIfAbsent(
                            say(
                                    "%.4g to %.4g Hz",
                                    question.band().from(), question.band().to()),
                            band -> new ArrayList<>())
                    .add(letter));
            if (asked.isPresent() && asked.get().reference() != reference) {
                elsewhere.add(letter);
            }
        }
        StringBuilder text = new StringBuilder(say("Sensitivity, noise and equivalent at %.4g Hz", reference));
        if (!elsewhere.isEmpty()) {
            text.append(", that of A; the limits of ")
                    .append(String.join(", ", elsewhere))
                    .append(" are judged at ")
                    .append(elsewhere.size() == 1 ? "its own" : "their own");
        }
        text.append(".");
        if (bands.size() > 1) {
            text.append(" Bands of use differ:");
            bands.forEach((band, letters) -> text.append(" ")
                    .append(String.join(", ", letters))
                    .append(" ")
                    .append(band)
                    .append(";"));
            text.append(" what belongs to a band belongs to each one's own.");
        }
        return text.toString();
    }

    private static OptionalDouble reference(ComparedDevice device) {
        return device.contender()
                .question()
                .map(question -> OptionalDouble.of(question.reference()))
                .orElseGet(OptionalDouble::empty);
    }

    private static List<Row> all(List<ComparedDevice> devices) {
        ComparedDevice first = devices.get(0);
        List<Row> rows = new ArrayList<>();
        for (Figure figure : SHOWN) {
            String unit = figure.unit().shown();
            rows.add(new Row(figure.word() + (unit.isEmpty() ? "" : ", " + unit), device -> shown(figure, device)));
            if (figure == Figure.LEAST_REJECTION) {
                rows.add(new Row(
                        "  found at, Hz",
                        device -> found(figure, device).map(Found::at).orElse(OptionalDouble.empty())));
            }
        }
        rows.add(new Row("least-rejection less A's, dB", device -> difference(Figure.LEAST_REJECTION, device, first)));
        rows.add(new Row("sensitivity over A's, dB", device -> level(Figure.SENSITIVITY, device, first)));
        rows.add(new Row("noise over A's, dB", device -> level(Figure.NOISE, device, first)));
        return rows;
    }

    static Optional<Found> found(Figure figure, ComparedDevice device) {
        return Optional.ofNullable(device.figures().get(figure));
    }

    private static OptionalDouble number(Figure figure, ComparedDevice device) {
        return found(figure, device).map(Found::number).orElse(OptionalDouble.empty());
    }

    private static OptionalDouble shown(Figure figure, ComparedDevice device) {
        OptionalDouble number = number(figure, device);
        return number.isPresent() ? OptionalDouble.of(figure.unit().show(number.getAsDouble())) : number;
    }

    private static OptionalDouble difference(Figure figure, ComparedDevice device, ComparedDevice first) {
        OptionalDouble own = number(figure, device);
        OptionalDouble base = number(figure, first);
        return own.isPresent() && base.isPresent()
                ? OptionalDouble.of(own.getAsDouble() - base.getAsDouble())
                : OptionalDouble.empty();
    }

    private static OptionalDouble level(Figure figure, ComparedDevice device, ComparedDevice first) {
        OptionalDouble own = number(figure, device);
        OptionalDouble base = number(figure, first);
        return own.isPresent() && base.isPresent()
                ? OptionalDouble.of(20.0 * FastMath.log10(own.getAsDouble() / base.getAsDouble()))
                : OptionalDouble.empty();
    }
}
