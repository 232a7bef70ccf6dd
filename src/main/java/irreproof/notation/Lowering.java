package irreproof.notation;

import irreproof.budget.Budget;
import irreproof.latex.Token;
import irreproof.latex.TokenKind;
import irreproof.notation.Expression.Face;
import irreproof.notation.parser.StatementParser;
import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;

/**
 * Turns the tokens of a passage into lexemes of the statement grammar: takes the noise of typesetting out, reads numbers
 * with their face, diagrams and scripts, and marks what cannot be read. One pass, linear; recursion only into groups, to
 * a bounded depth. Every lexeme keeps the author's characters it stands for; the brackets of a styled number
 * ({@code \mathbf{3}}) carry the styling command, so that the whole covers it.
 */
final class Lowering {
    /** Groups nested deeper than this are unreadable; nobody writes them. */
    static final int DEEPEST = 50;

    private static final int LONGEST_NUMBER = 40;
    private final TokenTape tape;
    private final Budget budget;
    private final YoungReader young;
    private final Noise noise;
    private final Signs signs;
    private final InnerEnvironments environments;
    private final List<Lexeme> lexemes = new ArrayList<>();

    private Lowering(TokenTape tape, Budget budget) {
        this.tape = tape;
        this.budget = budget;
        young = new YoungReader(tape);
        noise = new Noise(tape);
        signs = new Signs(tape, lexemes);
        environments = new InnerEnvironments(tape, young, lexemes);
    }

    static List<Lexeme> lower(List<Token> tokens, Budget budget) {
        TokenTape tape = new TokenTape(tokens);
        Lowering lowering = new Lowering(tape, budget);
        lowering.read(0, tape.size(), Face.PLAIN, 0);
        return lowering.lexemes;
    }

    private void read(int from, int to, Face outerFace, int depth) {
        Face face = outerFace;
        int i = from;
        while (i < to) {
            budget.spend(1);
            Token token = tape.at(i);
            if (token.kind() == TokenKind.CONTROL_WORD) {
                Commands.Meaning meaning = Commands.of(token.text());
                if (meaning instanceof Commands.FaceSwitch change) {
                    face = change.face();
                    i++;
                } else {
                    i = command(meaning, i, to, face, depth);
                }
            } else {
                i = other(token, i, to, face, depth);
            }
        }
    }

    private int other(Token token, int i, int to, Face face, int depth) {
        return switch (token.kind()) {
            case BEGIN_GROUP -> group(i, to, face, depth);
            case DIGIT -> number(i, to, face);
            case LETTER -> letters(i, to);
            case OTHER -> character(token, i, to);
            case SUPERSCRIPT, SUBSCRIPT -> Scripts.read(tape, i, to, lexemes);
            case CONTROL_SYMBOL -> symbol(token, i, to);
            case ALIGN -> add(StatementParser.SOFT_BREAK, i, i + 1);
            case PARAGRAPH_BREAK -> add(StatementParser.BREAK, i, i + 1);
            case VERBATIM, PARAMETER -> add(StatementParser.UNREADABLE, i, i + 1);
            case END_GROUP, INLINE_SHIFT, DISPLAY_SHIFT, SPACE, COMMENT -> i + 1;
            case CONTROL_WORD -> throw new IllegalStateException("a control word is read elsewhere");
        };
    }

    private int add(int type, int from, int to) {
        lexemes.add(Lexeme.bare(type, tape.span(from, to)));
        return to;
    }

    private Lexeme last() {
        return lexemes.isEmpty() ? null : lexemes.get(lexemes.size() - 1);
    }

    private int group(int i, int to, Face face, int depth) {
        int close = tape.closer(i);
        if (close < 0 || close >= to) {
            return i + 1;
        }
        enclose(StatementParser.GROUP_OPEN, i, new TokenTape.Argument(i + 1, close, close + 1), face, depth);
        return close + 1;
    }

