package flowshy.medium;

import java.util.List;
import java.util.OptionalDouble;

/** A liquid by its table. Refused where it boils or freezes. */
final class PlainLiquid implements MediumLaw {
    private final TableHeader header;
    private final TableCurves curves;

    PlainLiquid(MediumTable table) {
        this.header = table.header();
        this.curves = new TableCurves(table.rows());
    }

    @Override
    public TableHeader header() {
        return header;
    }

    @Override
    public Medium at(MediumQuery query) {
        Boiling.refuse(header.medium(), query, curves);
        Admission.state(header, query);
        double temperature = query.temperature();
        OptionalDouble soundSpeed = curves.soundSpeed(temperature);
        return LiquidState.of(
                header,
                header.medium(),
                query,
                curves.density(temperature),
                curves.viscosity(temperature),
                soundSpeed,
                List.of());
    }
}
