package flowshy.verdict.compare;

/** No value of a number makes two devices equal; the message says what was met instead. */
final class NoSolutionException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    NoSolutionException(String why) {
        super(why);
    }
}
