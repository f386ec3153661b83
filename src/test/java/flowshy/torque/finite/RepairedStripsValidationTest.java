package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.math.ReferenceTable;
import flowshy.medium.Medium;
import java.util.List;
import java.util.Map;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.ValueSource;

/** The repair against the solver, which the finite-element solution holds, over the range that the repair claims. */
class RepairedStripsValidationTest {
    private static final Medium UNIT = Medium.of("unit", 1.0, 1.0);

    /** Shapes of largest radius 1 by the names of the table. */
    private static Profile profile(String shape) {
        if (shape.startsWith("cylinder ")) {
            return new Cylinder(2.0 * Double.parseDouble(shape.substring(9)), 1.0);
        }
        return switch (shape) {
            case "club 7.5 round" -> new Club(15.0, 1.0 / 3.0, 20.0 / 3.0, 5.0 / 3.0, 1.0, Club.End.ROUND);
            case "club 10 flat" -> new Club(20.0, 0.4, 12.0, 4.0, 1.0, Club.End.FLAT);
            case "club 4 flat" -> new Club(8.0, 0.5, 4.0, 1.0, 1.0, Club.End.FLAT);
            case "club 10 on a thin stalk" -> new Club(20.0, 0.2, 15.0, 1.0, 1.0, Club.End.ROUND);
            case "taper 10 to a quarter" -> new Taper(20.0, 1.0, 0.25);
            case "taper 10 to a point" -> new Taper(20.0, 1.0, 0.0);
            case "taper 4 to a third" -> new Taper(8.0, 1.0, 1.0 / 3.0);
            case "taper 10 on a narrow foot" -> new Taper(20.0, 0.25, 1.0);
            default -> throw new IllegalArgumentException(shape);
        };
    }

    /** The errors in per cent as tabulated, and within what the model states of itself. */
    @ParameterizedTest
    @ValueSource(
            strings = {
                "cylinder 2",
                "cylinder 3.5",
                "cylinder 5",
                "cylinder 10",
                "cylinder 32",
                "club 7.5 round",
                "club 10 flat",
                "club 4 flat",
                "club 10 on a thin stalk",
                "taper 10 to a quarter",
                "taper 10 to a point",
                "taper 4 to a third",
                "taper 10 on a narrow foot"
            })
    void errorsAreAsTabulated(String shape) {
        Profile profile = profile(shape);
        List<Map<String, String>> rows =
                ReferenceTable.of(RepairedStripsValidationTest.class, "repair-errors.csv").rows().stream()
                        .filter(row -> shape.equals(row.get("shape")))
                        .toList();
        assertThat(rows).hasSizeGreaterThanOrEqualTo(6);
        for (Map<String, String> row : rows) {
            double delta = ReferenceTable.number(row, "layer_over_length") * profile.length();
            double omega = 2.0 / (delta * delta);
            FiniteTorques exact = new FiniteHair(profile, UNIT, 0.0).at(omega);
            FiniteFactors repaired = new RepairedStrips(profile, UNIT, 0.0).at(omega);
            double stream = error(repaired.stream(), exact.streamFactor());
            double rocking = error(repaired.rocking(), exact.rockingFactor());
            assertThat(100.0 * stream)
                    .as("stream %s", row)
                    .isCloseTo(ReferenceTable.number(row, "stream_percent"), within(0.2));
            assertThat(100.0 * rocking)
                    .as("rocking %s", row)
                    .isCloseTo(ReferenceTable.number(row, "rocking_percent"), within(0.3));
            assertThat(stream).isLessThan(repaired.streamError());
            assertThat(rocking).isLessThan(repaired.rockingError());
        }
    }

    /** The bounds are used up somewhere: a looser claim would say less than is known. */
    @Test
    void boundsAreNotLoose() {
        double stream = 0.0;
        double rocking = 0.0;
        for (Map<String, String> row : ReferenceTable.of(RepairedStripsValidationTest.class, "repair-errors.csv")
                .rows()) {
            stream = FastMath.max(stream, ReferenceTable.number(row, "stream_percent"));
            rocking = FastMath.max(rocking, ReferenceTable.number(row, "rocking_percent"));
        }
        assertThat(stream).isBetween(90.0 * RepairedStrips.STREAM_ERROR, 100.0 * RepairedStrips.STREAM_ERROR);
        assertThat(rocking).isBetween(90.0 * RepairedStrips.ROCKING_ERROR, 100.0 * RepairedStrips.ROCKING_ERROR);
    }

    /** The formula itself, against its evaluation by adaptive quadrature with other Bessel functions. */
    @Test
    void agreesWithItsOwnFormula() {
        ReferenceTable table = ReferenceTable.of(RepairedStripsValidationTest.class, "repaired-strips.csv");
        assertThat(table.rows()).hasSize(12);
        for (Map<String, String> row : table.rows()) {
            Profile profile = "taper".equals(row.get("shape")) ? new Taper(20.0, 1.0, 0.25) : new Cylinder(20.0, 1.0);
            double delta = ReferenceTable.number(row, "delta");
            FiniteFactors found =
                    new RepairedStrips(profile, UNIT, ReferenceTable.number(row, "pivot")).at(2.0 / (delta * delta));
            hold(found.stream(), row, "stream");
            hold(found.rocking(), row, "rocking");
        }
    }

    private static void hold(Complex found, Map<String, String> row, String name) {
        Complex expected =
                new Complex(ReferenceTable.number(row, name + "_re"), ReferenceTable.number(row, name + "_im"));
        assertThat(found.subtract(expected).norm()).as("%s %s", name, row).isCloseTo(0.0, within(1e-8));
    }

    @Test
    void saysWhereItsErrorIsNotKnown() {
        FiniteFactors blunt = new RepairedStrips(new Cylinder(3.8, 1.0), UNIT, 0.0).at(2.0);
        assertThat(blunt.streamError()).isEqualTo(Double.POSITIVE_INFINITY);
        FiniteFactors slow = new RepairedStrips(new Cylinder(20.0, 1.0), UNIT, 0.0).at(1e-7);
        assertThat(slow.rockingError()).isEqualTo(Double.POSITIVE_INFINITY);
        FiniteFactors usual = new RepairedStrips(new Cylinder(20.0, 1.0), UNIT, 0.0).at(0.1);
        assertThat(usual.streamError()).isLessThan(RepairedStrips.STREAM_ERROR);
    }

    private static double error(Complex found, Complex exact) {
        return found.subtract(exact).norm() / exact.norm();
    }
}
