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
    private static final int LONGEST = 50_000;
    private static final int LONGEST_WHEN_MANY_DO_NOT_CLOSE = 500;
    private static final int MANY = 20;

    static final String NO_VALUE = "NoValue";
    static final String TRUE = "BooleanTrue";
    static final String FALSE = "BooleanFalse";

    /** A macro's arguments in order, and the place of the whole call. */
    record Call(List<List<Token>> arguments, Span span) {}

    private final Expander expander;
    /** Everything read since the outermost request began, to put back. */
    private final List<Token> taken = new ArrayList<>();

    private int unclosed;

    Arguments(Expander expander) {
        this.expander = expander;
    }

    /** The arguments of a call, or null. */
    Call call(Token word, Macro macro) {
        taken.clear();
        List<List<Token>> found = new ArrayList<>();
        boolean complete = follows(macro.prefix());
        for (int i = 0; complete && i < macro.parameters().size(); i++) {
            List<Token> argument = argument(macro.parameters().get(i));
            found.add(argument);
            complete = argument != null;
        }
        if (!complete) {
            boolean overlong = taken.size() > LONGEST && expander.isExpanding();
            Span place = overlong ? span(word) : null;
            putBack();
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
        for (Token token : taken) {
            span = span.cover(token.span());
        }
        return span;
    }

    /** The next mandatory argument without its braces, or null. */
    List<Token> mandatory() {
        taken.clear();
        List<Token> argument = plain();
        if (argument == null) {
            putBack();
        }
        return argument;
    }

    /** An argument in brackets, or null if none stands here. */
    List<Token> optional() {
        taken.clear();
        return bracketed('[', ']');
    }

    /** What the last request read, braces and blanks included. */
    List<Token> lastTaken() {
        return List.copyOf(taken);
    }

    /** Eats a star if one stands here. */
    boolean star() {
        return mark('*');
    }

    /** Eats this character if it stands here, behind blanks. */
    boolean mark(char character) {
        taken.clear();
        return isMarked(character);
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
        StringBuilder name = new StringBuilder();
        Span span = word.span();
        Token token = expander.raw();
        while (token != null && token.kind() != TokenKind.CONTROL_WORD && token.kind() != TokenKind.PARAGRAPH_BREAK) {
            name.append(token.text());
            span = span.cover(token.span());
            token = expander.raw();
        }
        if (token == null || !token.isWord("endcsname")) {
            expander.push(token);
            return null;
        }
        return new Token(TokenKind.CONTROL_WORD, name.toString(), span.cover(token.span()));
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

    private List<Token> argument(Parameter parameter) {
        if (parameter instanceof Parameter.Plain) {
            return plain();
        }
        if (parameter instanceof Parameter.Mark mark) {
            return List.of(marker(isMarked(mark.character()) ? TRUE : FALSE));
        }
        if (parameter instanceof Parameter.Bracketed bracketed) {
            List<Token> argument = bracketed(bracketed.open(), bracketed.close());
            if (argument != null) {
                return argument;
            }
            return bracketed.fallback() == null ? List.of(marker(NO_VALUE)) : bracketed.fallback();
        }
        return upTo(((Parameter.Delimited) parameter).delimiter());
    }

    private static Token marker(String word) {
        return new Token(TokenKind.CONTROL_WORD, word, new Span(0, 0));
    }

    private List<Token> plain() {
        Token first = takeBehindBlanks();
        if (first == null) {
            return null;
        }
        switch (first.kind()) {
            case BEGIN_GROUP:
                return group();
            case END_GROUP, PARAGRAPH_BREAK, ALIGN, INLINE_SHIFT, DISPLAY_SHIFT:
                return null;
            case CONTROL_WORD:
                return first.text().equals("end") || first.text().equals("begin") ? null : List.of(first);
            default:
                return List.of(first);
        }
    }

    /** Up to the brace that closes the group just opened. */
    private List<Token> group() {
        List<Token> content = new ArrayList<>();
        int depth = 1;
        while (true) {
            Token token = takeInside(content.size());
            if (token == null) {
                return null;
            }
            if (token.kind() == TokenKind.BEGIN_GROUP) {
                depth++;
            } else if (token.kind() == TokenKind.END_GROUP && --depth == 0) {
                return content;
            }
            content.add(token);
        }
    }

    private List<Token> bracketed(char open, char close) {
        int before = taken.size();
        Token first = takeBehindBlanks();
        if (first == null || !first.isCharacter(open)) {
            putBack(before);
            return null;
        }
        List<Token> content = new ArrayList<>();
        int braces = 0;
        int brackets = 1;
        while (true) {
            Token token = takeInside(content.size());
            if (token == null || token.kind() == TokenKind.END_GROUP && braces == 0) {
                putBack(before);
                return null;
            }
            if (token.kind() == TokenKind.BEGIN_GROUP) {
                braces++;
            } else if (token.kind() == TokenKind.END_GROUP) {
                braces--;
            } else if (braces == 0 && token.isCharacter(open)) {
                brackets++;
            } else if (braces == 0 && token.isCharacter(close) && --brackets == 0) {
                return content;
            }
            content.add(token);
        }
    }

    private List<Token> upTo(List<Token> delimiter) {
        List<Token> content = new ArrayList<>();
        int braces = 0;
        while (true) {
            Token token = takeInside(content.size());
            if (token == null || token.kind() == TokenKind.END_GROUP && braces == 0) {
                return null;
            }
            content.add(token);
            if (token.kind() == TokenKind.BEGIN_GROUP) {
                braces++;
            } else if (token.kind() == TokenKind.END_GROUP) {
                braces--;
            } else if (braces == 0 && endsWith(content, delimiter)) {
                return stripBraces(content.subList(0, content.size() - delimiter.size()));
            }
        }
    }

    private static boolean endsWith(List<Token> tokens, List<Token> delimiter) {
        int from = tokens.size() - delimiter.size();
        if (from < 0) {
            return false;
        }
        for (int i = 0; i < delimiter.size(); i++) {
            if (!same(tokens.get(from + i), delimiter.get(i))) {
                return false;
            }
        }
        return true;
    }

    /** A delimited argument that is one group loses its braces. */
    private static List<Token> stripBraces(List<Token> tokens) {
        if (tokens.size() < 2 || tokens.get(0).kind() != TokenKind.BEGIN_GROUP) {
            return List.copyOf(tokens);
        }
        int depth = 0;
        for (int i = 0; i < tokens.size(); i++) {
            TokenKind kind = tokens.get(i).kind();
            depth += kind == TokenKind.BEGIN_GROUP ? 1 : kind == TokenKind.END_GROUP ? -1 : 0;
            if (depth == 0 && i < tokens.size() - 1) {
                return List.copyOf(tokens);
            }
        }
        return List.copyOf(tokens.subList(1, tokens.size() - 1));
    }

    private static boolean same(Token one, Token other) {
        return one.kind() == other.kind() && one.text().equals(other.text());
    }

    private boolean isMarked(char character) {
        int before = taken.size();
        Token token = takeBehindBlanks();
        if (token != null && token.isCharacter(character)) {
            return true;
        }
        putBack(before);
        return false;
    }

    private boolean follows(List<Token> prefix) {
        for (Token expected : prefix) {
            Token token = take();
            if (token == null || !same(token, expected)) {
                return false;
            }
        }
        return true;
    }

    private Token take() {
        Token token = expander.raw();
        if (token != null) {
            taken.add(token);
        }
        return token;
    }

    private Token takeBehindBlanks() {
        Token token = take();
        while (token != null && token.kind() == TokenKind.SPACE) {
            token = take();
        }
        return token;
    }

    /** The next token of an argument; null where the argument has to be given up. */
    private Token takeInside(int length) {
        Token token = take();
        int longest = unclosed > MANY ? LONGEST_WHEN_MANY_DO_NOT_CLOSE : LONGEST;
        boolean broken =
                token == null || length > longest || token.kind() == TokenKind.PARAGRAPH_BREAK && expander.isMathMode();
        if (broken) {
            unclosed++;
        }
        return broken ? null : token;
    }

    private void putBack() {
        putBack(0);
    }

    private void putBack(int from) {
        List<Token> tail = taken.subList(from, taken.size());
        expander.push(List.copyOf(tail));
        tail.clear();
    }
}
