package irreproof.cli;

/** How the process ends. */
final class ExitCode {
    /** Done, and nothing at severity error. */
    static final int CLEAN = 0;

    /** Done, with at least one error in the manuscript. */
    static final int FOUND_ERRORS = 1;

    /** Not done: wrong usage, something unreadable, or a fault of the program. */
    static final int FAILED = 2;

    private ExitCode() {}
}
