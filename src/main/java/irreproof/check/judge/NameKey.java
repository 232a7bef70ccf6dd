package irreproof.check.judge;

/**
 * A written name without its bars: names with equal keys must denote the same irrep throughout a reading.
 *
 * @param family names of one family (one dimension) with different numbers must denote different irreps; empty if the
 *     key itself says what it denotes (a Dynkin label)
 * @param number how many primes
 * @param text the name as it can be shown, without bars: {@code 15'}, {@code 8v}, {@code (2,1)}
 */
public record NameKey(String family, int number, String text) {
    // equals and hashCode written out: a record's generated ones cost a short run more than the rest of its work

    @Override
    public boolean equals(Object other) {
        return other instanceof NameKey that
                && number == that.number
                && text.equals(that.text)
                && family.equals(that.family);
    }

    @Override
    public int hashCode() {
        return 31 * text.hashCode() + number;
    }
}
