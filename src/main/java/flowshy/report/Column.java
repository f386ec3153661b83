package flowshy.report;

import java.util.function.Function;

/**
 * One column of a table: its name for programs, its words for people, and where the number comes from.
 *
 * @param <T> what a row is made of
 * @param name ends in its unit, e.g. {@code frequency_hz}
 * @param label first line of the printed head
 * @param unit second line of the printed head, empty for pure numbers
 * @param digits significant digits printed
 * @param cell takes the number from a row
 */
public record Column<T>(String name, String label, String unit, int digits, Function<T, Cell> cell) {}
