package flowshy.stream.record;

import flowshy.stream.record.Declaration.Role;
import java.util.ArrayList;
import java.util.Arrays;
import java.util.List;
import java.util.Optional;

/**
 * Two columns of numbers out of a text: the axis (frequency or time, may be missing) and the values, as written.
 *
 * <p>Cells are parted by tabs, semicolons, commas or blanks, whichever the first line of numbers has, in this order. Empty lines and
 * lines that begin with {@code #} are passed over.
 */
final class RecordRows {
    /** More faults than this help nobody. */
    private static final int MOST_PROBLEMS = 20;

    private final String file;
    private final Declaration declaration;
    private final List<RecordProblem> problems = new ArrayList<>();
    private double[] axis = new double[1024];
    private double[] values = new double[1024];
    private int[] lines = new int[1024];
    private int[] axisColumns = new int[1024];
    private int[] valueColumns = new int[1024];
    private int size;
    private char separator;

    RecordRows(String file, String text, Declaration declaration) {
        this.file = file;
        this.declaration = declaration;
        int number = 0;
        for (String line : (Iterable<String>) text.lines()::iterator) {
            number++;
            if (number == 1 && line.startsWith("\uFEFF")) {
                line = line.substring(1); // byte order mark
            }
            if (number > declaration.skip() && !line.isBlank() && !line.startsWith("#")) {
                take(number, line);
                if (problems.size() >= MOST_PROBLEMS) {
                    break;
                }
            }
        }
        if (problems.isEmpty() && size == 0) {
            problem(
                    number == 0 ? 1 : number,
                    1,
                    "no line of numbers",
                    declaration.skip() + " lines skipped, then numbers");
        }
        judge();
    }

    int size() {
        return size;
    }

    /** Axis of a row, in SI. */
    double axis(int row) {
        return axis[row];
    }

    /** Value of a row, as written. */
    double value(int row) {
        return values[row];
    }

    /** Notes a fault at the axis of a row. */
    void axisProblem(int row, String found, String accepted) {
        problem(lines[row], axisColumns[row], found, accepted);
    }

    /** Notes a fault at the value of a row. */
    void valueProblem(int row, String found, String accepted) {
        problem(lines[row], valueColumns[row], found, accepted);
    }

    /** @throws RecordException if a fault was noted */
    void judge() {
        if (!problems.isEmpty()) {
            throw new RecordException(problems);
        }
    }

    private void problem(int line, int column, String found, String accepted) {
        if (problems.size() < MOST_PROBLEMS) {
            problems.add(new RecordProblem(file, line, column, found, accepted));
        }
    }

    private void take(int number, String line) {
        if (separator == 0) {
            separator = separatorOf(line);
        }
        List<int[]> cells = cells(line);
        List<Role> roles = declaration.roles();
        if (cells.size() != roles.size()) {
            problem(
                    number,
                    1,
                    cells.size() + " cells parted by " + name(separator),
                    roles.size() + " as declared ("
                            + String.join(", ", roles.stream().map(Role::name).toList())
                            + "); '-' passes a column over");
            return;
        }
        grow();
        axis[size] = Double.NaN;
        boolean sound = true;
        for (int i = 0; i < roles.size(); i++) {
            Role role = roles.get(i);
            if (role.kind() == Role.Kind.PASSED_OVER) {
                continue;
            }
            int start = cells.get(i)[0];
            String cell = line.substring(start, cells.get(i)[1]);
            int column = line.codePointCount(0, start) + 1;
            Optional<Double> parsed = number(cell);
            if (parsed.isEmpty()) {
                problem(
                        number,
                        column,
                        "'" + shown(cell) + "' in column " + role.name(),
                        "a number such as 0.25 or 2.5e-1" + hint(cell));
                sound = false;
            } else if (role.kind() == Role.Kind.VALUE) {
                values[size] = parsed.get();
                valueColumns[size] = column;
            } else {
                axis[size] = parsed.get() * role.factor();
                axisColumns[size] = column;
            }
        }
        lines[size] = number;
        size += sound ? 1 : 0;
    }

    private void grow() {
        if (size == values.length) {
            axis = Arrays.copyOf(axis, 2 * size);
            values = Arrays.copyOf(values, 2 * size);
            lines = Arrays.copyOf(lines, 2 * size);
            axisColumns = Arrays.copyOf(axisColumns, 2 * size);
            valueColumns = Arrays.copyOf(valueColumns, 2 * size);
        }
    }

    private static char separatorOf(String line) {
        for (char c : new char[] {'\t', ';', ','}) {
            if (line.strip().indexOf(c) >= 0) {
                return c;
            }
        }
        return ' ';
    }

    private static String name(char separator) {
        return switch (separator) {
            case '\t' -> "tabs";
            case ';' -> "semicolons";
            case ',' -> "commas";
            default -> "blanks";
        };
    }

    /** Start and end of each cell, blanks around it left out. */
    private List<int[]> cells(String line) {
        List<int[]> cells = new ArrayList<>();
        int at = 0;
        int end = line.length();
        if (separator == ' ') {
            while (at < end) {
                while (at < end && Character.isWhitespace(line.charAt(at))) {
                    at++;
                }
                int start = at;
                while (at < end && !Character.isWhitespace(line.charAt(at))) {
                    at++;
                }
                if (at > start) {
                    cells.add(new int[] {start, at});
                }
            }
            return cells;
        }
        while (true) {
            int stop = line.indexOf(separator, at);
            int low = at;
            int high = stop < 0 ? end : stop;
            while (low < high && Character.isWhitespace(line.charAt(low))) {
                low++;
            }
            while (high > low && Character.isWhitespace(line.charAt(high - 1))) {
                high--;
            }
            cells.add(new int[] {low, high});
            if (stop < 0) {
                return cells;
            }
            at = stop + 1;
        }
    }

    /** Only plain decimal numbers: parseDouble alone would take NaN, Infinity, 1d and 0x1p3. */
    private static Optional<Double> number(String cell) {
        if (cell.isEmpty() || !cell.chars().allMatch(c -> "0123456789+-.eE".indexOf(c) >= 0)) {
            return Optional.empty();
        }
        try {
            double value = Double.parseDouble(cell);
            return Double.isFinite(value) ? Optional.of(value) : Optional.empty();
        } catch (NumberFormatException e) {
            return Optional.empty();
        }
    }

    private static String hint(String cell) {
        return cell.matches("[-+]?\\d*,\\d+([eE][-+]?\\d+)?") ? ", with a point, not a comma" : "";
    }

    private static String shown(String cell) {
        String plain = cell.replaceAll("\\p{Cntrl}", "?");
        return plain.length() > 40 ? plain.substring(0, 40) + "…" : plain;
    }
}
