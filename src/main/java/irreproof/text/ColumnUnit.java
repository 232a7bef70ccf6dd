package irreproof.text;

/** What a column counts: UTF-16 units inside the program, or what a client of the language server asks for. */
public enum ColumnUnit {
    UTF_8,
    UTF_16,
    UTF_32;

    /** How many units the text between two offsets takes. A surrogate without its other half counts as a character. */
    public int count(CharSequence text, int start, int end) {
        if (this == UTF_16) {
            return end - start;
        }
        int units = 0;
        for (int at = start; at < end; ) {
            int character = Character.codePointAt(text, at);
            units += width(character);
            at += Character.charCount(character);
        }
        return units;
    }

    /** The offset this many units behind the start, at most the end; inside a character, the offset before it. */
    public int advance(CharSequence text, int start, int end, int units) {
        if (this == UTF_16) {
            return Math.min(end, start + Math.max(0, units));
        }
        int at = start;
        int left = units;
        while (at < end) {
            int character = Character.codePointAt(text, at);
            left -= width(character);
            if (left < 0) {
                break;
            }
            at += Character.charCount(character);
        }
        return Math.min(at, end);
    }

    private int width(int character) {
        return switch (this) {
            case UTF_8 -> character < 0x80 ? 1 : character < 0x800 ? 2 : character < 0x10000 ? 3 : 4;
            case UTF_16 -> Character.charCount(character);
            case UTF_32 -> 1;
        };
    }
}
