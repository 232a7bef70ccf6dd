package irreproof.check;

/** What sort of assertion a statement makes. */
public enum StatementKind {
    PRODUCT,
    BRANCHING,
    POWER,
    DIMENSION,
    INVARIANT,
    CONTAINMENT,
    OTHER;

    /** As printed in every report. */
    public String word() {
        return name().toLowerCase(java.util.Locale.ROOT);
    }
}
