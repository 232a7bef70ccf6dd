package irreproof.notation;

import irreproof.latex.Token;
import irreproof.latex.TokenKind;
import irreproof.notation.Expression.PowerKind;
import irreproof.notation.parser.StatementParser;
import java.util.List;

/**
 * Reads powers written in front: {@code \Lambda^2}, {@code \mathrm{Sym}^2}, {@code \otimes^3}. A letter S counts only
 * with an exponent and a bracket or a styled name behind it.
 */
final class Powers {
    private Powers() {}

    /** Adds the prefix that begins at the index and returns where reading goes on; the index itself if there is none. */
    static int prefix(TokenTape tape, int index, int to, List<Lexeme> lexemes) {
        int next = index + 1;
        PowerKind kind = kind(tape.at(index));
        if (kind == null) {
            String word;
            if (tape.at(index).kind() == TokenKind.LETTER) {
                next = index;
                while (tape.isKind(next, to, TokenKind.LETTER)) {
                    next++;
                }
                word = tape.text(index, next);
            } else {
                TokenTape.Argument argument = tape.argument(tape.isCharacter(next, to, '*') ? next + 1 : next, to);
                if (argument == null) {
                    return index;
                }
                word = Scripts.plain(tape, argument.from(), argument.to());
                next = argument.next();
            }
            kind = kind(word);
        }
        while (next < to && (tape.at(next).isWord("nolimits") || tape.at(next).isWord("limits"))) {
            next++;
        }
        int script = tape.skipSpaces(next, to);
        if (kind == null || !tape.isKind(script, to, TokenKind.SUPERSCRIPT)) {
            return index;
        }
        TokenTape.Argument argument = tape.argument(script + 1, to);
        int exponent = argument == null ? -1 : Scripts.plainExponent(tape, argument);
        if (exponent < 0 || !basesFollow(tape, argument.next(), to)) {
            return index;
        }
        lexemes.add(new Lexeme(
                StatementParser.PREFIX, new Lexeme.Exponent(kind, exponent, true), tape.span(index, argument.next())));
        return argument.next();
    }

    private static PowerKind kind(Token token) {
        if (token.isWord("otimes")) {
            return PowerKind.TENSOR;
        }
        return token.kind() == TokenKind.CONTROL_WORD && Commands.of(token.text()) instanceof Commands.PowerHead head
                ? head.kind()
                : null;
    }

    private static PowerKind kind(String word) {
        return switch (word) {
            case "S", "Sym", "Symm" -> PowerKind.SYMMETRIC;
            case "Alt", "Asym", "Ext", "\\Lambda", "\\wedge", "\\bigwedge" -> PowerKind.EXTERIOR;
            default -> null;
        };
    }

    private static boolean basesFollow(TokenTape tape, int index, int to) {
        int next = tape.skipSpaces(index, to);
        while (next < to
                && (tape.at(next).kind() == TokenKind.CONTROL_SYMBOL
                        || tape.at(next).isWord("left"))) {
            next = tape.skipSpaces(next + 1, to);
        }
        if (next >= to) {
            return false;
        }
        Token token = tape.at(next);
        return token.isCharacter('(')
                || token.isCharacter('[')
                || token.kind() == TokenKind.BEGIN_GROUP
                || token.kind() == TokenKind.DIGIT
                || token.kind() == TokenKind.CONTROL_WORD;
    }
}
