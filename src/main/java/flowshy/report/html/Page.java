package flowshy.report.html;

import java.io.IOException;
import java.io.InputStream;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.function.Consumer;
import java.util.regex.MatchResult;
import java.util.regex.Matcher;
import java.util.regex.Pattern;

/** The frame of a page: head, policy, style. One file that needs nothing from anywhere. */
public final class Page {
    /** Nothing is loaded, nothing runs; only the style in the page itself counts. */
    private static final String POLICY =
            "default-src 'none'; style-src 'unsafe-inline'; base-uri 'none'; form-action 'none'";

    private static final Pattern STYLE = Pattern.compile("<style>.*?</style>", Pattern.DOTALL);
    private static final Pattern COLOUR = Pattern.compile("--([a-z-]+):\\s*(#[0-9a-f]{6});");

    /** What stands before it in the palette holds in the light and on paper. */
    private static final Pattern LIGHT = Pattern.compile("@media");

    /** A shape or group of a drawing with an opacity: what stands before it, the share, what stands behind. */
    private static final Pattern SHEER = Pattern.compile(
            "<((?:g|rect|path|line|polygon|polyline|circle|ellipse|text)\\b[^>]*?) opacity=\"([^\"]*)\"([^>/]*)");

    private Page() {}

    /**
     * A page.
     *
     * @param title any text, shown by the browser
     * @param body writes what the page holds
     * @return HTML that is well-formed XML
     */
    public static String of(String title, Consumer<Html> body) {
        return of(title, body, read("palette.css") + read("screen.css") + read("print.css"));
    }

    /**
     * The same page with the style for paper, for a maker that knows no more than CSS 2.1.
     *
     * @param page made here
     * @return HTML that is well-formed XML
     */
    public static String onPaper(String page) {
        String style = read("paper.css");
        Matcher colour = COLOUR.matcher(LIGHT.split(read("palette.css"), 2)[0]);
        while (colour.find()) {
            style = style.replace("var(--" + colour.group(1) + ")", colour.group(2));
        }
        String paper = STYLE.matcher(page).replaceFirst(Matcher.quoteReplacement("<style>" + style + "</style>"));
        return SHEER.matcher(paper).replaceAll(shape -> Matcher.quoteReplacement(sheer(shape)));
    }

    /** The maker stumbles over the opacity of a shape as a whole; that of its filling and its line, it can. */
    private static String sheer(MatchResult shape) {
        String others = shape.group(1) + shape.group(3);
        String share = shape.group(2);
        return "<" + others + (others.contains(" fill-opacity=") ? "" : " fill-opacity=\"" + share + "\"")
                + (others.contains(" stroke-opacity=") ? "" : " stroke-opacity=\"" + share + "\"");
    }

    private static String of(String title, Consumer<Html> body, String style) {
        Html html = new Html();
        html.doctype();
        html.tag("html")
                .with("xmlns", "http://www.w3.org/1999/xhtml")
                .with("lang", "en")
                .holds(() -> {
                    html.tag("head").holds(() -> {
                        html.tag("meta").with("charset", "utf-8").empty();
                        html.tag("meta")
                                .with("http-equiv", "Content-Security-Policy")
                                .with("content", POLICY)
                                .empty();
                        html.tag("meta")
                                .with("name", "viewport")
                                .with("content", "width=device-width, initial-scale=1")
                                .empty();
                        html.tag("meta")
                                .with("name", "color-scheme")
                                .with("content", "light dark")
                                .empty();
                        html.tag("meta")
                                .with("name", "referrer")
                                .with("content", "no-referrer")
                                .empty();
                        html.tag("title", title);
                        html.style(style);
                    });
                    html.tag("body").holds(() -> body.accept(html));
                });
        return html.toString();
    }

    private static String read(String name) {
        try (InputStream file = Page.class.getResourceAsStream(name)) {
            return new String(file.readAllBytes(), StandardCharsets.UTF_8);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }
}
