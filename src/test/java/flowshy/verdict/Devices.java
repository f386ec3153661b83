package flowshy.verdict;

import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import flowshy.medium.PropertySource;
import flowshy.response.Attitude;
import flowshy.response.Device;
import flowshy.response.Suspension;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Devices that the tests of this package share. */
final class Devices {
    static final Medium AIR = Medium.of("air", 1.2, 1.82e-5);
    static final Medium WATER = Medium.of("water", 998.2, 1.0016e-3);
    static final Cylinder ROD = new Cylinder(7.6e-4, 4.2e-5);
    static final Suspension HELD = suspension(4e-9, Attitude.UPRIGHT);

    private Devices() {}

    static Suspension suspension(double stiffness, Attitude attitude) {
        return new Suspension(stiffness, 4e-13, 0.0, 0.0, attitude, OptionalDouble.empty());
    }

    static Device bare(Profile profile, double density, Medium medium) {
        return new Device(
                new Hair(profile, density, OptionalDouble.empty()), Optional.empty(), medium, Covers.OPEN, medium);
    }

    static Device held(Suspension suspension, OptionalDouble modulus, Medium medium, Cover cover) {
        return new Device(new Hair(ROD, 1190.0, modulus), Optional.of(suspension), medium, cover, medium);
    }

    static Device sealed(Profile profile, double density, Medium medium) {
        return new Device(
                new Hair(profile, density, OptionalDouble.empty()), Optional.empty(), AIR, Covers.SEALED, medium);
    }

    static Medium gas(double meanFreePath) {
        return new Medium(
                "thin gas",
                Phase.GAS,
                293.15,
                500.0,
                0.006,
                1.82e-5,
                OptionalDouble.empty(),
                OptionalDouble.of(meanFreePath),
                List.of(),
                List.of());
    }

    static Medium known(String name, double density, PropertySource.Reading reading, double uncertainty) {
        PropertySource source = new PropertySource("density", "a table", reading, OptionalDouble.of(uncertainty));
        return new Medium(
                name,
                Phase.LIQUID,
                293.15,
                101325.0,
                density,
                1e-3,
                OptionalDouble.empty(),
                OptionalDouble.empty(),
                List.of(source),
                List.of());
    }
}
