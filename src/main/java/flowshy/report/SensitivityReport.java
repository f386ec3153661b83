package flowshy.report;

import flowshy.math.Figures;
import flowshy.verdict.design.Sensitivities;
import flowshy.verdict.design.Sensitivities.Place;
import flowshy.verdict.design.Sensitivity;
import flowshy.verdict.design.Sensitivity.Slope;
import java.util.ArrayList;
import java.util.List;
import java.util.stream.Collectors;
import org.hipparchus.util.FastMath;

/** What each dimension and property does to the rejection, as text and JSON. */
public final class SensitivityReport {
    /** What the figures are. */
    public static final String WHAT =
            "Change of the rejection when one number grows by one per cent, a temperature by one kelvin; the rest of the"
                    + " device stays.";

    /** More are no help in a terminal; JSON has them all. */
    private static final int PRINTED = 12;

    private SensitivityReport() {}

    /** A table, the strongest first; nothing if there is none. */
    static void print(TextPage page, Sensitivities slopes) {
        if (slopes.numbers().isEmpty()) {
            return;
        }
        page.heading("What to tighten first");
        page.paragraph(WHAT + " " + places(slopes));
        List<Sensitivity> shown =
                slopes.numbers().subList(0, Math.min(PRINTED, slopes.numbers().size()));
        page.namedTable("number", shown.stream().map(SensitivityReport::name).toList(), columns(slopes), shown);
        int left = slopes.numbers().size() - shown.size();
        page.paragraph(how(slopes) + (left > 0 ? " Weaker and in the JSON alone: " + left + "." : ""));
    }

    /**
     * A column a place.
     *
     * @param slopes what was found
     * @return changes [dB]
     */
    public static List<Column<Sensitivity>> columns(Sensitivities slopes) {
        List<Column<Sensitivity>> columns = new ArrayList<>();
        for (int i = 0; i < slopes.places().size(); i++) {
            int index = i;
            String at = "at " + hertz(slopes.places().get(i));
            columns.add(new Column<>(
                    at, at, "dB", 3, one -> Cell.of(one.slopes().get(index).change(), "")));
        }
        return columns;
    }

    private static String hertz(Place place) {
        return Figures.of(place.frequency(), 4) + " Hz";
    }

    /**
     * How a number is called.
     *
     * @param one a number
     * @return its path or words; told where it counts by the kelvin
     */
    public static String name(Sensitivity one) {
        return one.name() + (one.degrees() ? ", per K" : "");
    }

    /**
     * Where in the band the frequencies lie.
     *
     * @param slopes what was found
     * @return one sentence
     */
    public static String places(Sensitivities slopes) {
        return slopes.places().stream()
                .map(place -> hertz(place) + ": " + place.words())
                .collect(Collectors.joining("; ", "", "."));
    }

    /**
     * By which model the differences are made.
     *
     * @param slopes what was found
     * @return a clause, without a full stop
     */
    public static String by(Sensitivities slopes) {
        return "Differences by " + slopes.model().words() + " (finite-length: "
                + slopes.model().word() + ")";
    }

    /**
     * By which model, and how well.
     *
     * @param slopes what was found
     * @return one sentence
     */
    public static String how(Sensitivities slopes) {
        return by(slopes) + "; their own error is below " + Figures.of(raised(slopes.error()), 1) + " dB.";
    }

    /** To one digit, upwards. */
    private static double raised(double error) {
        if (!(error > 0.0)) {
            return 0.0;
        }
        double digit = FastMath.pow(10.0, FastMath.floor(FastMath.log10(error)));
        return digit * FastMath.ceil(error / digit);
    }

    /** The field {@code sensitivities}, of every number, and by which model they were made. */
    static void write(JsonPage json, Sensitivities slopes) {
        json.text("sensitivities_finite_length", slopes.model().word());
        json.array("sensitivities", slopes.numbers(), one -> {
            json.text("number", one.name());
            json.number("value_si", one.value());
            String name = one.degrees() ? "rejection_db_per_k" : "rejection_db_per_percent";
            json.array("slopes", places(slopes, one), at -> {
                json.number("frequency_hz", at.slope().frequency());
                json.text("where", at.place().words());
                json.number(name, at.slope().change());
                json.number("error_db", at.slope().error());
            });
        });
    }

    private record At(Place place, Slope slope) {}

    private static List<At> places(Sensitivities slopes, Sensitivity one) {
        List<At> all = new ArrayList<>();
        for (Slope slope : one.slopes()) {
            all.add(new At(slopes.places().get(all.size()), slope));
        }
        return all;
    }
}
