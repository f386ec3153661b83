package flowshy.torque.finite;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.hair.Profile;
import flowshy.medium.Medium;
import java.io.IOException;
import java.io.InputStream;
import java.nio.charset.StandardCharsets;
import java.util.ArrayList;
import java.util.List;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

/**
 * Against an independent finite-element solution of the same problem (azimuthal mode 1, Taylor–Hood elements, error about
 * 0.05 %). Asked for are 0.5 % and 0.4°; what the two methods leave is 0.05 % and 0.04°.
 */
class FiniteElementValidationTest {
    private static final double AMPLITUDE = 1e-3;
    private static final double PHASE = 0.1;

    private static final Profile CYLINDER = new Cylinder(800e-6, 40e-6);
    private static final Profile CLUB = new Club(900e-6, 20e-6, 400e-6, 100e-6, 60e-6, Club.End.ROUND);

    /** One row: case, frequency and four complex values. */
    private record Row(String name, double omega, List<Complex> values) {
        Medium medium() {
            return name.contains("air") ? Medium.of("air", 1.204, 1.825e-5) : Medium.of("water", 998.2, 1.0016e-3);
        }

        Profile profile() {
            return name.startsWith("club") ? CLUB : CYLINDER;
        }
    }

    @Test
    void streamPastTheFixedHair() throws IOException {
        for (Row row : rows()) {
            FiniteTorques found = new FiniteHair(row.profile(), row.medium(), 0.0).at(row.omega());
            hold(row, found.stream().lateralTorque(), row.values().get(0));
            hold(row, found.stream().force(), row.values().get(1));
        }
    }

    /**
     * The reference moves the surface by u_x = Ωz alone. Inside, that motion has the stress μΩ (xz), which joins the density:
     * ∫ z n_z dS = volume, ∫ n_z dS = area of the foot.
     */
    @Test
    void rockingOfTheHair() throws IOException {
        for (Row row : rows()) {
            double scale = row.profile().largestRadius();
            double mu = row.medium().viscosity();
            double beta = row.omega() * scale * scale / row.medium().kinematicViscosity();
            RingLayer layer = Bodies.layer(Meridian.of(row.profile(), scale), beta);
            Complex[] density = layer.moving(0.0, 1.0, 0.0);
            double volume = layer.rings().stream()
                    .flatMap(ring -> ring.pieces().stream())
                    .mapToDouble(RingPiece::volume)
                    .sum();
            double foot = row.profile().radius(0.0) / scale;
            Complex torque = RingLayer.dot(layer.motion(0.0, 1.0, 0.0), density).add(volume);
            Complex force = RingLayer.dot(layer.motion(1.0, 0.0, 0.0), density).add(FastMath.PI * foot * foot);
            hold(row, torque.multiply(mu * scale * scale * scale), row.values().get(2));
            hold(row, force.multiply(mu * scale * scale), row.values().get(3));
        }
    }

    private static void hold(Row row, Complex found, Complex reference) {
        assertThat(Bodies.amplitudeError(found, reference))
                .as("amplitude, %s at ω = %s", row.name(), row.omega())
                .isCloseTo(0.0, within(AMPLITUDE));
        assertThat(Bodies.phaseError(found, reference))
                .as("phase, %s at ω = %s", row.name(), row.omega())
                .isCloseTo(0.0, within(PHASE));
    }

    private static List<Row> rows() throws IOException {
        List<Row> rows = new ArrayList<>();
        try (InputStream in = FiniteElementValidationTest.class.getResourceAsStream("finite-length-reference.csv")) {
            assertThat(in).isNotNull();
            List<String> lines = new String(in.readAllBytes(), StandardCharsets.UTF_8)
                    .lines()
                    .toList();
            for (String line : lines) {
                if (line.startsWith("\"")) { // the names hold commas
                    String[] cells = line.substring(line.lastIndexOf('"') + 2).split(",", -1);
                    List<Complex> values = new ArrayList<>();
                    for (int i = 0; i < 4; i++) {
                        values.add(new Complex(
                                Double.parseDouble(cells[2 * i + 1]), Double.parseDouble(cells[2 * i + 2])));
                    }
                    double omega = 2.0 * FastMath.PI * Double.parseDouble(cells[0]);
                    rows.add(new Row(line.substring(1, line.lastIndexOf('"')), omega, values));
                }
            }
        }
        assertThat(rows).hasSize(14);
        return rows;
    }
}
