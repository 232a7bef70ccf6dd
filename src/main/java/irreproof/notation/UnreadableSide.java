package irreproof.notation;

import irreproof.text.Span;

/** Thrown while a tree is built, and caught by the reader of sides: what could not be read, in the author's words. */
final class UnreadableSide extends RuntimeException {
    private final transient Span span;

    UnreadableSide(String message, Span span) {
        super(message, null, false, false);
        this.span = span;
    }

    Span span() {
        return span;
    }
}
