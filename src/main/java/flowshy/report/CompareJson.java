package flowshy.report;

import flowshy.math.Figures;
import flowshy.report.chart.Chart;
import flowshy.study.Family;
import flowshy.study.Study;
import flowshy.study.Variant;
import flowshy.verdict.compare.CompareQuestion;
import flowshy.verdict.compare.ComparedDevice;
import flowshy.verdict.compare.Scaled;
import flowshy.verdict.figure.Figure;
import flowshy.verdict.figure.Found;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Devices side by side as JSON and CSV: every named quantity of each. */
public final class CompareJson {
    private CompareJson() {}

    /**
     * The comparison as an object.
     *
     * @param json where to write
     * @param families the studies with their variants
     * @param question what was asked
     * @param devices what was found, one a study or variant, same order
     * @param charts drawn of it, their numbers are left out if there are none
     */
    public static void write(
            JsonPage json,
            List<Family> families,
            CompareQuestion question,
            List<ComparedDevice> devices,
            List<Chart> charts) {
        List<Variant> variants =
                families.stream().flatMap(family -> family.all().stream()).toList();
        json.object(() -> {
            StudyJson.write(json, families.get(0).study());
            json.array("studies", families, family -> {
                Study study = family.study();
                json.text("title", study.title());
                json.text("file", study.origin().file());
                json.text("sha256", study.origin().sha256());
            });
            question.equal().ifPresent(figure -> json.text("equal", figure.word()));
            json.number("compared_at_hz", question.reference());
            json.text("decision", CompareQuestion.decision(devices).word());
            json.array("devices", numbers(devices), index -> device(json, variants.get(index), devices.get(index)));
            ChartTables.write(json, charts);
        });
    }

    private static List<Integer> numbers(List<ComparedDevice> devices) {
        List<Integer> numbers = new ArrayList<>();
        for (int i = 0; i < devices.size(); i++) {
            numbers.add(i);
        }
        return numbers;
    }

    private static void device(JsonPage json, Variant variant, ComparedDevice device) {
        json.text("name", variant.name());
        json.texts("stated", variant.changes());
        json.text("hold", variant.hold().word());
        variant.study()
                .ifPresent(study -> json.array("taken_as", study.takenAs(), taken -> {
                    json.text("key", taken.key());
                    json.text("value", taken.value());
                    json.text("why", taken.why());
                }));
        device.question().ifPresent(asked -> {
            json.text("shape", asked.device().hair().profile().shape());
            json.text("cover", asked.device().cover().words());
            json.text("medium", asked.device().around().name());
            json.object("band", () -> {
                json.number("from_hz", asked.band().from());
                json.number("to_hz", asked.band().to());
            });
            json.number("reference_hz", asked.reference());
            json.cell(
                    "stiffness_n_m_per_rad",
                    Cell.of(
                            asked.device()
                                    .suspension()
                                    .map(held -> held.stiffness())
                                    .orElse(Double.NaN),
                            "no suspension is stated"));
            json.cell(
                    "structural_damping_n_m_s_per_rad",
                    Cell.of(
                            asked.device()
                                    .suspension()
                                    .map(held -> held.damping())
                                    .orElse(Double.NaN),
                            "no suspension is stated"));
        });
        device.scaled().ifPresent(scaled -> json.object("scaled", () -> scaled(json, scaled)));
        if (!device.reason().isEmpty()) {
            json.text("no_solution", device.reason());
        }
        if (!device.figures().isEmpty()) {
            json.object("figures", () -> {
                for (Figure figure : Figure.values()) {
                    Found found = device.figures().get(figure);
                    json.cell(figure.column(), Cell.of(found.number(), found.reason()));
                    if (found.at().isPresent()) {
                        json.number(figure.column() + "_at_hz", found.at().getAsDouble());
                    }
                }
            });
        }
        device.answer().ifPresent(answer -> {
            CaveatJson.write(json, answer.caveats());
            json.object("verdict", () -> {
                json.text("decision", answer.verdict().decision().word());
                json.array("limits", answer.verdict().limits(), limit -> LimitJson.write(json, limit));
                json.text("sentence", answer.verdict().sentence());
            });
        });
    }

    private static void scaled(JsonPage json, Scaled scaled) {
        json.text("quantity", scaled.figure().word());
        json.text("changed", scaled.what());
        json.text("change", scaled.change());
        json.number("ratio", scaled.ratio());
        json.number("before_" + scaled.figure().column(), scaled.before());
        json.number("after_" + scaled.figure().column(), scaled.after());
    }

    /**
     * The comparison as CSV, one line a device.
     *
     * @param devices what was found
     * @return text
     */
    public static String csv(List<ComparedDevice> devices) {
        List<String> head = new ArrayList<>(List.of("device", "stated", "changed", "ratio", "decision", "no_solution"));
        for (Figure figure : Figure.values()) {
            head.add(figure.column());
        }
        List<List<String>> lines = new ArrayList<>();
        for (ComparedDevice device : devices) {
            List<String> line = new ArrayList<>(List.of(
                    device.contender().name(),
                    String.join("; ", device.contender().changes()),
                    device.scaled().map(Scaled::what).orElse(""),
                    device.scaled().map(scaled -> Figures.full(scaled.ratio())).orElse(""),
                    device.answer()
                            .map(answer -> answer.verdict().decision().word())
                            .orElse(""),
                    device.reason()));
            for (Figure figure : Figure.values()) {
                Found found = device.figures().get(figure);
                OptionalDouble number = found == null ? OptionalDouble.empty() : found.number();
                line.add(number.isPresent() ? Figures.full(number.getAsDouble()) : "");
            }
            lines.add(line);
        }
        return TableCsv.ofTexts(head, lines);
    }
}
