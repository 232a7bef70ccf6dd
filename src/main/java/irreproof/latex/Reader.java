package irreproof.latex;

import irreproof.budget.Budget;
import irreproof.text.SourceText;

/** Reads one source: lexing, macro definitions, expansion, passages, headings, prose. Never throws on any input. */
public final class Reader {
    private Reader() {}

    public static LatexDocument read(SourceText source, SourceProvider sources, Budget budget) {
        throw new UnsupportedOperationException("in the making");
    }

    /** A snippet typed on the command line or in a directive, flattened; spans refer to the snippet. */
    public static PlainText flatten(String snippet) {
        throw new UnsupportedOperationException("in the making");
    }
}
