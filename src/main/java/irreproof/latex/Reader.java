package irreproof.latex;

import irreproof.budget.Budget;
import irreproof.text.SourceText;
import java.util.List;
import java.util.Optional;

/** Reads one source: lexing, macro definitions, expansion, passages, headings, prose. Never throws on any input. */
public final class Reader {
    private static final String SNIPPET = "-";

    private Reader() {}

    public static LatexDocument read(SourceText source, SourceProvider sources, Budget budget) {
        return read(source, List.of(), sources, budget);
    }

    /**
     * Reads a source whose macros stand elsewhere too: a chapter without its own preamble.
     *
     * @param preambles files read before the source, for their definitions only
     */
    public static LatexDocument read(
            SourceText source, List<SourceText> preambles, SourceProvider sources, Budget budget) {
        Expander.Shared shared = new Expander.Shared(budget);
        Inclusions inclusions = new Inclusions(sources, shared);
        return new DocumentReader(source, shared, inclusions).read(preambles);
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
        Expander.Shared shared = new Expander.Shared(Budget.unlimited());
        return new DocumentReader(source, shared, new Inclusions(SourceProvider.none(), shared)).formula();
    }
}
