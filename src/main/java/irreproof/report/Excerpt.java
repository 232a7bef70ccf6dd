package irreproof.report;

import irreproof.text.LineIndex;
import irreproof.text.SourceText;
import irreproof.text.Span;

/**
 * The source line of a finding with a line of marks below it: a caret at its first character and tildes to its end, or
 * to the end of the line if it runs over several. Of a long line only the neighbourhood is shown. The marks count code
 * points; scripts whose characters are wider or narrower than a letter shift them.
 */
final class Excerpt {
    private static final int WIDEST = 110;
    private static final int BEFORE = 30;
    private static final String CUT = "…";

    private Excerpt() {}

    /** Two lines, each indented and ended. */
    static String print(SourceText source, Span span, String indent) {
        LineIndex lines = source.lines();
        LineIndex.Position start = lines.position(span.start());
        LineIndex.Position end = lines.position(span.end());
        int[] line =
                lines.lineSpan(start.line()).of(source.content()).codePoints().toArray();
        String text = lines.lineSpan(start.line()).of(source.content());
        int from = text.codePointCount(0, start.column());
        int to = end.line() == start.line() ? text.codePointCount(0, end.column()) : line.length;
        to = Math.max(to, from + 1);

        int first = line.length <= WIDEST ? 0 : Math.max(0, Math.min(from - BEFORE, line.length - WIDEST));
        int last = Math.min(line.length, first + WIDEST);
        StringBuilder shown = new StringBuilder(indent);
        StringBuilder marks = new StringBuilder(indent);
        if (first > 0) {
            shown.append(CUT);
            marks.append(' ');
        }
        for (int i = first; i < last; i++) {
            // A tab stays a tab in both lines, so that they line up whatever its width; nothing else may move the
            // cursor.
            shown.appendCodePoint(line[i] != '\t' && Character.isISOControl(line[i]) ? ' ' : line[i]);
            if (i < from) {
                marks.append(line[i] == '\t' ? '\t' : ' ');
            }
        }
        if (last < line.length) {
            shown.append(CUT);
        }
        marks.append('^').append("~".repeat(Math.max(0, Math.min(to, last) - from - 1)));
        return shown.toString().stripTrailing() + "\n" + marks + "\n";
    }
}
