package irreproof.check.judge;

/** Thrown where a statement cannot be judged; the message is the reason the user reads. */
public final class Undecidable extends RuntimeException {
    private final boolean otherGroup;

    private Undecidable(String reason, boolean otherGroup) {
        super(reason, null, false, false);
        this.otherGroup = otherGroup;
    }

    public Undecidable(String reason) {
        this(reason, false);
    }

    /** The names have forms that the group's irreps never have: the statement is about another group. */
    static Undecidable otherGroup(String reason) {
        return new Undecidable(reason, true);
    }

    /** See {@link #otherGroup(String)}. */
    boolean isOtherGroup() {
        return otherGroup;
    }
}
