package flowshy.cylinder;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;

/** Errors of the limits as measured before this code with 40 digits, printed to two digits, at Wo = 2 m. */
class LimitingFormValidationTest {
    @ParameterizedTest
    @CsvSource({
        "THIN_HAIR, 0.002, 8.5e-6",
        "THIN_HAIR, 0.02, 6.3e-4",
        "THIN_HAIR, 0.1, 0.012",
        "THIN_HAIR, 0.2, 0.043",
        "THIN_HAIR, 0.4, 0.15",
        "THIN_HAIR, 0.6, 0.31",
        "THIN_LAYER, 2.0, 4.4e-3",
        "THIN_LAYER, 4.0, 2.9e-4",
        "THIN_LAYER, 8.0, 1.4e-5"
    })
    void missesTheExactFunctionByAKnownAmount(LimitingForm form, double wo, double error) {
        assertThat(form.relativeError(wo) / error).isCloseTo(1.0, within(0.05));
    }

    @Test
    void refusesWhatIsNotPositive() {
        for (LimitingForm form : LimitingForm.values()) {
            assertThatThrownBy(() -> form.hydrodynamicFunction(Double.NaN))
                    .isInstanceOf(IllegalArgumentException.class);
            assertThat(form.words()).isNotBlank();
        }
    }
}
