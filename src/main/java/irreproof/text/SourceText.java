package irreproof.text;

/** One original text under the path the user knows it by ({@code -} for standard input), with its lines. */
public record SourceText(String path, String content, LineIndex lines) {
    public SourceText(String path, String content) {
        this(path, content, new LineIndex(content));
    }

    /** Line and column of an offset, both from 0, the column in these units. */
    public LineIndex.Position position(int offset, ColumnUnit unit) {
        LineIndex.Position found = lines.position(offset);
        int start = lines.lineSpan(found.line()).start();
        return new LineIndex.Position(found.line(), unit.count(content, start, start + found.column()));
    }

    /** The offset of a line and column, both from 0, the column in these units; clamped as in {@link LineIndex}. */
    public int offset(int line, int column, ColumnUnit unit) {
        if (line < 0 || line >= lines.lineCount()) {
            return lines.offset(line, 0);
        }
        Span span = lines.lineSpan(line);
        return unit.advance(content, span.start(), span.end(), column);
    }
}
