package flowshy.study.text;

/**
 * Where something stood: a place in a file, or a word of the command line.
 *
 * @param origin name of the file, or the option with its key, e.g. {@code --set hair.diameter}
 * @param line counted from 1; 0 where the origin has no lines
 * @param column counted from 1 in characters (code points); 0 where the origin has no lines
 */
public record Position(String origin, int line, int column) implements Comparable<Position> {
    /**
     * A place without lines, such as an option of the command line.
     *
     * @param label what to print for it
     * @return the position
     */
    public static Position label(String label) {
        return new Position(label, 0, 0);
    }

    @Override
    public int compareTo(Position other) {
        int byLine = Integer.compare(line, other.line);
        return byLine != 0 ? byLine : Integer.compare(column, other.column);
    }

    @Override
    public String toString() {
        return line == 0 ? origin : origin + ":" + line + ":" + column;
    }
}
