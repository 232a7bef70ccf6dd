package irreproof.server;

import irreproof.text.LineIndex;
import irreproof.text.Span;
import java.util.List;
import org.eclipse.lsp4j.TextDocumentContentChangeEvent;

/**
 * Applies a client's changes in their order, each to the text that the one before left behind. Lines above the topmost
 * change so far keep their offsets, so that the usual "replace all", sent from the bottom up, needs one line index.
 */
final class ContentChanges {
    private final PositionEncoding encoding;
    private final StringBuilder text;
    private Places places;
    private int firstStaleLine;

    private ContentChanges(String text, PositionEncoding encoding) {
        this.text = new StringBuilder(text);
        this.encoding = encoding;
        index();
    }

    static String apply(String text, List<TextDocumentContentChangeEvent> changes, PositionEncoding encoding) {
        ContentChanges result = new ContentChanges(text, encoding);
        changes.forEach(result::apply);
        return result.text.toString();
    }

    private void apply(TextDocumentContentChangeEvent change) {
        if (change.getRange() == null) {
            text.replace(0, text.length(), change.getText());
            firstStaleLine = 0;
            return;
        }
        if (change.getRange().getEnd().getLine() >= firstStaleLine) {
            index();
        }
        Span span = places.span(change.getRange());
        firstStaleLine = places.lines().position(span.start()).line();
        text.replace(span.start(), span.end(), change.getText());
    }

    private void index() {
        LineIndex lines = new LineIndex(text);
        places = new Places(text, lines, encoding);
        firstStaleLine = Integer.MAX_VALUE;
    }
}
