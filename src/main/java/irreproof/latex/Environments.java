package irreproof.latex;

import java.util.ArrayDeque;
import java.util.ArrayList;
import java.util.Deque;
import java.util.List;
import java.util.Set;

/** Expands the environments a document defines, at their begin and their end. */
final class Environments {
    private static final Set<String> ALSO_COMMANDS = Set.of("equation", "eqnarray", "align", "gather", "multline");
    private static final int DEEPEST = 1000;

    /** A user's environment that is open, with the call that opened it. */
    private record Open(String name, Arguments.Call call) {}

    private final Expander expander;
    private final MacroTable macros;
    private final Deque<Open> open = new ArrayDeque<>();

    Environments(Expander expander) {
        this.expander = expander;
        this.macros = expander.macros();
    }

    /** Called behind {@code \begin} or {@code \end}; true if the environment was the user's and is expanded. */
    boolean expand(Token word) {
        Arguments arguments = expander.arguments();
        List<Token> argument = arguments.mandatory();
        if (argument == null) {
            return false;
        }
        List<Token> taken = arguments.lastTaken();
        String name = Arguments.text(argument);
        MacroTable.Environment environment = macros.environment(name);
        boolean begins = word.text().equals("begin");
        if (environment == null) {
            environment = byCommands(name);
        }
        if (environment == null) {
            expander.push(taken);
            return false;
        }
        Token whole = word;
        for (Token token : taken) {
            whole = whole.at(whole.span().cover(token.span()));
        }
        Token place = new Token(TokenKind.CONTROL_WORD, word.text() + "{" + name + "}", whole.span());
        if (begins) {
            return begin(place, name, environment, taken);
        }
        end(place, name, environment);
        return true;
    }

    /** {@code \begin{name}} is {@code \name} and {@code \end{name}} is {@code \endname} where the user defined both. */
    private MacroTable.Environment byCommands(String name) {
        Macro begin = macros.find(name);
        Macro end = begin == null ? null : macros.find("end" + name);
        boolean usable = end != null && begin.expandable() && end.expandable();
        return usable ? new MacroTable.Environment(begin, end) : null;
    }

    private boolean begin(Token place, String name, MacroTable.Environment environment, List<Token> taken) {
        Arguments.Call call = expander.arguments().call(place, environment.begin());
        if (call == null) {
            expander.push(taken);
            return false;
        }
        if (open.size() < DEEPEST) {
            open.push(new Open(name, call));
        }
        expander.instantiate(place, environment.begin(), call);
        return true;
    }

    private void end(Token place, String name, MacroTable.Environment environment) {
        List<List<Token>> arguments = List.of();
        if (!open.isEmpty() && open.peek().name().equals(name)) {
            arguments = open.pop().call().arguments();
        }
        expander.instantiate(place, environment.end(), new Arguments.Call(arguments, place.span()));
    }

    /** {@code \equation} and {@code \endequation}, as a document's own environments use them. */
    boolean named(Token word) {
        boolean ends = word.text().startsWith("end")
                && ALSO_COMMANDS.contains(word.text().substring(3));
        if (!ends && !ALSO_COMMANDS.contains(word.text())) {
            return false;
        }
        String name = ends ? word.text().substring(3) : word.text();
        List<Token> tokens = new ArrayList<>();
        tokens.add(new Token(TokenKind.CONTROL_WORD, ends ? "end" : "begin", word.span()));
        tokens.add(new Token(TokenKind.BEGIN_GROUP, "{", word.span()));
        for (char c : name.toCharArray()) {
            tokens.add(Lexer.character(c, word.span()));
        }
        tokens.add(new Token(TokenKind.END_GROUP, "}", word.span()));
        expander.push(tokens);
        return true;
    }
}
