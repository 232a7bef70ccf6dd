package irreproof.notation;

/**
 * How sums are written.
 *
 * @param sign the sign between terms with the blanks around it
 * @param counting what stands between a count and what it counts; empty if the author was never seen to count
 * @param counts true if the author was seen to count
 * @param repeats true if the author was seen to repeat a term
 */
record SumStyle(String sign, String counting, boolean counts, boolean repeats) {
    static final SumStyle STANDARD = new SumStyle("\\oplus", "", false, false);
}
