package flowshy.medium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.withinPercentage;

import java.io.ByteArrayInputStream;
import java.io.IOException;
import java.nio.charset.StandardCharsets;
import java.util.List;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The reader of property tables, and what it says of a faulty one. */
class MediumTableTest {
    private static final String GOOD = """
            # medium: test oil
            # also called: oil T
            # about: an oil measured for a test
            # phase: liquid
            # table pressure: 1 atm
            # pressures: 10 kPa to 1 MPa
            # temperatures: 10 degC to 30 degC
            # density: own pycnometer, batch 7 | measured | 0.1 %
            # viscosity: own viscometer, batch 7 | measured | 1 %
            ## a remark
            temperature_degC,density_g_cm3,viscosity_mPa_s
            10,0.880,120
            20,0.873,70
            30,0.866,45
            """.replace("1 atm", "101325 Pa");

    private static MediumTable read(String text) throws IOException {
        return MediumTable.read(new ByteArrayInputStream(text.getBytes(StandardCharsets.UTF_8)), "oil.csv");
    }

    private static List<TableProblem> problems(String text) {
        MediumTableException fault = catchThrowableOfType(MediumTableException.class, () -> read(text));
        assertThat(fault).as("a fault in%n%s", text).isNotNull();
        return fault.problems();
    }

    @Test
    void readsUnitsIntoSi() throws IOException {
        MediumTable table = read(GOOD);
        assertThat(table.rows()).hasSize(3);
        assertThat(table.rows().get(0).temperature()).isEqualTo(283.15);
        assertThat(table.rows().get(0).density()).isEqualTo(880.0);
        assertThat(table.rows().get(0).viscosity()).isEqualTo(0.12);
        assertThat(table.header().aliases()).containsExactly("oil T");
        assertThat(table.header().source("viscosity").uncertainty()).hasValue(0.01);
        assertThat(table.header().source("density").reading()).isEqualTo(PropertySource.Reading.MEASURED);
    }

    @Test
    void servesAsMedium() throws IOException {
        Medium oil = Media.at(MediumQuery.of(read(GOOD), 293.15, 101325.0));
        assertThat(oil.name()).isEqualTo("test oil");
        assertThat(oil.density()).isCloseTo(873.0, withinPercentage(1e-10));
        assertThat(oil.viscosity()).isCloseTo(0.070, withinPercentage(1e-10));
        assertThatThrownBy(() -> Media.at(MediumQuery.of(read(GOOD), 310.0, 101325.0)))
                .isInstanceOf(OutOfTableException.class)
                .hasMessageContaining("test oil covers 10 °C to 30 °C; 36.85 °C was asked for");
    }

    /** One fault each: what is changed, and the place where it must be found. */
    @ParameterizedTest
    @CsvSource(delimiter = ';', quoteCharacter = '~', textBlock = """
            # phase: liquid;                      # phase: solid;                        4;  10; 'solid'
            # phase: liquid;                      # fase: liquid;                        4;   3; 'fase'
            # about: an oil measured for a test;  # medium: other;                       3;   3; second time
            # table pressure: 101325 Pa;          # table pressure: 101325 psi;          5;  19; '101325 psi'
            # pressures: 10 kPa to 1 MPa;         # pressures: 1 MPa to 10 kPa;          6;  14; '1 MPa to 10 kPa'
            # pressures: 10 kPa to 1 MPa;         # pressures: 10 kPa;                   6;  14; '10 kPa'
            # temperatures: 10 degC to 30 degC;   # temperatures: 10 degC to 40 degC;    7;   1; beyond the rows
            batch 7 | measured | 0.1 %;           batch 7 | guessed | 0.1 %;             8;  38; 'guessed'
            batch 7 | measured | 0.1 %;           batch 7 | measured | 0.1;              8;  49; '0.1'
            batch 7 | measured | 0.1 %;           batch 7, measured;                     8;  12; batch 7, measured
            ## a remark;                          # a remark;                           10;   1; '# a remark'
            viscosity_mPa_s;                      viscosity_P;                          11;  32; 'viscosity_P'
            density_g_cm3;                        temperature_K;                        11;  18; second time
            20,0.873,70;                          20 0.873 70;                          13;   1; 1 values
            20,0.873,70;                          # a late line: 1;                     13;   1; below the column headings
            """)
    void pointsAtTheFault(String good, String bad, int line, int column, String found) {
        assertThat(GOOD).contains(good);
        List<TableProblem> problems = problems(GOOD.replace(good, bad));
        assertThat(problems).anySatisfy(problem -> {
            assertThat(problem.line()).isEqualTo(line);
            assertThat(problem.column()).isEqualTo(column);
            assertThat(problem.found()).contains(found);
            assertThat(problem.accepted()).isNotBlank();
        });
    }

    @ParameterizedTest
    @CsvSource(
            delimiter = ';',
            value = {
                "20,0.873,70;20,0.873,seventy;13;10",
                "20,0.873,70;20,0.873,NaN;13;10",
                "20,0.873,70;20,-0.873,70;13;4",
                "20,0.873,70;20, 0,70;13;5",
                "20,0.873,70;20,0.873,1e999999999;13;10",
                "20,0.873,70;10,0.873,70;13;1"
            })
    void pointsAtTheNumber(String good, String bad, int line, int column) {
        List<TableProblem> problems = problems(GOOD.replace(good, bad));
        assertThat(problems).anySatisfy(problem -> {
            assertThat(problem.line()).isEqualTo(line);
            assertThat(problem.column()).isEqualTo(column);
        });
    }

