package flowshy.stream.record;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.catchThrowableOfType;
import static org.assertj.core.api.Assertions.within;

import java.util.List;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.CsvSource;
import org.junit.jupiter.params.provider.EnumSource;

/** What may be said about a file, and what is refused as ambiguous. */
class DeclarationTest {
    private static final OptionalDouble NONE = OptionalDouble.empty();

    private static DeclarationException refusal(String columns, String quantity, String unit) {
        DeclarationException e = catchThrowableOfType(
                DeclarationException.class,
                () -> Declaration.of(List.of(columns.split(";")), quantity, unit, 0, NONE, NONE));
        assertThat(e).as("%s %s %s", columns, quantity, unit).isNotNull();
        return e;
    }

    @ParameterizedTest
    @CsvSource({
        "density, m/s, says nothing of the bandwidth",
        "density, m/s/Hz, neither a density",
        "density, m/s/rtHz, that is an amplitude density",
        "density, m2/s, could be a viscosity",
        "density, dB, a level needs its reference",
        "amplitude density, (m/s)2/Hz, that is a density",
        "amplitude density, g, says nothing of the bandwidth",
        "band levels, dB, a level needs its reference",
        "band levels, dB SPL, a level needs its reference",
        "time record, V, a voltage",
        "rms lines, furlong, 'furlong'"
    })
    void ambiguousUnitsAreRefusedWithTheReason(String quantity, String unit, String reason) {
        DeclarationException refusal = refusal(quantity.equals("time record") ? "t;u" : "f;u", quantity, unit);
        assertThat(refusal.key()).isEqualTo("unit");
        assertThat(refusal.found()).contains("'" + unit + "'").contains(reason);
        assertThat(refusal.accepted()).contains("m/s");
    }

    @ParameterizedTest
    @EnumSource(Quantity.class)
    void everyAcceptedUnitIsAccepted(Quantity quantity) {
        List<RecordUnit> units = RecordUnit.accepted(quantity);
        assertThat(units).hasSizeGreaterThanOrEqualTo(10);
        for (RecordUnit unit : units) {
            assertThat(RecordUnit.of(unit.spelling(), quantity)).isEqualTo(unit);
        }
        assertThat(Quantity.of(quantity.word())).contains(quantity);
    }

    /** Spellings people use, and what one such unit is in SI. */
    @Test
    void spellingsAndFactors() {
        assertThat(RecordUnit.of("(µm/s)^2/Hz", Quantity.DENSITY).si(1.0, Quantity.DENSITY))
                .isCloseTo(1e-12, within(1e-26));
        assertThat(RecordUnit.of("( mm/s )2 / Hz", Quantity.DENSITY).si(2.0, Quantity.DENSITY))
                .isCloseTo(2e-6, within(1e-20));
        assertThat(RecordUnit.of("g²/Hz", Quantity.DENSITY).si(1.0, Quantity.DENSITY))
                .isCloseTo(96.1703842, within(1e-6));
        assertThat(RecordUnit.of("(g)2/Hz", Quantity.DENSITY).spelling()).isEqualTo("g2/Hz");
        assertThat(RecordUnit.of("Pa/sqrt(Hz)", Quantity.AMPLITUDE_DENSITY).si(3.0, Quantity.AMPLITUDE_DENSITY))
                .isEqualTo(9.0);
        assertThat(RecordUnit.of("dB re 20 μPa", Quantity.BAND_LEVELS).si(94.0, Quantity.BAND_LEVELS))
                .isCloseTo(1.0023745, within(0.5e-7));
        assertThat(RecordUnit.of("dB re 50 nm/s", Quantity.BAND_LEVELS).si(0.0, Quantity.BAND_LEVELS))
                .isEqualTo(50e-9);
        assertThat(RecordUnit.of("cm/s", Quantity.TIME_RECORD).si(3.0, Quantity.TIME_RECORD))
                .isCloseTo(0.03, within(1e-17));
        assertThat(RecordUnit.of("m/s2 peak", Quantity.RMS_LINES).si(1.0, Quantity.RMS_LINES))
                .isCloseTo(0.70710678, within(1e-8));
    }

    @Test
    void columnsMustFitTheQuantity() {
        assertThat(refusal("S", "density", "(m/s)2/Hz").found())
                .isEqualTo("0 columns of frequencies (f), one is needed");
        assertThat(refusal("f", "density", "(m/s)2/Hz").found()).contains("0 columns of values");
        assertThat(refusal("f;a;b", "density", "(m/s)2/Hz").found()).contains("2 columns of values");
        assertThat(refusal("t;S", "density", "(m/s)2/Hz").accepted()).isEqualTo("a column f, not t");
        assertThat(refusal("f;u", "time record", "m/s").accepted()).isEqualTo("a column t, not f");
        assertThat(refusal("f [ms];S", "density", "(m/s)2/Hz").accepted()).isEqualTo("f [Hz], f [kHz]");
        assertThat(refusal("f;S [m/s]", "density", "(m/s)2/Hz").accepted()).contains("stands under unit");
        assertThat(refusal("f;S", "power", "W").key()).isEqualTo("quantity");
        assertThat(refusal("f;S", "power", "W").accepted()).startsWith("density, amplitude density");
    }

    @Test
    void rateAndResolution() {
        assertThat(catchThrowableOfType(
                        DeclarationException.class,
                        () -> Declaration.of(
                                List.of("t", "u"), "time record", "m/s", 0, OptionalDouble.of(10.0), NONE)))
                .satisfies(e -> assertThat(e.key()).isEqualTo("rate"));
        assertThat(catchThrowableOfType(
                        DeclarationException.class,
                        () -> Declaration.of(List.of("f", "S"), "density", "g2/Hz", 0, NONE, OptionalDouble.of(1.0))))
                .satisfies(e -> assertThat(e.key()).isEqualTo("resolution"));
        assertThat(catchThrowableOfType(
                        DeclarationException.class,
                        () -> Declaration.of(List.of("u"), "time record", "m/s", 0, OptionalDouble.of(-1.0), NONE)))
                .satisfies(e -> assertThat(e.accepted()).isEqualTo("a positive frequency"));
        assertThat(catchThrowableOfType(
                        DeclarationException.class,
                        () -> Declaration.of(List.of("t", "u"), "time record", "m/s", -1, NONE, NONE)))
                .satisfies(e -> assertThat(e.key()).isEqualTo("skip"));
    }
}
