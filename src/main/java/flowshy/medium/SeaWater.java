package flowshy.medium;

import java.util.List;
import java.util.OptionalDouble;

/** Sea water at a practical salinity. */
final class SeaWater implements MediumLaw {
    private static final double ICE_POINT = 273.15;

    private final TableHeader header;
    private final TableCurves water;

    SeaWater(TableHeader header, MediumTable water) {
        this.header = header;
        this.water = new TableCurves(water.rows());
    }

    @Override
    public TableHeader header() {
        return header;
    }

    @Override
    public Medium at(MediumQuery query) {
        double salinity = query.value(MediumParameter.SALINITY).orElseThrow();
        Admission.state(header, query);
        String name = "sea water, salinity " + Phrases.number(salinity, 2);
        double vapour = SeaWaterLaws.vapourRatio(salinity)
                * water.saturationPressure(query.temperature()).orElseThrow();
        Boiling.refuse(name, query, vapour, OptionalDouble.empty());
        double t = query.temperature() - ICE_POINT;
        return LiquidState.of(
                header,
                name,
                query,
                SeaWaterLaws.density(salinity, t),
                SeaWaterLaws.viscosity(salinity, t),
                OptionalDouble.of(SeaWaterLaws.soundSpeed(salinity, t)),
                List.of());
    }
}
