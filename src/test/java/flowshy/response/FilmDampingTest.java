package flowshy.response;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.assertThatThrownBy;
import static org.assertj.core.api.Assertions.within;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import flowshy.response.SuspensionStatement.Damping;
import flowshy.response.SuspensionStatement.Dashpot;
import flowshy.response.SuspensionStatement.Quality;
import flowshy.response.SuspensionStatement.Resonance;
import flowshy.response.SuspensionStatement.RingDown;
import flowshy.response.SuspensionStatement.Spring;
import flowshy.response.SuspensionStatement.Stiffness;
import flowshy.stream.cover.Cavity;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import flowshy.stream.cover.SealedCover;
import java.util.ArrayList;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;
import org.hipparchus.complex.Complex;
import org.hipparchus.util.FastMath;
import org.junit.jupiter.api.Test;

/** The film under the plate and the wall of a measuring cavity, as parts of what was measured and of what is used. */
class FilmDampingTest {
    private static final Hair ROD = new Hair(new Cylinder(7.6e-4, 4.2e-5), 1190.0, OptionalDouble.empty());
    private static final TiltingPlateFilm FILM = new TiltingPlateFilm(1.4e-4, 9e-5, 4e-6);
    private static final Cover NARROW = new SealedCover(Optional.of(new Cavity(3e-4, 1e-3)));
    private static final Medium AIR = medium("air", 1.2, 1.82e-5);
    private static final Medium WATER = medium("water", 998.2, 1.0016e-3);

    private static Medium medium(String name, double density, double viscosity) {
        return new Medium(
                name,
                Phase.UNSTATED,
                293.15,
                101325.0,
                density,
                viscosity,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                List.of(),
                List.of());
    }

    private static Suspension suspension(double damping, Optional<TiltingPlateFilm> film) {
        return new Suspension(6e-8, damping, 5e-17, 2e-6, Attitude.UPRIGHT, OptionalDouble.empty(), film);
    }

    private static final Suspension TRUTH = suspension(7e-13, Optional.of(FILM));

    private static Suspension solve(Optional<Stiffness> stiffness, Damping damping) {
        return new SuspensionSolver(
                        ROD,
                        new SuspensionStatement(
                                stiffness,
                                damping,
                                5e-17,
                                2e-6,
                                Attitude.UPRIGHT,
                                OptionalDouble.empty(),
                                Optional.of(FILM)))
                .solve();
    }

    /** What the device would be measured to do, bare or in a cavity, gives back the suspension it was made of. */
    @Test
    void everyStatementOfADeviceWithFilmAndCavityGivesTheSuspensionBack() {
        int solved = 0;
        for (Cover cover : List.of(Covers.OPEN, NARROW)) {
            for (Optional<Medium> in : List.of(Optional.<Medium>empty(), Optional.of(AIR), Optional.of(WATER))) {
                Oscillator device = new Oscillator(ROD, TRUTH, in, cover);
                double omega = device.resonance();
                Complex s = device.decay().root().orElseThrow();
                double decay = -1.0 / s.getReal();
                Resonance resonance = new Resonance(omega / (2.0 * FastMath.PI), in, cover);
                List<Damping> dampings = List.of(
                        new Dashpot(device.totalDamping(omega, device.fluidInertia(omega)), in, cover),
                        new Quality(device.decay().quality(), in, cover),
                        new RingDown(OptionalDouble.empty(), decay, in, cover));
                for (Stiffness stiffness : List.of(resonance, new Spring(6e-8))) {
                    for (Damping damping : dampings) {
                        near(solve(Optional.of(stiffness), damping), stiffness + " with " + damping);
                        solved++;
                    }
                }
                double frequency = s.getImaginary() / (2.0 * FastMath.PI);
                near(
                        solve(Optional.empty(), new RingDown(OptionalDouble.of(frequency), decay, in, cover)),
                        "swing in " + in);
                solved++;
            }
        }
        assertThat(solved).isEqualTo(42);
    }

    private static void near(Suspension found, String what) {
        assertThat(found.stiffness() / 6e-8).as(what).isCloseTo(1.0, within(1e-9));
        // in water the structure holds about a thousandth of the whole damping
        assertThat(found.damping() / 7e-13).as(what).isCloseTo(1.0, within(1e-6));
        assertThat(found.film()).contains(FILM);
    }

