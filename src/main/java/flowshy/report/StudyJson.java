package flowshy.report;

import flowshy.study.Study;

/** The head of every answer: which study, which version, which defaults. */
final class StudyJson {
    private StudyJson() {}

    /**
     * Writes the fields {@code study} and {@code taken_as}.
     *
     * @param json with an open object
     * @param study what was asked
     */
    static void write(JsonPage json, Study study) {
        json.object("study", () -> {
            json.text("title", study.title());
            json.text("file", study.origin().file());
            json.text("version", Version.number());
            json.text("sha256", study.origin().sha256());
            json.array("files_read", study.origin().filesRead(), file -> {
                json.text("file", file.file());
                json.text("sha256", file.sha256());
            });
            json.texts("set", study.origin().settings());
            json.object("document", () -> study.document().forEach(json::text));
        });
        json.array("taken_as", study.takenAs(), taken -> {
            json.text("key", taken.key());
            json.text("value", taken.value());
            json.text("why", taken.why());
        });
    }
}
