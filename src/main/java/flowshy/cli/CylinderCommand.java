package flowshy.cli;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.hair.Profile;
import flowshy.medium.Medium;
import flowshy.report.CylinderReport;
import flowshy.study.Study;
import flowshy.study.StudyReader;
import flowshy.torque.StripFactors;
import flowshy.verdict.error.StripPoint;
import java.nio.file.Path;
import java.util.ArrayList;
import java.util.List;
import java.util.Locale;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.concurrent.Callable;
import picocli.CommandLine.Command;
import picocli.CommandLine.Mixin;
import picocli.CommandLine.Model.CommandSpec;
import picocli.CommandLine.Option;
import picocli.CommandLine.ParameterException;
import picocli.CommandLine.Parameters;
import picocli.CommandLine.Spec;

/** One strip of a hair, factor by factor. */
@Command(
        name = "cylinder",
        mixinStandardHelpOptions = true,
        description = "Force of the medium on one strip of the hair, factor by factor, for a check by hand.",
        footer = {
            "",
            "Examples: flowshy cylinder study.yaml --at \"400 um\" --frequencies \"80 Hz, 320 Hz\"",
            "          flowshy cylinder --diameter \"80 um\" --medium air --frequencies \"80 Hz\" --limits"
        })
final class CylinderCommand implements Callable<Integer> {
    @Parameters(arity = "0..1", paramLabel = "STUDY", description = "study that names hair and medium")
    private Path study;

    @Option(
            names = "--at",
            converter = QuantityConverters.Height.class,
            description = "height of the strip above the wall, e.g. \"400 um\"; without it the free stream is taken")
    private Double at;

    @Option(
            names = "--diameter",
            converter = QuantityConverters.Diameter.class,
            description = "diameter of the strip, without a study")
    private Double diameter;

    @Option(names = "--medium", paramLabel = "NAME", description = "medium, without a study; see the command media")
    private String mediumName;

    @Mixin
    private MediumOptions state;

    @Option(
            names = "--frequencies",
            required = true,
            paramLabel = "LIST",
            converter = Frequencies.Converter.class,
            description = "e.g. \"80 Hz, 320 Hz\"")
    private Frequencies frequencies;

    @Option(names = "--limits", description = "set the thin-hair and thin-layer limits beside, with their error")
    private boolean limits;

    @Option(names = "--set", paramLabel = "KEY=VALUE", description = "overlay a key of the study; may be repeated")
    private List<String> settings = new ArrayList<>();

    @Mixin
    private OutputOptions output;

    @Spec
    private CommandSpec spec;

    @Override
    public Integer call() {
        List<StripPoint> points = new ArrayList<>();
        OscillatingCylinder strip = study == null ? fromOptions() : fromStudy(points);
        OptionalDouble height = at == null ? OptionalDouble.empty() : OptionalDouble.of(at);
        List<StripFactors> factors = frequencies.values().stream()
                .map(frequency -> StripFactors.of(strip, height, frequency))
                .toList();
        String head = String.format(
                Locale.ROOT,
                "Strip of %.6g um diameter in %s, %s",
                2e6 * strip.radius(),
                strip.medium().name(),
                at == null ? "in the free stream" : String.format(Locale.ROOT, "%.6g um above the wall", 1e6 * at));
        output.send(
                spec.commandLine(),
                CylinderReport.text(head, factors, points, strip.caveats(), limits),
                output.json()
                        ? Optional.of(CylinderReport.json(head, factors, points, strip.caveats(), limits))
                        : Optional.empty(),
                output.csv() ? Optional.of(CylinderReport.csv(factors, limits)) : Optional.empty());
        return 0;
    }

    private OscillatingCylinder fromOptions() {
        if (diameter == null || mediumName == null) {
            throw new ParameterException(spec.commandLine(), "name a STUDY, or both --diameter and --medium");
        }
        if (!settings.isEmpty()) {
            throw new ParameterException(spec.commandLine(), "--set overlays a study; none is named");
        }
        Medium medium = state.medium(mediumName);
        return new OscillatingCylinder(0.5 * diameter, medium);
    }

    private OscillatingCylinder fromStudy(List<StripPoint> points) {
        if (diameter != null || mediumName != null) {
            throw new ParameterException(
                    spec.commandLine(), "--diameter and --medium go without a study; use --set to change one");
        }
        Study read = StudyReader.read(study, settings);
        Profile profile = read.device().hair().profile();
        if (at == null) {
            throw new ParameterException(spec.commandLine(), "--at HEIGHT says which strip of the hair");
        }
        if (at <= profile.length() && !(profile.radius(at) > 0.0)) {
            throw new UserException("--at names the point of the hair, which has no diameter; go a little below");
        }
        if (at > profile.length()) {
            throw new UserException(String.format(
                    Locale.ROOT,
                    "--at %.6g um lies beyond the hair, which is %.6g um long",
                    1e6 * at,
                    1e6 * profile.length()));
        }
        if (!read.surroundings().isEmpty()) {
            for (double frequency : frequencies.values()) {
                points.add(StripPoint.of(read.device(), read.surroundings(), at, frequency));
            }
        }
        return new OscillatingCylinder(profile.radius(at), read.device().around());
    }
}
