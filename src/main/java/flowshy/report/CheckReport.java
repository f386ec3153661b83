package flowshy.report;

import flowshy.study.Study;
import flowshy.study.keys.KeyRow;
import java.util.List;

/** What a study was understood to say, and what a study may say. */
public final class CheckReport {
    private CheckReport() {}

    /**
     * A study as understood, for a terminal.
     *
     * @param study without problems
     * @return text
     */
    public static String text(Study study) {
        TextPage page = new TextPage();
        page.line(study.origin().file() + ": understood");
        study.origin().settings().forEach(setting -> page.line("with --set " + setting));
        page.heading("As written, and in SI");
        for (Study.Understood value : study.understood()) {
            boolean same = value.written().equals(value.si());
            page.row(value.key(), same ? value.written() : value.written() + "  =  " + value.si());
        }
        page.heading("Taken as (not stated in the study)");
        study.takenAs().forEach(taken -> page.row(taken.key(), taken.value() + " (" + taken.why() + ")"));
        for (Study.FileRead file : study.origin().filesRead()) {
            page.line("read " + file.file());
            page.line("  sha256 " + file.sha256());
        }
        return page.toString();
    }

    /**
     * A study as understood, as an object.
     *
     * @param json where to write
     * @param study without problems
     */
    public static void write(JsonPage json, Study study) {
        json.object(() -> {
            StudyJson.write(json, study);
            json.array("understood", study.understood(), value -> {
                json.text("key", value.key());
                json.text("written", value.written());
                json.text("si", value.si());
            });
        });
    }

    /**
     * A study as understood, as CSV.
     *
     * @param study without problems
     * @return text
     */
    public static String csv(Study study) {
        return TableCsv.ofTexts(
                List.of("key", "written", "si"),
                study.understood().stream()
                        .map(value -> List.of(value.key(), value.written(), value.si()))
                        .toList());
    }

    /**
     * Every key, for a terminal.
     *
     * @param rows of the key table
     * @return text
     */
    public static String keys(List<KeyRow> rows) {
        TextPage page = new TextPage();
        page.line("Keys of a study: kind and range; default; meaning");
        for (KeyRow row : rows) {
            page.line("");
            page.note(row.path(), row.words().isEmpty() ? "" : "(" + String.join(", ", row.words()) + ")");
            page.row("", row.value().kind() + "; " + row.defaultWords());
            page.row("", row.meaning());
            row.instead().ifPresent(instead -> page.row("", "not built yet in this version: " + instead));
        }
        return page.toString();
    }
}
