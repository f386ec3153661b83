package flowshy.stream.surroundings;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.medium.Medium;
import flowshy.stream.Stated;
import java.util.List;
import org.junit.jupiter.api.Test;

/** The table of starting values: complete, each number with its source and status. */
class NamedSurroundingsTest {
    private static final Medium AIR = Medium.of("air", 1.2, 1.812e-5);

    @Test
    void holdsTheNamesThatAreWanted() {
        assertThat(NamedSurroundings.all())
                .hasSizeGreaterThanOrEqualTo(12)
                .extracting(NamedSurrounding::name)
                .contains("still room", "ventilated room", "fan outlet", "light wind")
                .doesNotContain("stream")
                .doesNotHaveDuplicates();
        assertThat(NamedSurroundings.of("ventilated room")).isPresent();
        assertThat(NamedSurroundings.of("stream")).isEmpty();
        assertThat(NamedSurroundings.of("volcano")).isEmpty();
    }

    @Test
    void everyNumberHasItsSource() {
        for (NamedSurrounding named : NamedSurroundings.all()) {
            assertThat(named.about()).as(named.name()).isNotBlank();
            assertThat(named.numbers()).as(named.name()).isNotEmpty();
            for (NamedSurrounding.StartingValue number : named.numbers()) {
                assertThat(number.stated().source())
                        .as("%s %s", named.name(), number.stated().key())
                        .matches(".*(common practice|\\(seen\\)|seen\\)|from memory).*");
                assertThat(number.stated().assumed()).isTrue();
                assertThat(number.unit()).isIn("m", "m/s", "1", "dB", "Hz");
            }
        }
    }

    @Test
    void everyKindHasTheNumbersItNeeds() {
        for (NamedSurrounding named : NamedSurroundings.all()) {
            List<String> keys =
                    named.numbers().stream().map(n -> n.stated().key()).toList();
            switch (named.kind()) {
                case STREAM ->
                    assertThat(keys)
                            .as(named.name())
                            .containsExactly("mean-speed", "turbulence", "length-scale", "fetch");
                case DUCT ->
                    assertThat(keys).as(named.name()).contains("mean-speed").containsAnyOf("diameter", "width");
                case SOUND -> assertThat(keys).as(named.name()).containsExactly("level", "from", "to");
                default -> assertThat(named.kind()).as(named.name()).isNull();
            }
        }
    }

    /** Every named stream makes a source in air, and says that its numbers are assumed. */
    @Test
    void everyNamedStreamStreams() {
        int streams = 0;
        for (NamedSurrounding named : NamedSurroundings.all()) {
            if (named.number("fetch").isPresent()) {
                Stream stream = new Stream(
                        named.name(),
                        0.0,
                        named.number("mean-speed").orElseThrow().value(),
                        named.number("turbulence").orElseThrow(),
                        named.number("length-scale").orElseThrow(),
                        named.number("fetch").orElseThrow(),
                        AIR);
                assertThat(stream.density(1.0))
                        .as(named.name())
                        .isGreaterThan(0.0)
                        .isFinite();
                assertThat(stream.share(6.0).at(5e-4).norm())
                        .as(named.name())
                        .isGreaterThan(0.0)
                        .isFinite();
                assertThat(stream.assumed()).hasSize(3);
                streams++;
            }
        }
        assertThat(streams).isGreaterThanOrEqualTo(8);
    }

    @Test
    void bareStreamHasDefaults() {
        assertThat(NamedSurroundings.ofBareStream("turbulence").value()).isEqualTo(0.4);
        assertThat(NamedSurroundings.ofBareStream("length-scale").value()).isCloseTo(0.1, within(1e-15));
        Stated fetch = NamedSurroundings.ofBareStream("fetch");
        assertThat(fetch.source()).contains("common practice, no source");
        assertThatThrownBy(() -> NamedSurroundings.ofBareStream("mean-speed"))
                .isInstanceOf(IllegalArgumentException.class);
    }
}
