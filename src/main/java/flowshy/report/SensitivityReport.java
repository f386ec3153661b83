package flowshy.report;

import flowshy.math.Figures;
import flowshy.verdict.design.Sensitivity;
import flowshy.verdict.design.Sensitivity.Slope;
import java.util.ArrayList;
import java.util.List;

/** What each dimension and property does to the rejection, as text and JSON. */
final class SensitivityReport {
    /** More are no help in a terminal; JSON has them all. */
    private static final int PRINTED = 12;

    private SensitivityReport() {}

    /** A table, the strongest first; nothing if there is none. */
    static void print(TextPage page, List<Sensitivity> slopes) {
        if (slopes.isEmpty()) {
            return;
        }
        page.heading("What to tighten first");
        page.paragraph(
                "Change of the rejection when one number grows by one per cent, a temperature by one kelvin; the rest of the"
                        + " device stays. Where the whole hair is solved, its estimate in closed form stands in.");
        List<Column<Sensitivity>> columns = new ArrayList<>();
        List<Slope> first = slopes.get(0).slopes();
        for (int i = 0; i < first.size(); i++) {
            int index = i;
            columns.add(new Column<>(
                    "",
                    "at " + Figures.of(first.get(i).frequency(), 4) + " Hz",
                    "dB",
                    3,
                    one -> Cell.of(one.slopes().get(index).change(), "")));
        }
        List<Sensitivity> shown = slopes.subList(0, Math.min(PRINTED, slopes.size()));
        page.namedTable(
                "number",
                shown.stream()
                        .map(one -> one.name() + (one.degrees() ? ", per K" : ""))
                        .toList(),
                columns,
                shown);
        double worst = slopes.stream()
                .flatMap(one -> one.slopes().stream())
                .mapToDouble(Slope::error)
                .max()
                .orElse(0.0);
        page.paragraph("Differences at two steps, their own error below " + Figures.of(worst, 1) + " dB."
                + (slopes.size() > PRINTED ? " " + (slopes.size() - PRINTED) + " weaker ones are in the JSON." : ""));
    }

    /** The field {@code sensitivities}, of every number. */
    static void write(JsonPage json, List<Sensitivity> slopes) {
        json.array("sensitivities", slopes, one -> {
            json.text("number", one.name());
            json.number("value_si", one.value());
            String name = one.degrees() ? "rejection_db_per_k" : "rejection_db_per_percent";
            json.array("slopes", one.slopes(), slope -> {
                json.number("frequency_hz", slope.frequency());
                json.number(name, slope.change());
                json.number("error_db", slope.error());
            });
        });
    }
}
