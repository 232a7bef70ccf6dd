package irreproof.check.judge;

/**
 * A written name without its bars: names with equal keys must denote the same irrep throughout a reading.
 *
 * @param family names of one family (one dimension) with different numbers must denote different irreps; empty if the
 *     key itself says what it denotes (a Dynkin label)
 * @param number how many primes
 * @param text the name as it can be shown, without bars: {@code 15'}, {@code 8v}, {@code (2,1)}
 * @param mark a subscript that is no part of the name but may tell irreps of one dimension apart; or empty
 */
public record NameKey(String family, int number, String text, String mark) {
    /** A key of a name without such a mark. */
    public NameKey(String family, int number, String text) {
        this(family, number, text, "");
    }

    // equals and hashCode written out: a record's generated ones cost a short run more than the rest of its work

    @Override
    public boolean equals(Object other) {
        return other instanceof NameKey that
                && number == that.number
                && text.equals(that.text)
                && mark.equals(that.mark)
                && family.equals(that.family);
    }

    @Override
    public int hashCode() {
        return 31 * text.hashCode() + number;
    }
}
