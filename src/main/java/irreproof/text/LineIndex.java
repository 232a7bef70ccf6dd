package irreproof.text;

import java.util.Arrays;

/**
 * Converts between offsets and lines of one text. Lines end at LF, CRLF or CR. Lines and columns start at 0 here (the
 * reports for people add 1; the language server's protocol starts at 0 too); columns count UTF-16 units. A column past
 * the end of its line is clamped to the end of the line, a line past the end of the text to the end of the text.
 */
public final class LineIndex {
    private final int[] starts;
    private final int[] ends;
    private final int length;

    public LineIndex(CharSequence text) {
        length = text.length();
        int[] lineStarts = new int[16];
        int[] lineEnds = new int[16];
        int lines = 0;
        int start = 0;
        for (int i = 0; i <= length; i++) {
            boolean last = i == length;
            if (!last && text.charAt(i) != '\n' && text.charAt(i) != '\r') {
                continue;
            }
            if (lines == lineStarts.length) {
                lineStarts = Arrays.copyOf(lineStarts, 2 * lines);
                lineEnds = Arrays.copyOf(lineEnds, 2 * lines);
            }
            lineStarts[lines] = start;
            lineEnds[lines++] = i;
            if (!last && text.charAt(i) == '\r' && i + 1 < length && text.charAt(i + 1) == '\n') {
                i++;
            }
            start = i + 1;
        }
        starts = Arrays.copyOf(lineStarts, lines);
        ends = Arrays.copyOf(lineEnds, lines);
    }

    /** A place in a text; both numbers start at 0, the column in UTF-16 units. */
    public record Position(int line, int column) {}

    public int lineCount() {
        return starts.length;
    }

    public Position position(int offset) {
        int clamped = Math.max(0, Math.min(offset, length));
        int found = Arrays.binarySearch(starts, clamped);
        int line = found >= 0 ? found : -found - 2;
        return new Position(line, Math.min(clamped, ends[line]) - starts[line]);
    }

    public int offset(int line, int column) {
        if (line >= starts.length) {
            return length;
        }
        int start = starts[Math.max(0, line)];
        return Math.max(start, Math.min(start + Math.max(0, column), ends[Math.max(0, line)]));
    }

    /** The line without its line end. */
    public Span lineSpan(int line) {
        return new Span(starts[line], ends[line]);
    }
}