    /** In one medium a film is a dashpot of its damping; in another it follows the viscosity; in vacuum it is not there. */
    @Test
    void theFilmIsADashpotThatFollowsTheMedium() {
        for (Medium medium : List.of(AIR, WATER)) {
            Oscillator film = new Oscillator(ROD, TRUTH, Optional.of(medium));
            Suspension dashpot = suspension(7e-13 + FILM.damping(medium), Optional.empty());
            Oscillator plain = new Oscillator(ROD, dashpot, Optional.of(medium));
            double omega = 2.0 * FastMath.PI * 170.0;
            assertThat(film.denominator(omega)
                            .subtract(plain.denominator(omega))
                            .norm())
                    .isLessThan(1e-14 * film.denominator(omega).norm());
            assertThat(film.decay().quality() / plain.decay().quality()).isCloseTo(1.0, within(1e-10));
            assertThat(film.resonance()).isEqualTo(plain.resonance());
        }
        assertThat(TRUTH.filmDamping(Optional.of(WATER)) / TRUTH.filmDamping(Optional.of(AIR)))
                .isCloseTo(1.0016e-3 / 1.82e-5, within(1e-12));
        assertThat(TRUTH.filmDamping(Optional.empty())).isZero();
        double inVacuum = new Oscillator(ROD, TRUTH, Optional.empty()).totalDamping(1000.0, Complex.ZERO);
        assertThat(inVacuum).isEqualTo(7e-13);
    }

    /** √(4kT R): the film's share of the noise is that of its damping. */
    @Test
    void theFilmMakesNoise() {
        Device device = new Device(ROD, Optional.of(TRUTH), AIR, Covers.OPEN, AIR);
        Device without = new Device(ROD, Optional.of(suspension(7e-13, Optional.empty())), AIR, Covers.OPEN, AIR);
        ResponsePoint point = new Response(device).at(120.0);
        double torque = point.motionTorque().norm();
        double more = square(point.thermalNoise().orElseThrow() * torque)
                - square(new Response(without).at(120.0).thermalNoise().orElseThrow() * torque);
        assertThat(more / (4.0 * 1.380649e-23 * 293.15 * FILM.damping(AIR))).isCloseTo(1.0, within(1e-9));
        assertThat(point.motion().orElseThrow().norm())
                .isLessThan(
                        new Response(without).at(120.0).motion().orElseThrow().norm());
    }

    private static double square(double value) {
        return value * value;
    }

    /** Hair and film alone damp more than was measured: refused, with both named. */
    @Test
    void lessDampingThanHairAndFilmGiveIsRefused() {
        Oscillator free = new Oscillator(ROD, suspension(0.0, Optional.of(FILM)), Optional.of(AIR));
        double most = free.decay().quality();
        List<Damping> refused = new ArrayList<>();
        refused.add(new Quality(1.02 * most, Optional.of(AIR)));
        refused.add(new Dashpot(
                0.98 * free.totalDamping(free.resonance(), free.fluidInertia(free.resonance())), Optional.of(AIR)));
        refused.add(new RingDown(
                OptionalDouble.empty(),
                -1.02 / free.decay().root().orElseThrow().getReal(),
                Optional.of(AIR)));
        for (Damping damping : refused) {
            assertThatThrownBy(() -> solve(Optional.of(new Spring(6e-8)), damping))
                    .isInstanceOf(SuspensionException.class)
                    .hasMessageContaining("the fluid on the hair and under the plate alone");
        }
        // without the film the same quality factor is possible
        assertThat(new SuspensionSolver(
                                ROD,
                                new SuspensionStatement(
                                        Optional.of(new Spring(6e-8)),
                                        refused.get(0),
                                        5e-17,
                                        2e-6,
                                        Attitude.UPRIGHT,
                                        OptionalDouble.empty()))
                        .solve()
                        .damping())
                .isPositive();
    }

    /** The wall of a narrow cavity damps the hair by itself; a measurement there says less of the suspension. */
    @Test
    void aMeasurementInANarrowCavityLeavesLessToTheSuspension() {
        Quality bare = new Quality(12.0, Optional.of(AIR));
        Quality confined = new Quality(12.0, Optional.of(AIR), NARROW);
        Quality wide = new Quality(12.0, Optional.of(AIR), Covers.SEALED);
        Optional<Stiffness> spring = Optional.of(new Spring(6e-8));
        assertThat(solve(spring, confined).damping())
                .isLessThan(0.95 * solve(spring, bare).damping());
        assertThat(solve(spring, wide)).isEqualTo(solve(spring, bare));
    }
}
