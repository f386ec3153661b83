package flowshy.report.pdf;

import static org.assertj.core.api.Assertions.assertThat;

import flowshy.report.html.Page;
import java.awt.image.BufferedImage;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.Arrays;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.cos.COSName;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.pdmodel.font.PDFont;
import org.apache.pdfbox.rendering.PDFRenderer;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.Test;

class PdfPageTest {
    private static final float A4_WIDTH = 595.276f;
    private static final float A4_HEIGHT = 841.890f;

    private static String page() {
        return Page.of(
                "Sensor µ",
                html -> html.tag("main").holds(() -> {
                    html.tag("h1").holds(() -> html.user("Pouť & <b> שלום Ωμ 😀"));
                    html.tag("p", "5.507×10⁻¹⁶ kg·m², m/s²/√Hz, 300 µm ✓ ✗ –");
                    html.listing("hair: {length: 5 um}\n");
                    html.drawing(
                            "<svg xmlns=\"http://www.w3.org/2000/svg\" viewBox=\"0 0 100 50\" width=\"100\" height=\"50\"><title>t</title>"
                                    + "<rect width=\"100\" height=\"50\" style=\"fill:#0b5d36\"/><g opacity=\"0.4\"><rect width=\"5\" height=\"5\" opacity=\"0.5\"/></g><text x=\"5\" y=\"20\">drawn µ</text></svg>");
                    for (int i = 0; i < 120; i++) {
                        html.tag("p", "line " + i);
                    }
                }));
    }

    @Test
    void laysOutOnA4WithItsTypefaceInside() throws IOException {
        try (PDDocument document = Loader.loadPDF(PdfPage.of(page()))) {
            assertThat(document.getNumberOfPages()).isBetween(2, 5);
            int fonts = 0;
            for (PDPage sheet : document.getPages()) {
                assertThat(sheet.getMediaBox().getWidth()).isBetween(A4_WIDTH - 0.5f, A4_WIDTH + 0.5f);
                assertThat(sheet.getMediaBox().getHeight()).isBetween(A4_HEIGHT - 0.5f, A4_HEIGHT + 0.5f);
                for (COSName name : sheet.getResources().getFontNames()) {
                    PDFont font = sheet.getResources().getFont(name);
                    assertThat(font.isEmbedded()).as(font.getName()).isTrue();
                    fonts++;
                }
            }
            assertThat(fonts).isPositive();
            String text = new PDFTextStripper().getText(document);
            assertThat(text)
                    .contains("Pouť & <b>", "Ωμ 😀", "5.507×10⁻¹⁶ kg·m², m/s²/√Hz, 300 µm ✓ ✗ –")
                    .contains("hair: {length: 5 um}")
                    .contains("line 119")
                    .doesNotContain("\u25A1");
            assertThat(document.getDocumentInformation().getTitle()).isEqualTo("Sensor µ");
            assertThat(document.getDocumentCatalog().getStructureTreeRoot()).isNotNull();
        }
    }

    /** At any width: the words before each number push it over the edge of a line somewhere. */
    @Test
    void noLineEndsWithinANumber() throws IOException {
        StringBuilder numbers = new StringBuilder();
        for (int i = 0; i < 400; i++) {
            numbers.append("x".repeat(1 + i % 7)).append(" −0.123 +0.456 2.93×10⁻⁴ ");
        }
        String page = Page.of("Numbers", html -> html.tag("p", numbers.toString()));
        try (PDDocument document = Loader.loadPDF(PdfPage.of(page))) {
            String[] lines = new PDFTextStripper().getText(document).split("\\R");
            assertThat(lines).hasSizeGreaterThan(50);
            assertThat(lines)
                    .allSatisfy(line -> assertThat(line.strip())
                            .doesNotEndWith(".")
                            .doesNotEndWith("2.93")
                            .doesNotStartWith("×"));
        }
    }

    @Test
    void theSamePageGivesTheSameBytes() throws IOException {
        byte[] first = PdfPage.of(page());
        byte[] second = PdfPage.of(page());
        assertThat(first).hasSizeGreaterThan(1000);
        assertThat(Arrays.equals(first, second)).isTrue();
        String raw = new String(first, StandardCharsets.ISO_8859_1);
        assertThat(raw)
                .startsWith("%PDF-1.")
                .contains("<xmp:CreateDate>1970-01-01T00:00:00+00:00<")
                .doesNotContainPattern("20[0-9]{2}-[01][0-9]-[0-3][0-9]T");
        try (PDDocument document = Loader.loadPDF(first)) {
            assertThat(document.getDocumentInformation().getCreationDate().getTimeInMillis())
                    .isZero();
            assertThat(document.getDocumentInformation().getModificationDate()).isNull();
        }
    }

    @Test
    void drawsWhatIsDrawn() throws IOException {
        try (PDDocument document = Loader.loadPDF(PdfPage.of(page()))) {
            BufferedImage sheet = new PDFRenderer(document).renderImage(0);
            int green = 0;
            for (int x = 0; x < sheet.getWidth(); x++) {
                for (int y = 0; y < sheet.getHeight(); y++) {
                    green += (sheet.getRGB(x, y) & 0xFFFFFF) == 0x0B5D36 ? 1 : 0;
                }
            }
            assertThat(green).as("points of the drawing's ground").isGreaterThan(2000);
        }
    }

    @Test
    void losesNoCharacterThatItsTypefaceLacks() throws IOException {
        String page = Page.of("t", html -> html.tag("p").holds(() -> html.user("a振b🙂c")));
        try (PDDocument document = Loader.loadPDF(PdfPage.of(page))) {
            assertThat(new PDFTextStripper().getText(document)).contains("a[U+632F]b[U+1F642]c");
        }
    }

    @Test
    void setsRightToLeftTextFromRightToLeft() throws IOException {
        String page = Page.of("t", html -> html.tag("p").holds(() -> html.user("שלום")));
        try (PDDocument document = Loader.loadPDF(PdfPage.of(page))) {
            // the stripper turns the line round where its glyphs stand from right to left
            assertThat(new PDFTextStripper().getText(document)).contains("שלום");
        }
    }
}
