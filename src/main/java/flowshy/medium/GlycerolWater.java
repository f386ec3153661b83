package flowshy.medium;

import flowshy.math.Caveat;
import java.util.ArrayList;
import java.util.List;
import java.util.OptionalDouble;

/** Glycerol with water at any mass fraction. Boils where its water does by Raoult's law. */
final class GlycerolWater implements MediumLaw {
    /** Pure glycerol melts at 18 °C, 90 % at −1.6 °C (handbook, from memory); it stays liquid far below unless seeded. */
    private static final double CRYSTALS_ABOVE = 0.9;

    private static final double MELTING = 291.15;
    private static final double ICE_POINT = 273.15;

    /** The density formula is fitted to 15 to 30 °C (from memory); beyond, it is a guess of the same form. */
    private static final double DENSITY_FROM = 288.15;

    private static final double DENSITY_TO = 303.15;

    private final TableHeader header;
    private final TableCurves water;

    GlycerolWater(TableHeader header, MediumTable water) {
        this.header = header;
        this.water = new TableCurves(water.rows());
    }

    @Override
    public TableHeader header() {
        return header;
    }

    @Override
    public Medium at(MediumQuery query) {
        Admission.state(header, query);
        double w = query.value(MediumParameter.MASS_FRACTION).orElseThrow();
        double t = query.temperature() - ICE_POINT;
        String name = "glycerol-water, " + Phrases.percent(w) + " glycerol";
        double vapour = GlycerolWaterLaws.waterFraction(w)
                * water.saturationPressure(query.temperature()).orElseThrow();
        Boiling.refuse(name, query, vapour, OptionalDouble.empty());
        double waterSound = water.soundSpeed(query.temperature()).orElseThrow();
        return LiquidState.of(
                header,
                name,
                query,
                GlycerolWaterLaws.density(w, t),
                GlycerolWaterLaws.viscosity(w, t),
                OptionalDouble.of(GlycerolWaterLaws.soundSpeed(w, t, waterSound)),
                caveats(w, query.temperature()));
    }

    private static List<Caveat> caveats(double w, double temperature) {
        List<Caveat> caveats = new ArrayList<>();
        if (temperature < DENSITY_FROM || temperature > DENSITY_TO) {
            caveats.add(new Caveat(
                    Caveat.Subject.MEDIUM,
                    Caveat.Weight.WEAK,
                    "Density of glycerol-water: the formula is best from 15 °C to 30 °C; at "
                            + Phrases.celsius(temperature) + " it may be wrong by 1 %."));
        }
        if (w > CRYSTALS_ABOVE && temperature < MELTING) {
            caveats.add(new Caveat(
                    Caveat.Subject.MEDIUM,
                    Caveat.Weight.NOTE,
                    "Glycerol melts at 18 °C; with " + Phrases.percent(w) + " at " + Phrases.celsius(temperature)
                            + " it can crystallise if seeded."));
        }
        return caveats;
    }
}
