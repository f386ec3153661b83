package flowshy.cli;

/** Something on the command line, or a file it names, that the user can mend. */
final class UserException extends RuntimeException {
    private static final long serialVersionUID = 1L;

    /**
     * A message for the user.
     *
     * @param message what was found, what is accepted
     */
    UserException(String message) {
        super(message);
    }
}
