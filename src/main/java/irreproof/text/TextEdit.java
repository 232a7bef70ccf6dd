package irreproof.text;

import java.util.ArrayList;
import java.util.Comparator;
import java.util.List;

/** Replace the text in the span (of the original text) by the new text; an empty span inserts. */
public record TextEdit(Span span, String newText) {

    /**
     * The text after all the edits, which refer to the text before any of them.
     *
     * @throws IllegalArgumentException if two edits overlap
     */
    public static String apply(String text, List<TextEdit> edits) {
        List<TextEdit> ordered = new ArrayList<>(edits);
        ordered.sort(Comparator.comparingInt(edit -> edit.span().start()));
        StringBuilder result = new StringBuilder();
        int done = 0;
        for (TextEdit edit : ordered) {
            if (edit.span().start() < done) {
                throw new IllegalArgumentException(
                        "overlapping edits at offset " + edit.span().start());
            }
            result.append(text, done, edit.span().start()).append(edit.newText());
            done = edit.span().end();
        }
        return result.append(text, done, text.length()).toString();
    }
}
