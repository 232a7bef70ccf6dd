package irreproof.notation;

import irreproof.latex.Token;
import irreproof.latex.TokenKind;
import irreproof.notation.Commands.Meaning;
import irreproof.text.Span;
import java.util.ArrayDeque;
import java.util.Arrays;
import java.util.Deque;
import java.util.List;

/** The tokens of a passage with their matching braces, and how far the argument of a command reaches. */
final class TokenTape {
    /** An optional argument longer than this is none: keeps reading linear. */
    static final int FARTHEST_BRACKET = 1000;

    private static final int NONE = -1;

    private final List<Token> tokens;
    private final int[] closers;

    TokenTape(List<Token> tokens) {
        this.tokens = tokens;
        closers = new int[tokens.size()];
        Arrays.fill(closers, NONE);
        Deque<Integer> open = new ArrayDeque<>();
        for (int i = 0; i < tokens.size(); i++) {
            if (at(i).kind() == TokenKind.BEGIN_GROUP) {
                open.push(i);
            } else if (at(i).kind() == TokenKind.END_GROUP && !open.isEmpty()) {
                closers[open.pop()] = i;
            }
        }
    }

    /**
     * An argument.
     *
     * @param from its first token, without the brace
     * @param to behind its last token, without the brace
     * @param next behind the argument
     */
    record Argument(int from, int to, int next) {}

    int size() {
        return tokens.size();
    }

    Token at(int index) {
        return tokens.get(index);
    }

    boolean isKind(int index, int end, TokenKind kind) {
        return index < end && at(index).kind() == kind;
    }

    boolean isCharacter(int index, int end, char character) {
        return index < end && at(index).isCharacter(character);
    }

    /** Where the group that begins here ends, or a negative number if it never does. */
    int closer(int index) {
        return closers[index];
    }

    /** White space that prints nothing; a tie does print a space. */
    boolean isBlank(int index) {
        Token token = at(index);
        return token.kind() == TokenKind.COMMENT
                || token.kind() == TokenKind.SPACE && !token.text().equals("~");
    }

    int skipSpaces(int index, int end) {
        int i = index;
        while (i < end && isBlank(i)) {
            i++;
        }
        return i;
    }

    /** The mandatory argument that begins here: a group, a command with its own arguments, or one token; or null. */
    Argument argument(int index, int end) {
        return argument(index, end, 0);
    }

    private Argument argument(int index, int end, int depth) {
        int start = skipSpaces(index, end);
        if (start >= end || at(start).kind() == TokenKind.END_GROUP) {
            return null;
        }
        if (at(start).kind() == TokenKind.BEGIN_GROUP) {
            int close = closers[start];
            return close == NONE || close >= end ? null : new Argument(start + 1, close, close + 1);
        }
        int next = start + 1;
        if (at(start).kind() == TokenKind.CONTROL_WORD && depth < 4) {
            for (int i = argumentCount(Commands.of(at(start).text())); i > 0; i--) {
                Argument inner = argument(next, end, depth + 1);
                if (inner == null) {
                    break;
                }
                next = inner.next();
            }
        }
        return new Argument(start, next, next);
    }

    private static int argumentCount(Meaning meaning) {
        if (meaning instanceof Commands.Faced
                || meaning instanceof Commands.Bar
                || meaning instanceof Commands.Text
                || meaning instanceof Commands.Braced) {
            return 1;
        }
        if (meaning instanceof Commands.FractionOf) {
            return 2;
        }
        return meaning instanceof Commands.Wrapper wrapper ? wrapper.before() + 1 : 0;
    }

    /** Behind the optional arguments and the star that may begin here. */
    int skipOptional(int index, int end) {
        int i = isCharacter(index, end, '*') ? index + 1 : index;
        while (true) {
            int start = skipSpaces(i, end);
            if (!isCharacter(start, end, '[')) {
                return i;
            }
            int close = closingBracket(start, end);
            if (close == NONE) {
                return i;
            }
            i = close + 1;
        }
    }

    /** The square bracket that closes the one that begins here, over whole groups; negative if there is none. */
    int closingBracket(int open, int end) {
        int depth = 0;
        for (int i = open; i < Math.min(end, open + FARTHEST_BRACKET); i++) {
            if (at(i).isCharacter('[')) {
                depth++;
            } else if (at(i).isCharacter(']') && --depth == 0) {
                return i;
            } else if (at(i).kind() == TokenKind.BEGIN_GROUP && closers[i] != NONE) {
                i = closers[i];
            }
        }
        return NONE;
    }

    /** The author's characters of these tokens; empty behind the end of the token before if there are none. */
    Span span(int from, int to) {
        if (from >= to) {
            int place = from > 0 ? at(from - 1).span().end() : 0;
            return new Span(place, place);
        }
        Span place = at(from).span();
        for (int i = from + 1; i < to; i++) {
            place = place.cover(at(i).span());
        }
        return place;
    }

    /** The tokens written out, for labels. */
    String text(int from, int to) {
        StringBuilder text = new StringBuilder();
        for (int i = from; i < to; i++) {
            Token token = at(i);
            text.append(
                    switch (token.kind()) {
                        case CONTROL_WORD -> "\\" + token.text() + (isKind(i + 1, to, TokenKind.LETTER) ? " " : "");
                        case CONTROL_SYMBOL -> "\\" + token.text();
                        case BEGIN_GROUP -> "{";
                        case END_GROUP -> "}";
                        case SUPERSCRIPT -> "^";
                        case SUBSCRIPT -> "_";
                        case ALIGN -> "&";
                        case INLINE_SHIFT -> "$";
                        case DISPLAY_SHIFT -> "$$";
                        case SPACE, PARAGRAPH_BREAK -> " ";
                        case COMMENT -> "";
                        case PARAMETER -> "#" + token.text();
                        case LETTER, DIGIT, OTHER, VERBATIM -> token.text();
                    });
        }
        return text.toString();
    }
}