    /** Reads an argument between an opening lexeme, which stands for the command too, and a closing one. */
    private void enclose(int opener, int command, TokenTape.Argument argument, Face face, int depth) {
        if (depth >= DEEPEST) {
            add(StatementParser.UNREADABLE, command, argument.next());
            return;
        }
        int before = lexemes.size();
        add(opener, command, Math.max(command + 1, argument.from()));
        read(argument.from(), argument.to(), face, depth + 1);
        if (lexemes.size() == before + 1) {
            lexemes.remove(before);
        } else if (lexemes.size() == before + 2 && Adjacency.joins(last())) {
            Span whole = tape.span(command, argument.next());
            Lexeme sign = last();
            lexemes.subList(before, lexemes.size()).clear();
            lexemes.add(new Lexeme(sign.getType(), sign.content(), whole));
        } else {
            add(StatementParser.GROUP_CLOSE, argument.to(), argument.next());
        }
    }

    private int number(int i, int to, Face face) {
        StringBuilder digits = new StringBuilder();
        int next = i;
        int end = i;
        while (next < to && (tape.at(next).kind() == TokenKind.DIGIT || tape.isBlank(next))) {
            if (tape.at(next).kind() == TokenKind.DIGIT) {
                digits.append(tape.at(next).text());
                end = next + 1;
            }
            next++;
        }
        boolean decimal = tape.isCharacter(end, to, '.') && tape.isKind(end + 1, to, TokenKind.DIGIT);
        if (decimal || digits.length() > LONGEST_NUMBER) {
            return add(StatementParser.UNREADABLE, i, end);
        }
        lexemes.add(new Lexeme(StatementParser.NUMBER, new Lexeme.Digits(digits.toString(), face), tape.span(i, end)));
        return end;
    }

    private int letters(int i, int to) {
        int end = i;
        while (tape.isKind(end, to, TokenKind.LETTER)) {
            end++;
        }
        int prefixed = Powers.prefix(tape, i, to, lexemes);
        return prefixed > i ? prefixed : add(StatementParser.UNREADABLE, i, end);
    }

    private int character(Token token, int i, int to) {
        char c = token.text().length() == 1 ? token.text().charAt(0) : 0;
        if (c == '.') {
            return fullStops(i, to);
        }
        if (Characters.isPrime(c)) {
            int end = i;
            while (tape.isCharacter(end, to, c)) {
                end++;
            }
            lexemes.add(new Lexeme(StatementParser.PRIMES, new Lexeme.Count(end - i), tape.span(i, end)));
            return end;
        }
        if (c == ':' && tape.isCharacter(i + 1, to, '=')) {
            return signs.relation(Relation.Kind.EQUAL, false, i, i + 2);
        }
        Relation.Kind relation = Characters.relation(c);
        if (relation != null) {
            return signs.relation(relation, false, i, i + 1);
        }
        if (c == '•') {
            YoungReader.Result singlet = young.read(YoungReader.Form.SINGLET, i, to);
            lexemes.add(singlet.lexeme());
            return singlet.next();
        }
        if (Characters.isCombiningBar(c)) {
            lexemes.add(new Lexeme(StatementParser.STARS, new Lexeme.Count(1), tape.span(i, i + 1)));
            return i + 1;
        }
        return c == '~' ? i + 1 : add(Characters.type(c), i, i + 1);
    }

    private int fullStops(int i, int to) {
        int end = i;
        while (tape.isCharacter(end, to, '.')) {
            end++;
        }
        if (end - i > 1) {
            return add(StatementParser.DOTS, i, end);
        }
        boolean decimal = tape.isKind(end, to, TokenKind.DIGIT);
        return add(decimal ? StatementParser.UNREADABLE : StatementParser.BREAK, i, end);
    }

