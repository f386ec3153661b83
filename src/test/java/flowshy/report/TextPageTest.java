package flowshy.report;

import static org.assertj.core.api.Assertions.assertThat;

import java.util.List;
import org.junit.jupiter.api.Test;

class TextPageTest {
    @Test
    void wrapsUnderTheValue() {
        TextPage page = new TextPage();
        page.row("label", "word ".repeat(30));
        List<String> lines = page.toString().lines().toList();
        assertThat(lines).hasSizeGreaterThan(2);
        assertThat(lines).allSatisfy(line -> assertThat(line.length()).isLessThanOrEqualTo(80));
        assertThat(lines.get(0)).startsWith("  label                   word");
        assertThat(lines.get(1)).startsWith(" ".repeat(26) + "word");
    }

    @Test
    void setsColumnsRightAndMarksRows() {
        TextPage page = new TextPage();
        List<Column<Double>> columns = List.of(
                new Column<>("x_m", "x", "m", 3, value -> Cell.of(value, "not finite")),
                new Column<>("root", "root of x", "", 3, value -> Cell.of(Math.sqrt(value), "not finite")));
        page.table(columns, List.of(4.0, -1.0), value -> value < 0.0);
        assertThat(page.toString().lines())
                .containsExactly("      x root of x", "      m", "   4.00      2.00", "  -1.00         - *");
    }
}
