package irreproof.check;

/** How much a finding weighs; only errors make {@code check} exit with 1. */
public enum Severity {
    ERROR,
    WARNING,
    ADVICE;

    /** As printed in every report. */
    public String word() {
        return name().toLowerCase(java.util.Locale.ROOT);
    }
}
