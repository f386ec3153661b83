package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;

import java.awt.image.BufferedImage;
import java.io.File;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Map;
import java.util.concurrent.TimeUnit;
import java.util.regex.Matcher;
import java.util.regex.Pattern;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import org.apache.pdfbox.Loader;
import org.apache.pdfbox.pdmodel.PDDocument;
import org.apache.pdfbox.pdmodel.PDPage;
import org.apache.pdfbox.text.PDFTextStripper;
import org.junit.jupiter.api.BeforeAll;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/**
 * The report as a browser shows it. Part of the gate, which needs {@code chromium-headless-shell}, a package of Debian; without it this
 * fails, so that nobody takes a page for looked at that was not.
 */
class ReportInBrowserIT {
    private static final String BROWSER = "chromium-headless-shell";
    private static final int LIGHT = 0xFFFFFF;
    private static final int DARK = 0x15191C;

    /** Runs in a copy of the page whose policy was taken out, for the policy would rightly stop it. */
    private static final String MEASURE = """
            const wide = [...document.querySelectorAll('.wide, pre, figure, p, li, svg')];
            document.documentElement.setAttribute('data-measured', JSON.stringify({
              window: innerWidth,
              page: document.documentElement.scrollWidth,
              beyond: wide.filter(e => { const r = e.getBoundingClientRect(); return r.width > 0 && (r.left < -0.5 || r.right > innerWidth + 0.5); }).length,
              drawings: document.querySelectorAll('svg').length,
              flat: [...document.querySelectorAll('figure > svg')].filter(e => { const r = e.getBoundingClientRect(); return r.width < 200 || r.height < 100; }).length,
              sections: document.querySelectorAll('section').length,
              dark: matchMedia('(prefers-color-scheme: dark)').matches,
              title: document.querySelector('h1').textContent
            }));
            """;

    @TempDir
    static Path folder;

    private static Path browser;
    private static Path page;

    @BeforeAll
    static void findBrowserAndMakePage() throws IOException {
        browser = Stream.of(System.getenv("PATH").split(Pattern.quote(File.pathSeparator), -1))
                .map(place -> Path.of(place, BROWSER))
                .filter(Files::isExecutable)
                .findFirst()
                .orElseThrow(() -> new AssertionError(BROWSER + " is not on the path: apt-get install " + BROWSER));
        page = folder.resolve("page.html");
        Run run = Run.of(
                "report",
                "examples/weather-mast/study.yaml",
                "--set",
                "title=<b>Mast</b> שלום 😀",
                "--out",
                page.toString());
        assertThat(run.err()).isEmpty();
        String measured = Files.readString(page)
                .replaceFirst("<meta http-equiv=\"Content-Security-Policy\"[^>]*/>", "")
                .replace("</body>", "<script>" + MEASURE + "</script></body>");
        Files.writeString(folder.resolve("measured.html"), measured);
    }

    private static String run(String... words) {
        List<String> line = new ArrayList<>(List.of(
                browser.toString(),
                "--no-sandbox",
                "--disable-gpu",
                "--hide-scrollbars",
                "--force-device-scale-factor=1"));
        line.addAll(List.of(words));
        try {
            Path out = Files.createTempFile(folder, "out", ".txt");
            Process process = new ProcessBuilder(line)
                    .redirectOutput(out.toFile())
                    .redirectError(ProcessBuilder.Redirect.DISCARD)
                    .start();
            if (!process.waitFor(120, TimeUnit.SECONDS)) {
                process.destroyForcibly();
                throw new AssertionError("the browser did not end: " + line);
            }
            assertThat(process.exitValue()).as(line.toString()).isZero();
            return Files.readString(out);
        } catch (IOException e) {
            throw new AssertionError(line.toString(), e);
        } catch (InterruptedException e) {
            Thread.currentThread().interrupt();
            throw new AssertionError(line.toString(), e);
        }
    }

    private static String scheme(boolean dark) {
        return "--blink-settings=preferredColorScheme=" + (dark ? 0 : 1);
    }

    @ParameterizedTest
    @CsvSource({"1100, false", "1100, true", "390, false", "390, true"})
    void fitsTheWindow(int width, boolean dark) {
        String dom = run(
                "--dump-dom",
                scheme(dark),
                "--window-size=" + width + ",900",
                folder.resolve("measured.html").toUri().toString());
        Matcher found = Pattern.compile("data-measured=\"([^\"]*)\"").matcher(dom);
        assertThat(found.find()).as("the page was laid out").isTrue();
        Map<String, Object> measured = Json.object(Json.parse(
                found.group(1).replace("&quot;", "\"").replace("&lt;", "<").replace("&gt;", ">")));
        assertThat(measured.get("window")).isEqualTo((double) width);
        assertThat((Double) measured.get("page"))
                .as("nothing is wider than the window")
                .isLessThanOrEqualTo(width);
        assertThat(measured.get("beyond")).as("boxes beyond the window").isEqualTo(0.0);
        assertThat(measured.get("flat")).as("drawings without a size").isEqualTo(0.0);
        assertThat((Double) measured.get("sections")).isGreaterThan(10.0);
        assertThat(measured.get("dark")).isEqualTo(dark);
        assertThat(measured.get("title")).isEqualTo("<b>Mast</b> שלום 😀");
    }

    @ParameterizedTest
    @CsvSource({"1100, false", "1100, true", "390, false", "390, true"})
    void isSeen(int width, boolean dark) throws IOException {
        Path shot = folder.resolve("shot-" + width + "-" + dark + ".png");
        run(
                "--screenshot=" + shot,
                scheme(dark),
                "--window-size=" + width + ",2400",
                page.toUri().toString());
        BufferedImage seen = ImageIO.read(shot.toFile());
        assertThat(seen.getWidth()).isEqualTo(width);
        int ground = dark ? DARK : LIGHT;
        assertThat(seen.getRGB(1, 1) & 0xFFFFFF).isEqualTo(ground);
        int inked = 0;
        for (int x = 0; x < width; x++) {
            for (int y = 0; y < seen.getHeight(); y++) {
                inked += (seen.getRGB(x, y) & 0xFFFFFF) == ground ? 0 : 1;
            }
        }
        assertThat((double) inked / (width * seen.getHeight()))
                .as("share of the window with something on it")
                .isBetween(0.02, 0.9);
    }

    @Test
    void printsOnA4() throws IOException {
        Path sheet = folder.resolve("printed.pdf");
        run("--no-pdf-header-footer", "--print-to-pdf=" + sheet, page.toUri().toString());
        try (PDDocument document = Loader.loadPDF(sheet.toFile())) {
            assertThat(document.getNumberOfPages()).isBetween(4, 16);
            PDFTextStripper stripper = new PDFTextStripper();
            int at = 0;
            for (PDPage one : document.getPages()) {
                at++;
                assertThat(one.getMediaBox().getWidth()).isBetween(594.0f, 597.0f);
                assertThat(one.getMediaBox().getHeight()).isBetween(840.0f, 843.0f);
                stripper.setStartPage(at);
                stripper.setEndPage(at);
                assertThat(stripper.getText(document)).as("page %d", at).hasSizeGreaterThan(40);
            }
            stripper.setStartPage(1);
            stripper.setEndPage(at);
            assertThat(stripper.getText(document)).contains("Signatures", "confirmed by test", "SHA-256");
        }
    }
}
