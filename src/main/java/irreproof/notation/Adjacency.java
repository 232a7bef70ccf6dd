package irreproof.notation;

import irreproof.notation.parser.StatementParser;
import java.util.BitSet;

/** What can stand beside what: decides where a soft break ends a statement and what a dot means. */
final class Adjacency {
    private static final BitSet MARKS = types(
            StatementParser.SUBSCRIPT,
            StatementParser.PRIMES,
            StatementParser.STARS,
            StatementParser.EXPONENT,
            StatementParser.SUPERSCRIPT);
    private static final BitSet GROUP_OPENERS = types(StatementParser.GROUP_OPEN, StatementParser.BAR_OPEN);
    private static final BitSet OPENERS = types(
            StatementParser.ROUND_OPEN,
            StatementParser.SQUARE_OPEN,
            StatementParser.CURLY_OPEN,
            StatementParser.GROUP_OPEN,
            StatementParser.BAR_OPEN);
    private static final BitSet BRACKET_CLOSERS =
            types(StatementParser.ROUND_CLOSE, StatementParser.SQUARE_CLOSE, StatementParser.CURLY_CLOSE);
    private static final BitSet OPERANDS = types(
            StatementParser.NUMBER,
            StatementParser.FRACTION,
            StatementParser.DIAGRAM,
            StatementParser.DOTS,
            StatementParser.WORDS,
            StatementParser.UNREADABLE);
    private static final BitSet JOINTS = types(
            StatementParser.OPLUS,
            StatementParser.PLUS,
            StatementParser.MINUS,
            StatementParser.PLUS_MINUS,
            StatementParser.OTIMES,
            StatementParser.TIMES,
            StatementParser.CDOT,
            StatementParser.SLASH,
            StatementParser.RELATION);

    private Adjacency() {}

    private static BitSet types(int... types) {
        BitSet set = new BitSet();
        for (int type : types) {
            set.set(type);
        }
        return set;
    }

    private static boolean isIn(BitSet types, Lexeme lexeme) {
        return lexeme.getType() >= 0 && types.get(lexeme.getType());
    }

    static boolean endsOperand(Lexeme lexeme) {
        return isIn(OPERANDS, lexeme)
                || closesBracket(lexeme)
                || lexeme.is(StatementParser.GROUP_CLOSE)
                || isMark(lexeme);
    }

    static boolean beginsOperand(Lexeme lexeme) {
        return isIn(OPERANDS, lexeme) || opens(lexeme) || lexeme.is(StatementParser.PREFIX);
    }

    static boolean isMark(Lexeme lexeme) {
        return isIn(MARKS, lexeme);
    }

    static boolean opens(Lexeme lexeme) {
        return isIn(OPENERS, lexeme);
    }

    static boolean opensGroup(Lexeme lexeme) {
        return isIn(GROUP_OPENERS, lexeme);
    }

    /** A printing bracket that closes. */
    static boolean closesBracket(Lexeme lexeme) {
        return isIn(BRACKET_CLOSERS, lexeme);
    }

    /** A sign between two operands or two sides. */
    static boolean joins(Lexeme lexeme) {
        return isIn(JOINTS, lexeme);
    }
}
