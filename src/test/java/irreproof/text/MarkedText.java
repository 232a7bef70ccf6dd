package irreproof.text;

import java.util.ArrayList;
import java.util.List;

/**
 * A fixture whose expectations stand under the text: below a line, further lines that hold blanks, a run of carets and
 * perhaps a label mark the characters above them.
 *
 * <pre>
 * $3\otimes 3 = 8$
 *  ^^^^^^^^^^ a product
 *              ^ wrong
 * </pre>
 *
 * @param text the text without the marking lines
 * @param marks the marks in the order they are written
 */
public record MarkedText(String text, List<Mark> marks) {
    /** Some marked characters and what was written behind the carets. */
    public record Mark(Span span, String label) {}

    public static MarkedText of(String fixture) {
        StringBuilder text = new StringBuilder();
        List<Mark> marks = new ArrayList<>();
        int lineStart = 0;
        for (String line : fixture.lines().toList()) {
            int from = line.indexOf('^');
            if (from < 0 || !line.substring(0, from).isBlank()) {
                lineStart = text.length();
                text.append(line).append('\n');
                continue;
            }
            int to = from;
            while (to < line.length() && line.charAt(to) == '^') {
                to++;
            }
            Span span = new Span(lineStart + from, lineStart + to);
            if (span.end() > text.length()) {
                throw new IllegalArgumentException("carets behind the line's end: " + line);
            }
            marks.add(new Mark(span, line.substring(to).strip()));
        }
        return new MarkedText(text.toString(), marks);
    }
}
