package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;

import de.siegmar.fastcsv.reader.CsvReader;
import de.siegmar.fastcsv.reader.CsvRecord;
import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Map;
import java.util.Set;
import java.util.stream.Stream;
import javax.imageio.ImageIO;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.condition.EnabledOnOs;
import org.junit.jupiter.api.condition.OS;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NodeList;

/** Charts as files: they open, hold the numbers of the JSON, say what they show, and are written whole or not at all. */
class ChartsTest {
    @TempDir
    Path folder;

    static List<Path> examples() {
        try (Stream<Path> all = Files.list(Path.of("examples"))) {
            List<Path> studies =
                    all.map(example -> example.resolve("study.yaml")).sorted().toList();
            assertThat(studies).hasSizeGreaterThan(10);
            return studies;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    static List<Path> some() {
        return examples().stream()
                .filter(study -> study.toString().matches(".*(workbench-air|water-tank|fan-tray|vacuum-package).*"))
                .toList();
    }

    @ParameterizedTest
    @MethodSource("some")
    void tablesAreThoseOfTheJson(Path study) throws IOException {
        Run run = Run.of("bands", study.toString(), "--json", "--chart", folder.toString());
        assertThat(run.err()).isEmpty();
        List<Map<String, Object>> charts =
                Json.objects(Json.object(Json.parse(run.out())).get("charts"));
        assertThat(charts).isNotEmpty();
        assertThat(names("svg")).hasSameSizeAs(charts);
        for (Map<String, Object> chart : charts) {
            List<String> lines = Files.readAllLines(folder.resolve(chart.get("name") + ".csv"));
            List<Map<String, Object>> rows = Json.objects(chart.get("rows"));
            assertThat(rows).isNotEmpty();
            assertThat(lines).hasSize(rows.size() + 1);
            List<String> heads = fields(lines.get(0));
            int numbers = 0;
            for (int i = 0; i < rows.size(); i++) {
                List<String> fields = fields(lines.get(i + 1));
                for (int column = 0; column < heads.size(); column++) {
                    Object value = rows.get(i).get(heads.get(column));
                    if (value instanceof Double number) {
                        assertThat(Double.parseDouble(fields.get(column))).isEqualTo(number);
                        numbers++;
                    } else if (value == null) {
                        assertThat(fields.get(column)).isEmpty();
                    }
                }
            }
            assertThat(numbers).as("%s", chart.get("name")).isGreaterThanOrEqualTo(8);
        }
    }

    /** Every command that draws. */
    static List<List<String>> drawing() {
        String tray = "examples/fan-tray/study.yaml";
        List<List<String>> all = new ArrayList<>();
        some().forEach(study -> all.add(List.of("bands", study.toString())));
        all.add(List.of("bands", tray, "--force-at", "80 Hz, 1 kHz"));
        all.add(List.of("lid", tray));
        all.add(List.of("fill", "examples/wrong-fill/study.yaml"));
        all.add(List.of("compare", "examples/lift-machinery/study.yaml"));
        all.add(List.of(
                "size",
                "examples/workbench-air/study.yaml",
                "--set",
                "finite-length=off",
                "--vary",
                "hair.diameter",
                "--to",
                "minimize",
                "mass"));
        all.add(List.of("fit", "examples/measured-pickup/study.yaml"));
        all.add(List.of("tolerance", "examples/potting-oil/study.yaml", "--samples", "512", "--of", "resonance"));
        all.add(List.of(
                "map",
                "examples/hoist-chain/study.yaml",
                "--across",
                "hair.diameter=40 um..120 um",
                "--down",
                "hair.length=0.3 mm..1.2 mm",
                "--steps",
                "13,9"));
        return all;
    }

    private static List<String> with(List<String> words, String... more) {
        List<String> all = new ArrayList<>(words);
        all.addAll(List.of(more));
        return all;
    }

    private static Run drawn(List<String> words, Path into) {
        Run run = Run.of(with(words, "--chart", into.toString()).toArray(String[]::new));
        assertThat(run.code()).as("%s: %s", words, run.err()).isIn(0, 3);
        return run;
    }

    @ParameterizedTest
    @MethodSource("drawing")
    void svgIsXmlWithWordsAndWithoutScript(List<String> words) throws Exception {
        drawn(words, folder);
        List<String> names = names("svg");
        assertThat(names).isNotEmpty();
        for (String name : names) {
            String text = Files.readString(folder.resolve(name + ".svg"));
            Document document = xml(text);
            Element root = document.getDocumentElement();
            assertThat(root.getNamespaceURI()).isEqualTo("http://www.w3.org/2000/svg");
            assertThat(root.getAttribute("role")).isEqualTo("img");
            assertThat(text(document, "title")).isNotBlank();
            assertThat(text(document, "desc")).hasSizeGreaterThan(20);
            assertThat(text.toLowerCase(java.util.Locale.ROOT))
                    .doesNotContain(
                            "<script", "javascript:", "<image", "href", "onload", "<!doctype", "<foreignobject");
            Set<String> ids = new HashSet<>();
            NodeList all = document.getElementsByTagName("*");
            for (int i = 0; i < all.getLength(); i++) {
                String id = ((Element) all.item(i)).getAttribute("id");
                assertThat(id.isEmpty() || ids.add(id)).as("id %s twice", id).isTrue();
                assertThat(id.isEmpty() || id.startsWith(name + "-")).isTrue();
            }
            assertThat(ids).hasSizeGreaterThanOrEqualTo(2);
        }
    }

    @Test
    void pngHasTheSizeAndDensityOfPrint() throws IOException {
        assertThat(Run.of("bands", "examples/workbench-air/study.yaml", "--chart", folder.toString())
                        .code())
                .isZero();
        for (String name : names("png")) {
            byte[] bytes = Files.readAllBytes(folder.resolve(name + ".png"));
            var image = ImageIO.read(new ByteArrayInputStream(bytes));
            String svg = Files.readString(folder.resolve(name + ".svg"));
            String box = svg.replaceFirst("(?s).*?viewBox=\"0 0 (\\d+ \\d+)\".*", "$1");
            double width = Double.parseDouble(box.split(" ", -1)[0]);
            double height = Double.parseDouble(box.split(" ", -1)[1]);
            assertThat(image.getWidth()).isEqualTo((int) Math.round(width * 300 / 72));
            assertThat(image.getHeight()).isEqualTo((int) Math.round(height * 300 / 72));
            // pHYs: 300 dpi are 11811 pixels a metre, 0x2E23 or ".#", twice, unit 1
            assertThat(new String(bytes, StandardCharsets.ISO_8859_1)).contains("pHYs\0\0.#\0\0.#\u0001");
        }
    }

    @ParameterizedTest
    @MethodSource("drawing")
    void sameStudySameBytes(List<String> words) throws IOException {
        Path one = folder.resolve("one");
        Path two = folder.resolve("two");
        drawn(words, one);
        drawn(words, two);
        try (Stream<Path> files = Files.list(one)) {
            List<Path> all = files.toList();
            assertThat(all).hasSizeGreaterThanOrEqualTo(3);
            for (Path file : all) {
                assertThat(two.resolve(file.getFileName().toString())).hasSameBinaryContentAs(file);
            }
        }
    }

    /** README names every chart, and no other. */
    @Test
    void readmeListsEveryChart() throws IOException {
        Set<String> drawn = new HashSet<>();
        for (List<String> words : drawing()) {
            Path into = folder.resolve("c" + drawn.size() + words.get(0));
            drawn(words, into);
            try (Stream<Path> files = Files.list(into)) {
                files.map(file -> file.getFileName().toString().replaceFirst("\\.[a-z]+$", ""))
                        .map(name -> name.replaceFirst("^force-along-hair-.*", "force-along-hair-FREQUENCY"))
                        .map(name -> name.replaceFirst("^variance-.*", "variance-FIGURE"))
                        .forEach(drawn::add);
            }
        }
        Set<String> listed = new HashSet<>();
        String readme = Files.readString(Path.of("README.md"));
        String charts = readme.substring(readme.indexOf("## Charts"));
        charts.substring(0, charts.indexOf("\n## ", 3))
                .lines()
                .filter(line -> line.startsWith("| "))
                .map(line -> line.split("\\|", -1)[2].strip())
                .filter(name -> name.startsWith("`"))
                .forEach(name -> listed.add(name.replace("`", "")));
        assertThat(listed).hasSizeGreaterThan(10).containsExactlyInAnyOrderElementsOf(drawn);
    }

    @Test
    void titlesOfAnyKindAreText() throws Exception {
        String title =
                "<script>alert(\\\"1\\\")</script> & <b>'q'</b> \uD83D\uDE80 \u05E9\u05DC\u05D5\u05DD \u0645\u0631\u062D\u0628\u0627";
        Path study = Files.writeString(
                folder.resolve("odd.yaml"),
                "title: \"" + title
                        + "\"\nhair: {length: 540 um, diameter: 105 um, density: 1.19 g/cm3}\nmedium: air\n");
        Run run = Run.of(
                "bands", study.toString(), "--chart", folder.resolve("out").toString());
        assertThat(run.err()).isEmpty();
        String svg = Files.readString(folder.resolve("out/rejection.svg"));
        assertThat(svg).doesNotContain("<script", "<b>");
        Document document = xml(svg);
        List<String> texts = new ArrayList<>();
        NodeList all = document.getElementsByTagName("text");
        for (int i = 0; i < all.getLength(); i++) {
            texts.add(all.item(i).getTextContent());
        }
        assertThat(texts).anyMatch(text -> text.startsWith("<script>alert(\"1\")</script> & <b>'q'</b> \uD83D\uDE80"));
    }

    @Test
    void aPlaceThatIsNoFolderGivesOneMessageAndLeavesNothing() throws IOException {
        Path file = Files.writeString(folder.resolve("file"), "mine");
        Run run = Run.of("bands", "examples/workbench-air/study.yaml", "--chart", file.toString());
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err().lines()).hasSize(1);
        assertThat(run.err()).contains("cannot write charts into " + file, "is a file");
        assertThat(file).hasContent("mine");
    }

    @Test
    void aNameThatIsTakenByAFolderLeavesTheOthersAsTheyWere() throws IOException {
        Path out = folder.resolve("out");
        Files.createDirectories(out.resolve("rejection.png"));
        Files.writeString(out.resolve("rejection.svg"), "old");
        Run run = Run.of("bands", "examples/workbench-air/study.yaml", "--chart", out.toString());
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("rejection.png");
        assertThat(out.resolve("rejection.svg")).hasContent("old");
        try (Stream<Path> left = Files.list(out)) {
            assertThat(left).hasSize(2);
        }
    }

    /** A folder that nobody may write to: the processes of the system cannot be given children. */
    @Test
    @EnabledOnOs(OS.LINUX)
    void aFolderThatCannotBeMadeGivesOneMessage() {
        Run run = Run.of("bands", "examples/workbench-air/study.yaml", "--chart", "/proc/flowshy-charts");
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.out()).isEmpty();
        assertThat(run.err().lines()).hasSize(1);
        assertThat(run.err()).startsWith("flowshy: cannot write charts into /proc/flowshy-charts: ");
    }