    private int symbol(Token token, int i, int to) {
        return switch (token.text()) {
            case "\\" -> {
                add(StatementParser.SOFT_BREAK, i, i + 1);
                yield noise.rowSpacing(i + 1, to);
            }
            case "{" -> add(StatementParser.CURLY_OPEN, i, i + 1);
            case "}" -> add(StatementParser.CURLY_CLOSE, i, i + 1);
            case ",", ";", ":", "!", " ", ">", "/", "-", "(", ")", "[", "]", "@" -> i + 1;
            default -> add(StatementParser.UNREADABLE, i, i + 1);
        };
    }

    private int command(Commands.Meaning meaning, int i, int to, Face face, int depth) {
        if (meaning == null) {
            return add(StatementParser.UNREADABLE, i, i + 1);
        }
        if (meaning instanceof Commands.Single single) {
            return single.type() == StatementParser.OTIMES ? otimes(i, to) : add(single.type(), i, i + 1);
        }
        if (meaning instanceof Commands.Related related) {
            return signs.relation(related.kind(), related.negated(), i, i + 1);
        }
        if (meaning instanceof Commands.Dropped dropped) {
            return noise.command(i, to, dropped.arguments());
        }
        if (meaning instanceof Commands.Faced faced) {
            return faced(i, to, faced.face(), depth);
        }
        if (meaning instanceof Commands.Bar) {
            return styled(StatementParser.BAR_OPEN, i, tape.argument(i + 1, to), face, depth);
        }
        if (meaning instanceof Commands.Wrapper wrapper) {
            int start = i + 1;
            for (int before = wrapper.before(); before > 0; before--) {
                TokenTape.Argument skipped = tape.argument(tape.skipOptional(start, to), to);
                start = skipped == null ? start : skipped.next();
            }
            return wrapped(i, tape.argument(tape.skipOptional(start, to), to), to, face, depth);
        }
        if (meaning instanceof Commands.Braced) {
            int next = wrapped(i, tape.argument(i + 1, to), to, face, depth);
            return noise.scripts(next, to);
        }
        if (meaning instanceof Commands.Text) {
            return text(i, to, face, depth);
        }
        if (meaning instanceof Commands.FractionOf) {
            return Scripts.fraction(tape, i, to, face, lexemes);
        }
        if (meaning instanceof Commands.PowerHead) {
            int next = Powers.prefix(tape, i, to, lexemes);
            return next > i ? next : add(StatementParser.UNREADABLE, i, i + 1);
        }
        if (meaning instanceof Commands.Young diagram) {
            YoungReader.Result result = young.read(diagram.form(), i, to);
            lexemes.add(result.lexeme());
            return result.next();
        }
        return structure(meaning, i, to, face, depth);
    }

    private int structure(Commands.Meaning meaning, int i, int to, Face face, int depth) {
        if (meaning instanceof Commands.Space || meaning instanceof Commands.FaceSwitch) {
            return i + 1;
        }
        if (meaning instanceof Commands.DroppedDimension) {
            return noise.dimension(i + 1, to);
        }
        if (meaning instanceof Commands.EquationNumber) {
            return to;
        }
        if (meaning instanceof Commands.Interruption) {
            int next = noise.command(i, to, 1);
            return add(StatementParser.BREAK, i, next);
        }
        if (meaning instanceof Commands.Prime) {
            lexemes.add(new Lexeme(StatementParser.PRIMES, new Lexeme.Count(1), tape.span(i, i + 1)));
            return i + 1;
        }
        if (meaning instanceof Commands.LongArrow) {
            return signs.longArrow(i, to);
        }
        if (meaning instanceof Commands.Stacked stacked) {
            TokenTape.Argument base = signs.base(i, to, stacked.remarks());
            return signs.isRemarkOnName(i, to, base)
                    ? remarked(i, to, base, face, depth)
                    : signs.stacked(i, to, stacked.remarks(), base);
        }
        if (meaning instanceof Commands.Negation) {
            return signs.negation(i, to);
        }
        if (meaning instanceof Commands.Delimiter) {
            return delimiter(i, to);
        }
        if (meaning instanceof Commands.PhysicsBrackets) {
            TokenTape.Argument argument = tape.argument(i + 1, to);
            if (argument == null || depth >= DEEPEST) {
                return add(StatementParser.UNREADABLE, i, i + 1);
            }
            add(StatementParser.ROUND_OPEN, i, Math.max(i + 1, argument.from()));
            read(argument.from(), argument.to(), face, depth + 1);
            return add(StatementParser.ROUND_CLOSE, argument.to(), argument.next());
        }
        if (meaning instanceof Commands.Environment environment) {
            return environments.read(environment.begin(), i, to);
        }
        return add(StatementParser.UNREADABLE, i, i + 1);
    }

