package flowshy.cli;

/** Starts the command line. */
public final class Main {
    private Main() {}

    /**
     * Runs one command and leaves with its exit code.
     *
     * @param args the words of the command line
     */
    public static void main(String[] args) {
        System.exit(0);
    }
}
