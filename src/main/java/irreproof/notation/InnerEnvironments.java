package irreproof.notation;

import irreproof.notation.parser.StatementParser;
import java.util.List;
import java.util.Set;

/** Reads the environments inside a passage: those that only lay a formula out say nothing, others are unreadable. */
final class InnerEnvironments {
    private static final Set<String> TRANSPARENT_ENVIRONMENTS = Set.of(
            "split",
            "aligned",
            "align",
            "align*",
            "gathered",
            "gather",
            "gather*",
            "multline",
            "multline*",
            "multlined",
            "equation",
            "equation*",
            "eqnarray",
            "eqnarray*",
            "math",
            "displaymath",
            "subequations",
            "center",
            "flalign",
            "flalign*",
            "dmath",
            "dmath*",
            "small",
            "IEEEeqnarray",
            "IEEEeqnarray*");
    private static final Set<String> COLUMN_ENVIRONMENTS =
            Set.of("array", "tabular", "alignedat", "alignat", "alignat*");

    private final TokenTape tape;
    private final YoungReader young;
    private final List<Lexeme> lexemes;

    InnerEnvironments(TokenTape tape, YoungReader young, List<Lexeme> lexemes) {
        this.tape = tape;
        this.young = young;
        this.lexemes = lexemes;
    }

    /** Reads the command that begins or ends an environment, and a tableau to its end. Returns where reading goes on. */
    int read(boolean begin, int i, int to) {
        TokenTape.Argument name = tape.argument(i + 1, to);
        if (name == null) {
            return i + 1;
        }
        String environment = tape.text(name.from(), name.to());
        if (begin && environment.equals("ytableau")) {
            int end = name.next();
            while (end < to && !tape.at(end).isWord("end")) {
                end++;
            }
            TokenTape.Argument closing = end < to ? tape.argument(end + 1, to) : null;
            int next = closing == null ? end : closing.next();
            YoungReader.Result result = young.environment(i, tape.skipOptional(name.next(), end), end, next);
            lexemes.add(result.lexeme());
            return result.next();
        }
        if (COLUMN_ENVIRONMENTS.contains(environment)) {
            TokenTape.Argument columns = begin ? tape.argument(tape.skipOptional(name.next(), to), to) : null;
            return columns == null ? name.next() : columns.next();
        }
        if (TRANSPARENT_ENVIRONMENTS.contains(environment)) {
            return begin ? tape.skipOptional(name.next(), to) : name.next();
        }
        lexemes.add(Lexeme.bare(StatementParser.UNREADABLE, tape.span(i, name.next())));
        return name.next();
    }
}
