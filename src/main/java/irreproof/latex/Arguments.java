package irreproof.latex;

import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;

/**
 * Reads the arguments of commands from an expander's unexpanded tokens. An argument that is not there, or does not
 * close, is null, and what was read of it is put back: a missing brace must not swallow a manuscript. In mathematics an
 * argument ends no later than the paragraph.
 */
final class Arguments {
    /** A macro's arguments in order, and the place of the whole call. */
    record Call(List<List<Token>> arguments, Span span) {}

    private final Expander expander;
    private final ArgumentScanner scanner;

    Arguments(Expander expander) {
        this.expander = expander;
        this.scanner = new ArgumentScanner(expander);
    }

    /** The arguments of a call, or null. */
    Call call(Token word, Macro macro) {
        scanner.start();
        List<List<Token>> found = new ArrayList<>();
        boolean complete = scanner.follows(macro.prefix());
        for (int i = 0; complete && i < macro.parameters().size(); i++) {
            List<Token> argument = scanner.argument(macro.parameters().get(i));
            found.add(argument);
            complete = argument != null;
        }
        if (!complete) {
            boolean overlong = scanner.taken().size() > ArgumentScanner.LONGEST && expander.isExpanding();
            Span place = overlong ? span(word) : null;
            scanner.putBack(0);
            if (overlong) {
                expander.fail("the argument of \\" + word.text() + " grows without end", place);
            }
            return null;
        }
        return new Call(found, span(word));
    }

    /** The word with all that was read behind it. */
    private Span span(Token word) {
        Span span = word.span();
        for (Token token : scanner.taken()) {
            span = span.cover(token.span());
        }
        return span;
    }

    /** The next mandatory argument without its braces, or null. */
    List<Token> mandatory() {
        scanner.start();
        List<Token> argument = scanner.plain();
        if (argument == null) {
            scanner.putBack(0);
        }
        return argument;
    }

    /** An argument in brackets, or null if none stands here. */
    List<Token> optional() {
        scanner.start();
        return scanner.bracketed('[', ']');
    }

    /** What the last request read, braces and blanks included. */
    List<Token> lastTaken() {
        return List.copyOf(scanner.taken());
    }

    /** Eats a star if one stands here. */
    boolean star() {
        return mark('*');
    }

    /** Eats this character if it stands here, behind blanks. */
    boolean mark(char character) {
        scanner.start();
        return scanner.isMarked(character);
    }

    /** The control sequence, bare or in braces, that a definition is about; null if there is none. */
    Token controlSequence() {
        List<Token> argument = mandatory();
        if (argument == null) {
            return null;
        }
        Token found = null;
        for (Token token : argument) {
            if (token.kind() == TokenKind.SPACE) {
                continue;
            }
            if (found != null) {
                return null;
            }
            found = token;
        }
        boolean names =
                found != null && (found.kind() == TokenKind.CONTROL_WORD || found.kind() == TokenKind.CONTROL_SYMBOL);
        return names ? found : null;
    }

    /** Behind {@code \csname}: the control word that the tokens up to {@code \endcsname} spell, or null. */
    Token constructed(Token word) {
        scanner.start();
        Token token = scanner.take();
        while (token != null && token.kind() != TokenKind.CONTROL_WORD && token.kind() != TokenKind.PARAGRAPH_BREAK) {
            token = scanner.take();
        }
        if (token == null || !token.isWord("endcsname")) {
            scanner.putBack(0);
            return null;
        }
        List<Token> spelled = scanner.taken().subList(0, scanner.taken().size() - 1);
        return new Token(TokenKind.CONTROL_WORD, text(spelled), span(word));
    }

    /** The next mandatory argument as the characters of a name, or null. */
    String name() {
        List<Token> argument = mandatory();
        return argument == null ? null : text(argument);
    }

    static String text(List<Token> tokens) {
        StringBuilder text = new StringBuilder();
        for (Token token : tokens) {
            text.append(token.text());
        }
        return text.toString().strip();
    }
}
