package flowshy.report.html.section;

import flowshy.report.CompareTable;
import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.verdict.compare.ComparedDevice;
import java.util.List;
import java.util.stream.IntStream;

/** The study beside its variants, where it names any. */
final class VariantsSection implements ReportSection {
    @Override
    public String id() {
        return "variants";
    }

    @Override
    public String heading() {
        return "Variants side by side";
    }

    @Override
    public boolean asked(StudyReport report) {
        return report.variants().size() > 1;
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        List<ComparedDevice> devices = report.variants();
        words.paragraph(
                "The suspension of each variant is held as it was measured on the study's own hair, unless the variant says"
                        + " otherwise. " + CompareTable.frame(devices));
        html.tag("dl")
                .holds(() -> IntStream.range(0, devices.size()).forEach(i -> device(html, words, i, devices.get(i))));
        words.charts(id());
        Tables.of(
                        html,
                        "Quantities of each device",
                        CompareTable.columns(
                                devices,
                                IntStream.range(0, devices.size()).boxed().toList()),
                        CompareTable.rows(devices))
                .named("quantity", (page, row) -> page.text(row.name()))
                .write();
    }

    private static void device(Html html, Words words, int index, ComparedDevice device) {
        html.tag("dt").holds(() -> {
            html.text(CompareTable.letter(index) + " ");
            if (device.contender().changes().isEmpty()) {
                html.text("the study as it stands");
            } else {
                html.user(device.contender().name());
            }
            device.answer().ifPresent(answer -> {
                html.text(" ");
                words.badge(answer.verdict().decision());
            });
        });
        html.tag("dd").holds(() -> {
            if (!device.contender().changes().isEmpty()) {
                html.user(String.join("; ", device.contender().changes()));
            }
            if (!device.reason().isEmpty()) {
                html.text(" ");
                words.sentence(device.reason());
            }
        });
    }
}
