package irreproof.latex;

import irreproof.text.Span;

/**
 * One token, before or after macro expansion.
 *
 * @param text what the kind says; for single characters the character itself
 * @param span where it stands in the main document. For a token that came out of a macro's body this is the whole call
 *     (the control word with its arguments); for a token of an argument, the argument's own characters; for one that
 *     came from another file, the command that included the file
 */
public record Token(TokenKind kind, String text, Span span) {
    public boolean isWord(String name) {
        return kind == TokenKind.CONTROL_WORD && text.equals(name);
    }

    public boolean isCharacter(char character) {
        return (kind == TokenKind.OTHER || kind == TokenKind.LETTER || kind == TokenKind.DIGIT)
                && text.length() == 1
                && text.charAt(0) == character;
    }

    public Token at(Span place) {
        return new Token(kind, text, place);
    }
}
