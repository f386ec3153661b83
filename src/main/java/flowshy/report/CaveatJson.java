package flowshy.report;

import flowshy.math.Caveat;
import java.util.List;
import java.util.Locale;

/** Caveats as JSON, the same everywhere. */
final class CaveatJson {
    private CaveatJson() {}

    /**
     * Writes the field {@code caveats}.
     *
     * @param json with an open object
     * @param caveats in order
     */
    static void write(JsonPage json, List<Caveat> caveats) {
        json.array("caveats", caveats, caveat -> {
            json.text("about", caveat.about().name().toLowerCase(Locale.ROOT));
            json.text("weight", caveat.weight().words());
            json.text("text", caveat.text());
        });
    }
}
