package flowshy.study.text;

/** Makes text of a user safe to print on one line: a terminal obeys control characters, a reader should not have to. */
public final class Printable {
    /** Longest text that a message repeats; the rest is cut, for a whole file may stand in one value. */
    private static final int LONGEST = 80;

    private Printable() {}

    /**
     * Text with every control, formatting and surrogate character replaced and cut to one short line.
     *
     * @param text any text
     * @return printable text of at most 80 characters
     */
    public static String of(String text) {
        StringBuilder out = new StringBuilder();
        int kept = 0;
        for (int i = 0; i < text.length(); ) {
            int c = text.codePointAt(i);
            i += Character.charCount(c);
            if (kept == LONGEST) {
                return out.append('…').toString();
            }
            out.appendCodePoint(isControl(c) ? '\uFFFD' : c);
            kept++;
        }
        return out.toString();
    }

    /**
     * Whether a character steers a terminal or the direction of text instead of being seen.
     *
     * @param codePoint the character
     * @return true for control, direction and unpaired surrogate characters
     */
    public static boolean isControl(int codePoint) {
        return switch (Character.getType(codePoint)) {
            case Character.CONTROL, Character.SURROGATE, Character.LINE_SEPARATOR, Character.PARAGRAPH_SEPARATOR ->
                true;
            case Character.FORMAT -> codePoint != 0x200D && codePoint != 0x00AD;
            default -> false;
        };
    }
}
