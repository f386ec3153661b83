package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.math.ReferenceTable;
import flowshy.medium.Medium;
import java.util.Map;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** The repair against the solver, which the finite-element solution holds, over the range that the repair claims. */
class RepairedStripsValidationTest {
    private static final Medium UNIT = Medium.of("unit", 1.0, 1.0);
    private static final double[] SHARES = {0.0201, 0.2, 0.999};

    @ParameterizedTest
    @CsvSource({
        "3.5, 0.04, 0.09",
        "5, 0.04, 0.08",
        "7.5, 0.03, 0.06",
        "10, 0.03, 0.051",
        "20, 0.03, 0.04",
        "50, 0.02, 0.03"
    })
    void cylinders(double slenderness, double stream, double rocking) {
        hold(new Cylinder(2.0 * slenderness, 1.0), stream, rocking);
    }

    @Test
    void clubs() {
        hold(new Club(15.0, 1.0 / 3.0, 20.0 / 3.0, 5.0 / 3.0, 1.0, Club.End.ROUND), 0.05, 0.06);
        hold(
                new Club(20.0, 0.4, 12.0, 4.0, 1.0, Club.End.FLAT),
                RepairedStrips.STREAM_ERROR,
                RepairedStrips.ROCKING_ERROR);
    }

    @Test
    void tapers() {
        hold(new Taper(20.0, 1.0, 0.25), 0.04, 0.02);
        hold(new Taper(20.0, 1.0, 0.0), 0.06, 0.05);
    }

    /** Bounds that are used up to two thirds somewhere: a looser claim would say less than is known. */
    private static void hold(Profile profile, double stream, double rocking) {
        double worstStream = 0.0;
        double worstRocking = 0.0;
        for (double share : SHARES) {
            double delta = share * profile.length();
            double omega = 2.0 / (delta * delta);
            FiniteTorques exact = new FiniteHair(profile, UNIT, 0.0).at(omega);
            FiniteFactors repaired = new RepairedStrips(profile, UNIT, 0.0).at(omega);
            assertThat(repaired.streamError()).isEqualTo(RepairedStrips.STREAM_ERROR);
            assertThat(repaired.rockingError()).isEqualTo(RepairedStrips.ROCKING_ERROR);
            double streamError = error(repaired.stream(), exact.streamFactor());
            double rockingError = error(repaired.rocking(), exact.rockingFactor());
            assertThat(streamError).as("stream, δ/L = %s", share).isFinite().isLessThan(stream);
            assertThat(rockingError).as("rocking, δ/L = %s", share).isFinite().isLessThan(rocking);
            worstStream = FastMath.max(worstStream, streamError);
            worstRocking = FastMath.max(worstRocking, rockingError);
        }
        assertThat(worstStream).isGreaterThan(0.5 * stream);
        assertThat(worstRocking).isGreaterThan(0.5 * rocking);
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
        FiniteFactors blunt = new RepairedStrips(new Cylinder(4.0, 1.0), UNIT, 0.0).at(2.0);
        assertThat(blunt.streamError()).isEqualTo(Double.POSITIVE_INFINITY);
        FiniteFactors slow = new RepairedStrips(new Cylinder(20.0, 1.0), UNIT, 0.0).at(1e-4);
        assertThat(slow.rockingError()).isEqualTo(Double.POSITIVE_INFINITY);
    }

    private static double error(Complex found, Complex exact) {
        return found.subtract(exact).norm() / exact.norm();
    }
}
