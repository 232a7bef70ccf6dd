package irreproof.latex;

import irreproof.text.Span;
import java.util.HashSet;
import java.util.Set;

/**
 * Cuts one source into tokens, one at a time and only forwards, so that a definition may change how the rest is cut.
 * Never fails: whatever is no longer TeX comes out as {@link TokenKind#OTHER}. Linear in the length of the source.
 *
 * <p>Differs from TeX on purpose: a verbatim-like environment or command is one token with its delimiters, and so is
 * the address in {@code \\url}; category codes change only for {@code @} ({@code \makeatletter}).
 */
final class Lexer {
    private static final String[] CHARACTERS = new String[128];
    private static final Set<String> VERBATIM_ENVIRONMENTS = Set.of(
            "verbatim",
            "verbatim*",
            "Verbatim",
            "Verbatim*",
            "BVerbatim",
            "LVerbatim",
            "lstlisting",
            "minted",
            "comment",
            "filecontents",
            "filecontents*",
            "alltt",
            "luacode",
            "luacode*");
    private static final int LONGEST_ENVIRONMENT_NAME = 40;

    static {
        for (char c = 0; c < CHARACTERS.length; c++) {
            CHARACTERS[c] = String.valueOf(c);
        }
    }

    private final String text;
    private final Set<String> verbatim = new HashSet<>(VERBATIM_ENVIRONMENTS);
    private int position;
    private boolean atIsLetter;
    private boolean afterWord;
    private boolean atLineStart;

    Lexer(String text) {
        this.text = text;
    }

    /** The token for one character, as it would come out of a source (letters, digits and others alone). */
    static Token character(char c, Span span) {
        TokenKind kind =
                c >= '0' && c <= '9' ? TokenKind.DIGIT : Character.isLetter(c) ? TokenKind.LETTER : TokenKind.OTHER;
        return new Token(kind, single(c), span);
    }

    void atIsLetter(boolean letter) {
        atIsLetter = letter;
    }

    /** Treats the bodies of this environment as opaque from here on. */
    void addVerbatimEnvironment(String name) {
        verbatim.add(name);
    }

    int position() {
        return position;
    }

    /** The next token, or null at the end. */
    Token next() {
        while (position < text.length()) {
            int start = position;
            char c = text.charAt(start);
            if (isWhite(c)) {
                Token blank = whitespace(start);
                if (blank != null) {
                    return blank;
                }
                continue;
            }
            boolean behindWord = afterWord;
            afterWord = false;
            atLineStart = false;
            position++;
            switch (c) {
                case '\\':
                    return control(start);
                case '%':
                    afterWord = behindWord;
                    return comment(start);
                case '{':
                    return token(TokenKind.BEGIN_GROUP, "{", start);
                case '}':
                    return token(TokenKind.END_GROUP, "}", start);
                case '$':
                    if (position < text.length() && text.charAt(position) == '$') {
                        position++;
                        return token(TokenKind.DISPLAY_SHIFT, "$$", start);
                    }
                    return token(TokenKind.INLINE_SHIFT, "$", start);
                case '&':
                    return token(TokenKind.ALIGN, "&", start);
                case '^':
                    return token(TokenKind.SUPERSCRIPT, "^", start);
                case '_':
                    return token(TokenKind.SUBSCRIPT, "_", start);
                case '~':
                    return token(TokenKind.SPACE, "~", start);
                case '#':
                    return parameter(start);
                default:
                    return plain(c, start);
            }
        }
        return null;
    }

    private Token plain(char c, int start) {
        if (c < 128) {
            boolean digit = c >= '0' && c <= '9';
            boolean letter = c >= 'a' && c <= 'z' || c >= 'A' && c <= 'Z';
            return token(digit ? TokenKind.DIGIT : letter ? TokenKind.LETTER : TokenKind.OTHER, CHARACTERS[c], start);
        }
        int codePoint = text.codePointAt(start);
        position = start + Character.charCount(codePoint);
        TokenKind kind = Character.isLetter(codePoint) ? TokenKind.LETTER : TokenKind.OTHER;
        return token(kind, text.substring(start, position), start);
    }

    /** A run of blanks: a space, a paragraph break, or null where TeX skips it. */
    private Token whitespace(int start) {
        int lines = 0;
        int i = start;
        for (; i < text.length() && isWhite(text.charAt(i)); i++) {
            char c = text.charAt(i);
            if (isLineEnd(c)) {
                lines++;
                if (c == '\r' && i + 1 < text.length() && text.charAt(i + 1) == '\n') {
                    i++;
                }
            }
        }
        position = i;
        boolean skipped = afterWord || atLineStart;
        boolean paragraph = lines > (atLineStart ? 0 : 1);
        if (!paragraph && skipped) {
            return null;
        }
        afterWord = false;
        atLineStart = false;
        return paragraph ? token(TokenKind.PARAGRAPH_BREAK, "\n\n", start) : token(TokenKind.SPACE, " ", start);
    }

    private Token comment(int start) {
        int end = lineEnd(start);
        String body = text.substring(start + 1, end);
        position = end;
        if (position < text.length()) {
            position += text.startsWith("\r\n", position) ? 2 : 1;
        }
        atLineStart = true;
        return token(TokenKind.COMMENT, body, start);
    }

