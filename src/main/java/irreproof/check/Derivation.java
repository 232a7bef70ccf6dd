package irreproof.check;

import irreproof.budget.Budget;

/** Completes a bare product or sum: what {@code derive} prints. */
public final class Derivation {
    private Derivation() {}

    /**
     * The outcome of {@link #derive}.
     *
     * @param ok whether the statement could be completed
     * @param text the completed statement as LaTeX, or why there is none, in one line of plain words
     */
    public record Result(boolean ok, String text) {}

    /**
     * @param latex what the user typed, without math shifts ({@code \mathbf{3}\otimes\mathbf{8}})
     * @param group the group to work in, as typed by the user; empty if the LaTeX names it
     */
    public static Result derive(String latex, String group, Budget budget) {
        return new Result(false, "deriving is in the making");
    }
}
