package flowshy.report.html.section;

import flowshy.report.Version;
import flowshy.report.html.Html;
import flowshy.report.html.Tables;
import flowshy.study.Study;
import java.util.List;
import java.util.Map;

/** The title block: what the document is, lines to sign, and the digests that bind it to its study. It holds no clock time. */
final class DocumentSection implements ReportSection {
    /** Keys of the document block that name a person, who then signs. */
    private static final List<String> SIGN = List.of("prepared-by", "checked-by", "approved-by");

    @Override
    public String id() {
        return "document";
    }

    @Override
    public String heading() {
        return "Document";
    }

    @Override
    public void write(Html html, StudyReport report) {
        Words words = new Words(html, report);
        Study study = report.study();
        words.facts("Document", () -> {
            study.document().forEach((key, value) -> {
                if (!SIGN.contains(key)) {
                    words.fact(key, () -> html.user(value));
                }
            });
            words.fact("study", () -> html.user(study.origin().file()));
            words.fact("made by", "Flowshy " + Version.number());
        });
        signatures(html, words, study.document());
        digests(html, words, study.origin());
    }

    private static void signatures(Html html, Words words, Map<String, String> document) {
        html.tag("table").with("class", "signatures").holds(() -> {
            html.tag("caption", "Signatures");
            words.head("", "name", "signature", "date");
            html.tag("tbody")
                    .holds(() -> SIGN.forEach(key -> html.tag("tr").holds(() -> {
                        html.tag("th").with("scope", "row").holds(key.replace('-', ' '));
                        html.tag("td").holds(() -> html.user(document.getOrDefault(key, "")));
                        html.tag("td").holds("");
                        html.tag("td").holds("");
                    })));
        });
    }

    private static void digests(Html html, Words words, Study.Origin origin) {
        String caption = "SHA-256 of the study and of every file read";
        Tables.scrolled(
                html,
                caption,
                () -> html.tag("table").with("class", "texts digests").holds(() -> {
                    html.tag("caption", caption);
                    words.head("file", "SHA-256");
                    html.tag("tbody").holds(() -> {
                        digest(html, origin.file(), origin.sha256());
                        origin.filesRead().forEach(file -> digest(html, file.file(), file.sha256()));
                    });
                }));
    }

    private static void digest(Html html, String file, String sha256) {
        html.tag("tr").holds(() -> {
            html.tag("th").with("scope", "row").holds(() -> html.user(file));
            html.tag("td").holds(() -> html.tag("code", sha256));
        });
    }
}
