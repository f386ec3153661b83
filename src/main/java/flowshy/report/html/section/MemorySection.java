package flowshy.report.html.section;

import flowshy.medium.Medium;
import flowshy.medium.PropertySource;
import flowshy.medium.PropertySource.Reading;
import flowshy.report.html.Html;
import flowshy.report.html.Typography;
import flowshy.study.Study.TakenAs;
import java.util.ArrayList;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;

/** Every value from memory that the decision uses: to be looked up before one signs. */
final class MemorySection implements ReportSection {
    private static final String MARK = "from memory";

    @Override
    public String id() {
        return "memory";
    }

    @Override
    public String heading() {
        return "Values from memory";
    }

    /**
     * One value that nobody has looked up.
     *
     * @param what which value
     * @param source what is remembered of its source
     */
    private record Recalled(String what, String source) {}

    @Override
    public void write(Html html, StudyReport report) {
        List<Recalled> all = recalled(report);
        if (all.isEmpty()) {
            html.tag("p", "No property of the medium and no default that the decision uses is recalled from memory.");
            return;
        }
        html.tag(
                "p",
                "These were recalled and not seen in their source. Confirm them before the decision rests on them:");
        html.tag("ul")
                .holds(() -> all.forEach(value -> html.tag("li").holds(() -> {
                    html.user(value.what());
                    html.text(": ");
                    html.user(Typography.set(value.source()));
                })));
    }

    private static List<Recalled> recalled(StudyReport report) {
        List<Recalled> all = new ArrayList<>();
        Set<Medium> media = new LinkedHashSet<>();
        media.add(report.answer().device().around());
        media.add(report.answer().device().outside());
        for (Medium medium : media) {
            for (PropertySource source : medium.sources()) {
                boolean value = source.reading() == Reading.MEMORY;
                if (value || source.source().contains(MARK)) {
                    all.add(new Recalled(
                            (value ? "" : "in the source of ") + source.property() + " of " + medium.name(),
                            source.source()));
                }
            }
        }
        for (TakenAs taken : report.study().takenAs()) {
            if (taken.why().contains(MARK)) {
                all.add(new Recalled(taken.key() + " " + taken.value(), taken.why()));
            }
        }
        return all;
    }
}
