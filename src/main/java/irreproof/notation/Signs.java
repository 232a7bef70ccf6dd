package irreproof.notation;

import irreproof.latex.TokenKind;
import irreproof.notation.parser.StatementParser;
import java.util.List;

/** Reads relation signs: arrows that carry text, negated signs, signs with a remark over them. */
final class Signs {
    private final TokenTape tape;
    private final List<Lexeme> lexemes;

    Signs(TokenTape tape, List<Lexeme> lexemes) {
        this.tape = tape;
        this.lexemes = lexemes;
    }

    int relation(Relation.Kind kind, boolean negated, int from, int next) {
        lexemes.add(new Lexeme(StatementParser.RELATION, new Lexeme.Sign(kind, negated), tape.span(from, next)));
        return next;
    }

    int longArrow(int i, int to) {
        TokenTape.Argument remark = tape.argument(tape.skipOptional(i + 1, to), to);
        return relation(Relation.Kind.ARROW, false, i, remark == null ? i + 1 : remark.next());
    }

    int negation(int i, int to) {
        int next = tape.skipSpaces(i + 1, to);
        while (tape.isKind(next, to, TokenKind.CONTROL_SYMBOL)
                && tape.at(next).text().equals("!")) {
            next = tape.skipSpaces(next + 1, to);
        }
        if (next < to) {
            if (tape.at(next).kind() == TokenKind.CONTROL_WORD
                    && Commands.of(tape.at(next).text()) instanceof Commands.Related related) {
                return relation(related.kind(), !related.negated(), i, next + 1);
            }
            if (tape.isCharacter(next, to, '=')) {
                return relation(Relation.Kind.EQUAL, true, i, next + 1);
            }
        }
        return unreadable(i, i + 1);
    }

    /** What the remarks are stacked on; null if it is missing. */
    TokenTape.Argument base(int i, int to, int remarks) {
        TokenTape.Argument argument = tape.argument(i + 1, to);
        for (int left = remarks; left > 0 && argument != null; left--) {
            argument = tape.argument(argument.next(), to);
        }
        return argument;
    }

    /** True if one remark, which says to which part of a square a name belongs, is set over or under a styled name. */
    boolean isRemarkOnName(int i, int to, TokenTape.Argument base) {
        TokenTape.Argument remark = base == null ? null : tape.argument(i + 1, to);
        if (remark == null || remark.next() >= base.from() + 1 || base.from() >= base.to()) {
            return false;
        }
        boolean styled = tape.at(base.from()).kind() == TokenKind.CONTROL_WORD
                && (Commands.of(tape.at(base.from()).text()) instanceof Commands.Faced
                        || Commands.of(tape.at(base.from()).text()) instanceof Commands.Bar);
        return styled && Scripts.saysPart(tape, remark);
    }

    /** A relation with remarks stacked on it; one with a question mark asserts nothing and ends the statement. */
    int stacked(int i, int to, int remarks, TokenTape.Argument base) {
        if (base == null) {
            return unreadable(i, i + 1);
        }
        Lexeme.Sign sign = sign(base);
        if (sign == null) {
            return unreadable(i, base.next());
        }
        Relation.Kind kind = sign.kind();
        TokenTape.Argument remark = tape.argument(i + 1, to);
        for (int left = remarks; left > 0 && remark != null; left--) {
            if (tape.text(remark.from(), remark.to()).contains("?")) {
                lexemes.add(Lexeme.bare(StatementParser.BREAK, tape.span(i, base.next())));
                return base.next();
            }
            boolean part = tape.text(remark.from(), remark.to()).contains("sym");
            kind = part && kind == Relation.Kind.EQUAL ? Relation.Kind.ARROW : kind;
            remark = tape.argument(remark.next(), to);
        }
        return relation(kind, sign.negated(), i, base.next());
    }

    private Lexeme.Sign sign(TokenTape.Argument base) {
        int only = tape.skipSpaces(base.from(), base.to());
        if (only >= base.to() || tape.skipSpaces(only + 1, base.to()) < base.to()) {
            return null;
        }
        if (tape.at(only).kind() == TokenKind.CONTROL_WORD) {
            return Commands.of(tape.at(only).text()) instanceof Commands.Related related
                    ? new Lexeme.Sign(related.kind(), related.negated())
                    : null;
        }
        String text = tape.at(only).text();
        Relation.Kind kind = text.length() == 1 ? Characters.relation(text.charAt(0)) : null;
        return kind == null ? null : new Lexeme.Sign(kind, false);
    }

    private int unreadable(int from, int next) {
        lexemes.add(Lexeme.bare(StatementParser.UNREADABLE, tape.span(from, next)));
        return next;
    }
}
