package flowshy.report;

import flowshy.verdict.Limit;

/** A limit as JSON, the same everywhere. */
final class LimitJson {
    private LimitJson() {}

    /**
     * One limit.
     *
     * @param json with an open object
     * @param limit the limit
     */
    static void write(JsonPage json, Limit limit) {
        String none = limit.reason().isEmpty() ? "it belongs to no single frequency" : limit.reason();
        json.text("limit", limit.name());
        json.text("unit", limit.unit());
        json.text("sense", limit.sense().word());
        json.number("required", limit.required());
        json.cell("found", Cell.of(limit.found(), none));
        json.cell("at_hz", Cell.of(limit.at(), none));
        json.text("decision", limit.decision().word());
        if (!limit.reason().isEmpty()) {
            json.text("reason", limit.reason());
        }
    }
}
