package irreproof.notation;

import irreproof.latex.Token;
import irreproof.latex.TokenKind;
import irreproof.notation.parser.StatementParser;
import java.util.regex.Pattern;

/** How far the typesetting reaches that says nothing about representations. Every method returns where reading goes on. */
final class Noise {
    private static final Pattern ROW_SPACING = Pattern.compile("\\s*-?(?:\\d|\\.|\\\\[a-z]+skip|\\\\jot).*[a-z].*");

    private final TokenTape tape;

    Noise(TokenTape tape) {
        this.tape = tape;
    }

    /** A command with so many arguments, and any optional ones. */
    int command(int i, int to, int arguments) {
        int next = i + 1;
        for (int left = arguments; left > 0; left--) {
            TokenTape.Argument argument = tape.argument(tape.skipOptional(next, to), to);
            if (argument == null) {
                return next;
            }
            next = argument.next();
        }
        return next;
    }

    /** A length or a number, in braces or bare ({@code \kern-2pt}). */
    int dimension(int i, int to) {
        int next = tape.skipSpaces(i, to);
        if (tape.isKind(next, to, TokenKind.BEGIN_GROUP) && tape.closer(next) > 0) {
            return tape.closer(next) + 1;
        }
        int start = next;
        while (next < to && isPartOfLength(next)) {
            next++;
        }
        int unit = tape.skipSpaces(next, to);
        boolean length =
                next > start && tape.isKind(unit, to, TokenKind.LETTER) && tape.isKind(unit + 1, to, TokenKind.LETTER);
        return length ? unit + 2 : next;
    }

    private boolean isPartOfLength(int i) {
        return tape.at(i).kind() == TokenKind.DIGIT
                || tape.at(i).isCharacter('.')
                || tape.at(i).isCharacter('-')
                || tape.at(i).isCharacter('=');
    }

    /** The star and the length that may follow the end of a row. */
    int rowSpacing(int i, int to) {
        int start = tape.isCharacter(i, to, '*') ? i + 1 : i;
        if (tape.isCharacter(start, to, '[')) {
            int close = tape.closingBracket(start, to);
            if (close > 0 && ROW_SPACING.matcher(tape.text(start + 1, close)).matches()) {
                return close + 1;
            }
        }
        return start;
    }

    /** Subscripts and superscripts that are remarks. */
    int scripts(int i, int to) {
        int next = tape.skipSpaces(i, to);
        while (tape.isKind(next, to, TokenKind.SUBSCRIPT) || tape.isKind(next, to, TokenKind.SUPERSCRIPT)) {
            TokenTape.Argument remark = tape.argument(next + 1, to);
            if (remark == null) {
                return next + 1;
            }
            next = tape.skipSpaces(remark.next(), to);
        }
        return next;
    }

    /**
     * The place of the bracket behind {@code \left} and its kin, which must be read with it; a negative number, if
     * reading goes on at its opposite because none follows.
     */
    int delimiter(int i, int to) {
        int next = tape.skipSpaces(i + 1, to);
        if (tape.isCharacter(next, to, '.')) {
            return -(next + 1);
        }
        boolean delimiter = next < to
                && (tape.at(next).kind() == TokenKind.OTHER
                        || tape.at(next).kind() == TokenKind.CONTROL_WORD
                        || tape.at(next).kind() == TokenKind.CONTROL_SYMBOL);
        return delimiter ? next : -(i + 1);
    }

    /** The type of the lexeme for a sized delimiter; anything but our brackets is unreadable, as in a ket. */
    int delimiterType(int index) {
        Token token = tape.at(index);
        int type = StatementParser.UNREADABLE;
        if (token.kind() == TokenKind.CONTROL_WORD) {
            type = Commands.of(token.text()) instanceof Commands.Single single ? single.type() : type;
        } else if (token.kind() == TokenKind.CONTROL_SYMBOL) {
            type = token.text().equals("{")
                    ? StatementParser.CURLY_OPEN
                    : token.text().equals("}") ? StatementParser.CURLY_CLOSE : type;
        } else {
            type = Characters.type(token.text().charAt(0));
        }
        Lexeme delimiter = Lexeme.bare(type, token.span());
        return Adjacency.opens(delimiter) || Adjacency.closesBracket(delimiter) ? type : StatementParser.UNREADABLE;
    }
}
