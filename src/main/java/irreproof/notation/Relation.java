package irreproof.notation;

import irreproof.text.Span;

/** What joins two sides of a statement. */
public record Relation(Kind kind, boolean negated, Span span) {
    /** The meanings a relation sign can have. */
    public enum Kind {
        /** {@code =}, {@code \cong}, {@code \simeq}, {@code \equiv}. */
        EQUAL,
        /** What need not be an equation: {@code \sim}, a sign of equality marked "sym", {@code \to}, {@code \rightarrow}, {@code \longrightarrow}, {@code \mapsto}, {@code \xrightarrow}. */
        ARROW,
        /** Nothing is written: the two sides stand in cells of one row of a table. */
        CELL,
        /** The left side contains the right: {@code \ni}, {@code \supset}, {@code \supseteq}. */
        CONTAINS,
        /** The right side contains the left: {@code \in}, {@code \subset}, {@code \subseteq}. */
        CONTAINED
    }
}
