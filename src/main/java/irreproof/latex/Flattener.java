package irreproof.latex;

import irreproof.text.Span;
import java.util.AbstractList;
import java.util.Arrays;
import java.util.RandomAccess;

/**
 * Writes expanded tokens down as {@link PlainText}, one at a time. Linear; a group costs one word, however deep.
 */
final class Flattener {
    private final StringBuilder text = new StringBuilder();
    private int[] starts = new int[256];
    private int[] ends = new int[256];
    private boolean mathMode;
    /** Arguments still to be left out, as in {@link Glyphs#unseenArguments}, and how deep in one of them we are. */
    private String unseen = "";

    private int unseenDepth;
    private boolean unseenBracket;
    /** Where the text of each open group that is an index starts, or -1 for any other group. */
    private int[] indices = new int[64];

    private final TextGroups groups = new TextGroups();

    private int depth;
    private boolean indexNext;
    private boolean spaceNext;

    void mathMode(boolean on) {
        mathMode = on;
    }

    void accept(Token token) {
        if (!unseen.isEmpty() && isUnseen(token)) {
            return;
        }
        boolean index = indexNext;
        if (token.kind() != TokenKind.SPACE) {
            indexNext = false;
        }
        switch (token.kind()) {
            case LETTER, DIGIT, OTHER -> {
                if (spaceNext && Character.isLetterOrDigit(token.text().charAt(0))) {
                    blank(token.span());
                }
                if (token.isCharacter(')')) {
                    dropBlank();
                }
                append(token.text(), token.span());
            }
            case SPACE -> {
                if (!mathMode || groups.inText() || token.text().equals("~")) {
                    blank(token.span());
                }
            }
            case PARAGRAPH_BREAK -> paragraph(token.span());
            case ALIGN -> blank(token.span());
            case SUBSCRIPT, SUPERSCRIPT -> {
                append(token.text(), token.span());
                indexNext = true;
            }
            case BEGIN_GROUP -> open(index, token.span());
            case END_GROUP -> close(token.span());
            case CONTROL_SYMBOL -> symbol(token);
            case CONTROL_WORD -> word(token, index);
            case INLINE_SHIFT, DISPLAY_SHIFT, COMMENT, VERBATIM, PARAMETER -> {
                // nothing a reader sees
            }
        }
        groups.accept(token);
        spaceNext = token.isWord("xspace");
    }

    private void open(boolean index, Span span) {
        int depth = groups.depth();
        if (depth == indices.length) {
            indices = Arrays.copyOf(indices, 2 * depth);
        }
        indices[depth] = index ? text.length() : -1;
        if (index) {
            append("{", span);
        }
    }

    /** Closes a group; an index of one character loses its braces. */
    private void close(Span span) {
        int start = groups.depth() == 0 ? -1 : indices[groups.depth() - 1];
        if (start < 0) {
            return;
        }
        if (text.length() == start + 2) {
            text.deleteCharAt(start);
            starts[start] = starts[start + 1];
            ends[start] = ends[start + 1];
        } else {
            append("}", span);
        }
    }

    private void symbol(Token token) {
        String symbol = token.text();
        switch (symbol) {
            case ",", ":", ";", ">", " ", "\\" -> {
                blank(token.span());
                if (symbol.equals("\\")) {
                    unseen = "o";
                }
            }
            case "&", "%", "#", "_", "{", "}", "|" -> append(symbol, token.span());
            case "$" -> append(symbol, token.span());
            default -> {
                // accents, thin negative spaces, hyphenation
            }
        }
    }

    private void word(Token token, boolean index) {
        String word = token.text();
        String shown = Glyphs.shown(word);
        if (" ".equals(shown)) {
            blank(token.span());
        } else if (shown != null) {
            append(shown, token.span());
        }
        unseen = Glyphs.unseenArguments(word);
        indexNext = index && shown == null;
    }

    /** True if the token belongs to an argument that is left out. */
    private boolean isUnseen(Token token) {
        boolean optional = unseen.charAt(0) == 'o';
        if (unseenDepth > 0) {
            TokenKind kind = token.kind();
            if (kind == TokenKind.BEGIN_GROUP || unseenBracket && token.isCharacter('[')) {
                unseenDepth++;
            } else if (kind == TokenKind.END_GROUP || unseenBracket && token.isCharacter(']')) {
                unseenDepth--;
            } else if (kind == TokenKind.PARAGRAPH_BREAK) {
                unseenDepth = 0;
                unseen = "";
                return false;
            }
            if (unseenDepth == 0) {
                unseen = unseen.substring(1);
            }
            return true;
        }
        if (token.kind() == TokenKind.SPACE && unseen.equals("o")) {
            unseen = "";
            return false;
        }
        if (token.kind() == TokenKind.SPACE || token.isCharacter('*')) {
            return true;
        }
        if (token.isCharacter('[')) {
            unseenBracket = true;
            unseenDepth = 1;
            if (!optional) {
                unseen = "o" + unseen;
            }
            return true;
        }
        if (optional) {
            unseen = unseen.substring(1);
            return !unseen.isEmpty() && isUnseen(token);
        }
        if (token.kind() == TokenKind.BEGIN_GROUP) {
            unseenBracket = false;
            unseenDepth = 1;
            return true;
        }
        unseen = "";
        return false;
    }

    /** One blank, unless a blank, a line feed or an opening parenthesis stands there already. */
    void blank(Span span) {
        int length = text.length();
        char last = length == 0 ? ' ' : text.charAt(length - 1);
        if (last != ' ' && last != '\n' && last != '(') {
            append(" ", span);
        }
    }

    /** A macro for {@code SU( #1 )}, made for formulas, is used in prose too. */
    private void dropBlank() {
        int length = text.length();
        if (length > 0 && text.charAt(length - 1) == ' ') {
            text.setLength(length - 1);
        }
    }

    void paragraph(Span span) {
        int length = text.length();
        if (length > 1 && text.charAt(length - 1) != '\n') {
            append("\n\n", span);
        }
    }

    private void append(String shown, Span span) {
        int from = text.length();
        text.append(shown);
        int to = text.length();
        if (to > starts.length) {
            starts = Arrays.copyOf(starts, Math.max(to, 2 * starts.length));
            ends = Arrays.copyOf(ends, starts.length);
        }
        Arrays.fill(starts, from, to, span.start());
        Arrays.fill(ends, from, to, span.end());
    }

    PlainText result() {
        return new PlainText(
                text.toString(), new Origins(Arrays.copyOf(starts, text.length()), Arrays.copyOf(ends, text.length())));
    }

    /** Spans kept as two arrays of numbers: a manuscript has one for each of its characters. */
    private static final class Origins extends AbstractList<Span> implements RandomAccess {
        private final int[] starts;
        private final int[] ends;

        Origins(int[] starts, int[] ends) {
            this.starts = starts;
            this.ends = ends;
        }

        @Override
        public Span get(int index) {
            return new Span(starts[index], ends[index]);
        }

        @Override
        public int size() {
            return starts.length;
        }
    }
}
