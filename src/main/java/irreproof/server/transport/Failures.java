package irreproof.server.transport;

/** Puts an unexpected failure into one line that is worth reporting. */
public final class Failures {
    private static final int LONGEST_MESSAGE = 300;

    private Failures() {}

    /** What failed, and the first place in this program that its trace names. */
    public static String describe(Throwable failure) {
        String message =
                String.valueOf(failure.getMessage()).lines().findFirst().orElse("");
        String what = failure.getClass().getSimpleName() + ": "
                + message.substring(0, Math.min(message.length(), LONGEST_MESSAGE));
        for (StackTraceElement frame : failure.getStackTrace()) {
            if (frame.getClassName().startsWith("irreproof.")) {
                return what + " at " + frame;
            }
        }
        return what;
    }
}