    @Test
    void severalStudiesGetAFolderEach() throws IOException {
        Run.of(
                "bands",
                "examples/workbench-air/study.yaml",
                "examples/water-tank/study.yaml",
                "--chart",
                folder.toString());
        assertThat(folder.resolve("study-1/rejection.svg")).exists();
        assertThat(folder.resolve("study-2/rejection.svg")).exists();
    }

    private static List<String> fields(String line) {
        try (CsvReader<CsvRecord> csv = CsvReader.builder().ofCsvRecord(line)) {
            return csv.iterator().next().getFields();
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private List<String> names(String ending) throws IOException {
        try (Stream<Path> files = Files.list(folder)) {
            return files.map(file -> file.getFileName().toString())
                    .filter(name -> name.endsWith("." + ending))
                    .map(name -> name.substring(0, name.length() - ending.length() - 1))
                    .sorted()
                    .toList();
        }
    }

    private static Document xml(String text) throws Exception {
        DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
        factory.setFeature("http://apache.org/xml/features/disallow-doctype-decl", true);
        factory.setNamespaceAware(true);
        var builder = factory.newDocumentBuilder();
        builder.setErrorHandler(null);
        return builder.parse(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)));
    }

    private static String text(Document document, String element) {
        return document.getElementsByTagName(element).item(0).getTextContent();
    }
}
