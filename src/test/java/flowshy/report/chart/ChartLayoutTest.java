package flowshy.report.chart;

import static org.assertj.core.api.Assertions.assertThat;

import flowshy.report.MapReport;
import flowshy.report.chart.device.BandsCharts;
import flowshy.report.chart.device.FitCharts;
import flowshy.report.chart.device.FitChartsTest;
import flowshy.report.chart.device.ForceChart;
import flowshy.report.chart.device.SensitivityChart;
import flowshy.report.chart.paper.LaidText;
import flowshy.report.chart.several.CompareCharts;
import flowshy.report.chart.several.CoverCharts;
import flowshy.report.chart.several.FillChart;
import flowshy.report.chart.several.MapChartTest;
import flowshy.report.chart.several.ToleranceCharts;
import flowshy.report.chart.several.ToleranceChartsTest;
import flowshy.study.Family;
import flowshy.study.MapWords;
import flowshy.study.Study;
import flowshy.study.StudyMap;
import flowshy.study.StudyReader;
import flowshy.study.Variant;
import flowshy.verdict.BandsAnswer;
import flowshy.verdict.compare.CompareQuestion;
import flowshy.verdict.fill.Fill;
import flowshy.verdict.fill.FillQuestion;
import flowshy.verdict.fit.FitAnswer;
import flowshy.verdict.force.ForceAlong;
import flowshy.verdict.lid.LidQuestion;
import flowshy.verdict.map.GridRun;
import java.io.IOException;
import java.nio.file.Files;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.HashSet;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.Set;
import java.util.stream.Stream;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.api.io.TempDir;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.Arguments;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.MethodSource;
import org.junit.jupiter.params.provider.ValueSource;

/** Every text of every chart lies on the sheet, is not clipped, and covers no other. */
class ChartLayoutTest {
    @TempDir
    static Path folder;

    static List<Arguments> studies() throws IOException {
        List<Arguments> all = new ArrayList<>();
        try (Stream<Path> examples = Files.list(Path.of("examples"))) {
            examples.map(example -> example.resolve("study.yaml"))
                    .sorted()
                    .forEach(study -> all.add(Arguments.of(study, List.of())));
        }
        assertThat(all).hasSizeGreaterThan(10);
        Path bench = Path.of("examples/workbench-air/study.yaml");
        Path tray = Path.of("examples/fan-tray/study.yaml");
        String title =
                "title=A very long title that a careful person gave to a study of many words, and more of them, and then \u05E9\u05DC\u05D5\u05DD";
        all.add(Arguments.of(bench, List.of("band.to=30 kHz", "band.from=0.1 Hz", title)));
        all.add(Arguments.of(bench, List.of("band.from=300 Hz", "band.to=320 Hz")));
        all.add(Arguments.of(bench, List.of("band.to=5 kHz", "accept.rejection=33.3 dB")));
        all.add(Arguments.of(bench, List.of("medium=water", "band.to=10 kHz", "accept.rejection=3 dB")));
        all.add(Arguments.of(bench, List.of("cover=sealed", "suspension.quality.value=150", "band.to=2 kHz")));
        all.add(Arguments.of(tray, List.of("cover={kind: roofed, gap: 0.5 mm, length: 6 mm}")));
        all.add(Arguments.of(
                tray,
                List.of("cover={kind: vented, holes: 4, hole-diameter: 0.2 mm, hole-depth: 0.2 mm, sides: through,"
                        + " cavity-volume: 30 mm3, cavity-section: 12 mm2}")));
        all.add(Arguments.of(
                tray,
                List.of("surroundings={a draught with a long name for a picture: {kind: stream,"
                        + " mean-speed: 0.3 m/s}, b: {kind: tone, frequency: 150 Hz, speed: 1 mm/s},"
                        + " c: {kind: sound, level: 80 dB, from: 50 Hz, to: 400 Hz}, d: {kind: stream, mean-speed: 0.1 m/s},"
                        + " e: {kind: stream, mean-speed: 0.2 m/s}, f: {kind: stream, mean-speed: 5 cm/s},"
                        + " g: {kind: tone, frequency: 60 Hz, speed: 2 mm/s}}")));
        return all;
    }

    @ParameterizedTest
    @MethodSource("studies")
    void textsOfBandsFit(Path file, List<String> settings) {
        StudyReader reader = StudyReader.open(file, settings);
        Study study = reader.study();
        BandsAnswer answer = study.question().answer();
        List<Chart> charts = new ArrayList<>(BandsCharts.of(study, answer));
        charts.addAll(SensitivityChart.of(study.title(), reader.sensitivities(study, answer)));
        fit(charts);
    }

    @ParameterizedTest
    @MethodSource("studies")
    void textsOfLidFit(Path file, List<String> settings) {
        Study study = StudyReader.read(file, settings);
        fit(CoverCharts.of(study, new LidQuestion(study.question(), study.reference(), study.candidates()).answer()));
    }

    @Test
    void textsOfFillFit() {
        Study study = StudyReader.read(Path.of("examples/wrong-fill/study.yaml"), List.of());
        FillQuestion question = new FillQuestion(
                study.device(),
                study.band(),
                study.acceptance(),
                study.reference(),
                Fill.known(
                        study.device().outside().temperature(),
                        study.device().outside().pressure()));
        fit(FillChart.of(study, study.acceptance(), question.answer().rows()));
    }

