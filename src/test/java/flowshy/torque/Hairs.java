package flowshy.torque;

import flowshy.hair.Club;
import flowshy.hair.Club.End;
import flowshy.hair.Cylinder;
import flowshy.hair.Hair;
import flowshy.hair.MeasuredProfile;
import flowshy.hair.Profile;
import flowshy.hair.Taper;
import flowshy.medium.Medium;
import flowshy.medium.Phase;
import java.util.ArrayList;
import java.util.LinkedHashMap;
import java.util.List;
import java.util.Map;
import java.util.OptionalDouble;
import org.hipparchus.util.FastMath;

/** Hairs and media that the tests of this package share. */
public final class Hairs {
    private Hairs() {}

    static Hair of(Profile profile, double density) {
        return new Hair(profile, density, OptionalDouble.empty());
    }

    public static Medium gas(String name, double density, double viscosity, double meanFreePath) {
        return new Medium(
                name,
                Phase.GAS,
                /* temperature= */ 293.15,
                /* pressure= */ 101325.0,
                density,
                viscosity,
                OptionalDouble.empty(),
                OptionalDouble.of(meanFreePath),
                List.of(),
                List.of());
    }

    /** Air, helium, water and a thick oil. */
    static List<Medium> media() {
        return List.of(
                gas("air", 1.2, 1.82e-5, 6.5e-8),
                gas("helium", 0.1663, 1.962e-5, 1.9e-7),
                Medium.of("water", 998.2, 1.0016e-3),
                Medium.of("oil", 970.0, 12.0));
    }

    /** Every shape, with points, round ends, steps, narrow feet, waists and finely measured profiles. */
    static Map<String, Profile> profiles() {
        Map<String, Profile> profiles = new LinkedHashMap<>();
        profiles.put("cylinder", new Cylinder(8e-4, 4e-5));
        profiles.put("pointed taper", new Taper(7.2e-4, 4.4e-5, 0.0));
        profiles.put("blunt taper", new Taper(7.2e-4, 4.4e-5, 2.2e-5));
        profiles.put("needle", new Taper(7.2e-4, 4.4e-5, 1e-7));
        profiles.put("narrow foot", new Taper(5.5e-4, 2e-6, 3.1e-5));
        profiles.put("club, round", new Club(9e-4, 2e-5, 4e-4, 1e-4, 6e-5, End.ROUND));
        profiles.put("club, step", new Club(6.6e-4, 1.4e-5, 3.7e-4, 0.0, 5.2e-5, End.FLAT));
        profiles.put("club, step, round", new Club(9e-4, 2e-5, 4e-4, 0.0, 6e-5, End.ROUND));
        profiles.put("club, all shoulder", new Club(9e-4, 3e-6, 1e-5, 7e-4, 1e-4, End.ROUND));
        profiles.put("club, fat", new Club(1e-3, 1e-4, 1e-4, 1e-4, 4e-4, End.ROUND));
        profiles.put(
                "measured",
                new MeasuredProfile(
                        List.of(0.0, 1.1e-4, 3.9e-4, 5.2e-4, 7.4e-4), List.of(5.1e-5, 3.3e-5, 2.6e-5, 3.8e-5, 0.0)));
        profiles.put("waist", new MeasuredProfile(List.of(0.0, 3e-4, 7.4e-4), List.of(5.1e-5, 5e-7, 3e-5)));
        profiles.put("finely measured", finelyMeasured(150));
        return profiles;
    }

    private static Profile finelyMeasured(int pieces) {
        List<Double> heights = new ArrayList<>();
        List<Double> radii = new ArrayList<>();
        for (int i = 0; i <= pieces; i++) {
            double share = (double) i / pieces;
            heights.add(7e-4 * share);
            radii.add(4e-5 * (1.0 + 0.3 * FastMath.sin(9.0 * share)) * FastMath.sqrt(1.0001 - share));
        }
        return new MeasuredProfile(heights, radii);
    }
}
