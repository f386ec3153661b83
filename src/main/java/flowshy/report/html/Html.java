package flowshy.report.html;

import flowshy.study.text.Printable;
import java.util.Locale;
import java.util.regex.Pattern;

/**
 * Writes HTML that is also well-formed XML. Text is escaped, there is no way to an address outside the page, and only a drawing of our
 * own is taken as it stands.
 */
public final class Html {
    private static final Pattern NAME = Pattern.compile("[a-z][a-zA-Z0-9-]*");
    private static final Pattern PROLOGUE =
            Pattern.compile("^\\s*(?:<\\?[^>]*>\\s*|<!DOCTYPE[^>]*>\\s*|<!--.*?-->\\s*)*", Pattern.DOTALL);
    private static final Pattern OUTSIDE = Pattern.compile(
            "(?i)<script|<foreignObject|<!ENTITY|\\bon[a-z]+\\s*=|(?:href|src)\\s*=\\s*[\"'](?!#|data:image/)|url\\(\\s*[\"']?(?!#)");

    private final StringBuilder out = new StringBuilder();

    /** An empty page. */
    public Html() {}

    /**
     * Begins an element.
     *
     * @param name e.g. {@code p}
     * @return give it attributes, then what it holds
     */
    public Tag tag(String name) {
        return new Tag(checked(name));
    }

    /**
     * An element that holds a text.
     *
     * @param name e.g. {@code p}
     * @param text escaped
     */
    public void tag(String name, String text) {
        tag(name).holds(text);
    }

    /**
     * Text of ours.
     *
     * @param text escaped
     */
    public void text(String text) {
        escape(text);
    }

    /**
     * Text of the user: isolated, so that its direction does not turn what stands around it; characters that steer direction or a
     * terminal are shown by their number and not obeyed.
     *
     * @param text any
     */
    public void user(String text) {
        tag("bdi").with("dir", "auto").holds(shown(text, false));
    }

    /**
     * Text of the user as it stands, line for line.
     *
     * @param text any
     */
    public void listing(String text) {
        tag("pre")
                .with("dir", "ltr")
                .with("tabindex", "0")
                .holds(shown(text.replace("\r\n", "\n").replace('\r', '\n'), true));
    }

    /**
     * A number as print sets it, with the value in SI and twelve digits behind it for programs.
     *
     * @param amount number, unit, digits
     */
    public void amount(Amount amount) {
        tag("data").with("value", amount.machine()).holds(amount.text());
    }

    /**
     * A drawing made by this program.
     *
     * @param svg one element {@code svg} with its own name space, perhaps behind an XML head
     * @throws IllegalArgumentException if it is no SVG, or names something outside the page
     */
    public void drawing(String svg) {
        String plain = PROLOGUE.matcher(svg).replaceFirst("").strip();
        if (!plain.startsWith("<svg")
                || !plain.endsWith("</svg>")
                || OUTSIDE.matcher(plain).find()) {
            throw new IllegalArgumentException(
                    "not a self-contained drawing: " + plain.substring(0, Math.min(plain.length(), 80)));
        }
        out.append(plain);
    }

    /**
     * A style sheet of ours; its text must be free of markup.
     *
     * @param css the rules
     */
    void style(String css) {
        if (css.indexOf('<') >= 0 || css.indexOf('&') >= 0 || css.contains("url(") || css.contains("@import")) {
            throw new IllegalArgumentException("a style that is markup or leads outside");
        }
        out.append("<style>").append(css).append("</style>\n");
    }

    /** The first line. */
    void doctype() {
        out.append("<!DOCTYPE html>\n");
    }

    @Override
    public String toString() {
        return out.toString();
    }

    /** One element being written. */
    public final class Tag {
        private final String name;

        private Tag(String name) {
            this.name = name;
            out.append('<').append(name);
        }

        /**
         * An attribute.
         *
         * @param attribute its name
         * @param value escaped
         * @return this
         * @throws IllegalArgumentException if it would lead outside the page or run a script
         */
        public Tag with(String attribute, String value) {
            String low = checked(attribute).toLowerCase(Locale.ROOT);
            boolean outside =
                    (low.equals("href") && !value.startsWith("#")) || low.equals("src") || low.startsWith("on");
            if (outside) {
                throw new IllegalArgumentException(attribute + " leads outside the page: " + value);
            }
            out.append(' ').append(attribute).append("=\"");
            escape(value);
            out.append('"');
            return this;
        }

        /**
         * What it holds.
         *
         * @param inside writes it
         */
        public void holds(Runnable inside) {
            out.append('>');
            inside.run();
            out.append("</").append(name).append('>');
            if (BLOCKS.contains("," + name + ",")) {
                out.append('\n');
            }
        }

        /**
         * What it holds.
         *
         * @param text escaped
         */
        public void holds(String text) {
            holds(() -> escape(text));
        }

        /** Nothing: an element such as {@code meta} or {@code br}. */
        public void empty() {
            out.append("/>");
        }
    }

    private static final String BLOCKS =
            ",p,h1,h2,h3,li,ul,ol,dl,dd,tr,table,thead,tbody,caption,section,header,footer,main,nav,figure,figcaption,div,aside,details,summary,pre,head,body,html,title,";

    private static String checked(String name) {
        if (!NAME.matcher(name).matches()) {
            throw new IllegalArgumentException("no name: " + name);
        }
        return name;
    }

    private static String shown(String text, boolean lines) {
        StringBuilder shown = new StringBuilder();
        text.codePoints().forEach(c -> {
            boolean blank = c == '\t' || (lines && c == '\n');
            if (Printable.isControl(c) && !blank) {
                shown.append(String.format(Locale.ROOT, "[U+%04X]", c));
            } else {
                shown.appendCodePoint(c);
            }
        });
        return shown.toString();
    }

    private void escape(String text) {
        text.codePoints().forEach(c -> {
            switch (c) {
                case '&' -> out.append("&amp;");
                case '<' -> out.append("&lt;");
                case '>' -> out.append("&gt;");
                case '"' -> out.append("&quot;");
                case '\'' -> out.append("&#39;");
                default -> out.appendCodePoint(legal(c) ? c : 0xFFFD);
            }
        });
    }

    /** Characters that XML 1.0 allows, less the unassigned pair at the end of each plane and the old control characters. */
    private static boolean legal(int c) {
        return c == '\t'
                || c == '\n'
                || (c >= 0x20 && c <= 0x7E)
                || (c >= 0xA0 && c < 0xD800)
                || (c > 0xDFFF && (c & 0xFFFE) != 0xFFFE);
    }
}
