package flowshy.report.html.section;

import flowshy.report.Version;
import flowshy.report.html.Html;
import flowshy.study.Study;
import java.util.regex.Pattern;

/** All that anyone needs to make this page again: program, words of the command line, the study itself. */
final class ReproduceSection implements ReportSection {
    private static final Pattern PLAIN = Pattern.compile("[\\w./=:+-]+");

    @Override
    public String id() {
        return "reproduce";
    }

    @Override
    public String heading() {
        return "To make this page again";
    }

    @Override
    public void write(Html html, StudyReport report) {
        Study.Origin origin = report.study().origin();
        html.tag("p")
                .holds("Flowshy " + Version.number() + ", with the study below"
                        + (origin.filesRead().isEmpty() ? "" : " and the files named in it beside it")
                        + ". The same study gives the same bytes.");
        html.listing(command(origin));
        html.tag("h3").holds(() -> html.user(origin.file()));
        html.listing(origin.text());
    }

    private static String command(Study.Origin origin) {
        StringBuilder line = new StringBuilder("java -jar target/flowshy.jar report ").append(word(origin.file()));
        origin.settings().forEach(setting -> line.append(" \\\n    --set ").append(word(setting)));
        return line.append(" \\\n    --out report.html").toString();
    }

    /** As a shell reads it. */
    private static String word(String text) {
        return PLAIN.matcher(text).matches() ? text : "'" + text.replace("'", "'\\''") + "'";
    }
}
