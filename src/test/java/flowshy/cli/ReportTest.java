package flowshy.cli;

import static org.assertj.core.api.Assertions.assertThat;

import flowshy.math.Figures;
import flowshy.report.chart.Chart;
import flowshy.report.html.section.StudyReport;
import flowshy.study.StudyReader;
import java.io.IOException;
import java.io.StringReader;
import java.io.UncheckedIOException;
import java.nio.charset.StandardCharsets;
import java.nio.file.Files;
import java.nio.file.Path;
import java.security.MessageDigest;
import java.util.ArrayList;
import java.util.HashMap;
import java.util.HexFormat;
import java.util.List;
import java.util.Map;
import java.util.stream.Stream;
import javax.xml.parsers.DocumentBuilderFactory;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.MethodSource;
import org.w3c.dom.Document;
import org.w3c.dom.Element;
import org.w3c.dom.NamedNodeMap;
import org.w3c.dom.Node;
import org.w3c.dom.NodeList;
import org.xml.sax.InputSource;

/** The report as a user makes it: a strict parser reads it, it leads nowhere, and its numbers are those of the JSON. */
class ReportTest {
    private static final String SMALL =
            "hair: {length: 700 um, diameter: 80 um, density: 1.2 g/cm3}\nmedium: air\nfinite-length: off\n";

    /** Page and answer of an example, made once for all that is asked of them. */
    private static final Map<String, Made> MADE = new HashMap<>();

    @TempDir
    Path folder;

    private record Made(String page, int code, Map<String, Object> json, int bandsCode) {}

    private Made made(String study) {
        Made known = MADE.get(study);
        if (known == null) {
            Path file = folder.resolve("made.html");
            Run run = Run.of("report", study, "--out", file.toString());
            assertThat(run.err()).isEmpty();
            Run bands = Run.of("bands", study, "--json");
            known = new Made(read(file), run.code(), Json.object(Json.parse(bands.out())), bands.code());
            MADE.put(study, known);
        }
        return known;
    }

