package irreproof.latex;

import irreproof.text.Span;

/**
 * Cuts one source into tokens, one at a time and only forwards, so that a definition may change how the rest is cut.
 * Never fails: whatever is no longer TeX comes out as {@link TokenKind#OTHER}. Linear in the length of the source.
 *
 * <p>Differs from TeX on purpose: a verbatim-like environment or command is one token with its delimiters, and so is
 * the address in {@code \\url}; category codes change only for {@code @} ({@code \makeatletter}).
 */
final class Lexer {
    private static final String[] CHARACTERS = new String[128];

    static {
        for (char c = 0; c < CHARACTERS.length; c++) {
            CHARACTERS[c] = String.valueOf(c);
        }
    }

    private final String text;
    private final OpaqueText opaque;
    private int position;
    private boolean atIsLetter;
    private boolean afterWord;
    private boolean atLineStart;

    Lexer(String text) {
        this.text = text;
        this.opaque = new OpaqueText(text);
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
        opaque.addEnvironment(name);
    }

    /** Goes to the end. */
    void stop() {
        position = text.length();
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
        OpaqueText.Stretch stretch = opaque.behind(word, position);
        if (stretch != null) {
            position = stretch.end();
            return token(TokenKind.VERBATIM, stretch.body().of(text), start);
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

    static boolean isLineEnd(char c) {
        return c == '\n' || c == '\r';
    }

    private static String single(char c) {
        return c < 128 ? CHARACTERS[c] : String.valueOf(c);
    }

    private Token token(TokenKind kind, String body, int start) {
        return new Token(kind, body, new Span(start, position));
    }
}
