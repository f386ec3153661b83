package flowshy.medium;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import java.io.IOException;
import org.junit.jupiter.api.Test;

/** Gases away from the pressure of their table against equations of state that are evaluated outside this program. */
class GasPressureValidationTest {
    private static final int ROWS = 169;

    /** Also between the rows of the tables. Every state lies inside the uncertainty that the medium itself states there, and half of the states inside a tenth of 1 %. */
    @Test
    void staysInsideTheStatedUncertainty() throws IOException {
        int close = 0;
        for (String[] row : Reference.words("gas-pressure-reference.csv", ROWS)) {
            double temperature = Double.parseDouble(row[1]) + 273.15;
            double pressure = Double.parseDouble(row[2]);
            Medium gas = Media.at(MediumQuery.of(row[0], temperature, pressure));
            String state = String.join(" ", row);
            double density = gas.density() / Double.parseDouble(row[3]) - 1.0;
            assertThat(density).as("density, %s", state).isCloseTo(0.0, within(uncertainty(gas, "density")));
            double sound = gas.soundSpeed().orElseThrow() / Double.parseDouble(row[4]) - 1.0;
            assertThat(sound).as("sound speed, %s", state).isCloseTo(0.0, within(uncertainty(gas, "sound speed")));
            if (!row[5].isEmpty()) {
                double viscosity = gas.viscosity() / Double.parseDouble(row[5]) - 1.0;
                assertThat(viscosity).as("viscosity, %s", state).isCloseTo(0.0, within(uncertainty(gas, "viscosity")));
            }
            if (Math.abs(density) < 1e-4 && Math.abs(sound) < 1e-3) {
                close++;
            }
        }
        assertThat(close).isGreaterThan(ROWS / 2);
    }

    private static double uncertainty(Medium gas, String property) {
        return gas.sources().stream()
                .filter(source -> source.property().equals(property))
                .findFirst()
                .orElseThrow()
                .uncertainty()
                .orElseThrow();
    }
}
