package flowshy.response;

import flowshy.hair.Club;
import flowshy.hair.Club.End;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import flowshy.stream.cover.Cover;
import flowshy.stream.cover.Covers;
import java.util.List;
import java.util.Optional;
import java.util.OptionalDouble;

/** Devices that the tests of this package share. */
final class Devices {
    static final Hair ROD = hair(new Cylinder(7.6e-4, 4.2e-5), 1190.0);

    /** Too thin a medium to be felt: mass and drag are twelve digits below those of the hair. */
    static final Medium HARDLY_ANY = medium("hardly any", 300.0, 1e-12, 1e-22, OptionalDouble.empty());

    private Devices() {}

    static Hair hair(Profile profile, double density) {
        return new Hair(profile, density, OptionalDouble.empty());
    }

    static Medium medium(
            String name, double temperature, double density, double viscosity, OptionalDouble meanFreePath) {
        return new Medium(
                name,
                Phase.UNSTATED,
                temperature,
                101325.0,
                density,
                viscosity,
                OptionalDouble.empty(),
                meanFreePath,
                List.of(),
                List.of());
    }

    static Suspension suspension(double stiffness, double damping, double plate, double depth, Attitude attitude) {
        return new Suspension(stiffness, damping, plate, depth, attitude, OptionalDouble.empty());
    }

    static Device device(Hair hair, Suspension suspension, Medium medium, Cover cover) {
        return new Device(hair, Optional.of(suspension), medium, cover, medium);
    }

    /** The devices of devices.py, by name. */
    static Device named(String name) {
        Medium air = medium("air", 295.0, 1.19, 1.83e-5, OptionalDouble.of(6.6e-8));
        Medium helium = medium("helium", 310.0, 0.1663, 1.962e-5, OptionalDouble.of(1.9e-7));
        Medium water = medium("water", 283.0, 998.2, 1.0016e-3, OptionalDouble.empty());
        return switch (name) {
            case "cylinder in air" ->
                device(ROD, suspension(2.1e-9, 3e-13, 4e-17, 2e-6, Attitude.UPRIGHT), air, Covers.OPEN);
            case "taper in water" ->
                device(
                        hair(new Taper(7.2e-4, 4.4e-5, 0.0), 1210.0),
                        suspension(4e-8, 1e-12, 0.0, 0.0, Attitude.HANGING),
                        water,
                        Covers.OPEN);
            case "club in helium" ->
                device(
                        hair(new Club(9e-4, 2e-5, 4e-4, 1e-4, 6e-5, End.ROUND), 1180.0),
                        suspension(7e-10, 2e-14, 9e-17, 0.0, Attitude.HORIZONTAL),
                        helium,
                        Covers.OPEN);
            case "cylinder in water slow" ->
                device(
                        ROD,
                        suspension(2.1e-10, 0.0, 0.0, 0.0, Attitude.UPRIGHT),
                        medium("water", 293.15, 998.2, 1.0016e-3, OptionalDouble.empty()),
                        Covers.OPEN);
            default -> throw new IllegalArgumentException(name);
        };
    }

    static Device sealed(Device device) {
        return new Device(device.hair(), device.suspension(), device.outside(), Covers.SEALED, device.around());
    }
}
