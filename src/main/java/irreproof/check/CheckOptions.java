package irreproof.check;

import irreproof.latex.SourceProvider;

/**
 * What the caller decides about a check.
 *
 * @param defaultGroup a group for statements whose document names none, as typed by the user ({@code SU(5)}); or empty
 * @param stepsPerStatement the budget of each statement
 * @param cards whether the report carries what hover shows
 */
public record CheckOptions(String defaultGroup, SourceProvider sources, long stepsPerStatement, boolean cards) {
    public CheckOptions(String defaultGroup, SourceProvider sources, long stepsPerStatement) {
        this(defaultGroup, sources, stepsPerStatement, true);
    }

    /** Enough for every product that is common in papers; about a second of work. */
    public static final long DEFAULT_STEPS = 10_000_000;

    public static CheckOptions plain() {
        return new CheckOptions("", SourceProvider.none(), DEFAULT_STEPS);
    }
}
