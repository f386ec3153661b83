package flowshy.report.html;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatIllegalArgumentException;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

class HtmlTest {
    private final Html html = new Html();

    @Test
    void escapesTextAndAttributes() {
        html.tag("p").with("title", "a \"b\" <c> & 'd'").holds("<script>alert(1)</script> & \"quotes\"");
        assertThat(html)
                .hasToString("<p title=\"a &quot;b&quot; &lt;c&gt; &amp; &#39;d&#39;\">"
                        + "&lt;script&gt;alert(1)&lt;/script&gt; &amp; &quot;quotes&quot;</p>\n");
    }

    @Test
    void isolatesTheUsersText() {
        html.user("שלום <b>");
        assertThat(html).hasToString("<bdi dir=\"auto\">שלום &lt;b&gt;</bdi>");
    }

    @Test
    void showsCharactersThatSteerByTheirNumber() {
        html.user("a\u202Eb\u0007c\nd");
        assertThat(html).hasToString("<bdi dir=\"auto\">a[U+202E]b[U+0007]c[U+000A]d</bdi>");
    }

    @Test
    void keepsTheLinesOfAListing() {
        html.listing("a: 1\r\nb:\t<2>\n");
        assertThat(html.toString()).contains(">a: 1\nb:\t&lt;2&gt;\n</pre>");
    }

    @Test
    void replacesWhatXmlCannotHold() {
        html.text("a\u0000\uFFFE\uD800z");
        assertThat(html).hasToString("a\uFFFD\uFFFD\uFFFDz");
    }

    @Test
    void keepsCharactersBeyondTheFirstPlane() {
        html.text("😀");
        assertThat(html).hasToString("😀");
    }

    @Test
    void hasNoWayOutOfThePage() {
        assertThatIllegalArgumentException().isThrownBy(() -> html.tag("a").with("href", "https://example.org"));
        assertThatIllegalArgumentException().isThrownBy(() -> html.tag("a").with("href", "javascript:alert(1)"));
        assertThatIllegalArgumentException().isThrownBy(() -> html.tag("img").with("src", "picture.png"));
        assertThatIllegalArgumentException().isThrownBy(() -> html.tag("p").with("onclick", "go()"));
        assertThatIllegalArgumentException().isThrownBy(() -> html.tag("p><script"));
        html.tag("a").with("href", "#bands").holds("bands");
        assertThat(html.toString()).endsWith("<a href=\"#bands\">bands</a>");
    }

    @ParameterizedTest
    @ValueSource(
            strings = {
                "<p>no drawing</p>",
                "<svg><script>go()</script></svg>",
                "<svg onload=\"go()\"></svg>",
                "<svg><image xlink:href=\"http://example.org/a.png\"/></svg>",
                "<svg><a href='https://example.org'/></svg>",
                "<svg><foreignObject/></svg>",
                "<svg><rect style=\"fill:url(http://example.org)\"/></svg>",
                "<svg></svg><p></p>"
            })
    void refusesADrawingThatLeadsOutside(String svg) {
        assertThatIllegalArgumentException().isThrownBy(() -> html.drawing(svg));
    }

    @Test
    void takesADrawingWithoutItsHead() {
        html.drawing("<?xml version=\"1.0\"?>\n<!DOCTYPE svg>\n<svg><use href=\"#a\" clip-path=\"url(#b)\"/></svg>\n");
        assertThat(html).hasToString("<svg><use href=\"#a\" clip-path=\"url(#b)\"/></svg>");
    }
}
