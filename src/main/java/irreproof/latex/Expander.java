package irreproof.latex;

import irreproof.text.Span;
import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Set;

/**
 * Delivers the tokens of one source with the user's macros expanded, definitions and inclusions carried out and
 * conditionals resolved, after TeX's own scheme: a stack of token lists over the lexer. Every token carries the place
 * in the source it stands for (see {@link Token#span}).
 *
 * <p>Cost: linear in the tokens produced. What one command of the source may produce is limited, and so is the whole;
 * beyond the limit the command's expansion is given up with a problem, and reading goes on behind it.
 */
final class Expander {
    private static final int EXPANSIONS_PER_CALL = 20_000;
    private static final int TOKENS_PER_CALL = 400_000;

    /** Commands whose redefinition changes how they look, not what they are to us. */
    private static final Set<String> STRUCTURE = Set.of(
            "begin",
            "end",
            "part",
            "chapter",
            "section",
            "subsection",
            "subsubsection",
            "title",
            "caption",
            "footnote");

    /** Tokens waiting to be read before the source goes on. */
    private static final class Waiting {
        private final List<Token> tokens;
        private int position;

        Waiting(List<Token> tokens) {
            this.tokens = tokens;
        }
    }

    private final Lexer lexer;
    private final Reading reading;
    private final String path;
    private final Deque<Waiting> waiting = new ArrayDeque<>();
    private final List<Comment> comments = new ArrayList<>();
    private final Arguments arguments = new Arguments(this);
    private final Definitions definitions;
    private final Conditionals conditionals;
    private final Choices choices;
    private final Environments environments;
    private final Inclusions inclusions;
    private boolean mathMode;
    private boolean failed;
    private int expansions;
    private int produced;

    Expander(String path, String content, Reading reading, Inclusions inclusions) {
        this.path = path;
        this.lexer = new Lexer(content);
        this.reading = reading;
        this.inclusions = inclusions;
        definitions = new Definitions(this);
        conditionals = new Conditionals(this);
        choices = new Choices(this);
        environments = new Environments(this);
    }

    String path() {
        return path;
    }

    Lexer lexer() {
        return lexer;
    }

    Arguments arguments() {
        return arguments;
    }

    MacroTable macros() {
        return reading.macros();
    }

    /** The comments met so far. */
    List<Comment> comments() {
        return comments;
    }

    void mathMode(boolean on) {
        mathMode = on;
    }

    boolean isMathMode() {
        return mathMode;
    }

    /** True once after an expansion had to be given up. */
    boolean takeFailure() {
        boolean was = failed;
        failed = false;
        return was;
    }

    /** Gives up all that waits of a call in this place; reading goes on behind it. */
    void fail(String problem, Span place) {
        failed = true;
        List<Token> behind = new ArrayList<>();
        for (Waiting list : waiting) {
            for (Token token : list.tokens.subList(list.position, list.tokens.size())) {
                if (token.span().start() >= place.end()) {
                    behind.add(token);
                }
            }
        }
        waiting.clear();
        push(behind);
        reading.report(problem);
    }

    void report(String problem) {
        reading.report(problem);
    }

    /** Nothing more is read of this source. */
    void stop() {
        waiting.clear();
        lexer.stop();
    }

    /** The next token that means something to a reader, or null at the end. */
    Token next() {
        while (true) {
            Token token = raw();
            if (token == null || token.kind() != TokenKind.CONTROL_WORD && token.kind() != TokenKind.CONTROL_SYMBOL) {
                return token;
            }
            Macro macro =
                    STRUCTURE.contains(token.text()) ? null : reading.macros().find(token.text());
            if (macro != null && macro.expandable()) {
                if (!expand(token, macro)) {
                    return token;
                }
                continue;
            }
            Token meant = macro == null ? token : macro.body().get(0).at(token.span());
            if (meant.kind() != TokenKind.CONTROL_WORD || !isCarriedOut(meant)) {
                return meant;
            }
        }
    }

