package flowshy.verdict.compare;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Club;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.medium.Medium;
import flowshy.response.Attitude;
import flowshy.response.Device;
import flowshy.response.Suspension;
import flowshy.stream.cover.Covers;
import flowshy.verdict.Acceptance;
import flowshy.verdict.Band;
import flowshy.verdict.BandsQuestion;
import flowshy.verdict.design.NoDesignException;
import flowshy.verdict.figure.Evaluated;
import flowshy.verdict.figure.Figure;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import java.util.function.DoubleFunction;
import org.junit.jupiter.api.Test;
import org.junit.jupiter.params.ParameterizedTest;
import org.junit.jupiter.params.provider.EnumSource;

/** Equal quantities against closed forms and by working them out anew. */
class CompareQuestionTest {
    private static final Medium AIR = Medium.of("air", 1.19, 1.83e-5);
    private static final Suspension HELD =
            new Suspension(3e-9, 5e-13, 0.0, 0.0, Attitude.HANGING, OptionalDouble.empty());
    private static final Cylinder ROD = new Cylinder(7.4e-4, 4.3e-5);
    private static final Club CLUB = new Club(7.4e-4, 2.3e-5, 4e-4, 6e-5, 5.9e-5, Club.End.FLAT);

    private static BandsQuestion about(Profile profile, double density) {
        Device device = new Device(
                new Hair(profile, density, OptionalDouble.empty()), Optional.of(HELD), AIR, Covers.OPEN, AIR);
        return new BandsQuestion(device, new Band(20.0, 300.0), Acceptance.NONE);
    }

    /** A scaling by a function, from a start, within a factor of a hundred unless said. */
    private record By(double start, double least, double most, DoubleFunction<BandsQuestion> law) implements Scaling {
        @Override
        public String words() {
            return "x";
        }

        @Override
        public String written(double value) {
            return String.format(java.util.Locale.ROOT, "%.3g", value);
        }

        @Override
        public String change(double value) {
            return "x to " + written(value);
        }

        @Override
        public BandsQuestion at(double value) {
            return law.apply(value);
        }
    }

    private static ComparedDevice second(Figure figure, Scaling scaling) {
        Contender first = new Contender("rod", List.of(), Optional.of(about(ROD, 1300.0)), Optional.empty(), "");
        Contender other = new Contender(
                "other", List.of("x"), Optional.of(scaling.at(scaling.start())), Optional.of(scaling), "");
        return new CompareQuestion(List.of(first, other), Optional.of(figure))
                .answer()
                .get(1);
    }

    /** At equal length and density mass goes as d², at equal shape inertia and mass as the density. */
    @Test
    void scalesAsTheClosedFormsSay() {
        Scaling diameters = new By(1.0, 1e-2, 5.0, f -> about(ROD.thickened(f), 700.0));
        assertThat(second(Figure.MASS, diameters).scaled().orElseThrow().ratio())
                .isCloseTo(Math.sqrt(1300.0 / 700.0), within(1e-12));
        Scaling density = new By(700.0, 1.0, 1e5, rho -> about(ROD, rho));
        for (Figure figure : List.of(Figure.MASS, Figure.INERTIA, Figure.INERTIAL_TORQUE)) {
            assertThat(second(figure, density).scaled().orElseThrow().ratio())
                    .as(figure.word())
                    .isCloseTo(1300.0 / 700.0, within(1e-12));
        }
        Scaling equal = new By(1.0, 1e-2, 5.0, f -> about(ROD.thickened(f), 1300.0));
        assertThat(second(Figure.VOLUME, equal).scaled().orElseThrow().ratio()).isEqualTo(1.0);
    }

    /** Whatever is made equal is worked out anew on the scaled device, here by itself. */
    @ParameterizedTest
    @EnumSource(
            value = Figure.class,
            names = {
                "MASS",
                "VOLUME",
                "INERTIA",
                "INERTIAL_TORQUE",
                "RESONANCE",
                "FOOTPRINT",
                "LEAST_REJECTION",
                "QUALITY"
            })
    void isEqualWhenWorkedOutAnew(Figure figure) {
        Scaling diameters = new By(1.0, 1e-2, 5.0, f -> about(CLUB.thickened(f), 1300.0));
        Scaled scaled = second(figure, diameters).scaled().orElseThrow();
        double target = figure.of(new Evaluated(about(ROD, 1300.0))).value();
        double anew = figure.of(new Evaluated(about(CLUB.thickened(scaled.ratio()), 1300.0)))
                .value();
        assertThat(scaled.ratio()).isNotEqualTo(1.0);
        assertThat(anew).isCloseTo(target, within(1e-9 * target));
        assertThat(scaled.after()).isEqualTo(anew);
    }

    @Test
    void whatCannotBeMadeEqualSaysHowNearItComes() {
        Scaling little = new By(1.0, 0.9, 1.1, f -> about(ROD.thickened(f), 200.0));
        ComparedDevice none = second(Figure.MASS, little);
        assertThat(none.answer()).isEmpty();
        assertThat(none.reason())
                .isEqualTo("from 0.900 to 1.10 its mass goes from 6.964e-10 to 1.040e-09 kg; 5.588e-09 is wanted");
        Scaling ends = new By(1.0, 1e-3, 10.0, f -> {
            if (f > 1.2) {
                throw new NoDesignException("too thick");
            }
            return about(ROD.thickened(f), 200.0);
        });
        assertThat(second(Figure.MASS, ends).reason()).contains(" to 1.16 its mass ");
    }

    @Test
    void devicesAsTheyAreComeInTheirOrder() {
        Contender first = new Contender("rod", List.of(), Optional.of(about(ROD, 1300.0)), Optional.empty(), "");
        Contender club = new Contender("club", List.of("s"), Optional.of(about(CLUB, 1300.0)), Optional.empty(), "");
        Contender none = new Contender("none", List.of("s"), Optional.empty(), Optional.empty(), "it falls over");
        List<ComparedDevice> devices = new CompareQuestion(List.of(first, club, none), Optional.empty()).answer();
        assertThat(devices).extracting(device -> device.contender().name()).containsExactly("rod", "club", "none");
        assertThat(devices.get(0).figures()).hasSize(Figure.values().length);
        assertThat(devices.get(2).reason()).isEqualTo("it falls over");
        assertThat(devices.get(2).figures()).isEmpty();
    }
}
