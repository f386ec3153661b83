package flowshy.report;

import flowshy.math.Figures;
import flowshy.stream.surroundings.NamedSurrounding;
import java.util.ArrayList;
import java.util.List;

/** The named surroundings that a study may start from, as text, JSON and CSV. */
public final class SurroundingsReport {
    private SurroundingsReport() {}

    /**
     * For a terminal.
     *
     * @param all in the order printed
     * @return text
     */
    public static String text(List<NamedSurrounding> all) {
        TextPage page = new TextPage();
        page.line("Surroundings to start from, in a study:");
        page.line("  surroundings: {any name: {like: still room}}");
        page.line("Any key overrides; what is taken is listed in the answer, with half and twice");
        page.line("of it.");
        for (NamedSurrounding named : all) {
            page.line("");
            page.line("  " + named.name() + "   (" + named.kind().word() + ")");
            page.row("", named.about());
            for (NamedSurrounding.StartingValue number : named.numbers()) {
                page.row(
                        number.stated().key(),
                        Figures.of(number.stated().value(), 3) + (number.unit().equals("1") ? "" : " " + number.unit())
                                + " (" + number.stated().source() + ")");
            }
        }
        return page.toString();
    }

    /**
     * As JSON.
     *
     * @param all in order
     * @return text
     */
    public static String json(List<NamedSurrounding> all) {
        JsonPage json = new JsonPage();
        json.object(() -> json.array("surroundings", all, named -> {
            json.text("name", named.name());
            json.text("kind", named.kind().word());
            json.text("about", named.about());
            json.array("numbers", named.numbers(), number -> {
                json.text("key", number.stated().key());
                json.number("value", number.stated().value());
                json.text("unit", number.unit());
                json.text("source", number.stated().source());
            });
        }));
        return json.finish();
    }

    /**
     * As CSV.
     *
     * @param all in order
     * @return text
     */
    public static String csv(List<NamedSurrounding> all) {
        List<List<String>> rows = new ArrayList<>();
        for (NamedSurrounding named : all) {
            for (NamedSurrounding.StartingValue number : named.numbers()) {
                rows.add(List.of(
                        named.name(),
                        named.kind().word(),
                        number.stated().key(),
                        Figures.full(number.stated().value()),
                        number.unit(),
                        number.stated().source()));
            }
        }
        return TableCsv.ofTexts(List.of("name", "kind", "key", "value", "unit", "source"), rows);
    }
}