    /** {@code \overset{S}{\mathbf{6}}}: the remark says what a subscript would. */
    private int remarked(int i, int to, TokenTape.Argument base, Face face, int depth) {
        enclose(StatementParser.GROUP_OPEN, i, base, face, depth);
        TokenTape.Argument remark = tape.argument(i + 1, to);
        Scripts.addSubscript(tape, remark, tape.span(base.to(), base.next()), lexemes);
        return base.next();
    }

    /** A sized bracket is one with its command; the invisible delimiter is nothing. */
    private int delimiter(int i, int to) {
        int next = noise.delimiter(i, to);
        if (next < 0) {
            return -next;
        }
        return add(noise.delimiterType(next), i, next + 1);
    }

    private int faced(int i, int to, Face face, int depth) {
        int prefixed = Powers.prefix(tape, i, to, lexemes);
        if (prefixed > i) {
            return prefixed;
        }
        int start = tape.isCharacter(i + 1, to, '*') ? i + 2 : i + 1;
        TokenTape.Argument argument = tape.argument(start, to);
        if (argument != null && tape.at(i).isWord("textbf") && hasWord(argument)) {
            return words(i, argument);
        }
        return styled(StatementParser.GROUP_OPEN, i, argument, face, depth);
    }

    private int styled(int opener, int i, TokenTape.Argument argument, Face face, int depth) {
        if (argument == null) {
            return add(StatementParser.UNREADABLE, i, i + 1);
        }
        enclose(opener, i, argument, face, depth);
        return argument.next();
    }

    private int wrapped(int i, TokenTape.Argument argument, int to, Face face, int depth) {
        return argument == null ? Math.min(i + 1, to) : styled(StatementParser.GROUP_OPEN, i, argument, face, depth);
    }

    private int text(int i, int to, Face face, int depth) {
        TokenTape.Argument argument = tape.argument(tape.isCharacter(i + 1, to, '*') ? i + 2 : i + 1, to);
        if (argument == null) {
            return i + 1;
        }
        int prefixed = Powers.prefix(tape, i, to, lexemes);
        if (prefixed > i) {
            return prefixed;
        }
        return hasNumber(argument) && !hasWord(argument)
                ? styled(StatementParser.GROUP_OPEN, i, argument, face, depth)
                : words(i, argument);
    }

    private int words(int i, TokenTape.Argument argument) {
        lexemes.add(new Lexeme(
                StatementParser.WORDS,
                new Lexeme.Words(tape.text(argument.from(), argument.to())),
                tape.span(i, argument.next())));
        return argument.next();
    }

    private boolean hasNumber(TokenTape.Argument argument) {
        for (int i = argument.from(); i < argument.to(); i++) {
            if (tape.at(i).kind() == TokenKind.DIGIT) {
                return true;
            }
        }
        return false;
    }

    private boolean hasWord(TokenTape.Argument argument) {
        for (int i = argument.from(); i + 1 < argument.to(); i++) {
            if (tape.at(i).kind() == TokenKind.LETTER && tape.at(i + 1).kind() == TokenKind.LETTER) {
                return true;
            }
        }
        return false;
    }

    private int otimes(int i, int to) {
        Lexeme before = last();
        if (before == null || !Adjacency.endsOperand(before)) {
            int next = Powers.prefix(tape, i, to, lexemes);
            if (next > i) {
                return next;
            }
        }
        return add(StatementParser.OTIMES, i, i + 1);
    }
}
