package flowshy.medium;

import flowshy.math.Caveat;
import flowshy.medium.PropertySource.Reading;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/**
 * Two gases in one volume. Density: the molar volumes of the two at the same state add up (Amagat), so the second virial
 * coefficient of the pair is taken as the mean of the two. Viscosity: Wilke 1950. Sound speed: molar heat capacities of
 * the perfect gases added, acoustic virial coefficients from those of the two. Mean free path: with the mean molar mass. A share of 0 or 1 gives the pure gas.
 */
final class GasMixture {
    /** Wilke's rule against measured mixtures; up to several per cent where a light gas meets a heavy one. */
    private static final double WILKE = 0.03;

    private static final double WILKE_LIGHT_HEAVY = 0.08;
    private static final double FAR_MASSES = 5.0;
    private static final double SOUND = 0.005;
    private static final double PAIR = 0.003;
    private static final double PAIR_PRESSURE = 1e6;

    private final PureGas main;
    private final PureGas second;

    GasMixture(PureGas main, PureGas second) {
        this.main = main;
        this.second = second;
    }

    /**
     * The mixture at a state.
     *
     * @param query state, asked of the main gas
     * @param share mole fraction of the second gas [-]
     */
    Medium at(MediumQuery query, double share) {
        Medium a = main.at(query, (1.0 - share) * query.pressure());
        Medium b = second.at(query, share * query.pressure());
        if (share == 0.0) {
            return a;
        }
        if (share == 1.0) {
            return b;
        }
        double molarMass = (1.0 - share) * main.molarMass() + share * second.molarMass();
        double molarVolume = (1.0 - share) * main.molarMass() / a.density() + share * second.molarMass() / b.density();
        double viscosity = GasState.wilke(share, b.viscosity(), second.molarMass(), a.viscosity(), main.molarMass());
        return new Medium(
                a.name() + " with " + Phrases.percent(share) + " " + b.name(),
                Phase.GAS,
                query.temperature(),
                query.pressure(),
                molarMass / molarVolume,
                viscosity,
                soundSpeed(query, share, molarMass),
                GasState.meanFreePath(viscosity, query.temperature(), query.pressure(), molarMass),
                sources(a, b, query.pressure()),
                caveats(a, b));
    }

    private OptionalDouble soundSpeed(MediumQuery query, double share, double molarMass) {
        double temperature = query.temperature();
        OptionalDouble gamma = main.perfectGamma(temperature);
        OptionalDouble otherGamma = second.perfectGamma(temperature);
        if (gamma.isEmpty() || otherGamma.isEmpty()) {
            return OptionalDouble.empty();
        }
        double heatCapacity = (1.0 - share) * GasState.heatCapacity(gamma.getAsDouble())
                + share * GasState.heatCapacity(otherGamma.getAsDouble());
        return OptionalDouble.of(main.virial(temperature)
                .mixed(second.virial(temperature), share)
                .soundSpeed(GasState.gamma(heatCapacity), temperature, query.pressure(), molarMass));
    }

    private List<PropertySource> sources(Medium a, Medium b, double pressure) {
        double masses = Math.max(main.molarMass(), second.molarMass()) / Math.min(main.molarMass(), second.molarMass());
        List<PropertySource> sources = new ArrayList<>(List.of(
                new PropertySource(
                        "density",
                        "molar volumes of the two gases added (Amagat)",
                        Reading.OWN,
                        OptionalDouble.of(PAIR * pressure / PAIR_PRESSURE)),
                new PropertySource(
                        "viscosity",
                        "Wilke 1950, J. Chem. Phys. 18:517; uncertainty from memory",
                        Reading.SECOND_HAND,
                        OptionalDouble.of(masses > FAR_MASSES ? WILKE_LIGHT_HEAVY : WILKE)),
                new PropertySource(
                        "sound speed",
                        "molar heat capacities and virial coefficients of the two gases added",
                        Reading.OWN,
                        OptionalDouble.of(SOUND))));
        for (Medium part : List.of(a, b)) {
            for (PropertySource source : part.sources()) {
                sources.add(source.of(part.name()));
            }
        }
        return sources;
    }

    private static List<Caveat> caveats(Medium a, Medium b) {
        List<Caveat> caveats = new ArrayList<>(a.caveats());
        caveats.addAll(b.caveats());
        return caveats;
    }
}
