package flowshy.report.pdf;

import com.openhtmltopdf.bidi.support.ICUBidiReorderer;
import com.openhtmltopdf.bidi.support.ICUBidiSplitter;
import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FSFontUseCase;
import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.FontStyle;
import com.openhtmltopdf.outputdevice.helper.BaseRendererBuilder.TextDirection;
import com.openhtmltopdf.outputdevice.helper.ExternalResourceControlPriority;
import com.openhtmltopdf.pdfboxout.PdfBoxRenderer;
import com.openhtmltopdf.pdfboxout.PdfRendererBuilder;
import com.openhtmltopdf.svgsupport.BatikSVGDrawer;
import com.openhtmltopdf.util.XRLog;
import flowshy.report.OwnTypeface;
import flowshy.report.Version;
import flowshy.report.html.Page;
import java.awt.Font;
import java.awt.color.ColorSpace;
import java.awt.color.ICC_Profile;
import java.io.ByteArrayOutputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.util.Calendar;
import java.util.EnumSet;
import java.util.GregorianCalendar;
import java.util.Locale;
import java.util.TimeZone;
import java.util.logging.Level;
import java.util.logging.Logger;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.common.PDMetadata;

/** A page of ours as PDF/A on A4: fixed dates and a fixed identity, so that the same page gives the same bytes. */
public final class PdfPage {
    /** Says on standard error which typefaces the machine has; ours are in the file. */
    private static final Logger TALKATIVE = Logger.getLogger("org.apache");

    private static final Pattern CLOCK = Pattern.compile("(?<=<xmp:CreateDate>)[^<]*");

    private PdfPage() {}

    /**
     * Lays a page out on paper.
     *
     * @param html made by {@link Page}
     * @return bytes of the file
     */
    public static byte[] of(String html) {
        TALKATIVE.setLevel(Level.SEVERE);
        XRLog.setLoggingEnabled(false);
        try (PDDocument document = new PDDocument()) {
            try (PdfBoxRenderer renderer = renderer(html, document)) {
                renderer.layout();
                renderer.createPDFWithoutClosing();
                withoutClock(document);
                document.setDocumentId((long) html.hashCode());
                ByteArrayOutputStream bytes = new ByteArrayOutputStream();
                document.save(bytes);
                return bytes.toByteArray();
            }
        } catch (IOException e) { // all in memory; the signature says it could
            throw new UncheckedIOException(e);
        }
    }

    private static PdfBoxRenderer renderer(String html, PDDocument document) {
        PdfRendererBuilder builder = new PdfRendererBuilder();
        builder.usePDDocument(document);
        builder.withHtmlContent(numbered(Page.onPaper(html)), null);
        builder.withProducer("Flowshy " + Version.number());
        builder.useSVGDrawer(new BatikSVGDrawer());
        builder.useUnicodeBidiSplitter(new ICUBidiSplitter.ICUBidiSplitterFactory());
        builder.useUnicodeBidiReorderer(new ICUBidiReorderer());
        builder.useUnicodeLineBreaker(new NumberBreaker());
        builder.defaultTextDirection(TextDirection.LTR);
        builder.useReplacementText("\u25A1");
        builder.useExternalResourceAccessControl(
                (address, kind) -> false, ExternalResourceControlPriority.RUN_BEFORE_RESOLVING_URI);
        builder.usePdfAConformance(PdfRendererBuilder.PdfAConformance.PDFA_3_U);
        builder.useColorProfile(ICC_Profile.getInstance(ColorSpace.CS_sRGB).getData());
        builder.usePdfUaAccessibility(true);
        typeface(builder, "DejaVuSans.ttf", "DejaVu Sans", 400, FontStyle.NORMAL);
        typeface(builder, "DejaVuSans-Bold.ttf", "DejaVu Sans", 700, FontStyle.NORMAL);
        typeface(builder, "DejaVuSans-Oblique.ttf", "DejaVu Sans", 400, FontStyle.ITALIC);
        typeface(builder, "DejaVuSansMono.ttf", "DejaVu Sans Mono", 400, FontStyle.NORMAL);
        return builder.buildPdfRenderer();
    }

    /** Characters that the typeface has not got, such as Chinese ones, stand as their numbers: none is lost. */
    private static String numbered(String html) {
        Font font = OwnTypeface.plain(1.0f);
        StringBuilder shown = new StringBuilder(html.length());
        html.codePoints().forEach(c -> {
            if (c < ' ' || font.canDisplay(c) || !Character.isDefined(c) || Character.getType(c) == Character.FORMAT) {
                shown.appendCodePoint(c);
            } else {
                shown.append(String.format(Locale.ROOT, "[U+%04X]", c));
            }
        });
        return shown.toString();
    }

    private static void typeface(PdfRendererBuilder builder, String file, String family, int weight, FontStyle style) {
        builder.useFont(
                () -> OwnTypeface.open(file),
                family,
                weight,
                style,
                true,
                EnumSet.of(FSFontUseCase.DOCUMENT, FSFontUseCase.SVG));
    }

    /** The page maker writes the hour of its work twice; here it is the beginning of the epoch, the same in both places. */
    private static void withoutClock(PDDocument document) throws IOException {
        Calendar never = new GregorianCalendar(TimeZone.getTimeZone("UTC"), Locale.ROOT);
        never.setTimeInMillis(0L);
        document.getDocumentInformation().setCreationDate(never);
        PDMetadata metadata = document.getDocumentCatalog().getMetadata();
        String words = new String(metadata.toByteArray(), StandardCharsets.UTF_8);
        String still = CLOCK.matcher(words).replaceAll(Matcher.quoteReplacement("1970-01-01T00:00:00+00:00"));
        metadata.importXMPMetadata(still.getBytes(StandardCharsets.UTF_8));
    }
}
