package irreproof.latex;

import irreproof.text.Span;
import java.util.ArrayList;
import java.util.List;

/** Finds single arguments in an expander's unexpanded tokens, and remembers all it read since it was started. */
final class ArgumentScanner {
    /** No argument is longer, in tokens. */
    static final int LONGEST = 50_000;

    private static final int LONGEST_WHEN_MANY_DO_NOT_CLOSE = 500;
    private static final int MANY = 20;

    static final String NO_VALUE = "NoValue";
    static final String TRUE = "BooleanTrue";
    static final String FALSE = "BooleanFalse";

    private final Expander expander;
    private final List<Token> taken = new ArrayList<>();
    private int unclosed;

    ArgumentScanner(Expander expander) {
        this.expander = expander;
    }

    /** Forgets what was read before. */
    void start() {
        taken.clear();
    }

    /** Everything read since the start, braces and blanks included. */
    List<Token> taken() {
        return taken;
    }

    /** The argument for a parameter, or null. */
    List<Token> argument(Parameter parameter) {
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

    /** One token, or a group without its braces. */
    List<Token> plain() {
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

    /** What stands between these characters; null, and nothing is read, if they do not stand here. */
    List<Token> bracketed(char open, char close) {
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

    /** Eats the character if it stands here. */
    boolean isMarked(char character) {
        int before = taken.size();
        Token token = takeBehindBlanks();
        if (token != null && token.isCharacter(character)) {
            return true;
        }
        putBack(before);
        return false;
    }

    /** Eats these tokens; false if others stand here. */
    boolean follows(List<Token> prefix) {
        for (Token expected : prefix) {
            Token token = take();
            if (token == null || !same(token, expected)) {
                return false;
            }
        }
        return true;
    }

    /** The next token, or null at the end. */
    Token take() {
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

    /** Gives back what was read, but for so many tokens at the beginning. */
    void putBack(int from) {
        List<Token> tail = taken.subList(from, taken.size());
        expander.push(List.copyOf(tail));
        tail.clear();
    }
}
