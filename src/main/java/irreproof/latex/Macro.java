package irreproof.latex;

import irreproof.text.Span;
import java.util.List;

/**
 * What a user's command stands for.
 *
 * @param prefix tokens that must follow the command before its first argument ({@code (} in {@code \def\x(#1){..}})
 * @param body the replacement, with {@link TokenKind#PARAMETER} tokens; spans in it mean nothing
 * @param expandable false for {@code \let} of a command no one has defined: the body is that command's one token, which
 *     keeps the meaning it had at that time
 */
public record Macro(List<Token> prefix, List<Parameter> parameters, List<Token> body, boolean expandable) {
    private static final Span NOWHERE = new Span(0, 0);

    public Macro {
        prefix = List.copyOf(prefix);
        parameters = List.copyOf(parameters);
        body = body.stream().map(token -> token.at(NOWHERE)).toList();
    }

    static Macro of(List<Parameter> parameters, List<Token> body) {
        return new Macro(List.of(), parameters, body, true);
    }

    static Macro alias(Token token) {
        return new Macro(List.of(), List.of(), List.of(token), false);
    }
}
