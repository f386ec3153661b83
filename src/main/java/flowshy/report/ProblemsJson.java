package flowshy.report;

import flowshy.study.text.Problem;
import java.util.List;

/** What is wrong with the input, as JSON for programs. */
public final class ProblemsJson {
    private ProblemsJson() {}

    /**
     * Problems of a study.
     *
     * @param problems in the order found
     * @return an object with a list {@code problems}
     */
    public static String of(List<Problem> problems) {
        JsonPage json = new JsonPage();
        json.object(() -> json.array("problems", problems, problem -> {
            json.text("at", problem.position().toString());
            json.text("file", problem.position().origin());
            json.whole("line", problem.position().line());
            json.whole("column", problem.position().column());
            json.text("key", problem.path());
            json.text("found", problem.found());
            json.text("accepted", problem.accepted());
            problem.nearest().ifPresent(near -> json.text("nearest", near));
            json.text("message", problem.text());
        }));
        return json.finish();
    }

    /**
     * A single message.
     *
     * @param message in words
     * @return an object with a list {@code problems} of one
     */
    public static String of(String message) {
        JsonPage json = new JsonPage();
        json.object(() -> json.array("problems", List.of(message), text -> json.text("message", text)));
        return json.finish();
    }
}