    private Token parameter(int start) {
        if (position < text.length()) {
            char c = text.charAt(position);
            if (c == '#' || c >= '1' && c <= '9') {
                position++;
                return token(TokenKind.PARAMETER, CHARACTERS[c], start);
            }
        }
        return token(TokenKind.OTHER, "#", start);
    }

    private Token control(int start) {
        if (position == text.length()) {
            return token(TokenKind.OTHER, "\\", start);
        }
        char first = text.charAt(position);
        if (!isWordLetter(first)) {
            return symbol(first, start);
        }
        int end = position + 1;
        while (end < text.length() && isWordLetter(text.charAt(end))) {
            end++;
        }
        position = end;
        String word = text.substring(start + 1, end);
        Token opaque = opaque(word, start);
        if (opaque != null) {
            return opaque;
        }
        afterWord = true;
        return token(TokenKind.CONTROL_WORD, word, start);
    }

    private Token symbol(char first, int start) {
        position++;
        switch (first) {
            case '(':
                return token(TokenKind.INLINE_SHIFT, "\\(", start);
            case ')':
                return token(TokenKind.INLINE_SHIFT, "\\)", start);
            case '[':
                return token(TokenKind.DISPLAY_SHIFT, "\\[", start);
            case ']':
                return token(TokenKind.DISPLAY_SHIFT, "\\]", start);
            case ' ', '\t', '\n', '\r':
                position--;
                whitespaceAfterBackslash();
                return token(TokenKind.CONTROL_SYMBOL, " ", start);
            default:
                position = start + 1 + Character.charCount(text.codePointAt(start + 1));
                return token(TokenKind.CONTROL_SYMBOL, text.substring(start + 1, position), start);
        }
    }

    private void whitespaceAfterBackslash() {
        boolean lineEnd = isLineEnd(text.charAt(position));
        position += text.startsWith("\r\n", position) ? 2 : 1;
        afterWord = true;
        atLineStart = lineEnd;
    }

    /** A command whose argument TeX does not read as TeX, or null. Called with the position behind the word. */
    private Token opaque(String word, int start) {
        return switch (word) {
            case "begin" -> verbatimEnvironment(start);
            case "verb", "Verb" -> delimited(start, position);
            case "lstinline" -> delimited(start, skipBracketed(position, '[', ']'));
            case "mintinline" -> delimited(start, skipBracketed(skipBracketed(position, '[', ']'), '{', '}'));
            case "url", "path", "nolinkurl", "href" -> address(start);
            default -> null;
        };
    }

    private Token verbatimEnvironment(int start) {
        if (position >= text.length() || text.charAt(position) != '{') {
            return null;
        }
        int last = Math.min(text.length(), position + LONGEST_ENVIRONMENT_NAME);
        int close = position + 1;
        while (close < last && text.charAt(close) != '}') {
            close++;
        }
        if (close == last) {
            return null;
        }
        String name = text.substring(position + 1, close);
        if (!verbatim.contains(name)) {
            return null;
        }
        String closing = "\\end{" + name + "}";
        int end = text.indexOf(closing, close);
        position = end < 0 ? text.length() : end + closing.length();
        return token(TokenKind.VERBATIM, text.substring(close + 1, end < 0 ? text.length() : end), start);
    }

    private Token delimited(int start, int from) {
        int open = from < text.length() && text.charAt(from) == '*' ? from + 1 : from;
        if (open >= text.length() || isLineEnd(text.charAt(open))) {
            return null;
        }
        char closer = text.charAt(open) == '{' ? '}' : text.charAt(open);
        int close = open + 1;
        while (close < text.length() && text.charAt(close) != closer && !isLineEnd(text.charAt(close))) {
            close++;
        }
        boolean closed = close < text.length() && text.charAt(close) == closer;
        position = closed ? close + 1 : close;
        return token(TokenKind.VERBATIM, text.substring(open + 1, close), start);
    }

    private Token address(int start) {
        if (position >= text.length() || text.charAt(position) != '{') {
            return null;
        }
        int open = position;
        int end = skipBracketed(open, '{', '}');
        if (end == open) {
            return null;
        }
        position = end;
        return token(TokenKind.VERBATIM, text.substring(open + 1, end - 1), start);
    }

    /** Behind a bracketed stretch that closes on the same line, or where it was asked to start. */
    private int skipBracketed(int from, char opener, char closer) {
        if (from >= text.length() || text.charAt(from) != opener) {
            return from;
        }
        int depth = 0;
        for (int i = from; i < text.length(); i++) {
            char c = text.charAt(i);
            if (c == opener) {
                depth++;
            } else if (c == closer && --depth == 0) {
                return i + 1;
            } else if (isLineEnd(c)) {
                return from;
            }
        }
        return from;
    }

    private int lineEnd(int from) {
        int end = from;
        while (end < text.length() && !isLineEnd(text.charAt(end))) {
            end++;
        }
        return end;
    }

    private boolean isWordLetter(char c) {
        return c >= 'a' && c <= 'z' || c >= 'A' && c <= 'Z' || c == '@' && atIsLetter;
    }

    private static boolean isWhite(char c) {
        return c == ' ' || c == '\n' || c == '\r' || c == '\t';
    }

    private static boolean isLineEnd(char c) {
        return c == '\n' || c == '\r';
    }

    private static String single(char c) {
        return c < 128 ? CHARACTERS[c] : String.valueOf(c);
    }

    private Token token(TokenKind kind, String body, int start) {
        return new Token(kind, body, new Span(start, position));
    }
}