    static List<String> examples() {
        try (Stream<Path> folders = Files.list(Path.of("examples"))) {
            List<String> studies = folders.map(example -> example.resolve("study.yaml"))
                    .filter(Files::exists)
                    .map(Path::toString)
                    .sorted()
                    .toList();
            assertThat(studies).hasSizeGreaterThanOrEqualTo(15);
            return studies;
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private Path study(String name, String text) {
        try {
            return Files.writeString(folder.resolve(name), text);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    private String page(Path study, String... more) {
        Path file = folder.resolve("page.html");
        List<String> words = new ArrayList<>(List.of("report", study.toString(), "--out", file.toString()));
        words.addAll(List.of(more));
        Run run = Run.of(words.toArray(String[]::new));
        assertThat(run.err()).isEmpty();
        assertThat(run.code()).isIn(0, 3);
        return read(file);
    }

    private static String read(Path file) {
        try {
            return Files.readString(file);
        } catch (IOException e) {
            throw new UncheckedIOException(e);
        }
    }

    /** As strictly as XML is read: one unclosed element, one bare ampersand, one repeated attribute and it fails. */
    private static Document parse(String page) {
        try {
            DocumentBuilderFactory factory = DocumentBuilderFactory.newInstance();
            factory.setNamespaceAware(true);
            factory.setFeature("http://apache.org/xml/features/nonvalidating/load-external-dtd", false);
            return factory.newDocumentBuilder().parse(new InputSource(new StringReader(page)));
        } catch (Exception e) { // three kinds of checked ones, each of which fails the test
            throw new AssertionError("the page is not well-formed", e);
        }
    }

    private static List<Element> elements(Node root, String name) {
        List<Element> found = new ArrayList<>();
        NodeList all = root instanceof Document page
                ? page.getElementsByTagName(name)
                : ((Element) root).getElementsByTagName(name);
        for (int i = 0; i < all.getLength(); i++) {
            found.add((Element) all.item(i));
        }
        return found;
    }

    private static Element section(Document page, String id) {
        return elements(page, "section").stream()
                .filter(section -> section.getAttribute("id").equals(id))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no section " + id));
    }

    private static String words(Node node) {
        return node.getTextContent().replace('\u00A0', ' ').replaceAll("\\s+", " ");
    }

    @ParameterizedTest
    @MethodSource("examples")
    void isOneFileThatLeadsNowhere(String study) {
        Document page = parse(made(study).page());
        List<Element> all = elements(page, "*");
        assertThat(all).hasSizeGreaterThan(200);
        List<String> ids = new ArrayList<>();
        for (Element element : all) {
            assertThat(element.getTagName())
                    .isNotIn("script", "link", "iframe", "img", "object", "embed", "form", "base");
            NamedNodeMap attributes = element.getAttributes();
            for (int i = 0; i < attributes.getLength(); i++) {
                String name = attributes.item(i).getNodeName();
                String value = attributes.item(i).getNodeValue();
                if (name.endsWith("href") || name.equals("src")) {
                    assertThat(value).startsWith("#");
                } else if (!name.startsWith("xmlns")) {
                    assertThat(value).as(name).doesNotContain("://").doesNotContain("javascript:");
                }
                if (name.equals("id")) {
                    ids.add(value);
                }
            }
        }
        assertThat(ids).doesNotHaveDuplicates();
        for (Element link : elements(page, "a")) {
            assertThat(ids).contains(link.getAttribute("href").substring(1));
        }
        String policy = elements(page, "meta").stream()
                .filter(meta -> meta.getAttribute("http-equiv").equals("Content-Security-Policy"))
                .findFirst()
                .orElseThrow()
                .getAttribute("content");
        assertThat(policy).startsWith("default-src 'none'").doesNotContain("script");
    }

    /** Every number of the points, the bands, the limits and the error, by its twelve digits. */
    @ParameterizedTest
    @MethodSource("examples")
    void itsNumbersAreThoseOfTheJson(String study) {
        Document page = parse(made(study).page());
        Map<String, Object> json = made(study).json();
        List<Map<String, Object>> points = Json.objects(json.get("points"));
        List<Element> rows = elements(
                elements(table(section(page, "response"), "Response at third-octave frequencies"), "tbody")
                        .get(0),
                "tr");
        assertThat(rows).hasSameSizeAs(points).isNotEmpty();
        for (int i = 0; i < points.size(); i++) {
            List<Double> said = values(rows.get(i));
            List<Double> wanted = points.get(i).values().stream()
                    .filter(Double.class::isInstance)
                    .map(Double.class::cast)
                    .toList();
            assertThat(said).as("row %d", i).containsExactlyElementsOf(wanted).hasSizeGreaterThanOrEqualTo(4);
        }
        assertThat(values(section(page, "bands"))).containsAll(numbers(Json.objects(json.get("bands"))));
        Map<String, Object> verdict = Json.object(json.get("verdict"));
        assertThat(values(section(page, "limits"))).containsAll(numbers(Json.objects(verdict.get("limits"))));
        if (json.containsKey("error")) {
            Map<String, Object> error = Json.object(json.get("error"));
            assertThat(values(section(page, "error")))
                    .contains((Double) error.get("rms_m_s2"), (Double) error.get("offset_m_s2"))
                    .containsAll(numbers(Json.objects(error.get("third_octaves"))));
        } else {
            assertThat(elements(page, "section"))
                    .noneMatch(section -> section.getAttribute("id").equals("error"));
        }
    }

    /** Every slope, in the order of the answer; no section where nothing moves the rejection. */
    @ParameterizedTest
    @MethodSource("examples")
    void tellsWhatToTightenFirst(String study) {
        Document page = parse(made(study).page());
        List<Map<String, Object>> numbers = Json.objects(made(study).json().get("sensitivities"));
        if (numbers.isEmpty()) {
            assertThat(elements(page, "section"))
                    .noneMatch(section -> section.getAttribute("id").equals("sensitivities"));
            return;
        }
        Element section = section(page, "sensitivities");
        List<Element> rows = elements(
                elements(table(section, "Change of the rejection, the strongest first"), "tbody")
                        .get(0),
                "tr");
        assertThat(rows).hasSameSizeAs(numbers);
        for (int i = 0; i < rows.size(); i++) {
            assertThat(words(rows.get(i)))
                    .startsWith(numbers.get(i).get("number").toString());
            assertThat(values(rows.get(i)))
                    .containsExactlyElementsOf(Json.objects(numbers.get(i).get("slopes")).stream()
                            .map(slope -> (Double)
                                    slope.getOrDefault("rejection_db_per_percent", slope.get("rejection_db_per_k")))
                            .toList());
        }
        assertThat(words(section))
                .contains(
                        "(finite-length: " + made(study).json().get("sensitivities_finite_length") + ")",
                        "least rejection of the band");
        assertThat(elements(section, "svg")).hasSize(1);
    }

    private static Element table(Element inside, String caption) {
        return elements(inside, "table").stream()
                .filter(table -> words(elements(table, "caption").get(0)).equals(caption))
                .findFirst()
                .orElseThrow(() -> new AssertionError("no table " + caption));
    }

    private static List<Double> values(Element inside) {
        return elements(inside, "data").stream()
                .map(data -> Double.valueOf(data.getAttribute("value")))
                .toList();
    }

    private static List<Double> numbers(List<Map<String, Object>> objects) {
        return objects.stream()
                .flatMap(object -> object.values().stream())
                .filter(Double.class::isInstance)
                .map(Double.class::cast)
                .toList();
    }

    @ParameterizedTest
    @MethodSource("examples")
    void everyFigureAgreesWithTheNumberBehindIt(String study) {
        for (Element data : elements(parse(made(study).page()), "data")) {
            String said = data.getTextContent();
            assertThat(said)
                    .doesNotContainPattern("[0-9][eE][-+0-9]")
                    .doesNotContain("NaN")
                    .isNotBlank();
            assertThat(said).matches("−?[0-9].*");
        }
    }

    @ParameterizedTest
    @MethodSource("examples")
    void tellsAllThatTheAnswerHolds(String study) {
        String html = made(study).page();
        Document page = parse(html);
        Map<String, Object> json = made(study).json();
        assertThat(words(section(page, "decision")))
                .contains(Json.object(json.get("verdict"))
                        .get("decision")
                        .toString()
                        .replace('-', ' '));
        String defaults = words(section(page, "defaults"));
        List<Map<String, Object>> taken = Json.objects(json.get("taken_as"));
        assertThat(taken).isNotEmpty();
        taken.forEach(entry -> assertThat(defaults).contains(entry.get("key").toString()));
        List<Map<String, Object>> caveats = Json.objects(json.get("caveats"));
        int shown = 0;
        for (String id : List.of("device", "medium", "bands", "response", "error")) {
            shown += elements(page, "section").stream()
                    .filter(section -> section.getAttribute("id").equals(id))
                    .mapToInt(section -> (int) elements(section, "ul").stream()
                            .filter(list -> list.getAttribute("class").equals("caveats"))
                            .flatMap(list -> elements(list, "li").stream())
                            .count())
                    .sum();
        }
        assertThat(shown).as("caveats beside their numbers").isEqualTo(caveats.size());
        Map<String, Object> origin = Json.object(json.get("study"));
        String document = words(section(page, "document"));
        assertThat(document).contains(origin.get("sha256").toString(), "prepared by", "checked by", "approved by");
        Json.objects(origin.get("files_read"))
                .forEach(file -> assertThat(document)
                        .contains(
                                file.get("sha256").toString(), file.get("file").toString()));
        List<Element> listings = elements(section(page, "reproduce"), "pre");
        assertThat(listings.get(listings.size() - 1).getTextContent()).isEqualTo(read(Path.of(study)));
        assertThat(words(section(page, "cautions"))).contains("confirmed by test");
    }

    /** The picture is drawn from the table behind it, and each of its points stands in the JSON: see the test of the charts. */
    @ParameterizedTest
    @MethodSource("examples")
    void hasEveryChartOnceWithTheNumbersBehindIt(String study) {
        Document page = parse(made(study).page());
        List<Chart> charts =
                StudyReport.of(StudyReader.open(Path.of(study), List.of())).charts();
        List<Element> figures = elements(page, "figure");
        assertThat(figures.stream().map(figure -> figure.getAttribute("id")).toList())
                .containsExactlyInAnyOrderElementsOf(
                        charts.stream().map(chart -> "chart-" + chart.name()).toList())
                .contains("chart-rejection");
        assertThat(elements(section(page, "decision"), "svg")).hasSize(1);
        List<Element> folded = elements(page, "details");
        assertThat(folded).hasSameSizeAs(charts);
        for (Chart chart : charts) {
            Element numbers = folded.stream()
                    .filter(details ->
                            elements(details, "caption").get(0).getTextContent().equals(chart.title()))
                    .findFirst()
                    .orElseThrow();
            assertThat(values(numbers))
                    .containsExactlyElementsOf(chart.table().rows().stream()
                            .flatMap(row -> row.values().stream())
                            .filter(Double::isFinite)
                            .map(value -> Double.valueOf(Figures.full(value)))
                            .toList());
            Element drawing = elements(
                            figures.stream()
                                    .filter(figure -> figure.getAttribute("id").equals("chart-" + chart.name()))
                                    .findFirst()
                                    .orElseThrow(),
                            "svg")
                    .get(0);
            assertThat(elements(drawing, "title").get(0).getTextContent()).isEqualTo(chart.title());
            assertThat(elements(drawing, "desc").get(0).getTextContent()).isNotBlank();
        }
    }

    @ParameterizedTest
    @MethodSource("examples")
    void leavesAsBandsDoes(String study) {
        assertThat(made(study).code()).isEqualTo(made(study).bandsCode()).isIn(0, 3);
    }

    @Test
    void theSameStudyGivesTheSameBytes() throws IOException {
        Path study = Path.of("examples/fan-tray/study.yaml");
        for (String name : List.of("a", "b")) {
            Run run = Run.of(
                    "report",
                    study.toString(),
                    "--out",
                    folder.resolve(name + ".html").toString(),
                    "--pdf",
                    folder.resolve(name + ".pdf").toString());
            assertThat(run.err()).isEmpty();
        }
        assertThat(folder.resolve("a.html")).hasSameBinaryContentAs(folder.resolve("b.html"));
        assertThat(folder.resolve("a.pdf")).hasSameBinaryContentAs(folder.resolve("b.pdf"));
        assertThat(Files.size(folder.resolve("a.pdf"))).isGreaterThan(10_000);
    }

    @Test
    void showsATitleOfMarkupAsText() {
        String title = "<script>alert('x')</script> & \"bold\" <b>b</b> 😀 שלום مرحبا";
        String html = page(study("odd.yaml", "title: '" + title.replace("'", "''") + "'\n" + SMALL));
        assertThat(html).doesNotContain("<script").doesNotContain("<b>");
        Document page = parse(html);
        Element heading = elements(page, "h1").get(0);
        assertThat(heading.getTextContent()).isEqualTo(title);
        assertThat(elements(heading, "bdi").get(0).getAttribute("dir")).isEqualTo("auto");
        assertThat(elements(page, "title").get(0).getTextContent()).isEqualTo(title);
    }

    @Test
    void showsNamesOfSourcesAsText() {
        String html = page(
                study(
                        "named.yaml",
                        SMALL
                                + "surroundings:\n  'fan <i>5 um</i> & מאוורר': {kind: tone, frequency: 110 Hz, speed: 0.6 mm/s}\n"));
        assertThat(html).doesNotContain("<i>");
        assertThat(words(section(parse(html), "error"))).contains("fan <i>5 um</i> & מאוורר (tone)");
    }

    @Test
    void recordsTheSettingsOfTheCommandLine() {
        Document page = parse(page(study("s.yaml", SMALL), "--set", "hair.diameter=95 um", "--set", "title=it's <b>"));
        assertThat(words(section(page, "asked"))).contains("--set hair.diameter=95 um", "--set title=it's <b>");
        assertThat(words(section(page, "reproduce")))
                .contains("--set 'hair.diameter=95 um'", "--set 'title=it'\\''s <b>'");
    }

    @Test
    void fillsTheTitleBlockAndLeavesTheLinesEmpty() {
        Document page = parse(page(study(
                "doc.yaml",
                SMALL + "document: {project: 'A <1>', revision: C, prepared-by: R. Moser, remarks: none}\n")));
        Element document = section(page, "document");
        assertThat(words(document))
                .contains("project")
                .contains("A <1>")
                .contains("revision")
                .contains("remarks");
        Element lines = elements(document, "table").stream()
                .filter(table -> table.getAttribute("class").equals("signatures"))
                .findFirst()
                .orElseThrow();
        List<Element> rows = elements(elements(lines, "tbody").get(0), "tr");
        assertThat(rows).hasSize(3);
        assertThat(words(rows.get(0)).strip()).isEqualTo("prepared byR. Moser");
        assertThat(words(rows.get(1)).strip()).isEqualTo("checked by");
        assertThat(elements(rows.get(2), "td")).hasSize(3);
    }

    @Test
    void namesValuesFromMemory() {
        assertThat(words(section(parse(page(Path.of("examples/weather-mast/study.yaml"))), "memory")))
                .contains("surroundings.wind.turbulence 24 %", "from memory");
        String mineral = SMALL.replace("medium: air", "medium: {name: mineral oil, grade: 100 mm2/s}");
        assertThat(words(section(parse(page(study("oil.yaml", mineral))), "memory")))
                .contains("density of mineral oil");
        String own = SMALL.replace("medium: air", "medium: {density: 900 kg/m3, viscosity: 20 mPa.s}");
        assertThat(words(section(parse(page(study("own.yaml", own))), "memory")))
                .contains("No property of the medium");
    }

    @Test
    void setsApartWhatTheDecisionRestsOn() {
        Document page = parse(page(Path.of("examples/weather-mast/study.yaml")));
        String decision = words(section(page, "decision"));
        assertThat(decision).contains("The flow carries the fluid far").contains("stretched to 10 °C");
        assertThat(decision).doesNotContain("The wall around the hair must be flat");
        assertThat(words(section(page, "response"))).contains("The wall around the hair must be flat");
    }

    @Test
    void hasNoCoversWhereNoneIsNamed() {
        assertThat(elements(parse(page(study("bare.yaml", SMALL))), "section"))
                .noneMatch(section -> section.getAttribute("id").equals("covers"));
        assertThat(words(section(parse(page(study("sealed.yaml", SMALL + "cover: sealed\n"))), "covers")))
                .contains("sealed");
    }

    @Test
    void answersAsJsonAndCsv() throws Exception {
        Path file = folder.resolve("a.html");
        String study = study("s.yaml", SMALL).toString();
        Map<String, Object> json = Json.object(Json.parse(
                Run.of("report", study, "--out", file.toString(), "--json").out()));
        Map<String, Object> written = Json.objects(json.get("files")).get(0);
        byte[] bytes = Files.readAllBytes(file);
        assertThat(written.get("file")).isEqualTo(file.toString());
        assertThat(written.get("bytes")).isEqualTo((double) bytes.length);
        String digest =
                HexFormat.of().formatHex(MessageDigest.getInstance("SHA-256").digest(bytes));
        assertThat(written.get("sha256")).isEqualTo(digest);
        assertThat(Run.of("report", study, "--out", file.toString(), "--csv").out())
                .isEqualTo("file,bytes,sha256\n" + file + "," + bytes.length + "," + digest + "\n");
    }

    @Test
    void putsSeveralStudiesIntoAFolder() throws IOException {
        Path there = Files.createDirectory(folder.resolve("pages"));
        Run run = Run.of(
                "report",
                "examples/fan-tray/study.yaml",
                "examples/workbench-air/study.yaml",
                study("s.yaml", SMALL).toString(),
                "--out",
                there.toString());
        assertThat(run.err()).isEmpty();
        assertThat(run.code()).isEqualTo(3);
        assertThat(names(there)).containsExactly("fan-tray-study.html", "s.html", "workbench-air-study.html");
    }

    private static List<String> names(Path there) throws IOException {
        try (Stream<Path> files = Files.list(there)) {
            return files.map(file -> file.getFileName().toString()).sorted().toList();
        }
    }

    @Test
    void refusesWordsThatDoNotGoTogether() {
        String study = study("s.yaml", SMALL).toString();
        refused("name the page: --out FILE.html", "report", study);
        refused("neither a folder nor does it end in .html", "report", study, "--out", study);
        refused("neither a folder nor does it end in .pdf", "report", study, "--pdf", "x.html");
        refused("must be a folder that is there", "report", study, study, "--out", "two.html");
        refused("would write the same page", "report", study, study, "--out", folder.toString());
        assertThat(read(Path.of(study))).isEqualTo(SMALL);
    }

    private static void refused(String why, String... words) {
        Run run = Run.of(words);
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains(why);
        assertThat(run.out()).isEmpty();
    }

    @Test
    void leavesNothingWhereItCannotWrite() throws IOException {
        Path study = study("s.yaml", SMALL);
        Run run = Run.of(
                "report",
                study.toString(),
                "--out",
                folder.resolve("missing/page.html").toString());
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err().lines()).singleElement().asString().contains("there is no folder");
        // the name of the half file is taken by a folder that holds something: it cannot be written nor be cleared away
        Path half = folder.resolve(".page.html." + ProcessHandle.current().pid() + ".part");
        Files.createDirectories(half.resolve("inside"));
        assertThat(Run.of(
                                "report",
                                study.toString(),
                                "--out",
                                folder.resolve("page.html").toString())
                        .code())
                .isEqualTo(2);
        assertThat(names(folder)).containsExactlyInAnyOrder(half.getFileName().toString(), "s.yaml");
    }

    @Test
    void saysWhatIsWrongWithAStudyAndWritesNothing() throws IOException {
        Path study = study("wrong.yaml", SMALL + "cover: lid\n");
        Run run = Run.of(
                "report", study.toString(), "--out", folder.resolve("page.html").toString());
        assertThat(run.code()).isEqualTo(2);
        assertThat(run.err()).contains("wrong.yaml:4:");
        assertThat(names(folder)).containsExactly("wrong.yaml");
    }

    @Test
    void isReadAsUtf8() {
        assertThat(new String(
                        page(study("u.yaml", "title: µ δ\n" + SMALL)).getBytes(StandardCharsets.UTF_8),
                        StandardCharsets.UTF_8))
                .contains("<meta charset=\"utf-8\"/>", "µ δ");
    }
}
