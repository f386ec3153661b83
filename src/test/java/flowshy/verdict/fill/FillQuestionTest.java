package flowshy.verdict.fill;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.medium.Media;
import flowshy.medium.Medium;
import flowshy.medium.MediumQuery;
import flowshy.response.Attitude;
import flowshy.response.Device;
import flowshy.response.Suspension;
import flowshy.stream.cover.Covers;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.junit.jupiter.api.Test;

class FillQuestionTest {
    private static final Band BAND = new Band(20.0, 300.0);
    private static final Medium NITROGEN = Media.at(MediumQuery.of("nitrogen", 293.15, 101325.0));

    private static Device device(double density) {
        return new Device(
                new Hair(new Cylinder(7e-4, 4e-5), density, OptionalDouble.empty()),
                Optional.of(new Suspension(4e-9, 2e-13, 0.0, 0.0, Attitude.HANGING, OptionalDouble.empty())),
                NITROGEN,
                Covers.OPEN,
                NITROGEN);
    }

    private static List<FillRow> rows(Device device, double temperature) {
        return new FillQuestion(device, BAND, Acceptance.NONE, 80.0, Fill.known(temperature, 101325.0))
                .answer()
                .rows();
    }

    private static FillRow row(List<FillRow> rows, String fill, boolean sealed) {
        return rows.stream()
                .filter(row -> row.fill().equals(fill) && row.cover().closed() == sealed)
                .findFirst()
                .orElseThrow();
    }

    @Test
    void everyKnownMediumStandsInTheTableTwice() {
        List<FillRow> rows = rows(device(1200.0), 293.15);
        assertThat(rows).hasSize(2 * Fill.known(293.15, 101325.0).size()).hasSizeGreaterThan(50);
    }

    /** The study's own fluid must give the study's own figures. */
    @Test
    void theStudysOwnFluidChangesNothing() {
        FillRow own = row(rows(device(1200.0), 293.15), "nitrogen", false);
        double least = new BandsQuestion(device(1200.0), BAND, Acceptance.NONE)
                .answer()
                .least()
                .orElseThrow()
                .rejection();
        assertThat(own.rejection()).isCloseTo(least, within(1e-9));
        assertThat(own.sensitivity()).isCloseTo(1.0, within(1e-12));
        assertThat(own.excluded()).isEmpty();
    }

    @Test
    void sortsWhatNothingSpeaksAgainstByRejection() {
        List<FillRow> good = rows(device(1200.0), 293.15).stream()
                .filter(row -> row.excluded().isEmpty() && row.medium().isPresent())
                .toList();
        assertThat(good).hasSizeGreaterThan(10);
        for (int i = 1; i < good.size(); i++) {
            assertThat(good.get(i).rejection())
                    .isLessThanOrEqualTo(good.get(i - 1).rejection());
        }
        assertThat(good.get(0).rejection()).isInfinite();
        assertThat(row(good, "hydrogen", false).rejection())
                .isGreaterThan(row(good, "argon", false).rejection());
    }

    @Test
    void saysWhatSpeaksAgainstAFluid() {
        List<FillRow> rows = rows(device(998.2), 293.15);
        assertThat(row(rows, "water", true).excluded())
                .anySatisfy(why -> assertThat(why).contains("one density"));
        assertThat(rows)
                .filteredOn(row -> row.fill().startsWith("silicone oil 1000"))
                .isNotEmpty()
                .allSatisfy(row -> assertThat(row.excluded())
                        .anySatisfy(why -> assertThat(why).contains("overdamped")));
        List<FillRow> cold = rows(device(1200.0), 263.15);
        assertThat(row(cold, "water", false).excluded())
                .anySatisfy(why -> assertThat(why).contains("freezes"));
        List<FillRow> thin = new FillQuestion(device(1200.0), BAND, Acceptance.NONE, 80.0, Fill.known(353.15, 20000.0))
                .answer()
                .rows();
        assertThat(row(thin, "water", false).excluded())
                .anySatisfy(why -> assertThat(why).contains("boils"));
    }

    /** An open hair in a liquid of its own density still feels the flow; sealed it feels nothing, so the noise has no bound. */
    @Test
    void liquidsLowerResonanceAndSensitivityWhenSealed() {
        List<FillRow> rows = rows(device(1200.0), 293.15);
        FillRow water = row(rows, "water", true);
        assertThat(water.resonance().orElseThrow())
                .isLessThan(0.7 * row(rows, "helium", true).resonance().orElseThrow());
        assertThat(water.sensitivity()).isLessThan(0.4);
        assertThat(row(rows, "silicone oil 10 cSt", true).fromMemory()).isTrue();
    }
}
