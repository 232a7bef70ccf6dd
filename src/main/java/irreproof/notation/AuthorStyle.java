package irreproof.notation;

import irreproof.notation.WrittenTerm.WrittenName;
import java.util.List;
import java.util.Map;

/**
 * How an author writes irreps and sums, learnt from what the author wrote. Every habit has a default, so that a style can
 * write everything.
 */
public final class AuthorStyle {
    private static final AuthorStyle STANDARD = new AuthorStyle(
            Map.of(),
            NameStyle.STANDARD,
            ListStyle.STANDARD,
            DiagramStyle.STANDARD,
            SpinStyle.STANDARD,
            Tuples.STANDARD,
            SumStyle.STANDARD);

    private final Map<WrittenName, String> known;
    private final NameStyle names;
    private final ListStyle lists;
    private final DiagramStyle diagrams;
    private final SpinStyle spins;
    private final Tuples tuples;
    private final SumStyle sums;

    /** How tuples are written, with a style of their own for the entries. */
    record Tuples(TupleStyle style, NameStyle names, SpinStyle spins) {
        static final Tuples STANDARD = new Tuples(TupleStyle.STANDARD, NameStyle.STANDARD, SpinStyle.STANDARD);
    }

    /** @param known names the author has written, as written: these are used again letter by letter */
    AuthorStyle(
            Map<WrittenName, String> known,
            NameStyle names,
            ListStyle lists,
            DiagramStyle diagrams,
            SpinStyle spins,
            Tuples tuples,
            SumStyle sums) {
        this.known = Map.copyOf(known);
        this.names = names;
        this.lists = lists;
        this.diagrams = diagrams;
        this.spins = spins;
        this.tuples = tuples;
        this.sums = sums;
    }

    /** Bold names, {@code \oplus}, repeated terms. */
    public static AuthorStyle standard() {
        return STANDARD;
    }

    /**
     * @param source the document that the spans of the samples refer to
     * @param samples the statement to be mended first, then others of the document in the order of their weight; they
     *     fill in what the first does not show
     */
    public static AuthorStyle learn(String source, List<Statement> samples) {
        return new StyleLearner(source).learn(samples);
    }

    String write(WrittenName name) {
        String written = known.get(name);
        if (written != null) {
            return written;
        }
        if (name instanceof WrittenTerm.Dimension dimension) {
            return names.write(dimension);
        }
        if (name instanceof WrittenTerm.Labels labels) {
            return lists.write(labels.labels());
        }
        if (name instanceof WrittenTerm.Tuple tuple) {
            return tuples.style().write(tuple, this::entry);
        }
        return name instanceof WrittenTerm.Diagram diagram
                ? diagrams.write(diagram.rows())
                : spins.write(((WrittenTerm.Spin) name).doubled());
    }

    private String entry(WrittenName name) {
        if (name instanceof WrittenTerm.Dimension dimension) {
            return tuples.names().write(dimension);
        }
        return name instanceof WrittenTerm.Spin spin ? tuples.spins().write(spin.doubled()) : write(name);
    }

    /** True if a count in front of this name cannot be taken for a name itself. */
    boolean standsOut(WrittenName name) {
        if (name instanceof WrittenTerm.Dimension) {
            return names.styling() == NameStyle.Styling.EACH;
        }
        return !(name instanceof WrittenTerm.Spin) || spins.isStyled();
    }

    /** False if a count would be set in the same face as the names. */
    boolean canCount(WrittenName name) {
        return !(name instanceof WrittenTerm.Dimension) || names.styling() != NameStyle.Styling.SWITCHED;
    }

    SumStyle sums() {
        return sums;
    }
}
