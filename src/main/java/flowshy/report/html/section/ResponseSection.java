package flowshy.report.html.section;

import flowshy.math.Caveat.Subject;
import flowshy.report.Column;
import flowshy.report.PointTable;
import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.response.ResponsePoint;
import flowshy.verdict.BandsAnswer;
import java.util.EnumSet;
import java.util.List;

/** The response by frequency. */
final class ResponseSection implements ReportSection {
    private static final double ROUNDING = 1e-9;

    @Override
    public String id() {
        return "response";
    }

    @Override
    public String heading() {
        return "Response by frequency";
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        BandsAnswer answer = report.answer();
        boolean moving =
                answer.points().stream().allMatch(point -> point.motion().isPresent());
        List<Column<ResponsePoint>> columns = PointTable.all(answer.acceptance()).stream()
                .filter(column -> answer.points().stream()
                        .anyMatch(point -> column.cell().apply(point).value().isPresent()))
                .toList();
        words.paragraph("Equivalent: the acceleration of the base that reads as much as flow of unit velocity."
                + (answer.acceptance().error().isPresent()
                        ? " Largest speed: the flow that keeps the error limit."
                        : "")
                + (moving ? "" : " Responses are left out: no suspension is stated that holds the hair."));
        words.charts(id());
        Tables.of(html, "Response at third-octave frequencies", columns, answer.points())
                .marked(point -> point.frequency() < answer.band().from() * (1.0 - ROUNDING)
                        || point.frequency() > answer.band().to() * (1.0 + ROUNDING))
                .write();
        words.caveats(EnumSet.of(Subject.MOTION, Subject.FLOW, Subject.NOISE));
        if (answer.error().isEmpty()) {
            words.caveats(EnumSet.of(Subject.ERROR));
        }
    }
}
