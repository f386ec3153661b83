package flowshy.report.chart.paper;

/** Text from outside as it may stand in a picture: one line, no control characters, no half of a character. */
final class PlainText {
    private PlainText() {}

    static String of(String text) {
        StringBuilder plain = new StringBuilder();
        text.codePoints().forEach(point -> {
            if (Character.isWhitespace(point) || Character.isSpaceChar(point)) {
                plain.append(' ');
            } else if ((point >= Character.MIN_SURROGATE && point <= Character.MAX_SURROGATE)
                    || point == 0xFFFE
                    || point == 0xFFFF) {
                plain.append('\uFFFD');
            } else if (!Character.isISOControl(point) && !(point >= 0x202A && point <= 0x202E)) {
                plain.appendCodePoint(point);
            }
        });
        return plain.toString().strip();
    }
}
