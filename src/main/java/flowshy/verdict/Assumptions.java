package flowshy.verdict;

import static flowshy.math.Figures.say;

import flowshy.cylinder.OscillatingCylinder;
import flowshy.hair.Profile;
import flowshy.math.Caveat;
import flowshy.math.Caveat.Subject;
import flowshy.math.Caveat.Weight;
import flowshy.medium.Medium;
import flowshy.medium.PropertySource;
import flowshy.medium.PropertySource.Reading;
import flowshy.response.Device;
import flowshy.response.Suspension;
import flowshy.torque.finite.LengthFactors;
import flowshy.torque.strips.ThinStrips;
import java.util.ArrayList;
import java.util.Collection;
import java.util.LinkedHashSet;
import java.util.List;
import java.util.Set;
import org.hipparchus.util.FastMath;

/** Collects what must stand beside the numbers of a device: where a model weakens, and where it ends. */
final class Assumptions {
    /** First bending frequency over resonance, and EI/L over stiffness, that count as stiff: common practice, no source. */
    private static final double STIFF = 10.0;

    private static final double NEARLY_EQUAL_DENSITY = 0.05;

    /** Share of the torque that may rest on a law that has ended: it moves the rejection by a tenth of a decibel or so. */
    private static final double LITTLE = 0.05;

    /** Less than this is not worth a word. */
    private static final double UNTOLD = 0.001;

    private Assumptions() {}

    /** Whether a model has ended that a quantity rests on. */
    static boolean ended(Collection<Caveat> caveats, Subject subject) {
        for (Caveat caveat : caveats) {
            if (caveat.weight() == Weight.OUT_OF_RANGE && caveat.about() == subject) {
                return true;
            }
        }
        return false;
    }

    /** The same for the rejection alone, whose laws have few ends: without the work of all that stands beside a whole answer. */
    static boolean rejectionEnds(Device device, Band band) {
        Medium around = device.around();
        boolean outside = !device.cover().closed() && ended(device.outside().caveats(), Subject.REJECTION);
        return outside
                || ended(around.caveats(), Subject.REJECTION)
                || ended(device.cover().assumptions(around), Subject.REJECTION)
                || rarefactionEnds(device, band);
    }

    private static boolean rarefactionEnds(Device device, Band band) {
        if (ThinStrips.none(device.hair().profile(), device.around(), OscillatingCylinder.SLIP_END)) {
            return false;
        }
        Set<Caveat> caveats = new LinkedHashSet<>();
        rarefaction(device, band, caveats);
        return ended(caveats, Subject.REJECTION);
    }

    static List<Caveat> of(Device device, Band band, DeviceFacts facts) {
        Set<Caveat> caveats = new LinkedHashSet<>();
        surroundedBy(device, caveats);
        fromMemory(device, caveats);
        rarefaction(device, band, caveats);
        if (!device.cover().closed()) {
            finiteLength(device, band, facts, caveats);
            excursion(device, band, facts, caveats);
        }
        if (device.cover().cavityRadius().isPresent()) {
            caveats.addAll(FiniteLength.inCavity(device));
        }
        density(device, caveats);
        caveats.addAll(device.cover().assumptions(device.around()));
        suspension(device, facts, caveats);
        film(device, band, facts, caveats);
        bending(device, facts, caveats);
        return new ArrayList<>(caveats);
    }

    private static void surroundedBy(Device device, Set<Caveat> caveats) {
        if (!device.cover().closed()) { // nothing outside touches a hair in a closed cavity
            caveats.addAll(device.outside().caveats());
        }
        caveats.addAll(device.around().caveats());
    }

    private static void fromMemory(Device device, Set<Caveat> caveats) {
        for (PropertySource source : device.around().sources()) {
            boolean decides =
                    source.property().equals("density") || source.property().equals("viscosity");
            if (decides && source.reading() == Reading.MEMORY) {
                caveats.add(new Caveat(
                        Subject.MEDIUM,
                        Weight.WEAK,
                        say(
                                "The %s of %s is recalled from memory (%s); the decision rests on it.",
                                source.property(), device.around().name(), source.source())));
            }
        }
    }

    /** Of a hair that only ends thinner than the slip law goes the rest still counts; a sealed one's reading rests on no law. */
    private static void rarefaction(Device device, Band band, Set<Caveat> caveats) {
        Profile profile = device.hair().profile();
        double thin = ThinStrips.share(
                profile, device.around(), 2.0 * FastMath.PI * band.from(), OscillatingCylinder.SLIP_END);
        Subject subject = device.cover().closed() ? Subject.RESONANCE : Subject.REJECTION;
        OscillatingCylinder thinnest = new OscillatingCylinder(profile.smallestRadius(), device.around());
        boolean ended = thinnest.knudsen() > OscillatingCylinder.SLIP_END;
        if (!ended || thin >= LITTLE) {
            thinnest.caveats().forEach(caveat -> caveats.add(new Caveat(subject, caveat.weight(), caveat.text())));
        }
        if (thin > UNTOLD && (!ended || thin < LITTLE)) {
            caveats.add(new Caveat(
                    subject,
                    thin < LITTLE ? Weight.NOTE : Weight.OUT_OF_RANGE,
                    say(
                            "Where the hair is thinner than %.3g um the slip law has ended; these parts carry %.2g %% of the torque of"
                                    + " the flow.",
                            2e6 * device.around().meanFreePath().orElseThrow() / OscillatingCylinder.SLIP_END,
                            100.0 * thin)));
        }
    }