    private boolean isCarriedOut(Token word) {
        switch (word.text()) {
            case "begin", "end":
                return environments.expand(word);
            case "relax", "protect", "leavevmode", "expandafter", "noexpand":
                return true;
            case "ensuremath":
                return mathMode;
            case "csname":
                push(arguments.constructed(word));
                return true;
            case "@nameuse":
                String name = arguments.name();
                push(name == null ? null : new Token(TokenKind.CONTROL_WORD, name, word.span()));
                return true;
            case "makeatletter":
                lexer.atIsLetter(true);
                return true;
            case "makeatother":
                lexer.atIsLetter(false);
                return true;
            default:
                return definitions.carryOut(word)
                        || conditionals.carryOut(word)
                        || choices.carryOut(word)
                        || inclusions.carryOut(word, this)
                        || environments.named(word);
        }
    }

    /** Replaces a call by its expansion; false if its arguments are not there. */
    private boolean expand(Token word, Macro macro) {
        Arguments.Call call = arguments.call(word, macro);
        if (call == null) {
            return false;
        }
        instantiate(word, macro, call);
        return true;
    }

    /** Pushes the macro's body with the arguments filled in; its own tokens stand for the whole call. */
    void instantiate(Token word, Macro macro, Arguments.Call call) {
        List<Token> result = new ArrayList<>(macro.body().size());
        List<Token> body = macro.body();
        for (int i = 0; i < body.size(); i++) {
            Token token = body.get(i);
            if (token.kind() != TokenKind.PARAMETER) {
                result.add(token.at(call.span()));
                continue;
            }
            if (token.text().equals("#")) {
                i += unquote(body, i, call.span(), result);
                continue;
            }
            int number = token.text().charAt(0) - '1';
            if (number >= 0 && number < call.arguments().size()) {
                result.addAll(call.arguments().get(number));
            }
            if (result.size() > TOKENS_PER_CALL) {
                break;
            }
        }
        expansions++;
        produced += result.size();
        reading.expanded(result.size());
        if (expansions > EXPANSIONS_PER_CALL || produced > TOKENS_PER_CALL || reading.isExhausted()) {
            fail("\\" + word.text() + " expands without end", call.span());
            return;
        }
        push(result);
    }

    /** One level of doubled parameter signs; returns how many tokens beyond the first it used up. */
    private static int unquote(List<Token> body, int at, Span place, List<Token> result) {
        Token following = at + 1 < body.size() ? body.get(at + 1) : null;
        if (following != null && following.kind() == TokenKind.DIGIT) {
            result.add(new Token(TokenKind.PARAMETER, following.text(), place));
            return 1;
        }
        boolean doubled = following != null
                && following.kind() == TokenKind.PARAMETER
                && following.text().equals("#");
        result.add(new Token(doubled ? TokenKind.PARAMETER : TokenKind.OTHER, "#", place));
        return doubled ? 1 : 0;
    }

    /** True while tokens of an expansion, or tokens put back, stand before the source. */
    boolean isExpanding() {
        return expansions > 0;
    }

    /** The next token as it stands, comments left out, or null at the end. */
    Token raw() {
        reading.budget().spend(1);
        Waiting top = waiting.peek();
        if (top != null) {
            Token token = top.tokens.get(top.position++);
            if (top.position == top.tokens.size()) {
                waiting.pop();
            }
            return token;
        }
        expansions = 0;
        produced = 0;
        while (true) {
            Token token = lexer.next();
            if (token == null || token.kind() != TokenKind.COMMENT) {
                return token;
            }
            int start = token.span().start();
            comments.add(new Comment(
                    token.text(), new Span(start, start + 1 + token.text().length())));
        }
    }

    /** Puts tokens back to be read next. */
    void push(List<Token> tokens) {
        if (!tokens.isEmpty()) {
            waiting.push(new Waiting(tokens));
        }
    }

    void push(Token token) {
        if (token != null) {
            push(List.of(token));
        }
    }
}
