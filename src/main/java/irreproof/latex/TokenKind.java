package irreproof.latex;

/** What a token is to TeX's eyes (category codes as in plain LaTeX). */
public enum TokenKind {
    /** A backslash with letters; {@link Token#text} holds the letters alone. */
    CONTROL_WORD,
    /** A backslash with one other character, such as {@code \,} or {@code \\}; the text holds that character. */
    CONTROL_SYMBOL,
    BEGIN_GROUP,
    END_GROUP,
    /** One dollar sign, or {@code \(} and {@code \)}. */
    INLINE_SHIFT,
    /** Two dollar signs, or {@code \[} and {@code \]}. */
    DISPLAY_SHIFT,
    ALIGN,
    SUPERSCRIPT,
    SUBSCRIPT,
    /** A macro parameter; the text holds its digit. */
    PARAMETER,
    LETTER,
    DIGIT,
    OTHER,
    SPACE,
    PARAGRAPH_BREAK,
    /** A comment with its line end; the text holds what stands behind the percent sign. */
    COMMENT,
    /** The body of a verbatim-like environment or command: opaque. */
    VERBATIM
}
