package irreproof.check.judge;

/**
 * A written name without its bars: names with equal keys must denote the same irrep throughout a reading.
 *
 * @param family names of one family (one dimension) with different numbers must denote different irreps; empty if the
 *     key itself says what it denotes (a Dynkin label)
 * @param number how many primes
 * @param text the name as it can be shown, without bars: {@code 15'}, {@code 8v}, {@code (2,1)}
 */
public record NameKey(String family, int number, String text) {}
