package flowshy.torque.strips;

import static org.assertj.core.api.Assertions.assertThat;
import static org.assertj.core.api.Assertions.within;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.hair.Club;
import flowshy.hair.Club.End;
import flowshy.hair.Cylinder;
import flowshy.hair.Taper;
import flowshy.medium.Medium;
import flowshy.torque.Hairs;
import org.junit.jupiter.api.Test;

class ThinStripsTest {
    private static final Medium GAS = Hairs.gas("gas", 1.2, 1.82e-5, 1e-6);

    @Test
    void aCylinderIsThinAsAWholeOrNotAtAll() {
        assertThat(ThinStrips.share(new Cylinder(7e-4, 9e-6), GAS, 100.0, 0.1)).isEqualTo(1.0);
        assertThat(ThinStrips.share(new Cylinder(7e-4, 1.1e-5), GAS, 100.0, 0.1))
                .isZero();
        assertThat(ThinStrips.share(new Cylinder(7e-4, 9e-9), Medium.of("oil", 900.0, 0.1), 100.0, 0.1))
                .isZero();
    }

    /** A club of two cylinders by hand: ∫ z dz over each times |Γ| a². */
    @Test
    void ofAClubTheStalkCounts() {
        Club club = new Club(8e-4, 9e-6, 5e-4, 0.0, 4e-5, End.FLAT);
        double stalk = gamma(9e-6) * 9e-6 * 9e-6 * 0.5 * 25e-8;
        double head = gamma(4e-5) * 16e-10 * 0.5 * (64e-8 - 25e-8);
        assertThat(ThinStrips.share(club, GAS, 100.0, 0.1) / (stalk / (stalk + head)))
                .isCloseTo(1.0, within(1e-9));
    }

    private static double gamma(double radius) {
        return new OscillatingCylinder(radius, GAS).hydrodynamicFunction(100.0).norm();
    }

    /** Of a cone the uppermost tenth is thin: 19 % of ∫ z dz, and less of the force, which falls off towards the tip. */
    @Test
    void ofAConeTheTipCounts() {
        double share = ThinStrips.share(new Taper(7e-4, 1e-4, 0.0), GAS, 100.0, 0.1);
        assertThat(share).isBetween(0.03, 0.19);
        assertThat(ThinStrips.share(new Taper(7e-4, 2e-4, 0.0), GAS, 100.0, 0.1))
                .isLessThan(share);
    }
}
