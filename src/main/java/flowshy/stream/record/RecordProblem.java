package flowshy.stream.record;

/**
 * One fault of a measured file, with its place.
 *
 * @param file name as the user knows it
 * @param line counted from 1
 * @param column counted from 1, in characters
 * @param found what stands there
 * @param accepted what may stand there
 */
public record RecordProblem(String file, int line, int column, String found, String accepted) {
    @Override
    public String toString() {
        return file + ":" + line + ":" + column + ": found " + found + "; accepted: " + accepted;
    }
}
