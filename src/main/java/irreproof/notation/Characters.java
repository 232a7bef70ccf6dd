package irreproof.notation;

import irreproof.notation.parser.StatementParser;

/** What single characters mean inside a statement; besides LaTeX's own, the mathematical signs of Unicode. */
final class Characters {
    private Characters() {}

    static boolean isPrime(char c) {
        return c == '\'' || c == '’' || c == '′';
    }

    /** A bar that is set over the character before it. */
    static boolean isCombiningBar(char c) {
        return c == '\u0304' || c == '\u0305';
    }

    /** The relation a character stands for, or null. */
    static Relation.Kind relation(char c) {
        return switch (c) {
            case '=', '≅', '≃', '≡' -> Relation.Kind.EQUAL;
            case '→', '⟶', '↦', '∼' -> Relation.Kind.ARROW;
            case '⊃', '⊇', '∋' -> Relation.Kind.CONTAINS;
            case '⊂', '⊆', '∈' -> Relation.Kind.CONTAINED;
            default -> null;
        };
    }

    /** The type of a lexeme without content. */
    static int type(char c) {
        return switch (c) {
            case '(' -> StatementParser.ROUND_OPEN;
            case ')' -> StatementParser.ROUND_CLOSE;
            case '[' -> StatementParser.SQUARE_OPEN;
            case ']' -> StatementParser.SQUARE_CLOSE;
            case ',' -> StatementParser.COMMA;
            case ';' -> StatementParser.SEMICOLON;
            case '+' -> StatementParser.PLUS;
            case '-', '−' -> StatementParser.MINUS;
            case '/' -> StatementParser.SLASH;
            case '⊕' -> StatementParser.OPLUS;
            case '⊗' -> StatementParser.OTIMES;
            case '×' -> StatementParser.TIMES;
            case '·' -> StatementParser.CDOT;
            case '±' -> StatementParser.PLUS_MINUS;
            case '…', '⋯' -> StatementParser.DOTS;
            case ':', '<', '>', '⇒', '⟹', '≠', '↔' -> StatementParser.BREAK;
            default -> StatementParser.UNREADABLE;
        };
    }
}