    @Test
    void textsOfMapsFit() {
        String diameter = "hair.diameter=40 um..120 um";
        fit(List.of(MapReport.chart(
                MapChartTest.map("hoist-chain", diameter, "hair.length=0.3 mm..1.2 mm", "least-rejection", false))));
        fit(List.of(MapReport.chart(
                MapChartTest.map("hoist-chain", diameter, "frequency=20 Hz..2 kHz", "rejection", true))));
        fit(List.of(MapReport.chart(
                MapChartTest.map("hoist-chain", "hair.density=1 g/cm3..4 g/cm3", diameter, "noise", false))));
        fit(List.of(MapReport.chart(MapChartTest.map(
                "weather-mast",
                "hair.stalk-length=100 um..850 um",
                "hair.head-diameter=50 um..200 um",
                "least-rejection",
                false))));
    }

    @Test
    void textsOfFitsFit() {
        Study study = FitChartsTest.study();
        FitAnswer answer = FitChartsTest.answer();
        fit(FitCharts.of(study, study.question().about(answer.device()).answer(), answer));
    }

    @ParameterizedTest
    @ValueSource(strings = {"workbench-air", "water-tank", "weather-mast", "nitrogen-stream", "vacuum-package"})
    void textsOfForcesFit(String example) {
        Study study = StudyReader.read(Path.of("examples/" + example + "/study.yaml"), List.of());
        List<ForceAlong> forces = Stream.of(3.0, 31.6, 412.3)
                .map(frequency -> ForceAlong.of(study.device(), frequency))
                .toList();
        fit(ForceChart.of(study.title(), forces));
    }

    @Test
    void textsOfTolerancesFit() {
        fit(ToleranceCharts.of(ToleranceChartsTest.study(), ToleranceChartsTest.answer()));
    }

    @Test
    void textsOfComparisonsFit() {
        Family family = StudyReader.open(Path.of("examples/lift-machinery/study.yaml"), List.of())
                .family(Optional.empty());
        fit(CompareCharts.of(
                family.study().title(),
                new CompareQuestion(
                                family.all().stream().map(Variant::contender).toList(), Optional.empty())
                        .answer()));
    }

    /** Scales of many digits, long units and many reasons without a number. */
    @ParameterizedTest
    @CsvSource(
            delimiter = '|',
            value = {
                "noise | accept.noise=15 ug/rtHz | frequency=5 Hz..5 kHz | suspension.quality.value=0.3..30 | true",
                "least-rejection | accept.rejection=23.75 dB | hair.diameter=20 um..900 um | hair.length=0.2 mm..1.5 mm | false",
                "rejection | accept.rejection=20 dB | medium.pressure=1 Pa..200 kPa | frequency=10 Hz..2 kHz | true",
                "equivalent | accept.error=0.1 m/s2 | hair.diameter=20 um..300 um | medium.temperature=-120 degC..300 degC | false",
                "sensitivity | accept.mass=5 ug | suspension.stiffness=2e-10 N.m/rad..3e-6 N.m/rad | hair.length=0.2 mm..1.5 mm | true",
                "inertial-torque | accept.mass=5 ug | hair.diameter=20 um..300 um | hair.length=0.2 mm..1.5 mm | true",
                "flow-sensitivity | cover=sealed | hair.diameter=20 um..60 um | hair.length=0.2 mm..1.5 mm | false"
            })
    void textsOfMapsOfManyFiguresFit(String figure, String setting, String across, String down, boolean log) {
        StudyReader reader = StudyReader.open(
                Path.of("examples/workbench-air/study.yaml"),
                List.of("suspension={stiffness: 9e-9 N.m/rad, quality: {value: 3.5, in: vacuum}}", setting));
        MapWords words = new MapWords(
                across, down, Optional.of(figure), OptionalDouble.empty(), List.of(13, 11), List.of(log, log));
        fit(List.of(MapReport.chart(StudyMap.of(reader, words, new GridRun(2, GridRun.Progress.NONE)))));
    }

    private static void fit(List<Chart> charts) {
        assertThat(charts).isNotEmpty();
        Set<String> names = new HashSet<>();
        for (Chart chart : charts) {
            assertThat(names.add(chart.name())).isTrue();
            assertThat(chart.name()).matches("[a-z]+(-[a-z0-9]+)*");
            assertThat(chart.description()).hasSizeGreaterThan(20).doesNotContain("NaN", "Infinity");
            List<LaidText> texts = chart.texts();
            assertThat(texts).hasSizeGreaterThan(5);
            String svg = chart.svg("");
            double width = number(svg, "0 0 (\\d+) \\d+");
            double height = number(svg, "0 0 \\d+ (\\d+)");
            List<String> faults = new ArrayList<>();
            for (int i = 0; i < texts.size(); i++) {
                LaidText text = texts.get(i);
                if (!text.whole()) {
                    faults.add("clipped: " + text);
                }
                if (!(text.left() >= 0.0 && text.top() >= 0.0 && text.right() <= width && text.bottom() <= height)) {
                    faults.add("off the sheet: " + text);
                }
                for (int j = i + 1; j < texts.size(); j++) {
                    if (text.overlaps(texts.get(j))) {
                        faults.add("overlap: " + text + " and " + texts.get(j));
                    }
                }
            }
            assertThat(faults).as("%s on %s by %s", chart.name(), width, height).isEmpty();
        }
    }

    private static double number(String svg, String pattern) {
        return Double.parseDouble(svg.replaceFirst("(?s).*?viewBox=\"" + pattern + "\".*", "$1"));
    }
}
