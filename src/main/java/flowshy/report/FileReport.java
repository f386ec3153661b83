package flowshy.report;

import flowshy.math.Figures;
import flowshy.study.Study;
import flowshy.verdict.Limit;
import flowshy.verdict.Verdict;
import java.security.MessageDigest;
import java.security.NoSuchAlgorithmException;
import java.util.HexFormat;
import java.util.List;

/** What a command says that answers with files: the decision, and what was written. */
public final class FileReport {
    private FileReport() {}

    /**
     * One file.
     *
     * @param file its path
     * @param bytes its length
     * @param sha256 of its bytes, lower-case hexadecimal
     */
    public record Written(String file, int bytes, String sha256) {
        /**
         * A file with its digest.
         *
         * @param file its path
         * @param content its bytes
         * @return what is told of it
         */
        public static Written of(String file, byte[] content) {
            try {
                byte[] digest = MessageDigest.getInstance("SHA-256").digest(content);
                return new Written(file, content.length, HexFormat.of().formatHex(digest));
            } catch (NoSuchAlgorithmException e) {
                throw new IllegalStateException("every Java platform has SHA-256", e);
            }
        }
    }

    /**
     * For a terminal.
     *
     * @param study what was asked
     * @param verdict how it comes out
     * @param files what was written
     * @return text
     */
    public static String text(Study study, Verdict verdict, List<Written> files) {
        TextPage page = new TextPage();
        page.line(
                "Flowshy " + Version.number() + "   report   " + study.origin().file());
        if (!study.title().isEmpty()) {
            page.line(study.title());
        }
        study.origin().settings().forEach(setting -> page.line("with --set " + setting));
        page.heading("Decision: " + verdict.decision().word());
        page.paragraph(verdict.sentence());
        for (Limit limit : verdict.limits()) {
            page.row(limit.name(), limit.decision().word());
        }
        page.heading("Written");
        for (Written file : files) {
            page.line("  " + file.file());
            page.line("    " + file.bytes() + " bytes, sha256");
            page.line("    " + file.sha256());
        }
        page.line("");
        page.paragraph(Cautions.SHORT);
        return page.toString();
    }

    /**
     * As an object.
     *
     * @param json where to write
     * @param study what was asked
     * @param verdict how it comes out
     * @param files what was written
     */
    public static void write(JsonPage json, Study study, Verdict verdict, List<Written> files) {
        json.object(() -> {
            StudyJson.write(json, study);
            json.object("verdict", () -> {
                json.text("decision", verdict.decision().word());
                json.text("sentence", verdict.sentence());
            });
            json.array("files", files, file -> {
                json.text("file", file.file());
                json.whole("bytes", file.bytes());
                json.text("sha256", file.sha256());
            });
        });
    }

    /**
     * As CSV.
     *
     * @param files what was written
     * @return text
     */
    public static String csv(List<Written> files) {
        return TableCsv.ofTexts(
                List.of("file", "bytes", "sha256"),
                files.stream()
                        .map(file -> List.of(file.file(), Figures.full(file.bytes()), file.sha256()))
                        .toList());
    }
}
