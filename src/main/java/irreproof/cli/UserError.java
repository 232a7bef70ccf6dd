package irreproof.cli;

/** Something the user asked for that cannot be done; the message says what and why, in one line of plain words. */
final class UserError extends Exception {
    private static final long serialVersionUID = 1;

    UserError(String message) {
        super(message);
    }
}
