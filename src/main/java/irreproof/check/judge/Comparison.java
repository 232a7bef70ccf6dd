package irreproof.check.judge;

import irreproof.engine.Decomposition;

/**
 * One side held against what it must agree with.
 *
 * @param side the index of the side that is held against the other
 * @param against the index of the side that decides
 * @param kind what the relation between them asserts
 * @param holds whether it is so
 * @param expected what the side must be, or must be part of
 * @param found what the side lists
 */
public record Comparison<I extends Comparable<? super I>>(
        int side, int against, Kind kind, boolean holds, Decomposition<I> expected, Decomposition<I> found) {
    /** What is asserted. */
    public enum Kind {
        /** The side equals the expected sum. */
        EQUAL,
        /** The side's terms occur in the expected sum, as often as they are listed. */
        PART_OF,
        /** The side does not equal the expected sum. */
        DIFFERENT,
        /** The side's terms do not all occur in the expected sum. */
        NOT_PART_OF
    }

    /** What the expected sum has beyond the side. */
    public Decomposition<I> missing() {
        return expected.minus(found).positivePart();
    }

    /** What the side has beyond the expected sum. */
    public Decomposition<I> surplus() {
        return found.minus(expected).positivePart();
    }
}