    @Test
    void tellsEveryFaultAtOnceInTheOrderOfTheFile() {
        List<TableProblem> problems = problems(GOOD.replace("liquid", "solid").replace("20,0.873,70", "20,x,70"));
        assertThat(problems).extracting(TableProblem::line).contains(4, 13);
        assertThat(problems.get(0).toString()).startsWith("oil.csv:");
    }

    /** A table without its provenance is refused, line by line. */
    @ParameterizedTest
    @CsvSource({
        "# medium:",
        "# about:",
        "# phase:",
        "# table pressure:",
        "# pressures:",
        "# temperatures:",
        "# density:",
        "# viscosity:"
    })
    void refusesATableWithoutAHeaderLine(String start) {
        String without = GOOD.lines().filter(line -> !line.startsWith(start)).reduce("", (a, b) -> a + b + "\n");
        assertThat(without).isNotEqualTo(GOOD);
        assertThat(problems(without))
                .anySatisfy(problem -> assertThat(problem.accepted()).contains(start));
    }

    @Test
    void refusesAGasWithoutMolarMass() {
        assertThat(problems(GOOD.replace("phase: liquid", "phase: gas")))
                .anySatisfy(problem -> assertThat(problem.accepted()).contains("# molar mass:"));
    }

    @Test
    void pointsAtBytesThatAreNotUtf8() {
        byte[] bytes = GOOD.replace("batch 7 | measured | 1 %", "batch ä | measured | 1 %")
                .getBytes(StandardCharsets.ISO_8859_1);
        MediumTableException fault = catchThrowableOfType(
                MediumTableException.class, () -> MediumTable.read(new ByteArrayInputStream(bytes), "oil.csv"));
        assertThat(fault.problems()).hasSize(1);
        assertThat(fault.problems().get(0).toString()).startsWith("oil.csv:9:36: found the byte 0xe4");
    }

    @Test
    void refusesAHugeFile() {
        byte[] bytes = new byte[2 << 20];
        java.util.Arrays.fill(bytes, (byte) '#');
        assertThatThrownBy(() -> MediumTable.read(new ByteArrayInputStream(bytes), "oil.csv"))
                .isInstanceOf(MediumTableException.class);
    }

    /** A family of grades: rising grades, each with rising temperatures, and the range in the header. */
    private static final String GRADED = GOOD.replace("# temperatures", "# grade: 10 mm2/s to 20 mm2/s\n# temperatures")
            .replace("temperature_degC,density", "grade_mm2_s,temperature_degC,density")
            .replace("10,0.880,120", "10,10,0.880,120")
            .replace("20,0.873,70", "10,20,0.873,70")
            .replace("30,0.866,45", "10,30,0.866,45\n20,10,0.89,240\n20,20,0.88,140\n20,30,0.87,90");

    @Test
    void readsAFamilyOfGrades() throws IOException {
        MediumTable table = read(GRADED);
        assertThat(table.rows()).hasSize(6);
        Medium between =
                Media.at(MediumQuery.of(table, 293.15, 101325.0).with(MediumParameter.GRADE, 10e-6 * Math.sqrt(2.0)));
        assertThat(between.viscosity()).isCloseTo(Math.sqrt(0.070 * 0.140), withinPercentage(1e-9));
    }

    @ParameterizedTest
    @CsvSource(delimiter = ';', quoteCharacter = '~', textBlock = """
            20,10,0.89,240;                  5,10,0.89,240;        16;  a grade that falls
            20,20,0.88,140;                  20,10,0.88,140;       17;  a temperature that does not rise
            # grade: 10 mm2/s to 20 mm2/s;   ## no range;          12;  a column grade without its range
            # phase: liquid;                 # phase: gas;          4;  grades of a gas
            20,30,0.87,90;                   20,29,0.87,90;         8;  beyond the rows
            """)
    void pointsAtTheFaultOfAFamily(String good, String bad, int line, String found) {
        assertThat(GRADED).contains(good);
        assertThat(problems(GRADED.replace(good, bad))).anySatisfy(problem -> {
            assertThat(problem.line()).isEqualTo(line);
            assertThat(problem.found()).contains(found);
        });
    }

    @Test
    void aTableOfTheUserHasRowsAndNoFormula() throws IOException {
        String header =
                GOOD.lines().filter(line -> line.startsWith("#")).reduce("# law: sea water\n", (a, b) -> a + b + "\n");
        MediumTable table = read(header);
        assertThatThrownBy(() -> Media.at(MediumQuery.of(table, 293.15, 101325.0)))
                .isInstanceOf(MediumTableException.class)
                .hasMessageContaining("'sea water'");
    }

    @Test
    void nothingIsExtrapolatedBeyondTheRows() throws IOException {
        TableCurves curves = new TableCurves(read(GOOD).rows());
        assertThatThrownBy(() -> curves.density(282.0)).isInstanceOf(RuntimeException.class);
    }
}
