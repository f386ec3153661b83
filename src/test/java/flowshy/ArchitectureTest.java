package flowshy;

import static com.tngtech.archunit.core.domain.JavaClass.Predicates.resideInAPackage;
import static com.tngtech.archunit.lang.syntax.ArchRuleDefinition.noClasses;
import static com.tngtech.archunit.library.Architectures.layeredArchitecture;
import static com.tngtech.archunit.library.GeneralCodingRules.NO_CLASSES_SHOULD_ACCESS_STANDARD_STREAMS;
import static com.tngtech.archunit.library.dependencies.SlicesRuleDefinition.slices;

import com.tngtech.archunit.base.DescribedPredicate;
import com.tngtech.archunit.core.domain.JavaClass;
import com.tngtech.archunit.core.importer.ImportOption;
import com.tngtech.archunit.junit.AnalyzeClasses;
import com.tngtech.archunit.junit.ArchTest;
import com.tngtech.archunit.lang.ArchRule;
import com.tngtech.archunit.library.Architectures.LayeredArchitecture;
import java.util.List;

/** Who may know whom, and the one home of each library. */
@AnalyzeClasses(packages = "flowshy", importOptions = ImportOption.DoNotIncludeTests.class)
class ArchitectureTest {
    /** From the command line down to plain numbers; an arrow may only point down this list. */
    private static final List<String> TOP_DOWN = List.of(
            "cli", "report", "study", "verdict", "response", "torque", "stream", "cylinder", "hair", "medium", "math");

    @ArchTest
    static final ArchRule ARROWS_POINT_DOWN = arrows();

    @ArchTest
    static final ArchRule NO_CYCLES =
            slices().matching("flowshy.(*)..").should().beFreeOfCycles();

    @ArchTest
    static final ArchRule PICOCLI_AT_HOME = onlyIn("flowshy.cli..", "picocli..");

    @ArchTest
    static final ArchRule YAML_AT_HOME = onlyIn("flowshy.study..", "org.snakeyaml..");

    @ArchTest
    static final ArchRule JSON_AT_HOME = onlyIn("flowshy.report..", "com.fasterxml..");

    @ArchTest
    static final ArchRule PAPER_AT_HOME = onlyIn("flowshy.report.pdf..", "com.openhtmltopdf..", "org.apache.pdfbox..");

    @ArchTest
    static final ArchRule WINDOWS_AT_HOME = onlyIn("flowshy.report..", "java.awt..");

    @ArchTest
    static final ArchRule CHARTS_AT_HOME = onlyIn("flowshy.report.chart.paper..", "org.jfree..");

    @ArchTest
    static final ArchRule SVG_AT_HOME = onlyIn("flowshy.report.chart.paper..", "org.apache.batik..");

    /** The two numerics libraries share ancestry: one does not check the other, and no class mixes their types. */
    @ArchTest
    static final ArchRule ONE_NUMERICS_LIBRARY_A_CLASS = noClasses()
            .that(DescribedPredicate.describe(
                    "use Hipparchus",
                    type -> type.getDirectDependenciesFromSelf().stream()
                            .anyMatch(arrow ->
                                    arrow.getTargetClass().getPackageName().startsWith("org.hipparchus"))))
            .should()
            .dependOnClassesThat()
            .resideInAPackage("org.apache.commons.math3..");

    @ArchTest
    static final ArchRule NO_STANDARD_STREAMS = NO_CLASSES_SHOULD_ACCESS_STANDARD_STREAMS;

    private static ArchRule arrows() {
        LayeredArchitecture layers = layeredArchitecture().consideringOnlyDependenciesInLayers();
        for (String layer : TOP_DOWN) {
            layers = layers.layer(layer).definedBy("flowshy." + layer + "..");
        }
        for (int i = 1; i < TOP_DOWN.size(); i++) {
            layers = layers.whereLayer(TOP_DOWN.get(i))
                    .mayOnlyBeAccessedByLayers(TOP_DOWN.subList(0, i).toArray(String[]::new));
        }
        return layers.whereLayer(TOP_DOWN.get(0)).mayNotBeAccessedByAnyLayer();
    }

    private static ArchRule onlyIn(String home, String... libraries) {
        DescribedPredicate<JavaClass> away = DescribedPredicate.not(resideInAPackage(home));
        return noClasses().that(away).should().dependOnClassesThat().resideInAnyPackage(libraries);
    }
}
