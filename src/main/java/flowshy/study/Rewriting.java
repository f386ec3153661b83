package flowshy.study;

import flowshy.study.keys.Field;
import flowshy.study.text.Position;
import flowshy.study.text.Problem;
import flowshy.study.text.StudyException;
import java.util.Optional;

/** The text of a study with numbers replaced where they stand; all else, comments too, stays as it was. */
final class Rewriting {
    private String text;

    Rewriting(String text) {
        this.text = text;
    }

    /**
     * Replaces a number.
     *
     * @throws StudyException if it does not stand in the text as read
     */
    void replace(Field field, String value) {
        Position at = field.position();
        Optional<Integer> offset = field.given() && at.line() > 0 ? offset(at) : Optional.empty();
        if (offset.isPresent()) {
            int start = offset.get();
            for (String quote : new String[] {"", "'", "\""}) {
                String old = quote + field.written() + quote;
                if (text.startsWith(old, start)) {
                    text = text.substring(0, start) + quote + value + quote + text.substring(start + old.length());
                    return;
                }
            }
        }
        throw new StudyException(Problem.of(
                Position.label("--write"),
                field.path(),
                "does not stand in the file with its number",
                "state it there, without --set, or set it yourself"));
    }

    String text() {
        return text;
    }

    /** Columns count code points; line ends are LF, CR LF or CR. */
    private Optional<Integer> offset(Position at) {
        int line = 1;
        int start = 0;
        for (int i = 0; i < text.length() && line < at.line(); i++) {
            char c = text.charAt(i);
            if (c == '\n' || (c == '\r' && !(i + 1 < text.length() && text.charAt(i + 1) == '\n'))) {
                line++;
                start = i + 1;
            }
        }
        return line == at.line() && text.codePointCount(start, text.length()) >= at.column()
                ? Optional.of(text.offsetByCodePoints(start, at.column() - 1))
                : Optional.empty();
    }
}
