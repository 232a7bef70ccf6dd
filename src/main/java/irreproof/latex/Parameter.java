package irreproof.latex;

import java.util.List;

/** One parameter of a macro, by the way its argument is found. */
public sealed interface Parameter {
    /** One token, or a group without its braces. */
    record Plain() implements Parameter {}

    /** Everything up to the delimiter, as after {@code \def\x#1.}; the delimiter is eaten. */
    record Delimited(List<Token> delimiter) implements Parameter {
        public Delimited {
            delimiter = List.copyOf(delimiter);
        }
    }

    /**
     * An argument between two characters, mostly brackets.
     *
     * @param fallback what stands in if there is none; null if the macro can ask whether there was one
     */
    record Bracketed(char open, char close, List<Token> fallback) implements Parameter {
        public Bracketed {
            fallback = fallback == null ? null : List.copyOf(fallback);
        }
    }

    /** A single character that may stand there, mostly a star; the macro can ask whether it did. */
    record Mark(char character) implements Parameter {}
}
