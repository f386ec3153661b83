package flowshy.report;

import flowshy.study.NumberKey;
import java.util.Locale;

/** Keys of a study as names for programs. */
final class KeyNames {
    private KeyNames() {}

    /** The path with its SI unit at the end, e.g. {@code hair_diameter_m}. */
    static String column(NumberKey key) {
        String unit = key.dimension()
                .siUnit()
                .replace("/rad", "_per_rad")
                .replaceAll("[()]", "")
                .replaceAll("[./]", "_")
                .toLowerCase(Locale.ROOT);
        String name = key.path().replaceAll("[^A-Za-z0-9]+", "_").replaceAll("_$", "");
        return unit.equals("1") ? name : name + "_" + unit;
    }
}
