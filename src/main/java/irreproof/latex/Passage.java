package irreproof.latex;

import irreproof.text.Span;
import java.util.List;

/**
 * One stretch of mathematics, macros expanded.
 *
 * @param environment the environment's name ({@code align*}), or {@code $}, {@code $$}, {@code \[} or {@code \(}
 * @param span the passage with its delimiters, in the main document
 */
public record Passage(Layout layout, String environment, List<Row> rows, Span span) {
    /** How the passage is set. */
    public enum Layout {
        INLINE,
        DISPLAY,
        /** A {@code tabular}: cells hold only their mathematics. */
        TABLE
    }

    public Passage {
        rows = List.copyOf(rows);
    }
}
