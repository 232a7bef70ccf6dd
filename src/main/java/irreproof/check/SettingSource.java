package irreproof.check;

/** Where the group of a statement was found. */
public enum SettingSource {
    DIRECTIVE,
    STATEMENT,
    PROSE,
    HEADING,
    PROJECT,
    INFERRED,
    NONE;

    /** As printed in every report. */
    public String word() {
        return name().toLowerCase(java.util.Locale.ROOT);
    }
}
