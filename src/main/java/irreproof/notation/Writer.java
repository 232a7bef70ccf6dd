package irreproof.notation;

import java.math.BigInteger;
import java.util.ArrayList;
import java.util.List;

/** Prints the right side of a statement in an author's style. */
public final class Writer {
    /** More copies than this are counted, whatever the author's habit. */
    private static final BigInteger MOST_COPIES = BigInteger.valueOf(4);

    private Writer() {}

    /**
     * The terms in the given order. Reading the result gives the same names again.
     *
     * @throws IllegalArgumentException if there are no terms
     */
    public static String sum(List<WrittenTerm> terms, AuthorStyle style) {
        if (terms.isEmpty()) {
            throw new IllegalArgumentException("a sum without terms");
        }
        List<String> written = new ArrayList<>();
        for (WrittenTerm term : terms) {
            String name = style.write(term.name());
            if (!style.canCount(term.name()) || isRepeated(term.count(), style.sums())) {
                for (int copies = term.count().intValueExact(); copies > 0; copies--) {
                    written.add(name);
                }
            } else {
                written.add(term.count() + counting(term, style, terms.size() > 1) + name);
            }
        }
        return String.join(style.sums().sign(), written);
    }

    /** One name. */
    public static String name(WrittenTerm.WrittenName name, AuthorStyle style) {
        return style.write(name);
    }

    private static boolean isRepeated(BigInteger count, SumStyle sums) {
        if (count.equals(BigInteger.ONE)) {
            return true;
        }
        boolean counts = sums.counts() && !sums.repeats();
        return !counts && count.compareTo(MOST_COPIES) <= 0;
    }

    /** Between a count and a plain number only a dot says that the count is no irrep. */
    private static String counting(WrittenTerm term, AuthorStyle style, boolean inSum) {
        String learnt = style.sums().counting();
        boolean clear = style.standsOut(term.name()) && !(learnt.contains("times") && !inSum);
        if (style.sums().counts() && (clear || learnt.contains("cdot"))) {
            return learnt;
        }
        return style.standsOut(term.name()) ? "\\," : "\\cdot ";
    }
}
