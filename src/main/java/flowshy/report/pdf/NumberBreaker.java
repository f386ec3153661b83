package flowshy.report.pdf;

import com.openhtmltopdf.extend.FSTextBreaker;
import java.text.BreakIterator;
import java.util.Locale;

/** Where a line may end: where the JDK says, but not within a number, which it would cut behind the point after a sign, and at {@code ×}. */
final class NumberBreaker implements FSTextBreaker {
    private final BreakIterator lines = BreakIterator.getLineInstance(Locale.ROOT);
    private String text = "";

    @Override
    public void setText(String newText) {
        text = newText;
        lines.setText(newText);
    }

    @Override
    public int next() {
        int at = lines.next();
        while (at != BreakIterator.DONE && at > 0 && at < text.length() && cuts(at)) {
            at = lines.next();
        }
        return at;
    }

    private boolean cuts(int at) {
        char before = text.charAt(at - 1);
        char after = text.charAt(at);
        boolean point = before == '.' && Character.isDigit(after);
        boolean power = Character.isDigit(before) && after == '×';
        return point || power;
    }
}
