package irreproof.engine.lie;

import irreproof.engine.Partition;

/**
 * Counts the diagrams that a diagram dominates: as many boxes, and no more of them in the first rows, for any number of
 * rows. They are the dominant weights of the irrep of SU(N) that the diagram stands for (Fulton and Harris,
 * Representation Theory, 15.3), and belong to the dominant weights of the other classical algebras. Row by row over the
 * boxes used and the length of the row; quadratic in the boxes, up to a logarithm.
 */
final class DominatedDiagrams {
    /** The partitions of 400 can be counted in 64 bits. */
    static final int MOST_BOXES = 400;

    private DominatedDiagrams() {}

    /**
     * @param diagram of at most {@link #MOST_BOXES} boxes
     * @param rows the most rows that are allowed
     */
    static long count(Partition diagram, int rows) {
        int boxes = Math.toIntExact(diagram.size());
        // by boxes used and length of the last row
        long[][] ways = new long[boxes + 1][boxes + 1];
        int longest = boxes;
        ways[0][boxes] = 1;
        long done = boxes == 0 ? 1 : 0;
        int limit = 0;
        for (int row = 0; row < Math.min(rows, boxes); row++) {
            limit += diagram.row(row);
            int longestNext = boxes / (row + 1);
            long[][] next = new long[boxes + 1][longestNext + 1];
            for (int used = 0; used < boxes; used++) {
                long longer = 0;
                for (int length = longest; length > 0; length--) {
                    longer += ways[used][length];
                    if (length <= longestNext && used + length <= limit) {
                        next[used + length][length] += longer;
                    }
                }
            }
            for (long complete : next[boxes]) {
                done += complete;
            }
            ways = next;
            longest = longestNext;
        }
        return done;
    }
}