    private static void finiteLength(Device device, Band band, DeviceFacts facts, Set<Caveat> caveats) {
        double length = device.hair().profile().length();
        LengthFactors.of(device.hair(), device.around(), device.pivotDepth())
                .ifPresentOrElse(
                        factors -> caveats.addAll(FiniteLength.of(device, band, factors)),
                        () -> strips(device, facts, caveats));
        caveats.add(new Caveat(
                Subject.FLOW,
                Weight.NOTE,
                say(
                        "The wall around the hair must be flat and wide against the hair (%.3g mm) and the Stokes layer (up to"
                                + " %.3g mm).",
                        1e3 * length, 1e3 * facts.layer().largest())));
    }

    private static void strips(Device device, DeviceFacts facts, Set<Caveat> caveats) {
        double length = device.hair().profile().length();
        caveats.add(new Caveat(
                Subject.REJECTION,
                Weight.WEAK,
                say(
                        "Strip theory: each slice counts as part of an endless cylinder. Layer over length runs from %.2g to %.2g"
                                + " here, length over diameter is %.3g. For a cylinder of 10 : 1 an independent finite-element"
                                + " solution has %s more flow torque at a ratio of 0.5, 6 %% at 0.3, 3 %% at 0.15, none at 0.05;"
                                + " 50 %% for a post of 2 : 1. With finite-length: auto or on the whole hair is solved.",
                        facts.layer().least() / length,
                        facts.layer().largest() / length,
                        facts.slenderness(),
                        "12 %")));
    }

    private static void excursion(Device device, Band band, DeviceFacts facts, Set<Caveat> caveats) {
        double radius = device.hair().profile().smallestRadius();
        double low = 0.3
                * 2.0
                * FastMath.PI
                * band.from()
                * FastMath.max(radius, facts.layer().largest());
        double high = 0.3
                * 2.0
                * FastMath.PI
                * band.to()
                * FastMath.max(radius, facts.layer().least());
        caveats.add(new Caveat(
                Subject.FLOW,
                Weight.NOTE,
                say(
                        "Small excursions: the force law is linear while the fluid moves less than 0.3 of radius or layer,"
                                + " that is below about %.2g m/s at %.4g Hz and %.2g m/s at %.4g Hz, without a mean stream.",
                        low, band.from(), high, band.to())));
    }

    private static void density(Device device, Set<Caveat> caveats) {
        double hair = device.hair().density();
        double contrast = (hair - device.around().density()) / hair;
        if (device.cover().closed() && FastMath.abs(contrast) < NEARLY_EQUAL_DENSITY) {
            caveats.add(new Caveat(
                    Subject.MOTION,
                    Weight.WEAK,
                    say(
                            "Hair (%.5g kg/m3) and fill (%.5g kg/m3) are nearly of one density: of the hair's inertial torque %.2g %%"
                                    + " is left, and it changes with temperature.",
                            hair, device.around().density(), 100.0 * contrast)));
        }
    }

    private static void suspension(Device device, DeviceFacts facts, Set<Caveat> caveats) {
        if (device.suspension().isEmpty()) {
            return;
        }
        if (facts.medium().isEmpty()) {
            caveats.add(new Caveat(
                    Subject.RESONANCE,
                    Weight.OUT_OF_RANGE,
                    say(
                            "The upright hair falls over: its weight takes %.4g N.m/rad of the suspension's %.4g N.m/rad.",
                            -facts.gravityStiffness(), device.suspension().get().stiffness())));
        }
        if (facts.staticTilt() != 0.0) {
            caveats.add(new Caveat(
                    Subject.MOTION,
                    Weight.NOTE,
                    say(
                            "Horizontal: gravity tilts the hair by %.4g mrad, as a steady 9.80665 m/s2 would.",
                            1e3 * facts.staticTilt())));
        }
    }

    private static void film(Device device, Band band, DeviceFacts facts, Set<Caveat> caveats) {
        double highest = FastMath.max(
                band.to(), facts.medium().map(DeviceFacts.Swing::resonance).orElse(0.0));
        device.suspension()
                .flatMap(Suspension::film)
                .ifPresent(film -> caveats.addAll(film.caveats(device.around(), 2.0 * FastMath.PI * highest)));
    }

    private static void bending(Device device, DeviceFacts facts, Set<Caveat> caveats) {
        if (facts.bendingFrequency().isEmpty()) {
            if (device.suspension().isPresent()) {
                caveats.add(new Caveat(
                        Subject.HAIR,
                        Weight.NOTE,
                        "The hair counts as rigid: without hair.youngs-modulus its bending is not checked."));
            }
            return;
        }
        double bending = facts.bendingFrequency().getAsDouble();
        facts.medium().ifPresent(swing -> {
            if (bending < STIFF * swing.resonance()) {
                caveats.add(new Caveat(
                        Subject.MOTION,
                        Weight.WEAK,
                        say(
                                "The hair bends: its first bending frequency in the medium, %.4g Hz, is below ten times the resonance"
                                        + " (%.4g Hz); it does not turn as a rigid body.",
                                bending, swing.resonance())));
            }
        });
        device.suspension().map(Suspension::stiffness).ifPresent(stiffness -> {
            double hair = facts.bendingStiffness().orElseThrow();
            if (hair < STIFF * stiffness) {
                caveats.add(new Caveat(
                        Subject.MOTION,
                        Weight.WEAK,
                        say(
                                "The hair is soft: its EI/L of %.3g N.m/rad is below ten times the suspension's %.3g N.m/rad.",
                                hair, stiffness)));
            }
        });
    }
}
