package irreproof.budget;

/** Thrown out of work whose budget is used up; the caller turns it into an {@code undecided} with this reason. */
public final class BudgetExceeded extends RuntimeException {
    /** What ran out. */
    public enum Cause {
        CANCELLED,
        TIME,
        STEPS,
        TOO_LARGE
    }

    private final Cause cause;

    public BudgetExceeded(Cause cause, String message) {
        super(message, null, false, false);
        this.cause = cause;
    }

    public Cause reason() {
        return cause;
    }
}
