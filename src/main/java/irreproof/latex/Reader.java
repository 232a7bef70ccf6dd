package irreproof.latex;

import irreproof.budget.Budget;
import irreproof.budget.BudgetExceeded;
import irreproof.text.SourceText;
import java.util.List;
import java.util.Optional;

/**
 * Reads one source: lexing, macro definitions, expansion, passages, headings, prose. Takes any input: what cannot be read
 * is left out or becomes one of the document's problems. One step of the budget is one token.
 */
public final class Reader {
    private static final String SNIPPET = "-";

    private Reader() {}

    /** @throws BudgetExceeded if the budget is cancelled, late, or too small for the source */
    public static LatexDocument read(SourceText source, SourceProvider sources, Budget budget) {
        return read(source, sources.preambles(source.path()), sources, budget);
    }

    /**
     * Reads a source whose macros stand elsewhere too: a chapter without its own preamble.
     *
     * @param roots the documents that include the source, for what they define before they do so
     * @throws BudgetExceeded if the budget is cancelled, late, or too small for the source
     */
    public static LatexDocument read(SourceText source, List<SourceText> roots, SourceProvider sources, Budget budget) {
        return reader(source, sources, budget).read(roots);
    }

    private static DocumentReader reader(SourceText source, SourceProvider sources, Budget budget) {
        Reading reading = new Reading(budget);
        return new DocumentReader(source, reading, new Inclusions(source.path(), sources, reading));
    }

    /** A snippet typed on the command line or in a directive, flattened; spans refer to the snippet. */
    public static PlainText flatten(String snippet) {
        return read(new SourceText(SNIPPET, snippet), SourceProvider.none(), Budget.unlimited())
                .prose();
    }

    /**
     * A formula typed without math shifts ({@code \mathbf{8}\otimes\mathbf{8}}), read as one inline passage; spans
     * refer to the snippet. Empty if there is nothing in it. A snippet with its own shifts gives its first passage.
     */
    public static Optional<Passage> passage(String snippet) {
        SourceText source = new SourceText(SNIPPET, snippet);
        return reader(source, SourceProvider.none(), Budget.unlimited()).formula();
    }
}
