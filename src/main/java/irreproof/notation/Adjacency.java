package irreproof.notation;

import irreproof.notation.parser.StatementParser;

/** What can stand beside what: decides where a soft break ends a statement and what a dot means. */
final class Adjacency {
    private Adjacency() {}

    static boolean endsOperand(Lexeme lexeme) {
        return switch (lexeme.getType()) {
            case StatementParser.NUMBER,
                    StatementParser.FRACTION,
                    StatementParser.DIAGRAM,
                    StatementParser.DOTS,
                    StatementParser.ROUND_CLOSE,
                    StatementParser.SQUARE_CLOSE,
                    StatementParser.CURLY_CLOSE,
                    StatementParser.GROUP_CLOSE,
                    StatementParser.WORDS,
                    StatementParser.UNREADABLE -> true;
            default -> isMark(lexeme);
        };
    }

    static boolean beginsOperand(Lexeme lexeme) {
        return switch (lexeme.getType()) {
            case StatementParser.NUMBER,
                    StatementParser.FRACTION,
                    StatementParser.DIAGRAM,
                    StatementParser.DOTS,
                    StatementParser.PREFIX,
                    StatementParser.WORDS,
                    StatementParser.UNREADABLE -> true;
            default -> opens(lexeme);
        };
    }

    static boolean isMark(Lexeme lexeme) {
        return switch (lexeme.getType()) {
            case StatementParser.SUBSCRIPT,
                    StatementParser.PRIMES,
                    StatementParser.STARS,
                    StatementParser.EXPONENT,
                    StatementParser.SUPERSCRIPT -> true;
            default -> false;
        };
    }

    static boolean opens(Lexeme lexeme) {
        return switch (lexeme.getType()) {
            case StatementParser.ROUND_OPEN, StatementParser.SQUARE_OPEN, StatementParser.CURLY_OPEN -> true;
            default -> opensGroup(lexeme);
        };
    }

    static boolean opensGroup(Lexeme lexeme) {
        return lexeme.is(StatementParser.GROUP_OPEN) || lexeme.is(StatementParser.BAR_OPEN);
    }

    /** A printing bracket that closes. */
    static boolean closesBracket(Lexeme lexeme) {
        return lexeme.is(StatementParser.ROUND_CLOSE)
                || lexeme.is(StatementParser.SQUARE_CLOSE)
                || lexeme.is(StatementParser.CURLY_CLOSE);
    }

    /** A sign between two operands or two sides. */
    static boolean joins(Lexeme lexeme) {
        return switch (lexeme.getType()) {
            case StatementParser.OPLUS,
                    StatementParser.PLUS,
                    StatementParser.MINUS,
                    StatementParser.PLUS_MINUS,
                    StatementParser.OTIMES,
                    StatementParser.TIMES,
                    StatementParser.CDOT,
                    StatementParser.SLASH,
                    StatementParser.RELATION -> true;
            default -> false;
        };
    }
}
