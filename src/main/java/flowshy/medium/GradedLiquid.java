package flowshy.medium;

import java.util.List;
import java.util.NavigableMap;
import java.util.OptionalDouble;
import java.util.TreeMap;
import org.hipparchus.util.FastMath;

/**
 * A family of oils named by their nominal kinematic viscosity. Between two grades of the table the logarithm of each property runs
 * straight over the logarithm of the grade, which keeps the viscosity at the temperature of the name equal to the grade. A
 * grade boils where its lighter neighbour does.
 */
final class GradedLiquid implements MediumLaw {
    private static final double ROUNDING = 1e-12;

    private final TableHeader header;
    private final NavigableMap<Double, TableCurves> grades = new TreeMap<>();

    GradedLiquid(MediumTable table) {
        this.header = table.header();
        List<Double> names = table.rows().stream()
                .map(row -> row.grade().orElseThrow())
                .distinct()
                .toList();
        for (double name : names) {
            grades.put(
                    name,
                    new TableCurves(table.rows().stream()
                            .filter(row -> row.grade().getAsDouble() == name)
                            .toList()));
        }
    }

    @Override
    public TableHeader header() {
        return header;
    }

    @Override
    public Medium at(MediumQuery query) {
        double asked = query.value(MediumParameter.GRADE).orElseThrow();
        double grade = FastMath.max(grades.firstKey(), FastMath.min(grades.lastKey(), asked));
        var lower = grades.floorEntry(grade * (1.0 + ROUNDING));
        var upper = grades.ceilingEntry(grade * (1.0 - ROUNDING));
        String name = header.medium() + ", grade " + Phrases.number(1e6 * asked, 3) + " mm2/s";
        Boiling.refuse(name, query, lower.getValue());
        Admission.state(header, query);
        double share = lower.getKey().equals(upper.getKey())
                ? 0.0
                : FastMath.log(grade / lower.getKey()) / FastMath.log(upper.getKey() / lower.getKey());
        double temperature = query.temperature();
        TableCurves a = lower.getValue();
        TableCurves b = upper.getValue();
        OptionalDouble sound = a.soundSpeed(temperature);
        OptionalDouble otherSound = b.soundSpeed(temperature);
        return LiquidState.of(
                header,
                name,
                query,
                between(a.density(temperature), b.density(temperature), share),
                between(a.viscosity(temperature), b.viscosity(temperature), share),
                sound.isPresent() && otherSound.isPresent()
                        ? OptionalDouble.of(between(sound.getAsDouble(), otherSound.getAsDouble(), share))
                        : OptionalDouble.empty(),
                List.of());
    }

    private static double between(double low, double high, double share) {
        return low * FastMath.pow(high / low, share);
    }
}
