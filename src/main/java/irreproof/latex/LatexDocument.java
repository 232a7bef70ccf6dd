package irreproof.latex;

import irreproof.text.SourceText;
import irreproof.text.Span;
import java.util.List;

/**
 * What the reader found in one source; every list is in document order and every span refers to {@link #source}.
 *
 * @param paragraphs the stretches between paragraph breaks and headings; a display belongs to the paragraph around it
 * @param prose the whole document flattened, mathematics included
 * @param problems what could not be read (a macro that expands without end, an included file's trouble)
 */
public record LatexDocument(
        SourceText source,
        List<Passage> passages,
        List<Heading> headings,
        List<Span> paragraphs,
        List<Comment> comments,
        PlainText prose,
        MacroTable macros,
        List<String> problems) {
    public LatexDocument {
        passages = List.copyOf(passages);
        headings = List.copyOf(headings);
        paragraphs = List.copyOf(paragraphs);
        comments = List.copyOf(comments);
        problems = List.copyOf(problems);
    }
}
