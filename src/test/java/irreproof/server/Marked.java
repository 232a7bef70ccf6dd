package irreproof.server;

import java.util.ArrayList;
import java.util.List;
import java.util.regex.Pattern;
import org.eclipse.lsp4j.Position;
import org.eclipse.lsp4j.Range;

/**
 * A text with carets under what is meant: a line of blanks and carets marks ranges of the line above and is not part of
 * the text. The ranges count UTF-16 units.
 */
record Marked(String text, List<Range> ranges) {
    private static final Pattern MARKS = Pattern.compile("[ ^]*\\^[ ^]*");
    private static final Pattern RUN = Pattern.compile("\\^+");

    static Marked of(String marked) {
        List<String> lines = new ArrayList<>();
        List<Range> ranges = new ArrayList<>();
        for (String line : marked.split("\n", -1)) {
            if (MARKS.matcher(line).matches()) {
                int above = lines.size() - 1;
                RUN.matcher(line)
                        .results()
                        .forEach(run -> ranges.add(
                                new Range(new Position(above, run.start()), new Position(above, run.end()))));
            } else {
                lines.add(line);
            }
        }
        return new Marked(String.join("\n", lines), ranges);
    }

    /** The only range. */
    Range range() {
        if (ranges.size() != 1) {
            throw new IllegalStateException(ranges.size() + " marks");
        }
        return ranges.get(0);
    }
}
