package irreproof.check;

/** What is known of a statement. {@link #HOLDS} and {@link #FAILS} are claims; when in doubt it is undecided. */
public enum Verdict {
    HOLDS,
    FAILS,
    UNDECIDED;

    /** As printed in every report. */
    public String word() {
        return name().toLowerCase(java.util.Locale.ROOT);
    }
}
